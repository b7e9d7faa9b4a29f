import { solveLinearProgram, type Condition } from "./linear-program";
import type { Place } from "./plan";

/** What is asked of the places: the worst departure from the wanted inset least, and what may not be passed. */
export interface Question {
  /** No place may hang over the edge by more than this (inches); null for no limit. */
  overhang: number | null;
  /** Places whose departure is settled: it may not exceed this. By place; null where it is still to be made least. */
  settled: readonly (number | null)[];
  /** Ask for the least overhang instead of the least departure. */
  leastOverhang?: boolean;
}

export interface Minimax {
  unknowns: number[];
  worst: number;
  /** By place: how much of the answer hangs on it; they add up to 1. */
  weights: number[];
}

const wide = 1e5;

/** The unknowns that answer the question for one pose, exactly but for rounding: a linear program. Null when a limit cannot be met. */
export function minimax(places: readonly Place[], unknowns: number, question: Question): Minimax | null {
  const conditions = conditionsOf(places.map(({ alpha, beta, wanted }) => ({ row: alpha, beta, wanted, slack: 0 })), question);
  const solved = solveLinearProgram([...new Array<number>(unknowns).fill(0), 1], conditions.map(({ condition }) => condition), wide);
  if (solved === null) return null;
  return { unknowns: solved.x.slice(0, -1), worst: solved.value, weights: weightsOf(places.length, conditions, solved.multipliers) };
}

export interface Affine {
  row: readonly number[];
  beta: number;
  wanted: number;
  /** By how much the offset may truly be off from what row and beta say. */
  slack: number;
}

/** Every condition of the question; the last unknown is the worst departure. */
export function conditionsOf(places: readonly Affine[], { overhang, settled, leastOverhang = false }: Question): { place: number; condition: Condition }[] {
  return places.flatMap(({ row, beta, wanted, slack }, place) => {
    const against = row.map((item) => -item);
    const limit = settled[place] ?? null;
    const own = limit === null ? [1, 0] : [0, limit];
    const [share, room] = own as [number, number];
    const departures = leastOverhang
      ? [{ row: [...row, 1], bound: -beta - slack }]
      : [
          { row: [...row, share], bound: wanted - beta - slack - room },
          { row: [...against, share], bound: beta - wanted - slack - room },
        ];
    const limits = overhang === null ? [] : [{ row: [...row, 0], bound: -overhang - beta - slack }];
    return [...departures, ...limits].map((condition) => ({ place, condition }));
  });
}

export function weightsOf(places: number, conditions: readonly { place: number; condition: Condition }[], multipliers: readonly number[]): number[] {
  const weights = new Array<number>(places).fill(0);
  conditions.forEach(({ place, condition }, index) => {
    if (condition.row.at(-1) !== 0) weights[place] = weights[place]! + multipliers[index]!;
  });
  return weights;
}
