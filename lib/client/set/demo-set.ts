import { applyPatch, type CalculationPatch } from "./patch";
import { newSet } from "./new-set";
import type { SillSet } from "./schema";

/** Readings of an invented job, as a crew would type them: a workshop slab of 28 by 22 ft racked by 5/16 in, its bolts as poured. */
const wallBolts: Readonly<Record<string, readonly [string, string][]>> = {
  ab: [["9", "2 3/4"], ["66", "2 3/4"], ["124", "2 5/8"], ["183 1/2", "2 3/4"], ["198 3/8", "2 7/8"], ["262", "2 3/4"], ["325", "2 3/4"]],
  bc: [["9", "2 3/4"], ["72 1/8", "2 3/4"], ["135", "2 3/4"], ["198", "1 5/8"], ["253", "2 3/4"]],
  cd: [["10", "2 3/4"], ["70", "2 3/4"], ["131", "2 3/4"], ["190", "2 3/4"], ["206", "2 3/4"], ["266", "2 3/4"], ["326", "2 3/4"]],
  da: [["9", "2 3/4"], ["70", "2 3/4"], ["132", "2 3/4"], ["193", "2 3/4"], ["254", "2 3/4"]],
};

const bolts = (wall: string): CalculationPatch => ({
  fields: {
    mode: "check",
    plateWidth: "5 1/2",
    diameter: "1/2",
    rule: "us-irc",
    ...Object.fromEntries((wallBolts[wall] ?? []).flatMap(([station, offset], index) => [[`bolts.${index}.station`, station], [`bolts.${index}.offset`, offset]])),
  },
});

const calculations: Readonly<Record<string, CalculationPatch>> = {
  "concrete.squareness": { fields: { length: "28'", width: "22'", "diagonals.ac": "428 9/16", "diagonals.bd": "428 1/16", burn: "1 in", tolerance: "3/16" } },
  ...Object.fromEntries(Object.keys(wallBolts).map((wall) => [`bolts.anchors.${wall}`, bolts(wall)])),
};

/** The set that "Try the example" opens. Its answers are worked out when its stages are opened, as for any other set. */
export function demoSet(id: string, name: string, now: string): SillSet {
  return applyPatch(newSet(id, name, now), { calculations }, now);
}
