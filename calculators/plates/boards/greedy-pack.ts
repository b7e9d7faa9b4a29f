import { bestFill, type SizeCount } from "./best-fill";
import type { BoardKind, BoardPlan } from "./board-problem";

/**
 * A first plan: board after board, the largest piece left and what fills a board best beside it, from the kind that
 * costs least for what is used of it. Null when the boards run out.
 *
 * `shuffle` draws numbers from 0 to 1 and makes one of many different plans; without it the plan is always the same.
 */
export function greedyPack(sizes: readonly number[], kinds: readonly BoardKind[], weight: readonly number[], { shuffle, nodes = 1_000 }: { shuffle?: (() => number) | undefined; nodes?: number } = {}): BoardPlan["boards"] | null {
  const left = groupBySize(sizes);
  const available = kinds.map((kind) => kind.count);
  const boards: { kind: number; pieces: number[] }[] = [];
  for (;;) {
    const first = left.findIndex((group) => group.pieces.length > 0);
    if (first === -1) return boards;
    const counts: SizeCount[] = left.map((group) => ({ size: group.size, count: group.pieces.length }));
    let best: { kind: number; counts: number[]; rate: number; fill: number } | null = null;
    kinds.forEach((kind, index) => {
      if (available[index]! <= 0 || kind.capacity < left[first]!.size) return;
      const fill = bestFill(counts, kind.capacity, { first, nodes });
      const rate = (weight[index]! / fill.value) * (shuffle === undefined ? 1 : 1 + 0.06 * shuffle());
      if (best === null || rate < best.rate || (rate === best.rate && fill.value > best.fill)) best = { kind: index, counts: fill.counts, rate, fill: fill.value };
    });
    if (best === null) return null;
    const { kind, counts: taken } = best as { kind: number; counts: number[] };
    available[kind]! -= 1;
    boards.push({ kind, pieces: taken.flatMap((count, index) => left[index]!.pieces.splice(0, count)) });
  }
}

/** Piece numbers by size, largest first. */
export function groupBySize(sizes: readonly number[]): { size: number; pieces: number[] }[] {
  const groups = new Map<number, number[]>();
  sizes.forEach((size, piece) => {
    const group = groups.get(size);
    if (group === undefined) groups.set(size, [piece]);
    else group.push(piece);
  });
  return [...groups].map(([size, pieces]) => ({ size, pieces })).sort((a, b) => b.size - a.size);
}

/** The same pieces on the same boards, each board of the cheapest kind that is left and holds them. */
export function recut(boards: BoardPlan["boards"], sizes: readonly number[], kinds: readonly BoardKind[], weight: readonly number[]): BoardPlan["boards"] {
  const available = kinds.map((kind) => kind.count);
  for (const board of boards) available[board.kind]! -= 1;
  const loads = boards.map((board, index) => ({ index, load: board.pieces.reduce((sum, piece) => sum + sizes[piece]!, 0) }));
  const chosen = boards.map((board) => board.kind);
  for (const { index, load } of loads.sort((a, b) => a.load - b.load)) {
    available[chosen[index]!]! += 1;
    let best = chosen[index]!;
    kinds.forEach((kind, place) => {
      if (available[place]! > 0 && kind.capacity >= load && weight[place]! < weight[best]!) best = place;
    });
    chosen[index] = best;
    available[best]! -= 1;
  }
  return boards.map((board, index) => ({ kind: chosen[index]!, pieces: board.pieces }));
}
