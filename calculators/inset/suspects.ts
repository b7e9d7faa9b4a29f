import { chalkCorners, corners, figureOf, type Corner, type Figure, type Marks, type Slab } from "./chalk-geometry";
import { sides, type Diagonal, type Side } from "./input";

/** What was read on the chalk, burn taken off, and what the concrete's diagonals lead to expect. Inches. */
export interface ChalkReadings {
  slab: Slab;
  /** The insets as meant. */
  insets: Readonly<Record<Side, number>>;
  /** Slab diagonals as read; null when only sizes are known, and then the rack of the chalk is unknown too. */
  slabDiagonals: Readonly<Record<Diagonal, number>> | null;
  chalkDiagonals: Readonly<Record<Diagonal, number>> | null;
  chalkLines: Readonly<Partial<Record<Side, number>>>;
  readingError: number;
}

export interface Suspect {
  /** A whole line, or its mark at one end. */
  line: Side | null;
  end: Corner | null;
  /** Or one reading, by its field. */
  reading: string | null;
  /** Inches too far in (a line or mark), or to be added to the reading. */
  off: number;
  /** Root of the weighted squares left when this alone is put right. */
  rest: number;
  /** Whether it alone explains every reading. */
  fits: boolean;
}

/** As in squareness: readings contradict each other when their closure is more than 2.45 times the reading error. */
export const closureFactor = 2.45;

/** One misclosure: what was read less what was expected, over the root of the number of readings in it. */
type Expected = (figure: Figure, slab: Slab) => number;
interface Observation {
  value: number;
  expected: Expected;
  readings: number;
  /** The fields it is made of, with the sign each enters with. */
  fields: readonly (readonly [string, 1 | -1])[];
}

/**
 * Tests the chalk readings against the lines as meant, and finds what alone would explain them.
 *
 * Criterion: with misclosures r of k readings each (two in a drop, one in a length), the closure √Σ(r²/k) may reach
 * 2.45 reading errors. A drop is the slab's diagonal less the chalk's, so an error common to both cancels. Without slab
 * diagonals the chalk's rack is free and only what both diagonals say together is tested.
 *
 * Limit: the shapes that opposite lines make when they are off by as much are congruent, so nothing read within the
 * chalk can part them; only their offsets from the slab can.
 */
export function judgeChalk(readings: ChalkReadings): { closure: number; limit: number; suspects: Suspect[] } {
  const { slab, insets } = readings;
  const observations = observationsOf(readings);
  const limit = closureFactor * readings.readingError;
  const freeRack = readings.slabDiagonals === null && readings.chalkDiagonals !== null;
  const solve = (marksOf: (off: number) => Marks, hasOff: boolean) => fit(observations, slab, marksOf, freeRack, hasOff);
  const meant = marksFrom(insets);
  const closure = solve(() => meant, false).rest;
  if (closure <= limit) return { closure, limit, suspects: [] };

  const spare = observations.length - (freeRack ? 1 : 0);
  const candidate = (line: Side, end: Corner | null): Suspect => {
    const { off, rest } = solve((value) => withOff(meant, line, end, value), true);
    return { line, end, reading: null, off, rest, fits: rest <= limit };
  };
  const lines = sides.map((side) => candidate(side, null));
  const marks = spare < 2 ? [] : sides.flatMap((side, index) => [candidate(side, corners[index]!), candidate(side, corners[(index + 1) % 4]!)]);
  const misread = spare < 2 ? [] : misreadings(observations, (without) => fit(without, slab, () => meant, freeRack, false), limit);
  const best = (a: Suspect, b: Suspect) => Number(b.fits) - Number(a.fits) || a.rest - b.rest || Math.abs(a.off) - Math.abs(b.off);
  return { closure, limit, suspects: [...lines.sort(best), ...marks.filter(({ fits }) => fits).sort(best), ...misread.filter(({ fits }) => fits).sort(best)] };
}

/** Each reading in turn set aside: does the rest agree, and what would it have to be? */
function misreadings(observations: readonly Observation[], solve: (without: readonly Observation[]) => Solution, limit: number): Suspect[] {
  return observations.flatMap((observation) => {
    const { rest, figure, slab } = solve(observations.filter((other) => other !== observation));
    const change = observation.expected(figure, slab) - observation.value;
    return observation.fields.map(([reading, sign]): Suspect => ({ line: null, end: null, reading, off: sign * change, rest, fits: rest <= limit }));
  });
}

