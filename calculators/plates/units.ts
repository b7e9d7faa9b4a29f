import Fraction from "fraction.js";
import { Length } from "../length";
import { CalculationError } from "../schema";

/** More than this many units to an inch and a whole job would no longer fit whole numbers; 1/64 in and 1 mm share 8128. */
const mostPerInch = 100_000_000n;

/**
 * A common measure of all lengths of a job, so that planning counts in whole numbers and stays exact.
 *
 * @throws CalculationError `no-common-measure` when the lengths share none that is coarse enough, such as sevenths beside seventeenths of everything.
 */
export class Units {
  private readonly perInch: number;

  constructor(lengths: readonly Length[]) {
    let shared = 8n;
    for (const { inches } of lengths) {
      shared = (shared * inches.d) / greatestCommon(shared, inches.d);
      if (shared > mostPerInch) throw new CalculationError([{ pointer: "", code: "no-common-measure", params: {} }]);
    }
    this.perInch = Number(shared);
  }

  /** Exact: every length given is a whole number of units. */
  whole(length: Length): number {
    return Number(length.inches.mul(this.perInch).valueOf());
  }

  floor(length: Length): number {
    return Number(length.inches.mul(this.perInch).floor().valueOf());
  }

  ceil(length: Length): number {
    return Number(length.inches.mul(this.perInch).ceil().valueOf());
  }

  length(units: number): Length {
    return Length.from(new Fraction(units, this.perInch));
  }
}

function greatestCommon(a: bigint, b: bigint): bigint {
  while (b !== 0n) [a, b] = [b, a % b];
  return a;
}
