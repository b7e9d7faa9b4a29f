import Fraction from "fraction.js";
import { Length } from "../length";

/** Beyond this many ticks to an inch, whole numbers would no longer hold a wall; 1/64 in and 1 mm share 8128. */
const mostTicks = 8128n * 1000n;

/**
 * A common measure of many lengths, so that placing bolts counts in whole numbers and stays exact. Where the lengths
 * share none that is coarse enough, `floor` and `ceil` round to 1/8128 in on the side asked for.
 */
export class Ticks {
  private readonly perInch: number;

  constructor(lengths: readonly Length[]) {
    const shared = lengths.reduce((common, { inches }) => (common > mostTicks ? common : (common * inches.d) / greatestCommon(common, inches.d)), 4n);
    this.perInch = Number(shared > mostTicks ? 8128n : shared);
  }

  floor(length: Length): number {
    return Number(length.inches.mul(this.perInch).floor().valueOf());
  }

  ceil(length: Length): number {
    return Number(length.inches.mul(this.perInch).ceil().valueOf());
  }

  toLength(ticks: number): Length {
    return Length.from(new Fraction(ticks, this.perInch));
  }
}

function greatestCommon(a: bigint, b: bigint): bigint {
  while (b !== 0n) [a, b] = [b, a % b];
  return a;
}
