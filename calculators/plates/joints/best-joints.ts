import { type Interval, type IntervalSet, normalized, union, without } from "./intervals";
import { piecewiseWays, type PieceEnd, type PieceWay } from "./piece-ways";
import { layOut, type LaidStretch, type PieceLimits, type Stretch } from "./stretch";
import { image, preimage } from "./zone";

/** The pieces that may begin or end at each place of a stretch: 0 is its start, then its gaps in order, then its end. */
export interface PieceGraph {
  stretch: LaidStretch;
  places: readonly PieceEnd[];
  /** From each place: every piece that can begin there. */
  pieces: readonly (readonly { to: number; way: PieceWay }[])[];
}

export function pieceGraph(bare: Stretch, limits: PieceLimits): PieceGraph {
  const stretch = layOut(bare, limits);
  const gaps = stretch.gaps.flatMap((within, bolts): PieceEnd[] => (within === null ? [] : [{ within, bolts, fixed: false }]));
  const places: PieceEnd[] = [
    { within: [stretch.from, stretch.from], bolts: 0, fixed: true },
    ...gaps,
    { within: [stretch.to, stretch.to], bolts: stretch.bolts.length, fixed: true },
  ];
  const last = places.length - 1;
  const pieces = places.map((start, index) =>
    index === last
      ? []
      : places.flatMap((end, to) => {
          const isLater = to > index || (to === index && !start.fixed);
          const tooFar = end.within[0] - start.within[1] > limits.longest;
          return to === 0 || !isLater || tooFar ? [] : piecewiseWays(stretch, limits, start, end).map((way) => ({ to, way }));
        }),
  );
  return { stretch, places, pieces };
}

/** The least that any joints cost: added anchors first, then pieces. */
export interface LeastCost {
  added: number;
  pieces: number;
}

/**
 * The fewest added anchors, and with those the fewest pieces, over all positions of all joints. Exact: positions are
 * kept as sets, so none is left out; a place reached at no greater cost is never looked at again.
 *
 * When the far end cannot be reached: how far joints get, and how many of them.
 */
export function leastCost({ places, pieces, stretch }: PieceGraph): LeastCost | { stuckAt: number; joint: number } {
  const last = places.length - 1;
  const reached: IntervalSet[] = places.map(() => []);
  const waiting = new Map<number, Map<number, IntervalSet[]>>(); // added → pieces → place
  const put = (added: number, count: number, place: number, set: IntervalSet) => {
    const byCount = waiting.get(added) ?? new Map<number, IntervalSet[]>();
    waiting.set(added, byCount);
    const sets = byCount.get(count) ?? places.map(() => []);
    byCount.set(count, sets);
    sets[place] = union(sets[place]!, set);
  };
  put(0, 0, 0, [[stretch.from, stretch.from]]);
  let stuck = { stuckAt: stretch.from, joint: 1 };
  for (;;) {
    const added = least(waiting.keys());
    if (added === null) return stuck;
    const byCount = waiting.get(added)!;
    const count = least(byCount.keys());
    if (count === null) {
      waiting.delete(added);
      continue;
    }
    const sets = byCount.get(count)!;
    byCount.delete(count);
    if (sets[last]!.length > 0) return { added, pieces: count };
    sets.forEach((set, place) => {
      const fresh = without(set, reached[place]!);
      if (fresh.length === 0) return;
      reached[place] = union(reached[place]!, fresh);
      const farthest = fresh.at(-1)![1];
      if (farthest > stuck.stuckAt) stuck = { stuckAt: farthest, joint: count + 1 };
      for (const { to, way } of pieces[place]!) {
        const ends = fresh.flatMap((interval): Interval[] => image(way.ends, interval) === null ? [] : [image(way.ends, interval)!]);
        if (ends.length > 0) put(added + way.added, count + 1, to, normalized(ends));
      }
    });
  }
}

function least(keys: Iterable<number>): number | null {
  let smallest: number | null = null;
  for (const key of keys) if (smallest === null || key < smallest) smallest = key;
  return smallest;
}

/**
 * From which positions of each place the far end can still be reached with exactly so many anchors and pieces.
 * `remaining(place, added, pieces)` answers from a table that fills itself.
 */
export function remainingWays({ places, pieces }: PieceGraph): (place: number, added: number, count: number) => IntervalSet {
  const last = places.length - 1;
  const table = new Map<number, IntervalSet>();
  const remaining = (place: number, added: number, count: number): IntervalSet => {
    if (place === last) return added === 0 && count === 0 ? [places[last]!.within] : [];
    if (added < 0 || count <= 0) return [];
    const key = (added * 4096 + count) * 4096 + place;
    const known = table.get(key);
    if (known !== undefined) return known;
    const starts: Interval[] = [];
    for (const { to, way } of pieces[place]!) {
      for (const interval of remaining(to, added - way.added, count - 1)) {
        const start = preimage(way.ends, interval);
        if (start !== null) starts.push(start);
      }
    }
    const set = normalized(starts);
    table.set(key, set);
    return set;
  };
  return remaining;
}
