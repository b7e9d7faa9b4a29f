import { z } from "zod";
import { lengthAnswer } from "../schema";
import { stripOperations } from "./input";

const errorIn = z.number().meta({ description: "Inches by which this form is longer than the true length; negative when shorter" });

export const printedForm = lengthAnswer.extend({ errorIn }).meta({ id: "PrintedForm", description: "A length and what rounding its text did to it" });
export type PrintedForm = z.output<typeof printedForm>;

export const decimalForm = z
  .strictObject({
    value: z.number().meta({ description: "Unrounded" }),
    text: z.string().meta({ description: "Rounded once: a tie goes up in decimal feet and inches, as in printed tables, and to the even graduation in metric" }),
    errorIn,
  })
  .meta({ id: "DecimalForm", description: "A length as a decimal number of one unit", example: { value: 8.276041666666666, text: "8.2760 ft", errorIn: -0.0005 } });
export type DecimalForm = z.output<typeof decimalForm>;

const stripLineAnswer = z.strictObject({
  op: z.enum(stripOperations),
  length: lengthAnswer.nullable().meta({ description: "What was added or subtracted; null for times and divide" }),
  factor: z.string().nullable().meta({ description: "What was multiplied or divided by, as an exact fraction such as 31/3; null for add and subtract" }),
  total: lengthAnswer.meta({ description: "The running total after this line" }),
});

export const conversionsAnswer = z
  .strictObject({
    total: lengthAnswer.meta({ description: "The length itself: `value`, or the strip's last running total" }),
    feetInches: printedForm.meta({ description: "In feet and inches; to 1/16 when the precision is metric" }),
    inches: printedForm.meta({ description: "In inches, as a tape that counts inches shows it" }),
    decimalFeet: decimalForm.meta({ description: "To four places, as a plan or an engineer's tape has it" }),
    decimalInches: decimalForm.meta({ description: "To four places" }),
    millimetres: decimalForm.meta({ description: "To 0.1 mm, or to the metric precision asked for" }),
    centimetres: decimalForm,
    metres: decimalForm,
    strip: z.array(stripLineAnswer).nullable().meta({ description: "Each line and its running total; null without a strip" }),
    spacing: z
      .strictObject({
        count: z.int(),
        each: lengthAnswer,
        marks: z.array(lengthAnswer).meta({ description: "From zero to the end of each space, each rounded by itself, so that no error adds up" }),
      })
      .nullable()
      .meta({ description: "null unless `spaces` was asked for" }),
  })
  .meta({ id: "ConversionsAnswer" });

export type ConversionsAnswer = z.output<typeof conversionsAnswer>;
