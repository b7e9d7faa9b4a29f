import type Fraction from "fraction.js";
import { Length, type LengthUnit } from "./length";
import { LengthError } from "./length-error";

/** The longest length that is read, either way. */
export const rangeLimit = Length.from(10_000, "ft");

/** A length as read, before the field's unit is known: `bare` is a number with no unit of its own. Immutable. */
export class ReadLength {
  private constructor(
    /** The number as written when `bare`, else inches. */
    readonly value: Fraction,
    readonly bare: boolean,
  ) {
    Object.freeze(this);
  }

  static bare(value: Fraction): ReadLength {
    return new ReadLength(value, true);
  }

  static of(length: Length): ReadLength {
    return new ReadLength(length.inches, false);
  }

  /** −1, 0 or 1; no unit changes a sign. */
  get sign(): number {
    return Math.sign(this.value.compare(0));
  }

  /** @throws LengthError `out-of-range` past 10 000 ft either way. */
  in(unit: LengthUnit): Length {
    const length = Length.from(this.value, this.bare ? unit : "in");
    if (length.magnitude().compare(rangeLimit) > 0) throw new LengthError("out-of-range", { limit: "10000 ft" });
    return length;
  }
}
