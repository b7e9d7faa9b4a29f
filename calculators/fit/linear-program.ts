import { solveLinear } from "../geometry/solve-linear";

/** One condition: row · x ≥ bound. */
export interface Condition {
  row: readonly number[];
  bound: number;
}

export interface Solved {
  x: number[];
  value: number;
  /** What each condition holds back: the dual solution, positive only where the condition is met exactly. */
  multipliers: number[];
}

/** A condition missed by less than this (inches) is met. */
const missed = 1e-10;
/** A multiplier may go this far below nothing while pivots are chosen for their size (Harris). */
const leeway = 1e-11;

/**
 * The least cost · x under all conditions, x being free within ±`box`; null when no x meets them.
 *
 * Dual simplex on a basis of as many conditions as unknowns. It starts at the corner of the box that costs least, where
 * every multiplier is already right, and takes in the condition missed most until none is missed; after many steps
 * without end it takes them by number (Bland), which cannot cycle. The multipliers it ends with prove the optimum: they
 * are not negative, their rows add up to the cost, and their bounds to the value. The answer is solved afresh from the
 * last basis, so that no step's rounding stays in it.
 *
 * For a few dozen unknowns; rows should be of about unit length.
 */
export function solveLinearProgram(cost: readonly number[], conditions: readonly Condition[], box: number): Solved | null {
  const unknowns = cost.length;
  const count = conditions.length;
  // Conditions, then for each unknown the two walls of the box: x ≥ −box and −x ≥ −box.
  const boundOf = (index: number) => (index < count ? conditions[index]!.bound : -box);
  const basis = cost.map((item, index) => count + 2 * index + (item < 0 ? 1 : 0));
  // Columns of the inverse of the basis' rows: at the box's corner a diagonal of signs.
  const inverse = cost.map((item, order) => {
    const column = new Float64Array(unknowns);
    column[order] = item < 0 ? -1 : 1;
    return column;
  });
  const x = new Float64Array(unknowns);
  const weights = new Float64Array(unknowns);
  const multipliers = new Float64Array(unknowns);
  const patience = 50 * unknowns + 200;
  for (let step = 0; step < 4 * patience; step += 1) {
    x.fill(0);
    for (let order = 0; order < unknowns; order += 1) {
      const bound = boundOf(basis[order]!);
      const column = inverse[order]!;
      for (let item = 0; item < unknowns; item += 1) x[item] = x[item]! + bound * column[item]!;
    }
    const entering = mostMissed(conditions, x, box, step > patience);
    if (entering < 0) return settle(cost, conditions, box, basis);
    const wall = entering - count;
    for (let order = 0; order < unknowns; order += 1) {
      const column = inverse[order]!;
      weights[order] = wall < 0 ? along(column, conditions[entering]!.row) : column[wall >> 1]! * (wall % 2 === 0 ? 1 : -1);
      multipliers[order] = along(column, cost);
    }
    const leaving = leavingOf(basis, weights, multipliers, step > patience);
    if (leaving < 0) return null;
    const pivot = inverse[leaving]!;
    for (let item = 0; item < unknowns; item += 1) pivot[item] = pivot[item]! / weights[leaving]!;
    for (let order = 0; order < unknowns; order += 1) {
      const weight = weights[order]!;
      if (order === leaving || weight === 0) continue;
      const column = inverse[order]!;
      for (let item = 0; item < unknowns; item += 1) column[item] = column[item]! - weight * pivot[item]!;
    }
    basis[leaving] = entering;
  }
  return null;
}

function along(column: Float64Array, row: readonly number[]): number {
  let sum = 0;
  for (let item = 0; item < row.length; item += 1) sum += column[item]! * row[item]!;
  return sum;
}

function settle(cost: readonly number[], conditions: readonly Condition[], box: number, basis: readonly number[]): Solved | null {
  const count = conditions.length;
  const rowOf = (index: number) => (index < count ? conditions[index]!.row : cost.map((_, item) => (item === (index - count) >> 1 ? ((index - count) % 2 === 0 ? 1 : -1) : 0)));
  const rows = basis.map(rowOf);
  const x = solveLinear(rows, basis.map((index) => (index < count ? conditions[index]!.bound : -box)));
  const y = solveLinear(rows.map((_, column) => rows.map((row) => row[column]!)), cost);
  if (x === null || y === null) return null;
  const multipliers = new Array<number>(count).fill(0);
  basis.forEach((index, order) => {
    if (index < count) multipliers[index] = Math.max(0, y[order]!);
  });
  return { x, value: x.reduce((sum, item, index) => sum + item * cost[index]!, 0), multipliers };
}

function mostMissed(conditions: readonly Condition[], x: Float64Array, box: number, byNumber: boolean): number {
  let found = -1;
  let most = missed;
  for (let index = 0; index < conditions.length; index += 1) {
    const { row, bound } = conditions[index]!;
    let short = bound;
    for (let item = 0; item < x.length; item += 1) short -= row[item]! * x[item]!;
    if (short <= most) continue;
    found = index;
    if (byNumber) return found;
    most = short;
  }
  for (let item = 0; item < x.length; item += 1) {
    const past = Math.abs(x[item]!) - box;
    if (past <= Math.max(most, 1e-7)) continue;
    found = conditions.length + 2 * item + (x[item]! < 0 ? 0 : 1);
    if (byNumber) return found;
    most = past;
  }
  return found;
}

/** The condition whose multiplier runs out first; of those that nearly do, the one that turns sharpest, or by number. */
function leavingOf(basis: readonly number[], weights: Float64Array, multipliers: Float64Array, byNumber: boolean): number {
  let least = Infinity;
  weights.forEach((weight, order) => {
    if (weight > 1e-9) least = Math.min(least, (Math.max(0, multipliers[order]!) + (byNumber ? 0 : leeway)) / weight);
  });
  let found = -1;
  weights.forEach((weight, order) => {
    if (weight <= 1e-9 || Math.max(0, multipliers[order]!) / weight > least) return;
    if (found < 0 || (byNumber ? basis[order]! < basis[found]! : weight > weights[found]!)) found = order;
  });
  return found;
}
