import { normalized, without, type Interval, type IntervalSet } from "./intervals";

/** A bolt that stands in the concrete. One that does not count (a hold-down, one off the middle third) still has its hole. */
export interface StandingBolt {
  at: number;
  counts: boolean;
}

/** A part of a wall with nothing to interrupt the sill: its ends are piece ends whatever the joints are. */
export interface Stretch {
  from: number;
  to: number;
  bolts: readonly StandingBolt[];
  /** At this stretch's own ends, where the rule wants the first bolt nearer than at a joint. */
  farthestAtStart?: number;
  farthestAtEnd?: number;
}

/** What every piece must keep, in whole units; Infinity where the rule states no limit. */
export interface PieceLimits {
  /** A piece's end to any bolt at least; where the rule states none, half the hole. */
  clear: number;
  /** A piece's end to its first bolt that counts, at most. */
  farthest: number;
  /** From bolt to bolt within a piece, at most. */
  spacing: number;
  /** Bolts that count in a piece, at least. */
  perPiece: number;
  /** An added anchor to any other bolt, at least. */
  apart: number;
  /** A piece that ends in a joint, at least. */
  shortest: number;
  /** A piece, at most: what the longest board gives. */
  longest: number;
}

/** A stretch laid out for the search: where joints and added anchors can be at all. */
export interface LaidStretch extends Required<Stretch> {
  /** Sorted; `counts` is false as well for those too near an end of the stretch. */
  bolts: readonly StandingBolt[];
  /** Gap i lies between bolt i − 1 and bolt i: a joint may stand anywhere in it. Null where there is no room. */
  gaps: readonly (Interval | null)[];
  /** Where an added anchor keeps its distance from every bolt and from the ends of the stretch. */
  anchorPlaces: IntervalSet;
}

export function layOut(stretch: Stretch, { clear, apart, farthest }: PieceLimits): LaidStretch {
  const { from, to, farthestAtStart = farthest, farthestAtEnd = farthest } = stretch;
  const bolts = stretch.bolts
    .filter(({ at }) => at >= from && at <= to)
    .map(({ at, counts }) => ({ at, counts: counts && at - from >= clear && to - at >= clear }))
    .sort((a, b) => a.at - b.at);
  const gaps = Array.from({ length: bolts.length + 1 }, (_, index): Interval | null => {
    const low = index === 0 ? from + 1 : bolts[index - 1]!.at + clear;
    const high = index === bolts.length ? to - 1 : bolts[index]!.at - clear;
    return low <= high ? [Math.max(low, from + 1), Math.min(high, to - 1)] : null;
  }).map((gap) => (gap !== null && gap[0] <= gap[1] ? gap : null));
  const crowded = normalized(bolts.map(({ at }): Interval => [at - apart + 1, at + apart - 1]));
  return { from, to, farthestAtStart, farthestAtEnd, bolts, gaps, anchorPlaces: without(normalized([[from + clear, to - clear]]), crowded) };
}
