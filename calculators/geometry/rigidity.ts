import { cross, direction, minus, type Point } from "./point";
import { outside, rowSpace, size } from "./solve-linear";

export interface Pull {
  from: number;
  to: number;
}

export interface Rigidity {
  /** The points that are fixed to one another: the largest such group, the one with the first points when two are as large. */
  fixed: number[];
  /** Every other point, with the single pulls from fixed points that would each fix it (none when it needs two). */
  unfixed: { point: number; pulls: Pull[] }[];
  /** A fewest set of pulls that would fix everything. */
  fixWith: Pull[];
}

/** Of a unit change: below this only rounding is left. */
const rounding = 1e-6;

/**
 * Which points the measured lengths fix, by the rank of the rigidity matrix: a row for each length, and what each
 * coordinate does to it. A length not measured is settled by the others when its row lies in the space of theirs.
 *
 * `mayPull` says which points a tape can be pulled between when it proposes one. A length that settles less than `weakest`
 * of a unit change counts as none: pulls that cross too flat fix nothing a tape could tell.
 */
export function rigidityOf(points: readonly Point[], measured: readonly Pull[], mayPull: (pull: Pull) => boolean = () => true, weakest = rounding / 10): Rigidity {
  const space = rowSpace(measured.map((pull) => rowOf(points, pull)), weakest);
  const settled = Math.max(rounding, 2 * weakest);
  const fixed = largestGroup(points, space, settled);
  const others = points.map((_, index) => index).filter((index) => !fixed.includes(index));
  const isMeasured = new Set(measured.map(keyOf));
  const open = (pull: Pull) => !isMeasured.has(keyOf(pull)) && mayPull(pull);
  const unfixed = others.map((point) => ({
    point,
    pulls: fixed
      .map((from) => ({ from, to: point }))
      .filter((pull) => open(pull) && isFixedWith(points, space, fixed, pull, settled))
      .sort((a, b) => freedom(points, space, b) - freedom(points, space, a)),
  }));
  return { fixed, unfixed, fixWith: fewestPulls(points, space, fixed, others, open, settled) };
}

const keyOf = ({ from, to }: Pull) => `${Math.min(from, to)}-${Math.max(from, to)}`;

function rowOf(points: readonly Point[], { from, to }: Pull): number[] {
  const row = new Array<number>(2 * points.length).fill(0);
  const toward = direction(points[from]!, points[to]!);
  row[2 * from] = -toward.x;
  row[2 * from + 1] = -toward.y;
  row[2 * to] = toward.x;
  row[2 * to + 1] = toward.y;
  return row;
}

/** How much of a length between two points the others leave free, 0 to √2. */
function freedom(points: readonly Point[], space: number[][], pull: Pull): number {
  return size(outside(rowOf(points, pull), space));
}

function largestGroup(points: readonly Point[], space: number[][], settled: number): number[] {
  let largest: number[] = [0];
  const tight = points.map((_, from) => points.map((_, to) => from === to || (from < to && freedom(points, space, { from, to }) < settled)));
  const isTight = (from: number, to: number) => tight[Math.min(from, to)]![Math.max(from, to)]!;
  for (let first = 0; first < points.length; first += 1) {
    for (let second = first + 1; second < points.length; second += 1) {
      if (!isTight(first, second)) continue;
      const group = [first, second];
      for (let other = 0; other < points.length; other += 1) if (!group.includes(other) && group.every((member) => isTight(member, other))) group.push(other);
      if (group.length > largest.length || (group.length === largest.length && spread(points, group) > 2 * spread(points, largest))) largest = group;
    }
  }
  return [...largest].sort((a, b) => a - b);
}

/** How far from one line: of two groups as large, points along one side fix nothing else. */
function spread(points: readonly Point[], group: readonly number[]): number {
  const [first, second] = [points[group[0]!]!, points[group[1] ?? 0]!];
  return Math.max(...group.map((index) => Math.abs(cross(minus(second, first), minus(points[index]!, first)))));
}

function isFixedWith(points: readonly Point[], space: number[][], fixed: readonly number[], pull: Pull, settled: number): boolean {
  const free = outside(rowOf(points, pull), space);
  const length = size(free);
  if (length < settled) return false;
  const wider = [...space, free.map((item) => item / length)];
  return fixed.every((from) => from === pull.to || freedom(points, wider, { from, to: pull.to }) < settled);
}

function fewestPulls(points: readonly Point[], space: number[][], fixed: readonly number[], others: readonly number[], open: (pull: Pull) => boolean, settled: number): Pull[] {
  const found: Pull[] = [];
  const wider = [...space];
  const between = (from: readonly number[], to: readonly number[]) => from.flatMap((one) => to.filter((other) => other !== one).map((other) => ({ from: one, to: other })));
  while (wider.length < 2 * points.length - 3) {
    const candidates = [...between(fixed, others), ...between(others, others)].filter(open);
    const scored = candidates.map((pull) => ({ pull, free: freedom(points, wider, pull) })).filter(({ free }) => free > settled);
    if (scored.length === 0) break;
    const best = scored.reduce((a, b) => (b.free > a.free + 1e-9 ? b : a));
    const free = outside(rowOf(points, best.pull), wider);
    const length = size(free);
    wider.push(free.map((item) => item / length));
    found.push(best.pull);
  }
  return found;
}
