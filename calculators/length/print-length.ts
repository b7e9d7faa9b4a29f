import Fraction from "fraction.js";
import { Length } from "./length";

export const precisions = ["1/2", "1/4", "1/8", "1/16", "1/32", "1/64", "1mm", "0.5mm"] as const;
export type Precision = (typeof precisions)[number];

/** `feet-inches` carries feet from 12 in up (`28' 7 1/2"`); `inches` is what a tape that counts inches shows (`343 1/2"`). */
export type LengthStyle = "feet-inches" | "inches";

/** What the true length is beside the printed one: a little more, a little less, or the same. */
export type Lean = "strong" | "scant" | "exact";

const graduations = {
  "1/2": Length.from(new Fraction(1, 2)),
  "1/4": Length.from(new Fraction(1, 4)),
  "1/8": Length.from(new Fraction(1, 8)),
  "1/16": Length.from(new Fraction(1, 16)),
  "1/32": Length.from(new Fraction(1, 32)),
  "1/64": Length.from(new Fraction(1, 64)),
  "1mm": Length.from(1, "mm"),
  "0.5mm": Length.from(0.5, "mm"),
} as const satisfies Record<Precision, Length>;

/** An irrational length closer than this to a graduation (inches) is called exact: below what doubles can tell. */
const indistinct = 1e-7;

/** One graduation of a precision. */
export function graduation(precision: Precision): Length {
  return graduations[precision];
}

export function isMetric(precision: Precision): boolean {
  return precision.endsWith("mm");
}

/**
 * The nearest graduation; a tie goes to the even one (NIST HB 44 s. 10.3).
 *
 * `value` is exact, or a double of inches for an irrational length (right to 1e-7 in).
 * `lean` is the sign of true length minus rounded length, so a negative length that prints longer is strong.
 *
 * @example 11 31/32 in at 1/16 is 12 in, scant.
 */
export function roundLength(value: Length | number, precision: Precision): { rounded: Length; lean: Lean } {
  const step = graduations[precision];
  if (typeof value === "number") {
    const count = evenRound(value / step.toNumber());
    const rounded = step.times(count);
    const remainder = value - rounded.toNumber();
    return { rounded, lean: Math.abs(remainder) < indistinct ? "exact" : remainder > 0 ? "strong" : "scant" };
  }
  const rounded = roundTo(value, step);
  const sign = value.compare(rounded);
  return { rounded, lean: sign === 0 ? "exact" : sign > 0 ? "strong" : "scant" };
}

/** The nearest multiple of `step`; a tie goes to the even one. */
export function roundTo(value: Length, step: Length): Length {
  const ratio = value.inches.div(step.inches);
  const below = ratio.floor();
  const comparison = ratio.sub(below).mul(2).compare(1);
  const up = comparison > 0 || (comparison === 0 && below.n % 2n === 1n);
  return step.times(up ? below.add(1) : below);
}

function evenRound(value: number): number {
  const below = Math.floor(value);
  const rest = value - below;
  const count = rest > 0.5 || (rest === 0.5 && below % 2 !== 0) ? below + 1 : below;
  return count === 0 ? 0 : count;
}

/**
 * A length as a person reads it, rounded once. Metric precisions print millimetres whatever the style.
 *
 * @example 687/2 in at 1/16 prints `28' 7 1/2"`, or `343 1/2"` in the style `inches`; at 0.5mm `8725 mm`.
 */
export function printLength(value: Length | number, precision: Precision, style: LengthStyle = "feet-inches"): string {
  return printRounded(roundLength(value, precision).rounded, precision, style);
}

/** A length that `roundLength` has rounded to this precision. */
export function printRounded(rounded: Length, precision: Precision, style: LengthStyle = "feet-inches"): string {
  const sign = rounded.isNegative() ? "-" : "";
  const size = rounded.magnitude();
  return sign + (isMetric(precision) ? `${size.in("mm").toString()} mm` : printInches(size, style));
}

/** An exact length with no rounding, for showing what was understood: fractions of any denominator are kept. */
export function printExact(value: Length, style: LengthStyle = "feet-inches"): string {
  return (value.isNegative() ? "-" : "") + printInches(value.magnitude(), style);
}

function printInches(size: Length, style: LengthStyle): string {
  const feet = style === "feet-inches" ? size.inches.div(12).floor() : new Fraction(0);
  const inches = size.inches.sub(feet.mul(12));
  const inchText = `${inches.toFraction(true)}"`;
  if (feet.n === 0n) return inchText;
  // `7' 0 7/8"`: the 0 stands, since `7' 7/8"` is too near `7' 7 8"` on a phone in the sun
  return `${feet.toString()}' ${inches.n !== 0n && inches.compare(1) < 0 ? `0 ${inchText}` : inchText}`;
}
