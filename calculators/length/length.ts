import Fraction from "fraction.js";

/** 1 in = 25.4 mm and 1 ft = 0.3048 m, exactly (85 FR 62698). Sizes of one unit in inches. */
const inchesPerUnit = {
  in: new Fraction(1),
  ft: new Fraction(12),
  mm: new Fraction(5, 127),
  cm: new Fraction(50, 127),
  m: new Fraction(5000, 127),
} as const;

export type LengthUnit = keyof typeof inchesPerUnit;
export const lengthUnits = ["in", "ft", "mm", "cm", "m"] as const satisfies readonly LengthUnit[];

/** Digits of a plain decimal, never an exponent, so that a JSON number means what was written. */
function exactDecimal(value: number): Fraction {
  if (Number.isSafeInteger(value)) return new Fraction(BigInt(value));
  if (!Number.isFinite(value)) throw new RangeError("A length needs a finite number");
  const [digits = "0", exponent] = String(value).split("e");
  const mantissa = new Fraction(digits);
  return exponent === undefined ? mantissa : mantissa.mul(new Fraction(10).pow(Number(exponent))!);
}

/**
 * An exact length: a rational number of inches, immutable.
 *
 * Units: inches inside; `from` and `to` name any other. Nothing is rounded here.
 * Source of the factors: 85 FR 62698 (1 ft = 0.3048 m exactly), hence 1 in = 25.4 mm.
 */
export class Length {
  static readonly zero = new Length(new Fraction(0));

  private constructor(readonly inches: Fraction) {
    Object.freeze(inches);
    Object.freeze(this);
  }

  /** `value` may be a number (taken as the decimal it prints as), or an exact fraction. */
  static from(value: number | Fraction, unit: LengthUnit = "in"): Length {
    const exact = typeof value === "number" ? exactDecimal(value) : value;
    return new Length(exact.mul(inchesPerUnit[unit]));
  }

  plus(other: Length): Length {
    return new Length(this.inches.add(other.inches));
  }

  minus(other: Length): Length {
    return new Length(this.inches.sub(other.inches));
  }

  times(factor: number | Fraction): Length {
    return new Length(this.inches.mul(typeof factor === "number" ? exactDecimal(factor) : factor));
  }

  /** @throws RangeError when the divisor is zero. */
  over(divisor: number | Fraction): Length {
    const exact = typeof divisor === "number" ? exactDecimal(divisor) : divisor;
    if (exact.n === 0n) throw new RangeError("A length cannot be divided by zero");
    return new Length(this.inches.div(exact));
  }

  negated(): Length {
    return new Length(this.inches.neg());
  }

  magnitude(): Length {
    return new Length(this.inches.abs());
  }

  /** −1, 0 or 1. */
  compare(other: Length): number {
    return Math.sign(this.inches.compare(other.inches));
  }

  equals(other: Length): boolean {
    return this.inches.equals(other.inches);
  }

  isZero(): boolean {
    return this.inches.n === 0n;
  }

  isNegative(): boolean {
    return this.inches.n !== 0n && this.inches.s < 0n;
  }

  isPositive(): boolean {
    return this.inches.n !== 0n && this.inches.s > 0n;
  }

  /** The exact count of another unit. */
  in(unit: LengthUnit): Fraction {
    return this.inches.div(inchesPerUnit[unit]);
  }

  /** The count as a double, right to two units in its last place. */
  toNumber(unit: LengthUnit = "in"): number {
    return toDouble(this.in(unit));
  }

  /** Exact inches as `687/2` or `336`. */
  toString(): string {
    return this.inches.toFraction();
  }
}

/**
 * The square root of a number of square inches: exact where it is rational, else the nearest double in inches.
 *
 * @throws RangeError when the number is negative.
 * @example 28 ft by 21 ft: squareRoot(336² + 252²) is exactly 420 in.
 */
export function squareRoot(squareInches: Fraction): Length | number {
  if (squareInches.s < 0n && squareInches.n !== 0n) throw new RangeError("No real square root");
  const top = wholeRoot(squareInches.n);
  const bottom = wholeRoot(squareInches.d);
  if (top !== null && bottom !== null) return Length.from(new Fraction(top, bottom));
  return Math.sqrt(toDouble(squareInches));
}

const doubleLimit = 1n << 1000n;

/** A sum of many unlike fractions outgrows the doubles above and below the line long before it does as a whole. */
function toDouble(value: Fraction): number {
  return value.n < doubleLimit && value.d < doubleLimit ? value.valueOf() : (Number(value.s) * Number((value.n << 64n) / value.d)) / 2 ** 64;
}

function bitsOf(value: bigint): number {
  return value.toString(16).length * 4;
}

/** The whole square root, or null when there is none; Newton's steps on whole numbers. */
function wholeRoot(value: bigint): bigint | null {
  if (value < 2n) return value;
  let guess = 1n << BigInt(Math.ceil(bitsOf(value) / 2)); // no less than the root, and from above the steps only fall
  for (;;) {
    const next = (guess + value / guess) / 2n;
    if (next >= guess) return guess * guess === value ? guess : null;
    guess = next;
  }
}
