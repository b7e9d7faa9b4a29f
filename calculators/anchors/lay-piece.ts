import { Length } from "../length";
import type { Rule } from "../rules";
import { evenOut, fewestBolts, type Demand } from "./fewest-bolts";
import { crowded, type Limits } from "./limits";
import { contains, marksWithin, without, within, type Span } from "./spans";
import { Ticks } from "./ticks";

interface PieceTask {
  from: Length;
  to: Length;
  limits: Limits;
  ends: Length;
  exception: Rule["shortWalls"][number] | null;
  centres: readonly Length[];
  reach: Length;
  grid: { step: Length; start: Length } | null;
  isFirst: boolean;
  isLast: boolean;
  /** Bolts moved off their even places stand on whole marks of this. */
  mark: Length;
}

export interface LaidPiece {
  from: Length;
  to: Length;
  stations: Length[];
  spacing: Length | null;
  even: boolean;
  /** The least distance between two bolts. */
  closest: Length | null;
}

/** Why a piece takes no layout; `least` is how long it must be, where that is the reason. */
export interface RefusedPiece {
  refused: "piece-too-short" | "no-layout";
  least: Length | null;
}

/** The bolts of one piece. Even ones where they keep clear of members; else the fewest that do, evened out. */
export function layPiece(task: PieceTask): LaidPiece | RefusedPiece {
  const { from, to, limits, exception } = task;
  if (exception?.bolts === 0) return laidPiece(task, [], true);
  const length = to.minus(from);
  const single = exception?.bolts === 1 || (limits.boltsPerPiece ?? 1) === 1;
  const count = exception?.bolts ?? limits.boltsPerPiece ?? 1;
  const edge = limits.endMinimum ?? Length.zero;
  if (exception === null && limits.endMinimum !== null && count > 1 && length.minus(edge.times(2)).compare(Length.zero) <= 0) {
    return { refused: "piece-too-short", least: edge.times(2).plus(crowded) };
  }
  const even = evenStations(task, single);
  const tight = place(task, even);
  return tight ?? { refused: "no-layout", least: null };
}

/** By formula: the fewest bolts evenly between two end bolts; one in the middle where two find no room and one will do. */
function evenStations({ from, to, limits, ends, exception }: PieceTask, single: boolean): Length[] {
  const length = to.minus(from);
  const middle = [from.plus(length.over(2))];
  if (exception !== null) return middle;
  const least = limits.endMinimum ?? Length.zero;
  const roomy = length.minus(ends.times(2)).compare(crowded) >= 0;
  if (!roomy && single) return middle;
  const quarter = length.over(4);
  const end = roomy ? ends : quarter.compare(least) > 0 ? quarter : least;
  const inner = length.minus(end.times(2));
  const bays = limits.spacing === null ? 1 : Math.max(1, Number(inner.inches.div(limits.spacing.inches).ceil().valueOf()));
  const count = Math.max(bays + 1, limits.boltsPerPiece ?? 2);
  return Array.from({ length: count }, (_, index) => from.plus(end).plus(inner.times(index).over(count - 1)));
}

function place(task: PieceTask, even: readonly Length[]): LaidPiece | null {
  const { from, to, limits, exception, reach, grid } = task;
  const centres = task.centres.filter((centre) => centre.plus(reach).compare(from) > 0 && centre.minus(reach).compare(to) < 0);
  const third = to.minus(from).over(3);
  const edge = exception === null ? (limits.endMinimum ?? Length.zero) : third;
  const known = [from, to, edge, reach, limits.spacing, limits.endMaximum, limits.wallEndMaximum, third, limits.diameter, ...even, ...centres, grid?.step, grid?.start, task.mark];
  const ticks = new Ticks(known.filter((length): length is Length => length instanceof Length));
  const [low, high] = [ticks.ceil(from.plus(edge)), ticks.floor(to.minus(edge))];
  if (low > high) return null;
  let allowed: Span[] = [[low, high]];
  for (const centre of centres) allowed = without(allowed, ticks.floor(centre), ticks.ceil(reach));
  if (grid !== null) allowed = marksWithin(allowed, ticks.floor(grid.start), Math.max(1, ticks.floor(grid.step)));
  if (grid === null && even.every((station) => contains(allowed, ticks.floor(station)))) return laidPiece(task, even, true);

  const demand = demandOf(task, allowed, ticks, even.length);
  const placement = fewestBolts(demand);
  if (placement.unmet.length > 0) return null;
  const wanted = even.map((station) => ticks.floor(station));
  const evened = evenOut(demand, placement, Math.max(1, ticks.floor(task.mark)), (bolt, left, right) => {
    if (left !== null && right !== null) return (left + right) / 2;
    return left === null ? wanted[0]! : right === null ? wanted.at(-1)! : bolt;
  });
  return laidPiece(task, evened.map((tick) => ticks.toLength(tick)), false);
}

function demandOf({ from, to, limits, exception, isFirst, isLast }: PieceTask, allowed: readonly Span[], ticks: Ticks, evenCount: number): Demand {
  const [start, end] = [ticks.ceil(from), ticks.floor(to)];
  const everywhere = { low: start, high: end, count: exception?.bolts ?? limits.boltsPerPiece ?? Math.min(2, evenCount) };
  const spacing = limits.spacing === null || exception !== null ? null : ticks.floor(limits.spacing);
  // Where the rule is silent, half the spacing on each side of a joint keeps it across the joint.
  const reachOf = (isEnd: boolean) => (isEnd ? (limits.wallEndMaximum ?? limits.spacing) : (limits.endMaximum ?? limits.spacing?.over(2) ?? null));
  const firstReach = reachOf(isFirst);
  const lastReach = reachOf(isLast);
  const needs = [everywhere];
  if (exception === null && firstReach !== null) needs.push({ low: start, high: Math.min(end, start + ticks.floor(firstReach)), count: 1 });
  if (exception === null && lastReach !== null) needs.push({ low: Math.max(start, end - ticks.floor(lastReach)), high: end, count: 1 });
  return { standing: [], allowed: within(allowed, start, end), spacing, runs: [[start, end]], needs, apart: Math.max(1, ticks.ceil(limits.diameter)) };
}

function laidPiece({ from, to }: PieceTask, stations: readonly Length[], even: boolean): LaidPiece {
  const gaps = stations.slice(1).map((station, index) => station.minus(stations[index]!));
  const widest = gaps.reduce<Length | null>((most, gap) => (most === null || gap.compare(most) > 0 ? gap : most), null);
  const closest = gaps.reduce<Length | null>((least, gap) => (least === null || gap.compare(least) < 0 ? gap : least), null);
  return { from, to, stations: [...stations], spacing: widest, even: even && gaps.length > 0, closest };
}
