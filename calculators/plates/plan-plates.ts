import { Length, printLength, type Precision } from "../length";
import { CalculationError, type Issue } from "../schema";
import type { BoardPlan, BoardProblem, StretchToCut } from "./boards/board-problem";
import { planBoards, type BoardsAnswer } from "./boards/plan-boards";
import type { PlatesInput } from "./input";
import { isPlanned } from "./joints/plan-joints";
import { planWall, type PlannedStretch } from "./plan-stretches";
import { polishedJoints } from "./polish-joints";
import { settle, type Settled } from "./settle-limits";
import { longestPiece, stockKinds, totalLength, type Stock } from "./stock-kinds";
import { surveyWalls, type SurveyedWall } from "./survey-walls";
import { Units } from "./units";

/** What whoever asks may want of the search besides its answer. */
export interface PlanOptions {
  /** Milliseconds that go by: a clock. */
  now?: () => number;
  /** Seconds at most, whatever the input asks. */
  mostSeconds?: number;
  /** Told now and then; `stage` 1 is the joints, 2 the boards. */
  onProgress?: (progress: { stage: 1 | 2; share: number; cost?: number; bound?: number }) => void;
  /** Asked now and then: true ends the search with the best plan so far. */
  isCancelled?: () => boolean;
}

/** A job planned, still in whole units. */
export interface Planned {
  input: PlatesInput;
  settled: Settled;
  units: Units;
  stock: Stock;
  walls: readonly SurveyedWall[];
  stretches: readonly PlannedStretch[];
  problem: BoardProblem;
  boards: BoardsAnswer & { plan: BoardPlan };
  /** Joints where they are easiest to mark. */
  joints: readonly (readonly number[])[];
  anchorsProved: boolean;
  /** Pieces had to be shorter than the longest board, since there are too few of those. */
  shortened: boolean;
  ended: "proved" | "looked" | "time";
}

const defaultSeconds = 0.6;
const freshStarts = 60;

/**
 * Both stages for a whole job.
 *
 * @throws CalculationError of `surveyWalls`, `stockKinds` and `Units`; `walls-or-pieces`; `piece-too-long` and
 * `not-enough-stock`; and for a wall that cannot keep the rule `no-place-for-joint`, `part-too-short` or `no-room-for-anchors`.
 */
export function planPlates(input: PlatesInput, { now = () => performance.now(), mostSeconds = Infinity, onProgress, isCancelled }: PlanOptions = {}): Planned {
  const end = now() + 1000 * Math.min(input.timeLimit ?? defaultSeconds, mostSeconds);
  const isOver = () => isCancelled?.() === true || now() >= end;
  if ((input.walls === undefined) === (input.pieces === undefined)) throw new CalculationError([{ pointer: "/walls", code: "walls-or-pieces", params: {} }]);
  if (input.walls?.length === 0 || input.pieces?.length === 0) throw new CalculationError([{ pointer: input.pieces === undefined ? "/walls" : "/pieces", code: "too-few", params: { minimum: 1 } }]);
  const settled = settle(input);
  const walls = surveyWalls(input, settled.plateWidth, settled.diameter);
  const units = new Units(lengthsOf(input, settled, walls));
  const stock = stockKinds(input, settled, units);
  const kerf = units.whole(settled.kerf);
  refuseTooMany(input, stock, units);
  const tiers = [...new Set(stock.usable)].sort((a, b) => b - a);
  let first: { added: number; stretches: PlannedStretch[] } | null = null;
  for (const longest of tiers) {
    let done = 0;
    const stretches = walls.flatMap((wall) => {
      onProgress?.({ stage: 1, share: done / walls.length });
      done += 1;
      return planWall(wall, settled, units, longest);
    });
    const issues = stretches.flatMap((stretch) => faultsOf(stretch, units, settled, input.precision));
    if (issues.length > 0) {
      if (first === null) throw new CalculationError(issues);
      break; // shorter pieces cannot keep the rule: the stock is what lacks
    }
    const added = stretches.reduce((sum, { plan, placedBefore }) => sum + (isPlanned(plan) ? plan.added : 0) + placedBefore.length, 0);
    first ??= { added, stretches };
    const problem: BoardProblem = { kinds: stock.kinds, kerf, stretches: input.pieces === undefined ? stretches.map(toCut) : piecesToCut(input, units, stock) };
    let asked = 0;
    let timedOut = false;
    const goOn = () => {
      asked += 1;
      if (asked % 8 === 0 && isOver()) timedOut = true;
      return !timedOut;
    };
    const told = (cost: number, bound: number) => onProgress?.({ stage: 2, share: Math.min(1, 1 - (end - now()) / 1000 / (input.timeLimit ?? defaultSeconds)), cost: cost * stock.moneyUnit, bound: bound * stock.moneyUnit });
    const boards = planBoards(problem, { goOn, starts: freshStarts, onBetter: told });
    if (boards.plan === null) continue;
    const planned = { ...boards, plan: boards.plan };
    return {
      input,
      settled,
      units,
      stock,
      walls,
      stretches,
      problem,
      boards: planned,
      joints: polishedJoints(problem, planned.plan, settled.graduations.map((step) => units.whole(step))),
      anchorsProved: added === first.added && stretches.every(({ plan, placedBefore }) => placedBefore.length === 0 || (isPlanned(plan) && plan.added === 0)),
      shortened: longest !== tiers[0],
      ended: boards.costProved && boards.countProved ? "proved" : timedOut ? "time" : "looked",
    };
  }
  throw new CalculationError([lackOf(input, first!.stretches, stock, units, settled)]);
}

