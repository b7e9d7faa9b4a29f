import { direction, distance, type Point } from "./point";
import { solveLinear } from "./solve-linear";

/** One length read between two numbered points, in inches. */
export interface Observation {
  from: number;
  to: number;
  length: number;
}

export interface AdjustedNetwork {
  points: Point[];
  /** Adjusted length less the length as read, one for each observation. */
  residuals: number[];
  /** Root of the sum of squared residuals. */
  closure: number;
  /** For each observation, how much of an error in it would stay in its own residual: 0 when nothing checks it. */
  redundancy: number[];
  converged: boolean;
}

/**
 * Least-squares places of points from the lengths between them, all of equal weight: Gauss-Newton with a step held back
 * (Levenberg) while it would make things worse. A figure in the plane keeps its own place and turn: the first point stays
 * where it starts, and the second on its line from it.
 *
 * Units: inches. Right to about 1e-10 in where the figure is rigid. The start must be near the figure wanted, since mirrored
 * corners fit the same lengths.
 */
export function adjustNetwork(start: readonly Point[], observations: readonly Observation[]): AdjustedNetwork {
  let points = [...start];
  let residuals = residualsOf(points, observations);
  let damping = 0;
  let converged = false;
  for (let round = 0; round < 60 && !converged; round += 1) {
    const slopes = slopesOf(points, observations);
    const normal = normalOf(slopes, slopes[0]?.length ?? 0);
    const right = normal.map((_, column) => slopes.reduce((sum, row, index) => sum - row[column]! * residuals[index]!, 0));
    const step = solveLinear(normal.map((row, index) => row.map((item, column) => (column === index ? item * (1 + damping) + (damping > 0 ? 1e-12 : 0) : item))), right);
    if (step === null) {
      damping = Math.max(damping * 10, 1e-9);
      if (damping > 1e6) break;
      continue;
    }
    const moved = movedBy(points, step);
    const next = residualsOf(moved, observations);
    if (sumOfSquares(next) <= sumOfSquares(residuals) + 1e-18 || damping > 1e6) {
      converged = Math.max(...step.map(Math.abs)) < 1e-10;
      points = moved;
      residuals = next;
      damping = damping < 1e-8 ? 0 : damping / 10;
    } else {
      damping = Math.max(damping * 10, 1e-6);
      if (damping > 1e6) converged = true;
    }
  }
  return { points, residuals, closure: Math.sqrt(sumOfSquares(residuals)), redundancy: redundancyOf(points, observations), converged };
}

const sumOfSquares = (items: readonly number[]) => items.reduce((sum, item) => sum + item * item, 0);

function residualsOf(points: readonly Point[], observations: readonly Observation[]): number[] {
  return observations.map(({ from, to, length }) => distance(points[from]!, points[to]!) - length);
}

/** How each length changes with the free coordinates: all but the first point's two and the second point's turn about it. */
function slopesOf(points: readonly Point[], observations: readonly Observation[]): number[][] {
  const along = direction(points[0]!, points[1]!);
  return observations.map(({ from, to }) => {
    const row = new Array<number>(2 * points.length).fill(0);
    const toward = direction(points[from]!, points[to]!);
    row[2 * from] = -toward.x;
    row[2 * from + 1] = -toward.y;
    row[2 * to] = toward.x;
    row[2 * to + 1] = toward.y;
    return [row[2]! * along.x + row[3]! * along.y, ...row.slice(4)];
  });
}

function movedBy(points: readonly Point[], step: readonly number[]): Point[] {
  const along = direction(points[0]!, points[1]!);
  return points.map((point, index) => {
    if (index === 0) return point;
    if (index === 1) return { x: point.x + along.x * step[0]!, y: point.y + along.y * step[0]! };
    return { x: point.x + step[2 * index - 3]!, y: point.y + step[2 * index - 2]! };
  });
}

function normalOf(slopes: readonly number[][], count: number): number[][] {
  return Array.from({ length: count }, (_, row) => Array.from({ length: count }, (_, column) => slopes.reduce((sum, slope) => sum + slope[row]! * slope[column]!, 0)));
}

/** Diagonal of I − A(AᵀA)⁻¹Aᵀ. */
function redundancyOf(points: readonly Point[], observations: readonly Observation[]): number[] {
  const slopes = slopesOf(points, observations);
  const normal = normalOf(slopes, slopes[0]?.length ?? 0);
  return slopes.map((row) => {
    const solved = solveLinear(normal, row);
    if (solved === null) return 0;
    const used = solved.reduce((sum, item, index) => sum + item * row[index]!, 0);
    return 1 - used < 1e-9 ? 0 : 1 - used;
  });
}
