import type { Interval } from "./intervals";

/**
 * Where the two ends of something may be: `a` in one interval, `b` in another, and `b − a` in a third. A system of
 * such differences with whole bounds has whole solutions whenever it has any, and eliminating a point between two
 * others leaves such a system again: that is what makes the search over joints exact.
 */
export interface Zone {
  a: Interval;
  b: Interval;
  apart: Interval;
}

/** The same zone with every bound as tight as the others make it; null when nothing is left. */
export function tightened({ a, b, apart }: Zone): Zone | null {
  const aTight: Interval = [Math.max(a[0], b[0] - apart[1]), Math.min(a[1], b[1] - apart[0])];
  if (aTight[0] > aTight[1]) return null;
  const bTight: Interval = [Math.max(b[0], aTight[0] + apart[0]), Math.min(b[1], aTight[1] + apart[1])];
  if (bTight[0] > bTight[1]) return null;
  const apartTight: Interval = [Math.max(apart[0], bTight[0] - aTight[1]), Math.min(apart[1], bTight[1] - aTight[0])];
  return apartTight[0] > apartTight[1] ? null : { a: aTight, b: bTight, apart: apartTight };
}

/** The zone of `a` and a further point that stands `step` beyond `b`, within `next`. */
export function extended(zone: Zone, step: Interval, next: Interval): Zone | null {
  return tightened({
    a: zone.a,
    b: [Math.max(next[0], zone.b[0] + step[0]), Math.min(next[1], zone.b[1] + step[1])],
    apart: [zone.apart[0] + step[0], zone.apart[1] + step[1]],
  });
}

/** Where `b` can be when `a` is within `interval`; null when nowhere. */
export function image({ a, b, apart }: Zone, interval: Interval): Interval | null {
  const low = Math.max(a[0], interval[0]);
  const high = Math.min(a[1], interval[1]);
  if (low > high) return null;
  const start = Math.max(b[0], low + apart[0]);
  const end = Math.min(b[1], high + apart[1]);
  return start > end ? null : [start, end];
}

/** Where `a` can be when `b` is within `interval`; null when nowhere. */
export function preimage({ a, b, apart }: Zone, interval: Interval): Interval | null {
  const low = Math.max(b[0], interval[0]);
  const high = Math.min(b[1], interval[1]);
  if (low > high) return null;
  const start = Math.max(a[0], low - apart[1]);
  const end = Math.min(a[1], high - apart[0]);
  return start > end ? null : [start, end];
}
