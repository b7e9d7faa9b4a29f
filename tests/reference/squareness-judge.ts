import { inv, matrix, multiply, norm, subtract, transpose, type Matrix } from "mathjs";

export const names = ["ab", "bc", "cd", "da", "ac", "bd"] as const;
export type Name = (typeof names)[number];
export type SixReadings = Record<Name, number>;

const ends: Record<Name, readonly [number, number]> = { ab: [0, 1], bc: [1, 2], cd: [2, 3], da: [3, 0], ac: [0, 2], bd: [1, 3] };

/**
 * An independent least-squares solution: observation equations in coordinates by Gauss-Newton with mathjs matrices. Unknowns are
 * B's x, C and D; A is the origin and B stays on x. No code or formula is shared with the core, which solves one condition
 * among the lengths.
 */
export function adjustByCoordinates(readings: SixReadings): { adjusted: SixReadings; closure: number } {
  const at = (unknowns: number[]): [number, number][] => [[0, 0], [unknowns[0]!, 0], [unknowns[1]!, unknowns[2]!], [unknowns[3]!, unknowns[4]!]];
  const length = (points: [number, number][], name: Name) => Math.hypot(points[ends[name][1]]![0] - points[ends[name][0]]![0], points[ends[name][1]]![1] - points[ends[name][0]]![1]);
  let unknowns = [readings.ab, readings.ab, readings.da, 0, readings.da];
  for (let round = 0; round < 100; round += 1) {
    const points = at(unknowns);
    const design = names.map((name) => {
      const [from, to] = ends[name];
      const size = length(points, name);
      const [dx, dy] = [(points[to]![0] - points[from]![0]) / size, (points[to]![1] - points[from]![1]) / size];
      const row = new Array<number>(8).fill(0);
      row[2 * to]! += dx;
      row[2 * to + 1]! += dy;
      row[2 * from]! -= dx;
      row[2 * from + 1]! -= dy;
      return [row[2]!, row[4]!, row[5]!, row[6]!, row[7]!];
    });
    const J: Matrix = matrix(design);
    const misfit = matrix(names.map((name) => readings[name] - length(points, name)));
    const step = multiply(inv(multiply(transpose(J), J)), multiply(transpose(J), misfit)) as unknown as Matrix;
    unknowns = unknowns.map((value, index) => value + Number(step.get([index])));
    if (Number(norm(step)) < 1e-11) break;
  }
  const points = at(unknowns);
  const adjusted = Object.fromEntries(names.map((name) => [name, length(points, name)])) as SixReadings;
  return { adjusted, closure: Number(norm(subtract(matrix(names.map((name) => adjusted[name])), matrix(names.map((name) => readings[name]))) as unknown as Matrix)) };
}
