import type { PlatesAnswer } from "@/calculators/plates";
import { keyFigure, type Adapter } from "./adapter";

export const plates: Adapter<PlatesAnswer> = {
  operation: () => "plates",
  key: ({ ok, pieces, boards, addedAnchors }) => keyFigure(!ok ? "out" : addedAnchors.length > 0 ? "warn" : "good", !ok ? "fails" : "plan", { pieces: pieces.length, boards: boards.length, added: addedAnchors.length }),
  gives: () => ({}),
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
