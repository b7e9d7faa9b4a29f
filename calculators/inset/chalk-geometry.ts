import { sides, type Side } from "./input";

/** Corners and sides, counter-clockwise from A. Inches, doubles: racked figures are irrational. */
export type Corner = "A" | "B" | "C" | "D";
export const corners = ["A", "B", "C", "D"] as const satisfies readonly Corner[];

export interface Point {
  x: number;
  y: number;
}

/** The slab as a parallelogram: opposite edges equal, corner A at `cosine`. */
export interface Slab {
  length: number;
  width: number;
  cosine: number;
}

/** How far in the two marks of each chalk line stand, at the side's first and second corner. */
export type Marks = Readonly<Record<Side, readonly [number, number]>>;

export interface Figure {
  ac: number;
  bd: number;
  ab: number;
  bc: number;
  cd: number;
  da: number;
}

export function slabCorners({ length, width, cosine }: Slab): Record<Corner, Point> {
  const d = { x: width * cosine, y: width * Math.sqrt(1 - cosine * cosine) };
  return { A: { x: 0, y: 0 }, B: { x: length, y: 0 }, C: { x: length + d.x, y: d.y }, D: d };
}

/**
 * Where the chalk lines cross. Each line runs through two marks, measured square to the slab's edge at its two corners.
 */
export function chalkCorners(slab: Slab, marks: Marks): Record<Corner, Point> {
  const at = slabCorners(slab);
  const lines = sides.map((side, index) => {
    const [from, to] = [at[corners[index]!], at[corners[(index + 1) % 4]!]];
    const size = Math.hypot(to.x - from.x, to.y - from.y);
    const inward = { x: -(to.y - from.y) / size, y: (to.x - from.x) / size };
    const [first, second] = marks[side];
    return [move(from, inward, first), move(to, inward, second)] as const;
  });
  const [ab, bc, cd, da] = lines as [Line, Line, Line, Line];
  return { A: crossing(da, ab), B: crossing(ab, bc), C: crossing(bc, cd), D: crossing(cd, da) };
}

/** The six lengths of a quadrilateral. */
export function figureOf({ A, B, C, D }: Record<Corner, Point>): Figure {
  const between = (p: Point, q: Point) => Math.hypot(q.x - p.x, q.y - p.y);
  return { ac: between(A, C), bd: between(B, D), ab: between(A, B), bc: between(B, C), cd: between(C, D), da: between(D, A) };
}

/**
 * How far a chalk corner stands from the slab's corner, whose two sides are inset by `first` and `second` and meet at
 * an angle of this cosine. Source: the diagonal of the small parallelogram the two strips share; with equal insets t
 * it is t / sin(angle / 2).
 *
 * @example 1/2 in at 90 degrees is 0.7071 in.
 */
export function cornerDistance(first: number, second: number, cosine: number): number {
  return Math.sqrt(first * first + second * second + 2 * first * second * cosine) / Math.sqrt(1 - cosine * cosine);
}

type Line = readonly [Point, Point];

function move({ x, y }: Point, direction: Point, distance: number): Point {
  return { x: x + direction.x * distance, y: y + direction.y * distance };
}

function crossing([a, b]: Line, [c, d]: Line): Point {
  const first = { x: b.x - a.x, y: b.y - a.y };
  const second = { x: d.x - c.x, y: d.y - c.y };
  const along = ((c.x - a.x) * second.y - (c.y - a.y) * second.x) / (first.x * second.y - first.y * second.x);
  return move(a, first, along);
}
