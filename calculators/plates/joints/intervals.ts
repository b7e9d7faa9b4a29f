/** A closed interval of whole units; a set of them is sorted and apart. All of a plan's positions are whole units (see `to-units`). */
export type Interval = readonly [low: number, high: number];
export type IntervalSet = readonly Interval[];

export const everywhere: Interval = [-Infinity, Infinity];

/** Sorted, merged where they touch or adjoin, empty ones dropped. */
export function normalized(intervals: readonly Interval[]): IntervalSet {
  const sorted = intervals.filter(([low, high]) => low <= high).sort((a, b) => a[0] - b[0]);
  const merged: [number, number][] = [];
  for (const [low, high] of sorted) {
    const last = merged.at(-1);
    if (last !== undefined && low <= last[1] + 1) last[1] = Math.max(last[1], high);
    else merged.push([low, high]);
  }
  return merged;
}

export function union(a: IntervalSet, b: IntervalSet): IntervalSet {
  return a.length === 0 ? b : b.length === 0 ? a : normalized([...a, ...b]);
}

export function clip(set: IntervalSet, [low, high]: Interval): IntervalSet {
  const clipped: Interval[] = [];
  for (const [start, end] of set) if (end >= low && start <= high) clipped.push([Math.max(start, low), Math.min(end, high)]);
  return clipped;
}

export function intersection(a: IntervalSet, b: IntervalSet): IntervalSet {
  return b.length === 0 ? [] : normalized(b.flatMap((interval) => clip(a, interval)));
}

/** What of `set` lies in none of `taken`. */
export function without(set: IntervalSet, taken: IntervalSet): IntervalSet {
  let rest = set;
  for (const [low, high] of taken) rest = rest.flatMap(([start, end]): Interval[] => (end < low || start > high ? [[start, end]] : ([[start, low - 1], [high + 1, end]] as Interval[]).filter(([from, to]) => from <= to)));
  return rest;
}

/** Every position `low` to `high` beyond one of the set. */
export function spread(set: IntervalSet, low: number, high: number): IntervalSet {
  return normalized(set.map(([start, end]): Interval => [start + low, end + high]));
}
