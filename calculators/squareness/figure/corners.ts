import { distance, minus, turn, type Point } from "../../geometry/point";
import type { Six } from "./braced-quadrilateral";

export const cornerNames = ["A", "B", "C", "D"] as const;
export type Corner = (typeof cornerNames)[number];
export type Corners = Readonly<Record<Corner, Point>>;

/** Where the corners of six lengths that close stand: A at the origin, B on x, C and D on y's side. */
export function placeCorners({ ab, bc, cd, da, ac }: Six): Corners {
  const bac = Math.acos((ab * ab + ac * ac - bc * bc) / (2 * ab * ac));
  const cad = Math.acos((da * da + ac * ac - cd * cd) / (2 * da * ac));
  return {
    A: { x: 0, y: 0 },
    B: { x: ab, y: 0 },
    C: { x: ac * Math.cos(bac), y: ac * Math.sin(bac) },
    D: { x: da * Math.cos(bac + cad), y: da * Math.sin(bac + cad) },
  };
}

/** Two sides and the cosine between them at A, opposite sides taken as equal. */
export function parallelogram(ab: number, da: number, cosine: number): Corners {
  const D = { x: da * cosine, y: da * Math.sqrt(1 - cosine * cosine) };
  return { A: { x: 0, y: 0 }, B: { x: ab, y: 0 }, C: { x: ab + D.x, y: D.y }, D };
}

/** Degrees between the two sides at each corner. */
export function anglesOf({ A, B, C, D }: Corners): Record<Corner, number> {
  const at = (corner: Point, before: Point, after: Point) => (turn(minus(after, corner), minus(before, corner)) * 180) / Math.PI;
  return { A: at(A, D, B), B: at(B, A, C), C: at(C, B, D), D: at(D, C, A) };
}

export function isConvex(corners: Corners): boolean {
  return Object.values(anglesOf(corners)).every((angle) => angle > 0 && angle < 180);
}

export function lengthsOf({ A, B, C, D }: Corners): Six {
  return { ab: distance(A, B), bc: distance(B, C), cd: distance(C, D), da: distance(D, A), ac: distance(A, C), bd: distance(B, D) };
}
