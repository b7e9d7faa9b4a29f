/** Small dense linear systems: rows of numbers, partial pivoting, no allocation beyond a copy. */
export type Matrix = readonly (readonly number[])[];

/** The x of A·x = b, or null when A is singular to working accuracy. */
export function solveLinear(matrix: Matrix, right: readonly number[]): number[] | null {
  const size = right.length;
  const rows = matrix.map((row, index) => [...row, right[index]!]);
  const scale = matrix.reduce((most, row) => row.reduce((own, item) => Math.max(own, Math.abs(item)), most), 0);
  for (let column = 0; column < size; column += 1) {
    let pivot = column;
    for (let row = column + 1; row < size; row += 1) if (Math.abs(rows[row]![column]!) > Math.abs(rows[pivot]![column]!)) pivot = row;
    if (Math.abs(rows[pivot]![column]!) <= 1e-13 * scale) return null;
    [rows[column], rows[pivot]] = [rows[pivot]!, rows[column]!];
    const lead = rows[column]!;
    for (let row = column + 1; row < size; row += 1) {
      const below = rows[row]!;
      const factor = below[column]! / lead[column]!;
      if (factor !== 0) for (let item = column; item <= size; item += 1) below[item] = below[item]! - factor * lead[item]!;
    }
  }
  const solution = new Array<number>(size).fill(0);
  for (let row = size - 1; row >= 0; row -= 1) {
    const items = rows[row]!;
    let rest = items[size]!;
    for (let item = row + 1; item < size; item += 1) rest -= items[item]! * solution[item]!;
    solution[row] = rest / items[row]!;
  }
  return solution;
}

/**
 * An orthonormal basis of the space the rows span: Gram-Schmidt, twice each for accuracy, the largest remaining row
 * first. Rows that keep less than `tolerance` of the largest row's length are taken as dependent.
 */
export function rowSpace(matrix: Matrix, tolerance = 1e-7): number[][] {
  const basis: number[][] = [];
  const rest = matrix.map((row) => [...row]);
  const largest = Math.max(0, ...rest.map(size));
  while (rest.length > 0) {
    let best = 0;
    rest.forEach((row, index) => {
      if (size(row) > size(rest[best]!)) best = index;
    });
    const row = outside(rest.splice(best, 1)[0]!, basis);
    const length = size(row);
    if (length <= tolerance * largest) break;
    const unit = row.map((item) => item / length);
    basis.push(unit);
    rest.forEach((other, index) => (rest[index] = outside(other, [unit])));
  }
  return basis;
}

/** What is left of a row after its part in the space of an orthonormal basis is taken away. */
export function outside(row: readonly number[], basis: Matrix): number[] {
  const left = [...row];
  for (let pass = 0; pass < 2; pass += 1) {
    for (const unit of basis) {
      const part = unit.reduce((sum, item, index) => sum + item * left[index]!, 0);
      if (part !== 0) for (let index = 0; index < left.length; index += 1) left[index] = left[index]! - part * unit[index]!;
    }
  }
  return left;
}

export function size(row: readonly number[]): number {
  return Math.sqrt(row.reduce((sum, item) => sum + item * item, 0));
}
