import type { SquarenessAnswer } from "@/calculators/squareness";

/** Whether the diagonals differ by more than one graduation. */
export function isSkewed({ shape }: SquarenessAnswer): boolean {
  return shape === "racked" || shape === "irregular";
}

export function isTapered({ shape }: SquarenessAnswer): boolean {
  return shape === "tapered" || shape === "irregular";
}

export function greatestTaper({ taper }: SquarenessAnswer) {
  return taper === null ? null : taper.length.in >= taper.width.in ? taper.length : taper.width;
}
