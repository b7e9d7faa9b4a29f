import type { PlatesAnswer } from "@/calculators/plates";

const exactText = ({ exact, in: inches }: { exact: string | null; in: number }) => `${exact ?? inches} in`;

/** What a plan asks the takeoff for, by the names of its fields. */
export function takeoffFromPlates({ boards, pieces, addedAnchors, totals, washer, limits }: PlatesAnswer) {
  const counts = new Map<string, number>();
  for (const { stock } of boards) counts.set(exactText(stock), (counts.get(exactText(stock)) ?? 0) + 1);
  const standing = pieces.flatMap(({ holes }) => holes).filter(({ kind }) => kind !== "added").length;
  return {
    lumber: [...counts].map(([length, count]) => ({ length, count: String(count) })),
    plateLength: exactText(totals.pieceLength),
    pieceCount: String(totals.pieces),
    bolts: standing === 0 ? "" : String(standing),
    newAnchors: addedAnchors.length === 0 ? "" : String(addedAnchors.length),
    plateWashers: washer === null ? "" : "true",
    diameter: exactText(limits.diameter),
  };
}
