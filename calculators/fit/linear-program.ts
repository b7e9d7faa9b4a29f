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
  const walls = cost.flatMap((_, index): Condition[] => [1, -1].map((sign) => ({ row: cost.map((_, other) => (other === index ? sign : 0)), bound: -box })));
  const all = [...conditions, ...walls];
  const basis = cost.map((item, index) => conditions.length + 2 * index + (item < 0 ? 1 : 0));
  // Columns of the inverse of the basis' rows: at the box's corner a diagonal of signs.
  const inverse = basis.map((index, order) => Float64Array.from(cost, (_, item) => (item === order ? all[index]!.row[order]! : 0)));
  const patience = 50 * unknowns + 200;
  for (let step = 0; step < 4 * patience; step += 1) {
    const x = pointOf(inverse, basis, all, unknowns);
    const entering = mostMissed(all, x, step > patience);
    if (entering < 0) {
      return settle(cost, conditions, all, basis);
    }
    const weights = inverse.map((column) => along(column, all[entering]!.row));
    const multipliers = inverse.map((column) => along(column, cost));
    const leaving = leavingOf(basis, weights, multipliers, step > patience);
    if (leaving < 0) return null;
    const pivot = inverse[leaving]!.map((item) => item / weights[leaving]!);
    inverse.forEach((column, order) => {
      if (order === leaving || weights[order] === 0) return;
      for (let item = 0; item < unknowns; item += 1) column[item] = column[item]! - weights[order]! * pivot[item]!;
    });
    inverse[leaving] = pivot;
    basis[leaving] = entering;
  }
  return null;
}

function along(column: Float64Array, row: readonly number[]): number {
  let sum = 0;
  for (let item = 0; item < row.length; item += 1) sum += column[item]! * row[item]!;
  return sum;
}

function pointOf(inverse: readonly Float64Array[], basis: readonly number[], all: readonly Condition[], unknowns: number): number[] {
  const x = new Array<number>(unknowns).fill(0);
  inverse.forEach((column, order) => {
    const { bound } = all[basis[order]!]!;
    for (let item = 0; item < unknowns; item += 1) x[item] = x[item]! + bound * column[item]!;
  });
  return x;
}

function settle(cost: readonly number[], conditions: readonly Condition[], all: readonly Condition[], basis: readonly number[]): Solved | null {
  const rows = basis.map((index) => all[index]!.row);
  const x = solveLinear(rows, basis.map((index) => all[index]!.bound));
  const y = solveLinear(rows.map((_, column) => rows.map((row) => row[column]!)), cost);
  if (x === null || y === null) return null;
  const multipliers = new Array<number>(conditions.length).fill(0);
  basis.forEach((index, order) => {
    if (index < conditions.length) multipliers[index] = Math.max(0, y[order]!);
  });
  return { x, value: x.reduce((sum, item, index) => sum + item * cost[index]!, 0), multipliers };
}

function mostMissed(all: readonly Condition[], x: readonly number[], byNumber: boolean): number {
  let found = -1;
  let most = missed;
  for (let index = 0; index < all.length; index += 1) {
    const { row, bound } = all[index]!;
    let short = bound;
    for (let item = 0; item < row.length; item += 1) short -= row[item]! * x[item]!;
    if (short <= most) continue;
    found = index;
    if (byNumber) return found;
    most = short;
  }
  return found;
}

/** The condition whose multiplier runs out first; of those that nearly do, the one that turns sharpest, or by number. */
function leavingOf(basis: readonly number[], weights: readonly number[], multipliers: readonly number[], byNumber: boolean): number {
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
