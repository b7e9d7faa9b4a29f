/** A column of the pattern problem: how often each row is served, and what it costs. */
export interface Column {
  cost: number;
  entries: readonly (readonly [row: number, amount: number])[];
}

/**
 * The linear problem of the patterns, solved by the revised simplex method with an explicit inverse. It only ever offers
 * prices: what is proved with them is checked afterwards in `relaxation`, whatever the arithmetic here did.
 */
export class PatternMaster {
  private readonly inverse: Float64Array[];
  private readonly values: Float64Array;
  private readonly basis: Column[];

  /** Starts from one column a row that serves just this row. */
  constructor(demands: readonly number[], starting: readonly Column[]) {
    this.basis = [...starting];
    this.values = Float64Array.from(demands, (demand, row) => demand / starting[row]!.entries[0]![1]);
    this.inverse = demands.map((_, row) => {
      const line = new Float64Array(demands.length);
      line[row] = 1 / starting[row]!.entries[0]![1];
      return line;
    });
  }

  /** The price of one more of each row. */
  prices(): Float64Array {
    const prices = new Float64Array(this.values.length);
    this.basis.forEach((column, row) => {
      if (column.cost === 0) return;
      const line = this.inverse[row]!;
      for (let index = 0; index < prices.length; index += 1) prices[index]! += column.cost * line[index]!;
    });
    return prices;
  }

  /** Brings a column into the basis; false when it can take nobody's place. */
  enter(column: Column): boolean {
    const size = this.values.length;
    const direction = new Float64Array(size);
    for (let row = 0; row < size; row += 1) {
      const line = this.inverse[row]!;
      let sum = 0;
      for (const [at, amount] of column.entries) sum += line[at]! * amount;
      direction[row] = sum;
    }
    let leaving = -1;
    let least = Infinity;
    for (let row = 0; row < size; row += 1) {
      if (direction[row]! <= 1e-9) continue;
      const ratio = this.values[row]! / direction[row]!;
      if (ratio < least - 1e-12 || (ratio < least + 1e-12 && leaving !== -1 && direction[row]! > direction[leaving]!)) {
        least = Math.min(least, ratio);
        leaving = row;
      }
    }
    if (leaving === -1) return false;
    const pivot = direction[leaving]!;
    const pivotLine = this.inverse[leaving]!;
    for (let index = 0; index < size; index += 1) pivotLine[index]! /= pivot;
    this.values[leaving]! /= pivot;
    for (let row = 0; row < size; row += 1) {
      const factor = direction[row]!;
      if (row === leaving || factor === 0) continue;
      const line = this.inverse[row]!;
      for (let index = 0; index < size; index += 1) line[index]! -= factor * pivotLine[index]!;
      this.values[row] = Math.max(0, this.values[row]! - factor * this.values[leaving]!);
    }
    this.basis[leaving] = column;
    return true;
  }
}
