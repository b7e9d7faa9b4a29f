import type { BoardKind, GoOn } from "./board-problem";
import { Packing, type SlidingJoint } from "./packing";

interface ExhaustOptions {
  kinds: readonly BoardKind[];
  weight: readonly number[];
  /** How small each piece can become, and as it is with the joints where they are. */
  least: readonly number[];
  sizes: readonly number[];
  joints: readonly SlidingJoint[];
  beat: number;
  floor: number;
  goOn: GoOn;
  steps: number;
}

export interface Exhausted {
  /** Lighter than the weight to beat; null when there is no such plan among those looked at. */
  packing: Packing | null;
  /** True when every plan was looked at. */
  proved: boolean;
  steps: number;
}

/**
 * Looks at every way to share out a few pieces among boards, for plans lighter than `beat`: the piece that must be longest
 * first, on each board begun that may hold it and on a new board of each kind. Joints slide only at the end, by `settle`,
 * which finds a place for them whenever there is one.
 */
export function exhaust({ kinds, weight, least, sizes, joints, beat, floor, goOn, steps: mostSteps }: ExhaustOptions): Exhausted {
  const order = least.map((_, piece) => piece).sort((a, b) => least[b]! - least[a]! || sizes[b]! - sizes[a]!);
  const need = sizes.reduce((sum, size) => sum + size, 0);
  const rate = Math.min(...kinds.map((kind, index) => weight[index]! / kind.capacity));
  const used = kinds.map(() => 0);
  const boards: { kind: number; pieces: number[]; load: number }[] = [];
  let best: Packing | null = null;
  let bestWeight = beat;
  let steps = 0;
  let proved = true;
  const search = (place: number, spent: number, capacity: number): void => {
    if (bestWeight <= floor || !proved) return;
    steps += 1;
    if (steps > mostSteps || ((steps & 1023) === 0 && !goOn())) {
      proved = false;
      return;
    }
    // What is bought already holds so much; the rest costs at least the cheapest rate.
    if (spent + Math.max(0, need - capacity) * rate > bestWeight - 1 + 1e-6) return;
    if (place === order.length) {
      if (capacity < need) return;
      const packing = new Packing(kinds, sizes, joints, boards);
      if (packing.settle()) {
        best = packing;
        bestWeight = spent;
      }
      return;
    }
    const piece = order[place]!;
    const tried = new Set<string>();
    for (const board of boards) {
      if (board.load + least[piece]! > kinds[board.kind]!.capacity) continue;
      if (joints.length === 0) {
        const same = `${board.kind} ${board.load}`;
        if (tried.has(same)) continue;
        tried.add(same);
      }
      board.pieces.push(piece);
      board.load += least[piece]!;
      search(place + 1, spent, capacity);
      board.pieces.pop();
      board.load -= least[piece]!;
    }
    kinds.forEach((kind, index) => {
      if (kind.capacity < least[piece]! || used[index]! >= kind.count) return;
      used[index]! += 1;
      boards.push({ kind: index, pieces: [piece], load: least[piece]! });
      search(place + 1, spent + weight[index]!, capacity + kind.capacity);
      boards.pop();
      used[index]! -= 1;
    });
  };
  search(0, 0, 0);
  return { packing: best, proved, steps };
}
