import { roundTo, type Length, type LengthUnit } from "../length";
import type { DecimalForm } from "./answer";

interface Rounding {
  /** The text is a multiple of this, which `places` decimals can write. */
  step: Length;
  places: number;
  /** Printed tables of decimal feet round a tie up (3/8 in is .0313); a tape's graduations go to the even one. */
  ties: "up" | "even";
}

/** A length as a decimal number of `unit`, rounded once. */
export function decimalForm(length: Length, unit: LengthUnit, { step, places, ties }: Rounding): DecimalForm {
  const size = length.magnitude();
  const rounded = ties === "even" ? roundTo(size, step) : step.times(size.inches.div(step.inches).add(0.5).floor());
  const error = length.isNegative() ? size.minus(rounded) : rounded.minus(size);
  const digits = rounded.in(unit).mul(10n ** BigInt(places)).n.toString().padStart(places + 1, "0");
  const decimals = places === 0 ? "" : `.${digits.slice(-places)}`;
  const sign = length.isNegative() && !rounded.isZero() ? "-" : "";
  return {
    value: length.toNumber(unit),
    text: `${sign}${places === 0 ? digits : digits.slice(0, -places)}${decimals} ${unit}`,
    errorIn: error.toNumber(),
  };
}
