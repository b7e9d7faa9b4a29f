/** A place in the plan, in inches: x east or along AB, y north or into the slab. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

export const plus = (a: Point, b: Point): Point => ({ x: a.x + b.x, y: a.y + b.y });
export const minus = (a: Point, b: Point): Point => ({ x: a.x - b.x, y: a.y - b.y });
export const scaled = (a: Point, factor: number): Point => ({ x: a.x * factor, y: a.y * factor });
export const dot = (a: Point, b: Point): number => a.x * b.x + a.y * b.y;
/** Twice the area of the triangle 0, a, b; positive when b lies counter-clockwise of a. */
export const cross = (a: Point, b: Point): number => a.x * b.y - a.y * b.x;
export const distance = (a: Point, b: Point): number => Math.hypot(b.x - a.x, b.y - a.y);
/** A quarter turn counter-clockwise: of a side's direction it is the normal that points into a counter-clockwise plan. */
export const quarterTurn = (a: Point): Point => ({ x: -a.y, y: a.x });
export const rotated = (a: Point, angle: number): Point => ({ x: a.x * Math.cos(angle) - a.y * Math.sin(angle), y: a.x * Math.sin(angle) + a.y * Math.cos(angle) });

/** The direction from a to b, one inch long. */
export function direction(a: Point, b: Point): Point {
  const length = distance(a, b);
  return { x: (b.x - a.x) / length, y: (b.y - a.y) / length };
}

/** The turn from direction a to direction b, in radians from −π to π, counter-clockwise positive. */
export const turn = (a: Point, b: Point): number => Math.atan2(cross(a, b), dot(a, b));
