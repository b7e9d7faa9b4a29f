import type { InsetAnswer } from "@/calculators/inset";
import { exactText, keyFigure, pointOf, typed, type Adapter } from "./adapter";

const corners = ["A", "B", "C", "D"] as const;
const sides = ["ab", "bc", "cd", "da"] as const;

export const inset: Adapter<InsetAnswer> = {
  operation: () => "insets",
  key({ check, lines }) {
    if (check === null) return keyFigure("plain", "lines", { along: lines.ab.text, across: lines.bc.text });
    return check.agrees ? keyFigure("good", "agrees", { along: lines.ab.text, across: lines.bc.text }) : keyFigure("out", "off");
  },
  gives: ({ lines, offsets }, asked) => ({
    ...Object.fromEntries(sides.map((side) => [`line.${side}`, exactText(lines[side])])),
    "inset.ab": exactText(offsets.A.ab),
    "inset.bc": exactText(offsets.B.bc),
    "inset.cd": exactText(offsets.C.cd),
    "inset.da": exactText(offsets.D.da),
    ...typed(asked, { ac: "chalkDiagonals.ac", bd: "chalkDiagonals.bd", burn: "burn" }),
  }),
  layers: ({ corners: places }) => ({ slab: corners.map((name) => pointOf(places[name].slab)), chalk: corners.map((name) => pointOf(places[name].chalk)) }),
  readings: ({ lines, expected, offsets }) => [
    { key: "inset.line", params: { line: "AB, CD" }, text: lines.ab.text },
    { key: "inset.line", params: { line: "BC, DA" }, text: lines.bc.text },
    { key: "inset.pull", params: { pull: "AC" }, text: expected.ac.reading.text },
    { key: "inset.pull", params: { pull: "BD" }, text: expected.bd.reading.text },
    { key: "inset.offset", params: { side: "AB" }, text: offsets.A.ab.text },
    { key: "inset.offset", params: { side: "BC" }, text: offsets.B.bc.text },
    { key: "inset.offset", params: { side: "CD" }, text: offsets.C.cd.text },
    { key: "inset.offset", params: { side: "DA" }, text: offsets.D.da.text },
  ],
};
