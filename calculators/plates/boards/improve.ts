import type { GoOn } from "./board-problem";
import type { Packing } from "./packing";
import { repair } from "./repair";

/** What a plan would do without, or have shorter. */
interface Saving {
  board: number;
  /** Null: no board at all. */
  kind: number | null;
  saved: number;
}

interface ImproveOptions {
  weight: readonly number[];
  /** Nothing is lighter than this: the search ends there. */
  floor: number;
  draw: () => number;
  goOn: GoOn;
  rounds: number;
  onBetter?: (packing: Packing) => void;
}

export const weightOfPacking = (packing: Packing, weight: readonly number[]) => packing.kinds.reduce((sum, kind) => sum + weight[kind]!, 0);

/**
 * Makes a sound packing lighter, a board less or a shorter board at a time, as long as the pieces can be brought onto what
 * is left. The answer is sound and never heavier than the packing given.
 */
export function improve(start: Packing, options: ImproveOptions): Packing {
  let best = start;
  for (;;) {
    const weightNow = weightOfPacking(best, options.weight);
    const better = weightNow > options.floor && options.goOn() ? oneBetter(best, options) : null;
    if (better === null) return best;
    best = better;
    options.onBetter?.(best);
  }
}

function oneBetter(packing: Packing, { weight, draw, goOn, rounds }: ImproveOptions): Packing | null {
  const spare = packing.loads.reduce((sum, load, board) => sum + packing.capacity(board) - load, 0);
  for (const saving of savingsOf(packing, weight, spare)) {
    if (!goOn()) return null;
    const tried = packing.copy();
    if (saving.kind === null) tried.remove(saving.board);
    else tried.kinds[saving.board] = saving.kind;
    if (repair(tried, rounds, draw, goOn)) return tried;
  }
  return null;
}

/** The savings that leave room enough in all, those that ask least of the pieces first. */
function savingsOf(packing: Packing, weight: readonly number[], spare: number): Saving[] {
  const used = packing.stock.map(() => 0);
  for (const kind of packing.kinds) used[kind]! += 1;
  const savings: (Saving & { lost: number })[] = [];
  packing.kinds.forEach((kind, board) => {
    const capacity = packing.capacity(board);
    if (packing.kinds.length > 1 && capacity <= spare) savings.push({ board, kind: null, saved: weight[kind]!, lost: packing.loads[board]! });
    packing.stock.forEach((other, index) => {
      const saved = weight[kind]! - weight[index]!;
      if (saved <= 0 || capacity - other.capacity > spare || used[index]! >= other.count) return;
      savings.push({ board, kind: index, saved, lost: Math.max(0, packing.loads[board]! - other.capacity) });
    });
  });
  return savings.sort((a, b) => a.lost - b.lost || b.saved - a.saved).slice(0, 40);
}
