import type { CheckAnswer, LayoutAnswer } from "@/calculators/anchors";
import { exactText, keyFigure, typed, type Adapter } from "./adapter";

/** One wall's bolts, laid out anew or judged as they stand. */
export const anchors: Adapter<LayoutAnswer | CheckAnswer> = {
  operation: (answer) => ("ok" in answer ? "anchors/check" : "anchors/layout"),
  key(answer) {
    if (!("ok" in answer)) return keyFigure("good", "layout", { bolts: answer.bolts });
    if (answer.ok) return keyFigure("good", "ok", { bolts: answer.bolts.length });
    return keyFigure(answer.unfixable.length > 0 ? "out" : "warn", "fails", { bolts: answer.bolts.length, findings: answer.findings.length, added: answer.additions.length });
  },
  gives(answer, asked) {
    const shared = { ...typed(asked, { diameter: "diameter", plateWidth: "plateWidth" }), ...(typeof asked.input.rule === "string" ? { rule: asked.input.rule } : {}) };
    if (!("ok" in answer)) return { ...shared, ...Object.fromEntries(answer.pieces.flatMap(({ stations }) => stations).map((station, index) => [`bolts.${index}.station`, exactText(station)])) };
    const bolts = answer.bolts.flatMap(({ station, offset, engineered }, index): [string, string][] => [
      [`bolts.${index}.station`, exactText(station)],
      ...(offset === null ? [] : [[`bolts.${index}.offset`, exactText(offset)] as [string, string]]),
      ...(engineered ? [[`bolts.${index}.engineered`, "true"] as [string, string]] : []),
    ]);
    return { ...shared, ...Object.fromEntries(bolts) };
  },
  layers(answer, { wall = "ab" }) {
    if (!("ok" in answer)) return { bolts: answer.pieces.flatMap(({ stations }) => stations).map((station) => ({ wall, station: station.in, offset: null, tone: "good" as const })) };
    const bad = new Set(answer.findings.flatMap(({ bolt }) => (bolt === null ? [] : [bolt])));
    return {
      bolts: [
        ...answer.bolts.map(({ station, offset, engineered }, index) => ({ wall, station: station.in, offset: offset?.in ?? null, tone: engineered ? ("engineered" as const) : bad.has(index) ? ("bad" as const) : ("good" as const) })),
        ...answer.additions.map(({ station, across }) => ({ wall, station: station.in, offset: across?.in ?? null, tone: "added" as const })),
      ],
    };
  },
  readings: (answer) =>
    "ok" in answer
      ? answer.additions.map(({ station }, index) => ({ key: "anchors.added", params: { number: index + 1 }, text: station.text }))
      : answer.pieces.flatMap(({ stations }) => stations).map((station, index) => ({ key: "anchors.station", params: { number: index + 1 }, text: station.text })),
};
