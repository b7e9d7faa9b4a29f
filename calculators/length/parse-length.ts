import type Fraction from "fraction.js";
import { Length, type LengthUnit } from "./length";
import { LengthError } from "./length-error";
import { tokenizeLength, type LengthToken } from "./length-tokens";
import { printExact } from "./print-length";

export const characterLimit = 64;
const rangeLimit = Length.from(10_000, "ft");

/** A length as read, before the field's unit is known: `bare` is a number with no unit of its own. */
export class ReadLength {
  private constructor(
    private readonly value: Fraction,
    readonly bare: boolean,
  ) {}

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

/**
 * Reads a typed length: feet and inches, inches, fractions, decimals or metric, in English or Spanish marks.
 *
 * Units: a bare number takes `unit`. Exact; nothing is rounded. One pass over the text, no backtracking.
 *
 * @throws LengthError with one of the codes of `LengthProblems`, and nothing else, for any text.
 * @example parseLength(`28' 7 1/2"`) is 343 1/2 in, and so are `28-7 1/2`, `343.5` and `8724.9 mm`.
 */
export function parseLength(text: string, unit: LengthUnit = "in"): Length {
  return readLength(text).in(unit);
}

/** As `parseLength`, for a text whose unit is settled later. */
export function readLength(text: string): ReadLength {
  if (text.length > characterLimit) throw new LengthError("too-many-characters", { limit: characterLimit });
  return new LengthReader(tokenizeLength(text).tokens).read();
}

interface Quantity {
  value: Fraction;
  /** `decimal` when any part had a decimal point; `whole` a plain count; `mixed` a fraction, with or without a whole. */
  form: "whole" | "decimal" | "mixed";
}

/** Walks the tokens once, left to right. */
class LengthReader {
  private position = 0;

  constructor(private readonly tokens: LengthToken[]) {}

  read(): ReadLength {
    if (this.tokens.length === 0) throw new LengthError("empty", {});
    const negative = this.take("dash");
    if (this.here?.kind === "dash") throw new LengthError("sign", {});
    const read = this.readUnsigned(negative);
    if (this.here !== undefined) throw this.unreadRest();
    return read;
  }

  private get here(): LengthToken | undefined {
    return this.tokens[this.position];
  }

  private take(kind: "dash" | "slash"): boolean {
    const found = this.here?.kind === kind;
    if (found) this.position += 1;
    return found;
  }

  private takeUnit(): LengthUnit | undefined {
    const token = this.here;
    if (token?.kind !== "unit") return undefined;
    this.position += 1;
    return token.unit;
  }

  private readUnsigned(negative: boolean): ReadLength {
    const signed = (value: Fraction) => (negative ? value.neg() : value);
    const first = this.readQuantity();
    const unit = this.takeUnit();
    if (unit === "ft") return ReadLength.of(Length.from(signed(this.addInches(first))));
    if (unit !== undefined) return ReadLength.of(Length.from(signed(first.value), unit));
    if (this.here?.kind !== "dash") return ReadLength.bare(signed(first.value));
    return ReadLength.of(Length.from(signed(this.readDashed(first))));
  }

  /** Inches after feet, in inches altogether: the separator may be a space, a dash, or nothing. */
  private addInches(feet: Quantity): Fraction {
    const feetInches = feet.value.mul(12);
    const dashed = this.take("dash");
    if (this.here === undefined && !dashed) return feetInches;
    if (this.here?.kind === "dash") throw new LengthError("sign", {});
    const inches = this.readQuantity({ dashJoins: true });
    const unit = this.takeUnit();
    if (unit !== undefined && unit !== "in") throw new LengthError("mixed-units", {});
    const total = feetInches.add(inches.value);
    if (feet.form !== "whole") {
      throw new LengthError("decimal-feet-then-inches", {
        first: printExact(Length.from(feetInches)),
        second: printExact(Length.from(feet.value.floor().mul(12).add(inches.value))),
      });
    }
    return this.carryChecked(inches.value, total);
  }

