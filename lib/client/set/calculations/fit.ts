import type { FitAnswer } from "@/calculators/fit";
import { exactText, inchText, keyFigure, pointOf, typed, type Adapter } from "./adapter";

/** The corners at which the plan turns inward, such as `D`; corners run counter-clockwise. */
function insideCorners(corners: FitAnswer["corners"]): string {
  const all = Object.entries(corners);
  const turnsInward = (index: number) => {
    const [[, before], [, at], [, after]] = [all.at(index - 1)!, all[index]!, all[(index + 1) % all.length]!];
    return (at.x - before.x) * (after.y - at.y) - (at.y - before.y) * (after.x - at.x) < 0;
  };
  return all.flatMap(([name], index) => (turnsInward(index) ? [name] : [])).join(", ");
}

export const fit: Adapter<FitAnswer> = {
  operation: () => "fits",
  key: ({ fits, worst, overhangNeeded }) => (fits ? keyFigure("good", "worst", { worst: worst.text }) : keyFigure("out", "overhangs", { needed: overhangNeeded?.text ?? worst.text })),
  gives: ({ lines, ranges, checks, corners }, asked) => ({
    ...Object.fromEntries(Object.entries(lines).map(([side, length]) => [`line.${side}`, exactText(length)])),
    ...Object.fromEntries(Object.entries(ranges).map(([side, { least, most }]) => [`inset.${side}`, inchText((least.in + most.in) / 2)])),
    ...Object.fromEntries(checks.map(({ from, to, length }) => [`check.${from}${to}`.toLowerCase(), exactText(length)])),
    inside: insideCorners(corners),
    ...typed(asked, { burn: "burn" }),
  }),
  layers: ({ slab, corners }) => ({ slab: Object.values(slab).map(pointOf), chalk: Object.values(corners).map(pointOf) }),
  readings: ({ offsets, checks }) => [
    ...Object.entries(offsets).flatMap(([corner, bySide]) => Object.entries(bySide).map(([side, length]) => ({ key: "fit.offset", params: { corner, side: side.toUpperCase() }, text: length.text }))),
    ...checks.map(({ from, to, reading }) => ({ key: "fit.check", params: { pull: `${from}${to}` }, text: reading.text })),
  ],
};
