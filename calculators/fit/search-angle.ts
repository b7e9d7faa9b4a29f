import { turn } from "../geometry/point";
import { solveLinearProgram } from "./linear-program";
import { conditionsOf, minimax, weightsOf, type Minimax, type Question } from "./minimax";
import { placesOf, type Slab } from "./plan";
import type { Placing } from "./poses";

export interface Found extends Minimax {
  angle: number;
  /** No angle whatever can do better than this. */
  lowerBound: number;
  proved: boolean;
}

/** The least overhang is asked over this many radians either way: a plan turned further is no fit. */
const mostTurn = 0.1;

interface Interval {
  from: number;
  to: number;
  lowerBound: number;
}

/**
 * The angle, and the unknowns at it, whose worst departure is least over all angles: branch and bound.
 *
 * At one angle the question is a linear program. Over an interval of angles a linear program bounds it from below:
 * each offset is replaced by its chord, with room for what it can bend from the chord (second derivative × width² / 8)
 * and for what its coefficients can swing (first derivative × half the width × the largest unknown). Intervals that cannot
 * beat the best found by `gap` are dropped; the rest are halved. What it answers is within `gap` of the best there is.
 * `intervals` is how many it may halve before it stops with `proved` false. Angles outside the first interval turn some side so far that its two ends alone differ by more than twice the best found.
 */
export function searchAngle(slab: Slab, placing: Placing, question: Question, gap: number, { starts = [0], intervals = 3000 }: { starts?: readonly number[]; intervals?: number } = {}): Found | null {
  let best: (Minimax & { angle: number }) | null = null;
  const tryAngle = (angle: number): void => {
    const found = minimax(placesOf(slab, placing.poseAt(angle)), placing.unknowns, question);
    if (found !== null && (best === null || found.worst < best.worst - 1e-9)) best = { ...found, angle };
  };
  starts.forEach(tryAngle);
  const first = wholeRange(slab, placing, question, best);
  const open: Interval[] = [{ ...first, lowerBound: 0 }];
  let proved = false;
  let tried = 0;
  let lowerBound = 0;
  while (open.length > 0) {
    const next = open.pop()!;
    lowerBound = next.lowerBound;
    const ceiling = worstOf(best);
    if (next.lowerBound >= ceiling - gap) {
      proved = true;
      break;
    }
    if ((tried += 1) > intervals) break;
    const middle = (next.from + next.to) / 2;
    for (const half of [{ from: next.from, to: middle }, { from: middle, to: next.to }]) {
      const bound = boundOver(slab, placing, question, half, ceiling);
      if (bound === null) continue;
      if (bound.value < worstOf(best) - gap) tryAngle(bound.angle);
      const child = { ...half, lowerBound: Math.max(next.lowerBound, bound.value) };
      const at = open.findIndex((other) => other.lowerBound <= child.lowerBound);
      open.splice(at < 0 ? open.length : at, 0, child);
    }
  }
  if (best === null) return null;
  const { worst } = best as Minimax;
  if (open.length === 0 && !proved) [proved, lowerBound] = [true, Math.max(0, worst - gap)];
  return { ...(best as Minimax & { angle: number }), lowerBound: Math.min(lowerBound, worst), proved };
}

const worstOf = (best: Minimax | null): number => best?.worst ?? Infinity;

/** The angles at which no side's ends differ by more than the best found allows. */
function wholeRange(slab: Slab, placing: Placing, question: Question, best: Minimax | null): { from: number; to: number } {
  const settledWorst = Math.max(0, ...question.settled.map((limit) => limit ?? 0));
  const most = question.leastOverhang || best === null ? Infinity : Math.max(best.worst, settledWorst);
  const free = placing.unknowns > 2;
  const widest = question.leastOverhang ? mostTurn : Math.PI / 4;
  let [from, to] = [-widest, widest];
  placing.directions.forEach((along, side) => {
    const length = placing.sideLengths[side]! - (free ? 8 * most + 1 : 0);
    const reach = length > 0 ? (2 * most + 1e-9) / length : Infinity;
    if (reach >= 0.7) return;
    const off = turn(slab.sides[side]!.along, along);
    from = Math.max(from, -off - Math.asin(reach));
    to = Math.min(to, -off + Math.asin(reach));
  });
  return from <= to ? { from, to } : { from: to, to: from };
}

/** A lower bound over an interval, and the angle where the bounding program has its least; null when no angle in it can meet the limits. */
function boundOver(slab: Slab, placing: Placing, question: Question, { from, to }: { from: number; to: number }, ceiling: number): { value: number; angle: number } | null {
  const width = to - from;
  const [low, high, middle] = [from, to, (from + to) / 2].map((angle) => placesOf(slab, placing.poseAt(angle))) as [Places, Places, Places];
  const reach = Math.max(1, ...low.map(({ beta }, index) => Math.abs(high[index]!.beta - beta)));
  const most = Number.isFinite(ceiling) ? ceiling : 100;
  const largest = placing.unknowns > 2 ? most + 0.1 : 3 * (most + Math.max(...middle.map(({ beta, wanted }) => Math.abs(beta - wanted))));
  const affine = low.map(({ beta, wanted, corner }, index) => ({
    row: [...middle[index]!.alpha, (high[index]!.beta - beta) / reach],
    beta,
    wanted,
    slack: (placing.bend * width * width) / 8 + ((corner === null ? placing.swing.edge : placing.swing.corner) * largest * width) / 2,
  }));
  const conditions = conditionsOf(affine, question).map(({ condition }) => condition);
  const none = new Array<number>(placing.unknowns).fill(0);
  conditions.push({ row: [...none, 1, 0], bound: 0 }, { row: [...none, -1, 0], bound: -reach });
  const solved = solveLinearProgram([...none, 0, 1], conditions, 1e5);
  if (solved === null) return null;
  return { value: Math.max(0, solved.value), angle: from + (width * Math.min(reach, Math.max(0, solved.x[placing.unknowns]!))) / reach };
}

type Places = ReturnType<typeof placesOf>;

/** At the angle found: how much of the answer hangs on each place when the angle may move too. They balance every slide and the turn. */
export function balanceAt(slab: Slab, placing: Placing, question: Question, angle: number): number[] | null {
  const width = 2e-7;
  const [low, high, middle] = [angle - width / 2, angle + width / 2, angle].map((at) => placesOf(slab, placing.poseAt(at))) as [Places, Places, Places];
  const affine = middle.map(({ alpha, beta, wanted }, index) => ({ row: [...alpha, (high[index]!.beta - low[index]!.beta) / width / placing.bend], beta, wanted, slack: 0 }));
  const conditions = conditionsOf(affine, question);
  const none = new Array<number>(placing.unknowns).fill(0);
  const turns = [1, -1].map((sign) => ({ row: [...none, sign, 0], bound: -1e-3 }));
  const solved = solveLinearProgram([...none, 0, 1], [...conditions.map(({ condition }) => condition), ...turns], 1e5);
  return solved === null ? null : weightsOf(middle.length, conditions, solved.multipliers);
}
