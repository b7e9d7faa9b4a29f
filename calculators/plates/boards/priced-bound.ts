import { bestFill } from "./best-fill";
import type { BoardKind, BoardProblem, StretchToCut } from "./board-problem";

/** What a piece is worth by its size: `worth[i]` from `sizes[i]` on, nothing below the first. Sizes rise. */
export interface PriceList {
  sizes: readonly number[];
  worth: readonly number[];
}

/** A window is looked at in so many parts; the bound errs by a part at most, always to the safe side. */
const parts = 12;

/**
 * A bound on the cost of every plan, wherever the joints stand: a price list under which no board can hold more worth
 * than it costs, and for each stretch the least worth that any way of jointing it has. The list is scaled down until the
 * first holds for kinds without limit; kinds of which there are few give back what they gain. So any list makes a bound,
 * and a good one makes a good bound.
 */
export function pricedBound({ stretches, kinds, kerf }: BoardProblem, prices: PriceList): number {
  if (!stretches.every((stretch) => stretch.complete)) return 0;
  const most = kinds.map((kind) => mostWorth(kind, prices));
  const scale = Math.min(1, ...kinds.map((kind, index) => (Number.isFinite(kind.count) || most[index]! <= kind.cost ? 1 : kind.cost / most[index]!)));
  const gained = kinds.reduce((sum, kind, index) => (Number.isFinite(kind.count) ? sum + kind.count * Math.max(0, most[index]! * scale - kind.cost) : sum), 0);
  const worth = (size: number) => worthOf(prices, size);
  const total = stretches.reduce((sum, stretch) => sum + leastWorth(stretch, kerf, worth), 0);
  return (total * scale - gained) * (1 - 1e-9);
}

function mostWorth(kind: BoardKind, { sizes, worth }: PriceList): number {
  const counts = sizes.map((size) => ({ size, count: Math.floor(kind.capacity / size) }));
  return bestFill(counts, kind.capacity, { value: worth, nodes: 60_000 }).bound;
}

function worthOf({ sizes, worth }: PriceList, size: number): number {
  let low = 0;
  let high = sizes.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (sizes[middle]! <= size) low = middle + 1;
    else high = middle;
  }
  return low === 0 ? 0 : worth[low - 1]!;
}

function leastWorth({ from, to, ways }: StretchToCut, kerf: number, worth: (size: number) => number): number {
  let least = Infinity;
  for (const windows of ways) {
    // The parts of one window: from each, the least worth of the pieces before it.
    let before: { low: number; high: number; worth: number }[] = [{ low: from, high: from, worth: 0 }];
    for (const [low, high] of [...windows, [to, to] as const]) {
      const width = high - low;
      const count = width === 0 ? 1 : Math.min(parts, width + 1);
      before = Array.from({ length: count }, (_, part) => {
        const start = low + Math.floor((width * part) / count);
        const end = part === count - 1 ? high : low + Math.floor((width * (part + 1)) / count);
        return { low: start, high: end, worth: Math.min(...before.map((other) => other.worth + worth(Math.max(0, start - other.high) + kerf))) };
      });
    }
    least = Math.min(least, before[0]!.worth);
  }
  return least;
}

/** Pieces of more than half the longest board: no board holds two of them, so each is worth the cheapest board that holds it. */
export function bigPiecePrices(kinds: readonly BoardKind[]): PriceList {
  const longest = Math.max(...kinds.map((kind) => kind.capacity));
  const half = Math.floor(longest / 2) + 1;
  const sizes = [...new Set([half, ...kinds.map((kind) => kind.capacity + 1)])].filter((size) => size >= half && size <= longest).sort((a, b) => a - b);
  return { sizes, worth: sizes.map((size) => Math.min(...kinds.filter((kind) => kind.capacity >= size).map((kind) => kind.cost))) };
}

/** Prices of single sizes, made to rise: a larger piece is worth no less than a smaller. */
export function risingPrices(pairs: readonly { size: number; worth: number }[]): PriceList {
  const sorted = [...pairs].sort((a, b) => a.size - b.size);
  let highest = 0;
  return { sizes: sorted.map((pair) => pair.size), worth: sorted.map((pair) => (highest = Math.max(highest, pair.worth))) };
}
