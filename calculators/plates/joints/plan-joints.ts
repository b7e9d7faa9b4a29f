import { leastCost, pieceGraph, type LeastCost } from "./best-joints";
import { jointWindows, type JointWindows } from "./joint-chains";
import type { LaidStretch, PieceLimits, Stretch } from "./stretch";

/** Stage 1 for one stretch: the least cost, and every way to have it. */
export interface JointPlan extends LeastCost {
  stretch: LaidStretch;
  ways: readonly JointWindows[];
  /** False when there are more ways than are kept. */
  complete: boolean;
}

/** Why a stretch cannot keep the rule, and the least that would let it. */
export interface NoJointPlan {
  stretch: LaidStretch;
  /** The joint that finds no place, counted from the stretch's start; 0 when the stretch as a whole is at fault. */
  joint: number;
  /** How far the joints before it get. */
  stuckAt: number;
  /** The shortest usable board with which it could be done; null when no board would do. */
  longestNeeded: number | null;
}

/** The joints of one stretch: fewest added anchors, then fewest pieces. Exact. */
export function planJoints(bare: Stretch, limits: PieceLimits): JointPlan | NoJointPlan {
  const graph = pieceGraph(bare, limits);
  const cost = leastCost(graph);
  if ("added" in cost) return { ...cost, stretch: graph.stretch, ...jointWindows(graph, limits, cost) };
  return { stretch: graph.stretch, joint: cost.joint, stuckAt: cost.stuckAt, longestNeeded: longestNeeded(bare, limits) };
}

export function isPlanned(plan: JointPlan | NoJointPlan): plan is JointPlan {
  return "ways" in plan;
}

/** Longer boards never hurt, so the least that does is found by halving. */
function longestNeeded(bare: Stretch, limits: PieceLimits): number | null {
  const whole = bare.to - bare.from;
  const suffices = (longest: number) => "added" in leastCost(pieceGraph(bare, { ...limits, longest }));
  if (whole <= limits.longest || !suffices(whole)) return null;
  let tooShort = limits.longest;
  let enough = whole;
  while (enough - tooShort > 1) {
    const middle = Math.floor((tooShort + enough) / 2);
    if (suffices(middle)) enough = middle;
    else tooShort = middle;
  }
  return enough;
}
