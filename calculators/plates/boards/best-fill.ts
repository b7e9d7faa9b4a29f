import type { GoOn } from "./board-problem";

/** Sizes still to be cut, largest first, each with how many there are. */
export interface SizeCount {
  size: number;
  count: number;
}

export const alwaysOn: GoOn = () => true;

/**
 * The set of sizes that fills `capacity` most worthily, with at most their counts; `value` per size is its worth (its
 * own size when the fill itself is what counts). `first` must be in it when given.
 *
 * Exact unless more than `nodes` steps were needed; then `proved` is false and `bound` still holds.
 */
export function bestFill(sizes: readonly SizeCount[], capacity: number, { value, first, nodes = 20_000 }: { value?: readonly number[]; first?: number; nodes?: number } = {}): { counts: number[]; value: number; bound: number; proved: boolean } {
  const worth = value ?? sizes.map((entry) => entry.size);
  const order = sizes.map((_, index) => index).filter((index) => sizes[index]!.count > 0 && worth[index]! > 0 && sizes[index]!.size <= capacity);
  order.sort((a, b) => worth[b]! / sizes[b]!.size - worth[a]! / sizes[a]!.size || sizes[b]!.size - sizes[a]!.size);
  const chosen = new Array<number>(sizes.length).fill(0);
  let room = capacity;
  let base = 0;
  if (first !== undefined) {
    chosen[first] = 1;
    room -= sizes[first]!.size;
    base = worth[first]!;
  }
  const smallest: number[] = new Array<number>(order.length + 1).fill(Infinity);
  for (let index = order.length - 1; index >= 0; index -= 1) smallest[index] = Math.min(smallest[index + 1]!, sizes[order[index]!]!.size);
  let best = base;
  let bestCounts = [...chosen];
  let steps = 0;
  let cut = 0; // the best that an abandoned branch could have had
  const search = (place: number, left: number, sum: number): void => {
    if (sum > best) {
      best = sum;
      bestCounts = [...chosen];
    }
    if (place === order.length || left < smallest[place]!) return;
    const index = order[place]!;
    const { size, count } = sizes[index]!;
    const hope = sum + (left * worth[index]!) / size;
    if (hope <= best + 1e-12 * Math.abs(best)) return;
    steps += 1;
    if (steps > nodes) {
      cut = Math.max(cut, hope);
      return;
    }
    const most = Math.min(count - (index === first ? 1 : 0), Math.floor(left / size));
    for (let take = most; take >= 0; take -= 1) {
      chosen[index]! += take;
      search(place + 1, left - take * size, sum + take * worth[index]!);
      chosen[index]! -= take;
      if (value === undefined && best === capacity) return;
    }
  };
  search(0, room, base);
  return { counts: bestCounts, value: best, bound: Math.max(best, cut), proved: cut <= best };
}
