import { cross, direction, dot, minus, plus, quarterTurn, scaled, type Point } from "./point";
import { around, crossingSides } from "./polygon";

export type Inset = { corners: Point[]; swallowed: null } | { corners: null; swallowed: number };

/**
 * The outline whose sides lie inside those of a counter-clockwise simple polygon, each by its own inset (negative: outside).
 *
 * Each new corner is where the two moved sides meet, so an outside corner keeps its angle and moves t / sin(angle/2)
 * along its bisector; an inside corner moves out into the plan likewise. Nothing is rounded or clipped: when a side would
 * be used up, or the new outline would cross itself, its number is answered in `swallowed` instead of corners.
 *
 * Units: inches. Neighbouring sides must not be collinear.
 */
export function insetPolygon(corners: readonly Point[], insets: readonly number[]): Inset {
  const sides = corners.map((corner, index) => {
    const along = direction(corner, around(corners, index + 1));
    return { along, through: plus(corner, scaled(quarterTurn(along), insets[index]!)) };
  });
  const moved = sides.map((side, index) => meeting(around(sides, index - 1), side));
  const swallowed = sides.findIndex(({ along }, index) => dot(minus(around(moved, index + 1), moved[index]!), along) <= 1e-9);
  if (swallowed >= 0) return { corners: null, swallowed };
  const crossing = crossingSides(moved);
  return crossing === null ? { corners: moved, swallowed: null } : { corners: null, swallowed: crossing[1] };
}

interface Line {
  along: Point;
  through: Point;
}

/** Where two lines meet. */
export function meeting(first: Line, second: Line): Point {
  const reach = cross(minus(second.through, first.through), second.along) / cross(first.along, second.along);
  return plus(first.through, scaled(first.along, reach));
}
