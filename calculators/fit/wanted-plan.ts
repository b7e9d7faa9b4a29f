import { cornerNames } from "../geometry/corner-names";
import { cross, direction, plus, scaled, turn, type Point } from "../geometry/point";
import { around, crossingSides, insideAngles, signedArea } from "../geometry/polygon";
import { closeWalk } from "../footprint/close-walk";
import type { ExactPoint } from "../footprint/outline";
import { readWalk } from "../footprint/walk-text";
import { Length } from "../length";
import { CalculationError, type Issue } from "../schema";
import type { FitInput } from "./input";
import type { BuiltSlab } from "./slab-corners";

export interface WantedPlan {
  points: Point[];
  exact: ExactPoint[] | null;
  /** Whether its sizes are wanted; false when only its angles were read off the slab. */
  sized: boolean;
}

const refusal = (pointer: string, code: string, params: Issue["params"] = {}) => new CalculationError([{ pointer, code, params }]);

/**
 * The plan of chalk lines to lay: the rectangle or walk that is wanted, or, with no size, the slab's own outline with every
 * corner taken to the nearest multiple of 45 degrees.
 *
 * @throws CalculationError `size-twice`, `size-needs-four`, `corners-differ` (another number of corners), `turns-differ` (an inside
 * corner where the slab has none), `plan-unclear` (the slab's corners are nowhere near usual angles).
 */
export function wantedPlan(input: FitInput, slab: BuiltSlab): WantedPlan {
  const walk = input.walk?.trim() ?? "";
  if (input.size !== undefined && walk !== "") throw refusal("/walk", "size-twice");
  const plan = walk !== "" ? fromWalk(walk, input) : input.size !== undefined ? rectangle(input.size, slab) : fromSlab(slab);
  const pointer = walk !== "" ? "/walk" : "/corners";
  if (plan.points.length !== slab.points.length) throw refusal(pointer, "corners-differ", { plan: plan.points.length, slab: slab.points.length });
  const inside = (points: readonly Point[]) => insideAngles(points).map((angle) => angle > 180);
  const [wanted, built] = [inside(plan.points), inside(slab.points)];
  const differs = wanted.findIndex((corner, index) => corner !== built[index]);
  if (differs >= 0) throw refusal(pointer, "turns-differ", { corner: cornerNames(wanted.length)[differs]! });
  return plan;
}

function rectangle({ length, width }: NonNullable<FitInput["size"]>, slab: BuiltSlab): WantedPlan {
  if (slab.points.length !== 4) throw refusal("/size", "size-needs-four", { slab: slab.points.length });
  const exact = [
    { x: Length.zero, y: Length.zero },
    { x: length, y: Length.zero },
    { x: length, y: width },
    { x: Length.zero, y: width },
  ];
  return { exact, points: exact.map(({ x, y }) => ({ x: x.toNumber(), y: y.toNumber() })), sized: true };
}

function fromWalk(text: string, { unit, precision }: FitInput): WantedPlan {
  const { legs, issues } = readWalk(text, unit, "/walk");
  if (issues.length > 0) throw new CalculationError(issues);
  const { outline } = closeWalk(legs, () => "/walk", precision);
  return { points: outline.points, exact: outline.exact, sized: true };
}

/** The slab's outline with its turns made usual: each side takes the direction nearest to its own among multiples of 45 degrees from AB. */
function fromSlab({ points }: BuiltSlab): WantedPlan {
  const first = direction(points[0]!, points[1]!);
  const eighths = points.map((corner, index) => Math.round(turn(first, direction(corner, around(points, index + 1))) / (Math.PI / 4)));
  const along = eighths.map((eighth) => ({ x: usual(eighth), y: usual(eighth - 2) }));
  const middles = points.map((corner, index) => scaled(plus(corner, around(points, index + 1)), 0.5));
  if (along.some((item, index) => Math.abs(cross(around(along, index - 1), item)) < 1e-9)) throw refusal("/corners", "plan-unclear");
  // In the frame of AB; each side through the middle of its slab edge.
  const turned = middles.map((middle) => ({ x: middle.x * first.x + middle.y * first.y, y: middle.y * first.x - middle.x * first.y }));
  const corners = along.map((item, index) => {
    const [before, through, from] = [around(along, index - 1), turned[index]!, around(turned, index - 1)];
    const reach = cross({ x: through.x - from.x, y: through.y - from.y }, item) / cross(before, item);
    return plus(from, scaled(before, reach));
  });
  if (crossingSides(corners) !== null || signedArea(corners) <= 0) throw refusal("/corners", "plan-unclear");
  return { points: corners, exact: null, sized: false };
}

/** cos of a number of eighth turns, exact at the quarters. */
function usual(eighth: number): number {
  return [1, Math.SQRT1_2, 0, -Math.SQRT1_2, -1, -Math.SQRT1_2, 0, Math.SQRT1_2][((eighth % 8) + 8) % 8]!;
}
