import { roundTo, type Length, type LengthUnit } from "../length";
import type { DecimalForm } from "./answer";

/** A length as a decimal number of `unit`, rounded once to a multiple of `step` that `places` decimals can write. */
export function decimalForm(length: Length, unit: LengthUnit, step: Length, places: number): DecimalForm {
  const rounded = roundTo(length, step);
  const digits = rounded.magnitude().in(unit).mul(10n ** BigInt(places)).n.toString().padStart(places + 1, "0");
  const decimals = places === 0 ? "" : `.${digits.slice(-places)}`;
  const sign = rounded.isNegative() ? "-" : "";
  return {
    value: length.toNumber(unit),
    text: `${sign}${places === 0 ? digits : digits.slice(0, -places)}${decimals} ${unit}`,
    errorIn: rounded.minus(length).toNumber(),
  };
}
