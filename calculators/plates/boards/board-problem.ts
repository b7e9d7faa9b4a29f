import type { JointWindows } from "../joints/joint-chains";

/**
 * Lengths here carry one kerf: n pieces fit a board when the sum of their sizes (length and kerf) is no more than its
 * capacity (length less both trims, and one kerf), which is the rule sum + (n − 1)·kerf ≤ length − 2·trim.
 */
export interface BoardKind {
  capacity: number;
  /** Whole units of money. */
  cost: number;
  /** Infinity when there are as many as wanted. */
  count: number;
}

/** A stretch to be cut: `ways` of jointing it, each a window for every joint; one way without joints for a single piece. */
export interface StretchToCut {
  from: number;
  to: number;
  ways: readonly JointWindows[];
  /** False when `ways` leaves some out. */
  complete: boolean;
}

export interface BoardProblem {
  kinds: readonly BoardKind[];
  stretches: readonly StretchToCut[];
  kerf: number;
}

/** Where the joints of each stretch went, and which pieces come from which board; pieces are numbered through all stretches. */
export interface BoardPlan {
  ways: readonly number[];
  joints: readonly (readonly number[])[];
  boards: readonly { kind: number; pieces: readonly number[] }[];
}

/** Lets the caller stop a long search; true means go on. */
export type GoOn = () => boolean;

/** Money first, then the number of boards, as one whole number. */
export function weights(kinds: readonly BoardKind[], pieces: number): number[] {
  return kinds.map((kind) => kind.cost * (pieces + 1) + 1);
}

export function weightOf(plan: BoardPlan["boards"], weight: readonly number[]): number {
  return plan.reduce((sum, board) => sum + weight[board.kind]!, 0);
}