/** More than these and a server would be kept busy; a house has a tenth of it. */
const most = { pieces: 300, wallInches: 6000 };

function refuseTooMany(input: PlatesInput, stock: Stock, units: Units): void {
  const walls = input.walls ?? [];
  const issues = walls.flatMap((wall, index): Issue[] => (wall.length.toNumber() > most.wallInches ? [{ pointer: `/walls/${index}/length`, code: "wall-too-long", params: { maximum: String(most.wallInches) } }] : []));
  const pieces = walls.reduce((sum, wall) => sum + Math.ceil(wall.length.toNumber() / units.length(longestPiece(stock)).toNumber()), 0);
  if (pieces > most.pieces) issues.push({ pointer: "/walls", code: "too-many-pieces", params: { maximum: most.pieces } });
  if (issues.length > 0) throw new CalculationError(issues);
}

function toCut({ plan }: PlannedStretch): StretchToCut {
  if (!isPlanned(plan)) throw new Error("only planned stretches are cut");
  return { from: plan.stretch.from, to: plan.stretch.to, ways: plan.ways, complete: plan.complete };
}

/** The cut list alone: every piece a stretch without joints. */
function piecesToCut(input: PlatesInput, units: Units, stock: Stock): StretchToCut[] {
  const longest = longestPiece(stock);
  const issues = input.pieces!.flatMap((piece, index): Issue[] => (units.whole(piece.length) > longest ? [{ pointer: `/pieces/${index}/length`, code: "piece-too-long", params: { longest: printLength(units.length(longest), input.precision) } }] : []));
  const count = input.pieces!.reduce((sum, piece) => sum + (piece.count ?? 1), 0);
  if (count > 500) issues.push({ pointer: "/pieces", code: "too-many", params: { maximum: 500 } });
  if (issues.length > 0) throw new CalculationError(issues);
  return input.pieces!.flatMap((piece) => Array.from({ length: piece.count ?? 1 }, (): StretchToCut => ({ from: 0, to: units.whole(piece.length), ways: [[]], complete: true })));
}

/** Why a stretch cannot keep the rule: which joint, and the least that would let it. */
function faultsOf({ wall, part, plan, limits }: PlannedStretch, units: Units, { apart, clear, endDistance }: Settled, precision: Precision): Issue[] {
  if (isPlanned(plan)) return [];
  const pointer = `/walls/${wall.index}`;
  const shown = (length: Length) => printLength(length, precision);
  const where = { wall: wall.name, part: part.index + 1, from: shown(part.from), to: shown(part.to) };
  if (plan.longestNeeded !== null) return [{ pointer, code: "no-place-for-joint", params: { ...where, joint: plan.joint, reached: shown(units.length(plan.stuckAt)), longest: shown(units.length(limits.longest)), needed: shown(units.length(plan.longestNeeded)) } }];
  const least = clear.times(2).plus(limits.perPiece > 1 ? apart.times(limits.perPiece - 1) : Length.zero);
  const length = part.to.minus(part.from);
  if (length.compare(least) < 0) return [{ pointer, code: "part-too-short", params: { ...where, length: shown(length), needed: shown(least), bolts: limits.perPiece } }];
  return [{ pointer, code: "no-room-for-anchors", params: { ...where, length: shown(length), endDistance: shown(endDistance) } }];
}

/** The stock does not suffice: how much is wanted, and how much there is. */
function lackOf(input: PlatesInput, stretches: readonly PlannedStretch[], stock: Stock, units: Units, { kerf }: Settled): Issue {
  const wanted = input.pieces === undefined ? totalLength(stretches.map(({ part }) => part.to.minus(part.from))) : totalLength(input.pieces.map((piece) => piece.length.times(piece.count ?? 1)));
  const there = stock.kinds.reduce((sum, kind) => sum + (Number.isFinite(kind.count) ? kind.count * kind.capacity : Infinity), 0);
  const given = Number.isFinite(there) ? printLength(units.length(there).minus(kerf.times(stock.kinds.reduce((sum, kind) => sum + kind.count, 0))), input.precision) : "";
  return { pointer: "/stock", code: "not-enough-stock", params: { wanted: printLength(wanted, input.precision), given } };
}

function lengthsOf(input: PlatesInput, settled: Settled, walls: readonly SurveyedWall[]): Length[] {
  const { kerf, trim, shortest, clear, apart, endDistance, graduations, limits, diameter } = settled;
  return [
    ...walls.flatMap((wall) => [...wall.parts.flatMap((part) => [part.from, part.to]), ...wall.bolts.map((bolt) => bolt.station)]),
    ...(input.pieces ?? []).map((piece) => piece.length),
    ...input.stock.map((entry) => entry.length),
    ...[kerf, trim, shortest, clear, apart, endDistance, diameter, ...graduations],
    ...[limits.spacing, limits.endMinimum, limits.endMaximum].filter((limit): limit is Length => limit !== null),
  ];
}
