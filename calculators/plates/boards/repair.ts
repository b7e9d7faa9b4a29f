import type { GoOn } from "./board-problem";
import type { Packing } from "./packing";

/** Numbers from 0 to 1, the same for the same seed, so that the same question always has the same answer. */
export function drawFrom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

/**
 * Tries to bring every piece of an overfull packing within its boards: joints slide, pieces move and change places, the
 * best exchange first, one that was just made not at once undone. True when it succeeded.
 */
export function repair(packing: Packing, rounds: number, draw: () => number, goOn: GoOn): boolean {
  if (packing.settle()) return true;
  const frozenUntil = new Int32Array(packing.sizes.length);
  for (let round = 1; round <= rounds && goOn(); round += 1) {
    const overfull = packing.kinds.flatMap((_, board) => (packing.over(board) > 0 ? [board] : []));
    const board = overfull[Math.floor(draw() * overfull.length)]!;
    const change = bestChange(packing, board, frozenUntil, round, draw);
    if (change === null) continue;
    packing.move(change.piece, change.to);
    frozenUntil[change.piece] = round + 3 + Math.floor(draw() * 6);
    if (change.against !== null) {
      packing.move(change.against, board);
      frozenUntil[change.against] = round + 3 + Math.floor(draw() * 6);
    }
    if (packing.settle()) return true;
  }
  return false;
}

interface Change {
  piece: number;
  to: number;
  against: number | null;
}

/** What takes most off the overfull boards together: a piece moved, or exchanged for another. */
function bestChange(packing: Packing, board: number, frozenUntil: Int32Array, round: number, draw: () => number): Change | null {
  const { sizes, loads, members, kinds } = packing;
  const overNow = packing.over(board);
  let best: Change | null = null;
  let bestGain = -Infinity;
  let ties = 0;
  const consider = (change: Change, shift: number) => {
    const there = packing.over(change.to);
    const after = Math.max(0, loads[board]! - shift - packing.capacity(board)) + Math.max(0, loads[change.to]! + shift - packing.capacity(change.to));
    const gain = overNow + there - after;
    if (gain > bestGain) {
      best = change;
      bestGain = gain;
      ties = 1;
    } else if (gain === bestGain) {
      ties += 1;
      if (draw() * ties < 1) best = change;
    }
  };
  for (const piece of members[board]!) {
    if (frozenUntil[piece]! >= round) continue;
    for (let to = 0; to < kinds.length; to += 1) {
      if (to === board) continue;
      consider({ piece, to, against: null }, sizes[piece]!);
      for (const against of members[to]!) {
        if (frozenUntil[against]! < round && sizes[against] !== sizes[piece]) consider({ piece, to, against }, sizes[piece]! - sizes[against]!);
      }
    }
  }
  return best;
}
