import { cross, direction, distance, minus, type Point } from "./point";
import { around, holds, segmentsMeet } from "./polygon";

export interface ProvingDiagonal {
  from: number;
  to: number;
  length: number;
  /** The corner that this diagonal places, from two others already placed. */
  fixes: number;
}

/**
 * The fewest diagonals that, with the sides, prove every corner of a counter-clockwise outline: n − 3 that part it into
 * triangles, none leaving the plan. Starting from the side AB each triangle places one more corner by two pulls, so when
 * all sides and these diagonals read as they should, every corner is where it should be.
 *
 * Among all such sets it takes the one whose dullest crossing of two pulls is nearest to square (a tape error moves a
 * corner by about its size over the sine of that angle), then the shortest. Exact search over intervals, n³ steps.
 */
export function provingDiagonals(corners: readonly Point[]): ProvingDiagonal[] {
  const count = corners.length;
  const ring = corners.map((_, index) => around(corners, index + 1)); // B … A, so that AB is the base of all
  const seen = visibility(ring);
  const best: (Plan | null)[][] = ring.map(() => ring.map(() => null));
  for (let span = 1; span < count; span += 1) {
    for (let from = 0; from + span < count; from += 1) best[from]![from + span] = span === 1 ? { sharpness: 1, total: 0, apex: -1 } : bestPlan(ring, best, seen, from, from + span);
  }
  const found: ProvingDiagonal[] = [];
  const name = (index: number) => (index + 1) % count;
  const walk = (from: number, to: number): void => {
    const apex = best[from]![to]?.apex ?? -1;
    if (apex < 0) return;
    for (const end of [from, to]) {
      if (Math.abs(apex - end) === 1) continue;
      const [low, high] = [name(Math.min(apex, end)), name(Math.max(apex, end))].sort((a, b) => a - b) as [number, number];
      found.push({ from: low, to: high, length: distance(corners[low]!, corners[high]!), fixes: name(apex) });
    }
    walk(from, apex);
    walk(apex, to);
  };
  walk(0, count - 1);
  return found;
}

interface Plan {
  sharpness: number;
  total: number;
  apex: number;
}

function bestPlan(ring: readonly Point[], best: (Plan | null)[][], seen: boolean[][], from: number, to: number): Plan | null {
  if (!seen[from]![to]) return null;
  let chosen: Plan | null = null;
  for (let apex = from + 1; apex < to; apex += 1) {
    const [left, right] = [best[from]![apex], best[apex]![to]];
    if (!left || !right || cross(minus(ring[apex]!, ring[from]!), minus(ring[to]!, ring[from]!)) <= 0) continue;
    const sine = Math.abs(cross(direction(ring[apex]!, ring[from]!), direction(ring[apex]!, ring[to]!)));
    const sharpness = Math.min(sine, left.sharpness, right.sharpness);
    const total = left.total + right.total + distance(ring[from]!, ring[to]!);
    if (sine > 1e-9 && (chosen === null || sharpness > chosen.sharpness + 1e-9 || (sharpness > chosen.sharpness - 1e-9 && total < chosen.total - 1e-9))) chosen = { sharpness, total, apex };
  }
  return chosen;
}

/** Which corners see one another inside the plan; neighbours do. */
function visibility(ring: readonly Point[]): boolean[][] {
  const count = ring.length;
  return ring.map((from, first) =>
    ring.map((to, second) => {
      const gap = Math.abs(first - second);
      if (gap === 1 || gap === count - 1) return true;
      if (gap === 0 || !holds(ring, { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 })) return false;
      return ring.every((corner, index) => {
        const next = (index + 1) % count;
        if ([index, next].some((end) => end === first || end === second)) return true;
        return !segmentsMeet(from, to, corner, around(ring, index + 1));
      });
    }),
  );
}
