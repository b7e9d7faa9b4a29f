import { graduation, isMetric, Length, roundLength, type LengthStyle, type LengthUnit, type Precision } from "../length";
import { CalculationError, measure } from "../schema";
import type { ConversionsAnswer, PrintedForm } from "./answer";
import { decimalForm } from "./decimal-form";
import type { ConversionsInput } from "./input";
import { runStrip } from "./run-strip";

const tenthMillimetre = Length.from(0.1, "mm");

/**
 * One length in every form, each with what rounding did to it; and tape arithmetic, exact from line to line.
 *
 * Units: lengths are exact rational inches; each form is rounded once, from the exact length, never from another form.
 * Source: 1 ft = 0.3048 m and 1 in = 25.4 mm exactly (85 FR 62698); a tie goes to the even graduation (NIST HB 44 s. 10.3).
 *
 * @throws CalculationError `nothing-to-convert` without `value` or `strip`, `value-and-strip` with both, and what `runStrip` throws.
 * @example 8 ft 3 5/16 in is 8.2760 ft (Glencoe activity 9): the worked example `decimalFoot`, which a test runs.
 */
export function convert({ value, strip, spaces, precision }: ConversionsInput): ConversionsAnswer {
  if (value !== undefined && strip !== undefined) throw new CalculationError([{ pointer: "/strip", code: "value-and-strip", params: {} }]);
  const totals = strip === undefined ? null : runStrip(strip);
  const total = totals?.at(-1) ?? value;
  if (total === undefined) throw new CalculationError([{ pointer: "/value", code: "nothing-to-convert", params: {} }]);

  const inchPrecision = isMetric(precision) ? "1/16" : precision;
  const decimal = (unit: LengthUnit) => decimalForm(total, unit, { step: Length.from(0.0001, unit), places: 4, ties: "up" });
  const metric = (unit: LengthUnit, shift: number) =>
    decimalForm(total, unit, { step: isMetric(precision) ? graduation(precision) : tenthMillimetre, places: shift + (precision === "1mm" ? 0 : 1), ties: "even" });
  return {
    total: measure(total, precision),
    feetInches: printedForm(total, inchPrecision, "feet-inches"),
    inches: printedForm(total, inchPrecision, "inches"),
    decimalFeet: decimal("ft"),
    decimalInches: decimal("in"),
    millimetres: metric("mm", 0),
    centimetres: metric("cm", 1),
    metres: metric("m", 3),
    strip:
      strip?.map((line, index) => ({
        op: line.op,
        length: "length" in line ? measure(line.length, precision) : null,
        factor: "factor" in line ? line.factor.toFraction() : null,
        total: measure(totals?.[index] ?? total, precision),
      })) ?? null,
    spacing: spaces === undefined ? null : equalSpaces(total, spaces, precision),
  };
}

function printedForm(length: Length, precision: Precision, style: LengthStyle): PrintedForm {
  const { rounded } = roundLength(length, precision);
  return { ...measure(length, precision, style), errorIn: rounded.minus(length).toNumber() };
}

function equalSpaces(total: Length, count: number, precision: Precision): ConversionsAnswer["spacing"] {
  const each = total.over(count);
  return { count, each: measure(each, precision), marks: Array.from({ length: count }, (_, index) => measure(each.times(index + 1), precision)) };
}
