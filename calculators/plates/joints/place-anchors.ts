import { clip, intersection, spread, type Interval, type IntervalSet } from "./intervals";
import type { LaidStretch, PieceLimits } from "./stretch";

/** An anchor to be drilled in: where it is best put, and how far it may go either way while the others stay. */
export interface PlacedAnchor {
  at: number;
  window: Interval;
}

/** What makes one place better than another, in whole units. */
export interface AnchorTaste {
  /** Preferred distance from a piece's end. */
  endDistance: number;
  /** From the coarsest to the finest: stations on a coarser graduation are easier to mark. */
  graduations: readonly number[];
}

/** Two neighbours in a piece, each a fixed bolt or a piece's end, and the anchors to go between. */
interface Link {
  from: number;
  to: number;
  fromEnd: boolean;
  toEnd: boolean;
}

/**
 * The fewest anchors that make a piece with these ends keep the rule, put where they are easy to mark. Null when none do.
 */
export function placeAnchors(stretch: LaidStretch, limits: PieceLimits, [from, to]: Interval, taste: AnchorTaste): PlacedAnchor[] | null {
  if (limits.perPiece === 0) return [];
  const fixed = stretch.bolts.filter((bolt) => bolt.counts && bolt.at > from && bolt.at < to).map((bolt) => bolt.at);
  const stops = [from, ...fixed, to];
  const links = stops.slice(1).map((stop, index): Link => ({ from: stops[index]!, to: stop, fromEnd: index === 0, toEnd: index === stops.length - 2 }));
  const counts = fewestByLink(links.map((link) => countsIn(stretch, limits, link)), limits.perPiece - fixed.length);
  if (counts === null) return null;
  return links.flatMap((link, index) => spreadOut(stretch, limits, link, counts[index]!, taste)).sort((a, b) => a.at - b.at);
}

/** The numbers of anchors that fit in a link: the fewest, then up to as many more as a piece may lack. */
function countsIn(stretch: LaidStretch, limits: PieceLimits, link: Link): number[] {
  const counts: number[] = [];
  for (let count = 0; count <= 400 && (counts.length === 0 || count <= counts[0]! + limits.perPiece); count += 1) {
    const sets = reach(stretch, limits, link, count);
    if (sets === null) {
      if (count > 0 && counts.length > 0) break;
      continue;
    }
    counts.push(count);
  }
  return counts;
}

/** How far an anchor must and may stand from a neighbour: a bolt, a joint, or an end of the stretch. */
function stepFrom(stretch: LaidStretch, limits: PieceLimits, at: number, isEnd: boolean): [number, number] {
  if (!isEnd) return [limits.apart, limits.spacing];
  return [limits.clear, at === stretch.from ? stretch.farthestAtStart : at === stretch.to ? stretch.farthestAtEnd : limits.farthest];
}

/** Where each of `count` anchors can be, each set seen from the link's start; null when they cannot reach its end. */
function reach(stretch: LaidStretch, limits: PieceLimits, link: Link, count: number): IntervalSet[] | null {
  const { from, to, fromEnd, toEnd } = link;
  if (count === 0) {
    const isPiece = fromEnd && toEnd;
    const distance = to - from;
    const [least, most] = fromEnd ? stepFrom(stretch, limits, from, true) : toEnd ? stepFrom(stretch, limits, to, true) : [0, limits.spacing];
    const inReach = distance >= least && distance <= most;
    return !isPiece && inReach ? [] : null;
  }
  const sets: IntervalSet[] = [];
  const [least, most] = stepFrom(stretch, limits, from, fromEnd);
  let reached = clip(intersection(spread([[from, from]], least, most), stretch.anchorPlaces), [from, to]);
  for (let index = 1; index <= count; index += 1) {
    if (reached.length === 0) return null;
    sets.push(reached);
    if (index < count) reached = clip(intersection(spread(reached, limits.apart, limits.spacing), stretch.anchorPlaces), [from, to]);
  }
  const [leastLast, mostLast] = stepFrom(stretch, limits, to, toEnd);
  sets[count - 1] = clip(sets[count - 1]!, [to - mostLast, to - leastLast]);
  return sets[count - 1]!.length > 0 ? sets : null;
}

/** One count for each link: as few as can be, yet no fewer in all than the piece lacks. Null when a link has none. */
function fewestByLink(options: readonly (readonly number[])[], lacking: number): number[] | null {
  if (options.some((counts) => counts.length === 0)) return null;
  let sums = new Map<number, number[]>([[0, []]]);
  for (const counts of options) {
    const next = new Map<number, number[]>();
    for (const [sum, chosen] of sums) for (const count of counts) if (!next.has(sum + count)) next.set(sum + count, [...chosen, count]);
    sums = next;
  }
  const enough = [...sums.keys()].filter((sum) => sum >= lacking).sort((a, b) => a - b);
  return enough.length === 0 ? null : sums.get(enough[0]!)!;
}

/** Puts the anchors of a link from its end backwards, each as near to its even place as the rest allow. */
function spreadOut(stretch: LaidStretch, limits: PieceLimits, link: Link, count: number, taste: AnchorTaste): PlacedAnchor[] {
  if (count === 0) return [];
  const sets = reach(stretch, limits, link, count)!;
  const start = link.fromEnd ? link.from + taste.endDistance : link.from;
  const end = link.toEnd ? link.to - taste.endDistance : link.to;
  const steps = count - 1 + (link.fromEnd ? 0 : 1) + (link.toEnd ? 0 : 1);
  const wanted = (index: number) => (steps === 0 ? (start + end) / 2 : start + ((end - start) * (index + (link.fromEnd ? 0 : 1))) / steps);
  const at: number[] = new Array<number>(count).fill(0);
  let allowed = sets[count - 1]!;
  for (let index = count - 1; index >= 0; index -= 1) {
    at[index] = easiestPlace(allowed, wanted(index), taste.graduations);
    if (index > 0) allowed = clip(sets[index - 1]!, [at[index]! - limits.spacing, at[index]! - limits.apart]);
  }
  return at.map((place, index) => {
    const before = index === 0 ? stepFrom(stretch, limits, link.from, link.fromEnd) : [limits.apart, limits.spacing];
    const after = index === count - 1 ? stepFrom(stretch, limits, link.to, link.toEnd) : [limits.apart, limits.spacing];
    const left = index === 0 ? link.from : at[index - 1]!;
    const right = index === count - 1 ? link.to : at[index + 1]!;
    const room = clip(clip(stretch.anchorPlaces, [left + before[0]!, left + before[1]!]), [right - after[1]!, right - after[0]!]);
    return { at: place, window: room.find(([low, high]) => low <= place && place <= high) ?? [place, place] };
  });
}

/** The place nearest to the one wanted, on the coarsest graduation that has one in the set. */
export function easiestPlace(set: IntervalSet, wanted: number, graduations: readonly number[]): number {
  for (const graduation of [...graduations, 1]) {
    let best: number | null = null;
    for (const [low, high] of set) {
      const nearest = Math.min(Math.max(wanted, low), high);
      for (const candidate of [Math.floor(nearest / graduation) * graduation, Math.ceil(nearest / graduation) * graduation]) {
        if (candidate >= low && candidate <= high && (best === null || Math.abs(candidate - wanted) < Math.abs(best - wanted))) best = candidate;
      }
    }
    if (best !== null) return best;
  }
  throw new RangeError("No place in an empty set");
}
