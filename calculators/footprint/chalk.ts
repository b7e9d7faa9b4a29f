import { sideName } from "../geometry/corner-names";
import { insetPolygon } from "../geometry/inset-polygon";
import { distance, type Point } from "../geometry/point";
import { around } from "../geometry/polygon";
import { type Length, squareRoot } from "../length";
import { CalculationError } from "../schema";
import type { ExactPoint, Outline } from "./outline";

/** The chalk lines' own corners and lengths, exact where the plan is. */
export interface Chalk {
  points: Point[];
  exact: ExactPoint[] | null;
  lengths: (Length | number)[];
}

/**
 * The plan's true inset: every side moved in by its own.
 *
 * @throws CalculationError `inset-swallows` at /inset when a side would be used up.
 */
export function chalkOf(outline: Outline, insets: readonly Length[]): Chalk {
  const inset = insetPolygon(outline.points, insets.map((length) => length.toNumber()));
  const count = insets.length;
  if (inset.corners === null) throw new CalculationError([{ pointer: "/inset", code: "inset-swallows", params: { side: sideName(inset.swallowed, count).toUpperCase() } }]);
  if (outline.exact === null) return { points: inset.corners, exact: null, lengths: inset.corners.map((corner, index) => distance(corner, around(inset.corners!, index + 1))) };
  const exact = exactInset(outline.exact, insets);
  const lengths = exact.map((corner, index) => {
    const next = around(exact, index + 1);
    return next.x.minus(corner.x).magnitude().plus(next.y.minus(corner.y).magnitude());
  });
  return { points: exact.map(({ x, y }) => ({ x: x.toNumber(), y: y.toNumber() })), exact, lengths };
}

/** Along the axes each corner takes its x from the upright side and its y from the level one. */
function exactInset(corners: readonly ExactPoint[], insets: readonly Length[]): ExactPoint[] {
  const moved = corners.map((corner, index) => {
    const next = around(corners, index + 1);
    const level = next.y.equals(corner.y);
    const forward = level ? next.x.compare(corner.x) > 0 : next.y.compare(corner.y) > 0;
    const inset = insets[index]!;
    // The plan lies left of a side walked counter-clockwise: above one that runs east, west of one that runs north.
    return level ? { level, at: forward ? corner.y.plus(inset) : corner.y.minus(inset) } : { level, at: forward ? corner.x.minus(inset) : corner.x.plus(inset) };
  });
  return moved.map((side, index) => {
    const before = around(moved, index - 1);
    return side.level ? { x: before.at, y: side.at } : { x: side.at, y: before.at };
  });
}

/** Between two corners, exact where that is rational. */
export function between(points: readonly Point[], exact: readonly ExactPoint[] | null, from: number, to: number): Length | number {
  if (exact === null) return distance(points[from]!, points[to]!);
  const x = exact[to]!.x.minus(exact[from]!.x).inches;
  const y = exact[to]!.y.minus(exact[from]!.y).inches;
  return squareRoot(x.mul(x).add(y.mul(y)));
}

