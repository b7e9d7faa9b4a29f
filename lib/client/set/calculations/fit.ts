import type { FitAnswer } from "@/calculators/fit";
import { exactText, inchText, keyFigure, pointOf, type Adapter } from "./adapter";

export const fit: Adapter<FitAnswer> = {
  operation: () => "fits",
  key: ({ fits, worst, overhangNeeded }) => (fits ? keyFigure("good", "worst", { worst: worst.text }) : keyFigure("out", "overhangs", { needed: overhangNeeded?.text ?? worst.text })),
  gives: ({ lines, ranges, checks }) => ({
    ...Object.fromEntries(Object.entries(lines).map(([side, length]) => [`line.${side}`, exactText(length)])),
    ...Object.fromEntries(Object.entries(ranges).map(([side, { least, most }]) => [`inset.${side}`, inchText((least.in + most.in) / 2)])),
    ...Object.fromEntries(checks.map(({ from, to, length }) => [`check.${from}${to}`.toLowerCase(), exactText(length)])),
  }),
  layers: ({ slab, corners }) => ({ slab: Object.values(slab).map(pointOf), chalk: Object.values(corners).map(pointOf) }),
  readings: ({ offsets, checks }) => [
    ...Object.entries(offsets).flatMap(([corner, bySide]) => Object.entries(bySide).map(([side, length]) => ({ key: "fit.offset", params: { corner, side: side.toUpperCase() }, text: length.text }))),
    ...checks.map(({ from, to, reading }) => ({ key: "fit.check", params: { pull: `${from}${to}` }, text: reading.text })),
  ],
};
