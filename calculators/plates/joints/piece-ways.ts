import { clip, intersection, spread, type Interval, type IntervalSet } from "./intervals";
import type { LaidStretch, PieceLimits } from "./stretch";
import { extended, tightened, type Zone } from "./zone";

/** One way a piece can keep the rule: where its ends may be when so many anchors are added in it. */
export interface PieceWay {
  added: number;
  ends: Zone;
}

/** The ends that a piece may have: fixed, or anywhere in the gap that begins after `bolt` bolts. */
export interface PieceEnd {
  within: Interval;
  /** How many bolts stand before it. */
  bolts: number;
  fixed: boolean;
}

/**
 * Every way in which a piece from `start` to `end` keeps the rule, fewest added anchors first. Exact: together the ways
 * hold just those pairs of ends that some placing of the anchors allows. More anchors than any piece could use are left out.
 */
export function piecewiseWays(stretch: LaidStretch, limits: PieceLimits, start: PieceEnd, end: PieceEnd): PieceWay[] {
  const inside = stretch.bolts.slice(start.bolts, end.bolts).filter((bolt) => bolt.counts).map((bolt) => bolt.at);
  const shortest = start.fixed && end.fixed ? 1 : Math.max(1, limits.shortest);
  const length: Interval = [shortest, limits.longest];
  return inside.length === 0 ? waysWithoutBolts(stretch, limits, start, end, length) : waysAround(stretch, limits, start, end, length, inside);
}

/** Anchors beyond this many never help: their steps, each short of the spacing by one bolt's crowding at most, already outreach the piece. */
function mostUseful({ perPiece, longest, spacing, apart }: PieceLimits, room: number): number {
  if (!Number.isFinite(spacing)) return Math.max(perPiece, 2);
  return Math.max(perPiece, 2 + Math.ceil(Math.min(longest, room) / Math.max(apart, spacing - 2 * apart)));
}

/** Bolts stand in the piece: the anchors left of the first, between, and right of the last do not know of each other. */
function waysAround(stretch: LaidStretch, limits: PieceLimits, start: PieceEnd, end: PieceEnd, length: Interval, inside: readonly number[]): PieceWay[] {
  const left = sideWays(stretch, limits, inside[0]!, start, -1);
  const right = sideWays(stretch, limits, inside.at(-1)!, end, 1);
  const ways: PieceWay[] = [];
  for (const between of countsBetween(stretch, limits, inside)) {
    left.forEach((starts, onLeft) =>
      right.forEach((ends, onRight) => {
        const added = onLeft + between + onRight;
        if (inside.length + added < limits.perPiece) return;
        for (const a of starts) for (const b of ends) addWay(ways, added, tightened({ a, b, apart: length }));
      }),
    );
  }
  return ways.sort((a, b) => a.added - b.added);
}

/** How many anchors can be added between the bolts of a piece: the fewest that keep the spacing, and more only while the piece still lacks bolts. */
function countsBetween(stretch: LaidStretch, limits: PieceLimits, inside: readonly number[]): number[] {
  let counts = new Set([0]);
  for (let index = 1; index < inside.length; index += 1) {
    const here = countsInOne(stretch, limits, inside[index - 1]!, inside[index]!, limits.perPiece - inside.length);
    counts = new Set([...counts].flatMap((sum) => here.map((count) => sum + count)));
  }
  const sorted = [...counts].sort((a, b) => a - b);
  return sorted.filter((count, index) => index === 0 || inside.length + sorted[index - 1]! < limits.perPiece);
}

/** Numbers of anchors that fit between two neighbouring bolts with every distance kept: the fewest, then as many more as `lacking` asks. */
function countsInOne(stretch: LaidStretch, { spacing, apart }: PieceLimits, from: number, to: number, lacking: number): number[] {
  const counts = to - from <= spacing ? [0] : [];
  let reached: IntervalSet = [[from, from]];
  for (let added = 1; counts.length === 0 || added <= lacking; added += 1) {
    reached = clip(intersection(spread(reached, apart, spacing), stretch.anchorPlaces), [from, to - apart]);
    if (reached.length === 0) break;
    if (to - reached.at(-1)![1] <= spacing) counts.push(added);
  }
  return counts;
}

/** By number of anchors added beyond the outermost bolt: where the piece's end may then be. */
function sideWays(stretch: LaidStretch, limits: PieceLimits, outermost: number, { within, fixed }: PieceEnd, direction: -1 | 1): IntervalSet[] {
  const ways: IntervalSet[] = [];
  const farthest = !fixed ? limits.farthest : direction < 0 ? stretch.farthestAtStart : stretch.farthestAtEnd;
  let outer: IntervalSet = [[outermost, outermost]];
  const room = direction < 0 ? outermost - within[0] : within[1] - outermost;
  for (let added = 0; added <= mostUseful(limits, Math.max(0, room)); added += 1) {
    const ends = clip(step(outer, limits.clear, farthest, direction), within);
    ways.push(ends);
    const reachesAll = ends.length === 1 && ends[0]![0] === within[0] && ends[0]![1] === within[1];
    if (reachesAll && added + 1 >= limits.perPiece) break;
    outer = intersection(step(outer, limits.apart, limits.spacing, direction), stretch.anchorPlaces);
    if (outer.length === 0) break;
  }
  return ways;
}

function step(set: IntervalSet, least: number, most: number, direction: -1 | 1): IntervalSet {
  return direction < 0 ? spread(set, -most, -least) : spread(set, least, most);
}

/** No bolt that counts stands in the piece: a chain of added anchors from end to end. */
function waysWithoutBolts(stretch: LaidStretch, limits: PieceLimits, start: PieceEnd, end: PieceEnd, length: Interval): PieceWay[] {
  const places = clip(stretch.anchorPlaces, [start.within[0], end.within[1]]);
  const fromStart: Interval = [limits.clear, start.fixed ? stretch.farthestAtStart : limits.farthest];
  const toEnd: Interval = [limits.clear, end.fixed ? stretch.farthestAtEnd : limits.farthest];
  const first = tightened({ a: start.within, b: start.within, apart: [0, 0] });
  let chains = first === null ? [] : places.flatMap((place) => kept(extended(first, fromStart, place)));
  const ways: PieceWay[] = [];
  for (let added = 1; added <= mostUseful(limits, end.within[1] - start.within[0]) && chains.length > 0; added += 1) {
    if (added >= limits.perPiece) {
      for (const chain of chains) {
        const ends = extended(chain, toEnd, end.within);
        if (ends !== null) addWay(ways, added, tightened({ ...ends, apart: [Math.max(ends.apart[0], length[0]), Math.min(ends.apart[1], length[1])] }));
      }
    }
    chains = undominated(chains.flatMap((chain) => places.flatMap((place) => kept(extended(chain, [limits.apart, limits.spacing], place)))));
  }
  return ways;
}

const kept = (zone: Zone | null): Zone[] => (zone === null ? [] : [zone]);

/** Drops a zone that lies wholly in another. */
function undominated(zones: Zone[]): Zone[] {
  return zones.filter((zone, index) => !zones.some((other, place) => place !== index && holds(other, zone) && (place < index || !holds(zone, other))));
}

function holds(outer: Zone, inner: Zone): boolean {
  return (["a", "b", "apart"] as const).every((side) => outer[side][0] <= inner[side][0] && inner[side][1] <= outer[side][1]);
}

function addWay(ways: PieceWay[], added: number, ends: Zone | null): void {
  if (ends !== null && !ways.some((way) => way.added <= added && holds(way.ends, ends))) ways.push({ added, ends });
}
