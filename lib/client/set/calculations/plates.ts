import type { PlatesAnswer } from "@/calculators/plates";
import { exactText, keyFigure, typed, type Adapter } from "./adapter";

/** Boards of one length are one line of the list. */
function lumberOf({ boards }: PlatesAnswer): [string, string][] {
  const counts = new Map<string, number>();
  for (const { stock } of boards) counts.set(exactText(stock), (counts.get(exactText(stock)) ?? 0) + 1);
  return [...counts].flatMap(([length, count], index) => [[`takeoff.lumber.${index}.length`, length], [`takeoff.lumber.${index}.count`, `${count}`]]);
}

export const plates: Adapter<PlatesAnswer> = {
  operation: () => "plates",
  key: ({ ok, pieces, boards, addedAnchors }) => keyFigure(!ok ? "out" : addedAnchors.length > 0 ? "warn" : "good", !ok ? "fails" : "plan", { pieces: pieces.length, boards: boards.length, added: addedAnchors.length }),
  gives(answer, asked) {
    const holes = answer.pieces.flatMap((piece) => piece.holes);
    return {
      ...Object.fromEntries(lumberOf(answer)),
      "takeoff.plateLength": exactText(answer.totals.pieceLength),
      "takeoff.pieceCount": `${answer.pieces.length}`,
      "takeoff.bolts": `${holes.filter(({ kind }) => kind === "bolt").length}`,
      "takeoff.newAnchors": `${answer.addedAnchors.length}`,
      ...typed(asked, { "takeoff.plateWidth": "plateWidth", "takeoff.diameter": "diameter" }),
    };
  },
  layers: ({ pieces }) => ({
    pieces: pieces.flatMap(({ wall, from, to }) => (wall === null || from === null || to === null ? [] : [{ wall, from: from.in, to: to.in }])),
    holes: pieces.flatMap(({ wall, holes }) => (wall === null ? [] : holes.map(({ station, across }) => ({ wall, station: station.in, across: across?.in ?? null })))),
  }),
  readings: ({ pieces }) =>
    pieces.flatMap(({ id, length, holes }) => [
      { key: "plates.piece", params: { piece: id }, text: length.text },
      ...holes.map(({ running }, index) => ({ key: "plates.hole", params: { piece: id, number: index + 1 }, text: running.text })),
    ]),
};