function observationsOf({ slabDiagonals, chalkDiagonals, chalkLines }: ChalkReadings): Observation[] {
  const diagonals = (["ac", "bd"] as const).flatMap((name): Observation[] => {
    if (chalkDiagonals === null) return [];
    const chalkField = `chalkDiagonals.${name}`;
    if (slabDiagonals === null) return [{ value: chalkDiagonals[name], expected: (figure) => figure[name], readings: 1, fields: [[chalkField, 1]] }];
    const slabDiagonal = (slab: Slab) => Math.sqrt(slab.length ** 2 + slab.width ** 2 + (name === "ac" ? 2 : -2) * slab.length * slab.width * slab.cosine);
    return [{ value: slabDiagonals[name] - chalkDiagonals[name], expected: (figure, slab) => slabDiagonal(slab) - figure[name], readings: 2, fields: [[chalkField, -1], [`slabDiagonals.${name}`, 1]] }];
  });
  const lengths = sides.flatMap((side): Observation[] => {
    const value = chalkLines[side];
    return value === undefined ? [] : [{ value, expected: (figure) => figure[side], readings: 1, fields: [[`chalkLines.${side}`, 1]] }];
  });
  return [...diagonals, ...lengths];
}

export function marksFrom(insets: Readonly<Record<Side, number>>): Marks {
  return { ab: [insets.ab, insets.ab], bc: [insets.bc, insets.bc], cd: [insets.cd, insets.cd], da: [insets.da, insets.da] };
}

function withOff(marks: Marks, line: Side, end: Corner | null, off: number): Marks {
  const [first, second] = marks[line];
  const isFirst = end === null || corners[sides.indexOf(line)] === end;
  const isSecond = end === null || !isFirst;
  return { ...marks, [line]: [first + (isFirst ? off : 0), second + (isSecond ? off : 0)] };
}

interface Solution {
  off: number;
  rest: number;
  figure: Figure;
  slab: Slab;
}

/** Gauss-Newton over at most two unknowns: the rack (when free) and how far something is off. Four rounds settle it below 1e-9 in. */
function fit(observations: readonly Observation[], slab: Slab, marksOf: (off: number) => Marks, freeRack: boolean, hasOff: boolean): Solution {
  const residualsAt = ([rack, off]: readonly [number, number]) => {
    const racked = { ...slab, cosine: slab.cosine + rack };
    const figure = figureOf(chalkCorners(racked, marksOf(off)));
    return { figure, racked, residuals: observations.map(({ value, expected, readings }) => (value - expected(figure, racked)) / Math.sqrt(readings)) };
  };
  const steps: readonly (readonly [number, number])[] = [...(freeRack ? [[1e-5, 0] as const] : []), ...(hasOff ? [[0, 1e-3] as const] : [])];
  let unknowns: [number, number] = [0, 0];
  for (let round = 0; round < (steps.length === 0 ? 0 : 5); round += 1) {
    const { residuals } = residualsAt(unknowns);
    const slopes = steps.map(([rack, off]) => {
      const ahead = residualsAt([unknowns[0] + rack, unknowns[1] + off]).residuals;
      const behind = residualsAt([unknowns[0] - rack, unknowns[1] - off]).residuals;
      return ahead.map((value, index) => (value - behind[index]!) / (2 * (rack + off)));
    });
    const change = leastSquares(slopes, residuals);
    steps.forEach(([rack], index) => (unknowns = rack > 0 ? [unknowns[0] + change[index]!, unknowns[1]] : [unknowns[0], unknowns[1] + change[index]!]));
  }
  const { figure, racked, residuals } = residualsAt(unknowns);
  return { off: unknowns[1], rest: Math.hypot(...residuals), figure, slab: racked };
}

/** The change of one or two unknowns that makes residuals least; an unknown that nothing depends on stays. */
function leastSquares(slopes: readonly number[][], residuals: readonly number[]): number[] {
  const dot = (a: readonly number[], b: readonly number[]) => a.reduce((sum, value, index) => sum + value * b[index]!, 0);
  const [first, second] = slopes;
  if (first === undefined) return [];
  if (second === undefined) {
    const size = dot(first, first);
    return [size < 1e-12 ? 0 : -dot(first, residuals) / size];
  }
  const [a, b, c] = [dot(first, first), dot(first, second), dot(second, second)];
  const determinant = a * c - b * b;
  if (determinant < 1e-12 * a * Math.max(c, 1e-12)) return [a < 1e-12 ? 0 : -dot(first, residuals) / a, 0];
  const [p, q] = [-dot(first, residuals), -dot(second, residuals)];
  return [(c * p - b * q) / determinant, (a * q - b * p) / determinant];
}