  /** `28-7 1/2`: feet and inches parted by a dash alone. `3-1/2` has a second reading and is refused. */
  private readDashed(feet: Quantity): Fraction {
    this.take("dash");
    if (this.here?.kind === "dash") throw new LengthError("sign", {});
    const inches = this.readQuantity({ dashJoins: true });
    const unit = this.takeUnit();
    if (unit !== undefined && unit !== "in") throw new LengthError("mixed-units", {});
    const total = feet.value.mul(12).add(inches.value);
    if (feet.form !== "whole") throw new LengthError("sign", {});
    if (inches.form === "mixed" && inches.value.compare(1) < 0) {
      throw new LengthError("two-readings", {
        first: printExact(Length.from(feet.value.add(inches.value)), "inches"),
        second: `${feet.value.toString()}' 0 ${inches.value.toFraction()}"`,
      });
    }
    return this.carryChecked(inches.value, total);
  }

  private carryChecked(inches: Fraction, total: Fraction): Fraction {
    if (inches.compare(12) >= 0) throw new LengthError("inches-over-twelve", { carried: printExact(Length.from(total)) });
    return total;
  }

  /** A whole number, a decimal, a fraction, or a whole number with a fraction; after feet a dash may join the last two. */
  private readQuantity({ dashJoins = false } = {}): Quantity {
    const token = this.here;
    if (token === undefined) throw new LengthError("incomplete", {});
    if (token.kind === "fraction") {
      this.position += 1;
      return { value: token.value, form: "mixed" };
    }
    if (token.kind === "dash") throw new LengthError("sign", {});
    if (token.kind !== "number") throw new LengthError(token.kind === "slash" ? "incomplete" : "mixed-units", {});
    this.position += 1;
    if (this.take("slash")) return { value: this.readDenominator(token), form: "mixed" };
    return this.readFractionAfter(token, dashJoins);
  }

  private readFractionAfter(whole: LengthToken & { kind: "number" }, dashJoins: boolean): Quantity {
    const alone: Quantity = { value: whole.value, form: whole.whole ? "whole" : "decimal" };
    const next = dashJoins && this.here?.kind === "dash" ? this.tokens[this.position + 1] : this.here;
    if (next?.kind !== "fraction" && next?.kind !== "number") return alone;
    if (next !== this.here) this.position += 1;
    this.position += 1;
    if (next.kind === "fraction") return this.mixed(whole, next.value);
    if (this.take("slash")) return this.mixed(whole, this.readDenominator(next));
    if (!whole.whole || !next.whole) throw new LengthError("mixed-units", {});
    throw new LengthError("two-readings", { first: `${whole.text}' ${next.text}"`, second: `${whole.text}.${next.text}` });
  }

  private mixed(whole: LengthToken & { kind: "number" }, fraction: Fraction): Quantity {
    if (!whole.whole) throw new LengthError("decimal-with-fraction", {});
    const value = whole.value.add(fraction);
    if (fraction.compare(1) >= 0) throw new LengthError("improper-fraction", { carried: value.toFraction(true) });
    return { value, form: "mixed" };
  }

  private readDenominator(numerator: LengthToken & { kind: "number" }): Fraction {
    const token = this.here;
    if (token?.kind === "dash") throw new LengthError("sign", {});
    if (token?.kind !== "number") throw new LengthError("incomplete", {});
    this.position += 1;
    if (!numerator.whole || !token.whole) throw new LengthError("decimal-with-fraction", {});
    if (token.value.n === 0n) throw new LengthError("zero-denominator", {});
    return numerator.value.div(token.value);
  }

  private unreadRest(): LengthError {
    const token = this.here;
    if (token?.kind === "dash") return new LengthError("sign", {});
    return new LengthError(token?.kind === "slash" ? "incomplete" : "mixed-units", {});
  }
}
