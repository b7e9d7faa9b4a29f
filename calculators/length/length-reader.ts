import type Fraction from "fraction.js";
import { Length, type LengthUnit } from "./length";
import { LengthError } from "./length-error";
import type { LengthToken } from "./length-tokens";
import { printExact } from "./print-length";
import { ReadLength } from "./read-length";

/** The finest fraction that can be written: far past any tape, and it keeps exact sums of many lengths short. */
const denominatorLimit = 1_000_000_000;

type NumberToken = LengthToken & { kind: "number" };

interface Quantity {
  value: Fraction;
  /** `decimal` when any part had a decimal point; `whole` a plain count; `mixed` a fraction, with or without a whole. */
  form: "whole" | "decimal" | "mixed";
}

/** Walks the tokens of one length once, left to right. */
export class LengthReader {
  private position = 0;
  private negative = false;

  constructor(private readonly tokens: readonly LengthToken[]) {}

  /** @throws LengthError, and nothing else. */
  read(): ReadLength {
    if (this.here === undefined) throw new LengthError("empty", {});
    this.negative = this.take("dash");
    if (this.here?.kind === "dash") throw new LengthError("sign", {});
    const read = this.readUnsigned();
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

  private signed(value: Fraction): Fraction {
    return this.negative ? value.neg() : value;
  }

  /** Inches as a sentence offers them, with the sign that was typed. */
  private offer(inches: Fraction, style?: "inches"): string {
    return printExact(Length.from(this.signed(inches)), style);
  }

  private readUnsigned(): ReadLength {
    const first = this.readQuantity();
    const unit = this.takeUnit();
    if (unit === "ft") return ReadLength.of(Length.from(this.signed(this.addInches(first))));
    if (unit !== undefined) return ReadLength.of(Length.from(this.signed(first.value), unit));
    if (this.here?.kind !== "dash") return ReadLength.bare(this.signed(first.value));
    return ReadLength.of(Length.from(this.signed(this.readDashed(first))));
  }

  /** Inches after feet, in inches altogether: the separator may be a space, a dash, or nothing. */
  private addInches(feet: Quantity): Fraction {
    const feetInches = feet.value.mul(12);
    const dashed = this.take("dash");
    if (this.here === undefined && !dashed) return feetInches;
    const inches = this.readInches();
    if (feet.form !== "whole") {
      throw new LengthError("decimal-feet-then-inches", { first: this.offer(feetInches), second: this.offer(feet.value.floor().mul(12).add(inches.value)) });
    }
    return this.carryChecked(feetInches, inches);
  }

  /** `28-7 1/2`: feet and inches parted by a dash alone. `3-1/2` has a second reading and is refused. */
  private readDashed(feet: Quantity): Fraction {
    this.take("dash");
    const inches = this.readInches();
    if (feet.form !== "whole") throw new LengthError("sign", {});
    if (inches.form === "mixed" && inches.value.compare(1) < 0) {
      const asFeet = this.offer(feet.value.mul(12).add(inches.value));
      throw new LengthError("two-readings", { first: this.offer(feet.value.add(inches.value), "inches"), second: asFeet });
    }
    return this.carryChecked(feet.value.mul(12), inches);
  }

  private readInches(): Quantity {
    const inches = this.readQuantity({ afterFeet: true });
    const unit = this.takeUnit();
    if (unit !== undefined && unit !== "in") throw new LengthError("mixed-units", {});
    return inches;
  }

  private carryChecked(feetInches: Fraction, inches: Quantity): Fraction {
    const total = feetInches.add(inches.value);
    if (inches.value.compare(12) >= 0) throw new LengthError("inches-over-twelve", { carried: this.offer(total) });
    return total;
  }

  /** A whole number, a decimal, a fraction, or a whole number with a fraction; after feet a dash may join the last two. */
  private readQuantity({ afterFeet = false } = {}): Quantity {
    const token = this.here;
    if (token === undefined) throw new LengthError("incomplete", {});
    if (token.kind === "dash") throw new LengthError("sign", {});
    if (token.kind === "unit" || token.kind === "slash") throw new LengthError("incomplete", {});
    this.position += 1;
    if (token.kind === "fraction") return { value: token.value, form: "mixed" };
    if (this.take("slash")) return { value: this.readDenominator(token), form: "mixed" };
    return this.readFractionAfter(token, afterFeet);
  }

  private readFractionAfter(whole: NumberToken, afterFeet: boolean): Quantity {
    const alone: Quantity = { value: whole.value, form: whole.whole ? "whole" : "decimal" };
    const next = afterFeet && this.here?.kind === "dash" ? this.tokens[this.position + 1] : this.here;
    if (next?.kind !== "fraction" && next?.kind !== "number") return alone;
    if (next !== this.here) this.position += 1;
    this.position += 1;
    if (next.kind === "fraction") return this.mixed(whole, next.value);
    if (this.take("slash")) return this.mixed(whole, this.readDenominator(next));
    if (afterFeet || !whole.whole || !next.whole) throw new LengthError("mixed-units", {});
    throw this.twoNumbers(whole, next);
  }

  /** `28 7` or `28 7 1/2`: feet and inches with the marks left out, or one number with a space or a point gone astray. */
  private twoNumbers(feet: NumberToken, inches: NumberToken): LengthError {
    const fraction = this.readFractionIfAny();
    const asFeet = this.offer(feet.value.mul(12).add(inches.value).add(fraction ?? 0));
    const run = `${feet.text}${inches.text}`;
    const astray = fraction === null ? `${this.negative ? "-" : ""}${feet.text}.${inches.text}` : this.offer(fraction.add(run), "inches");
    return new LengthError("two-readings", { first: asFeet, second: astray });
  }

  private readFractionIfAny(): Fraction | null {
    const token = this.here;
    if (token?.kind !== "fraction" && !(token?.kind === "number" && this.tokens[this.position + 1]?.kind === "slash")) return null;
    return this.readQuantity({ afterFeet: true }).value;
  }

  private mixed(whole: NumberToken, fraction: Fraction): Quantity {
    if (!whole.whole) throw new LengthError("decimal-with-fraction", {});
    const value = whole.value.add(fraction);
    if (fraction.compare(1) >= 0) throw new LengthError("improper-fraction", { carried: value.toFraction(true) });
    return { value, form: "mixed" };
  }

  private readDenominator(numerator: NumberToken): Fraction {
    const token = this.here;
    if (token?.kind === "dash") throw new LengthError("sign", {});
    if (token?.kind !== "number") throw new LengthError("incomplete", {});
    this.position += 1;
    if (!numerator.whole || !token.whole) throw new LengthError("decimal-with-fraction", {});
    if (token.value.n === 0n) throw new LengthError("zero-denominator", {});
    if (token.value.compare(denominatorLimit) > 0) throw new LengthError("too-fine", { limit: denominatorLimit });
    return numerator.value.div(token.value);
  }

  private unreadRest(): LengthError {
    const token = this.here;
    if (token?.kind === "dash") return new LengthError("sign", {});
    return new LengthError(token?.kind === "slash" ? "incomplete" : "mixed-units", {});
  }
}
