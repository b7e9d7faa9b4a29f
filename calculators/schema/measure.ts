import { z } from "zod";
import { type Length, printRounded, roundLength, type LengthStyle, type Precision } from "../length";

/** How every length is answered. `in`, `mm` and `exact` are unrounded; `text` is rounded to the precision asked for. */
export const lengthAnswer = z
  .strictObject({
    in: z.number().meta({ description: "Inches, unrounded" }),
    exact: z.string().nullable().meta({ description: "The exact rational of inches, such as 687/2; null for an irrational length" }),
    text: z.string().meta({ description: "Rounded once to the precision asked for; a tie goes to the even graduation" }),
    mm: z.number().meta({ description: "Millimetres, unrounded" }),
    lean: z.enum(["strong", "scant", "exact"]).meta({ description: "Whether the true length is a little more or less than text" }),
  })
  .meta({ id: "Length", description: "A length", example: { in: 343.5, exact: "687/2", text: "28' 7 1/2\"", mm: 8724.9, lean: "exact" } });

export type LengthAnswer = z.output<typeof lengthAnswer>;

/** The answer form of a length: an exact `Length`, or a double of inches where the length is irrational or adjusted. */
export function measure(value: Length | number, precision: Precision, style?: LengthStyle): LengthAnswer {
  const { rounded, lean } = roundLength(value, precision);
  const text = printRounded(rounded, precision, style);
  if (typeof value === "number") return { in: value, exact: null, text, mm: value * 25.4, lean };
  return { in: value.toNumber(), exact: value.toString(), text, mm: value.toNumber("mm"), lean };
}
