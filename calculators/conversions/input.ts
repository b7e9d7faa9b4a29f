import type Fraction from "fraction.js";
import { z } from "zod";
import type { ReadLength } from "../length";
import { calculatorInput, choiceField, lengthField, numberField } from "../schema";

export const stripOperations = ["add", "subtract", "times", "divide"] as const;
export type StripOperation = (typeof stripOperations)[number];

/** Adding and taking away want a length; times and divide want a plain number. */
type StripLine = { op: "add" | "subtract"; length: ReadLength } | { op: "times" | "divide"; factor: Fraction };

const scales = (op: unknown): op is "times" | "divide" => op === "times" || op === "divide";

const stripLine = z
  .strictObject({
    op: choiceField(stripOperations, { description: "What the line does to the total above it; the first line starts from zero" }),
    value: lengthField({ sign: "any", description: "A length to add or subtract; a plain number to multiply or divide by, such as 8, 12.5 or 10 1/3", example: "7 1/2" }),
  })
  .superRefine(({ op, value }, context) => {
    if (!scales(op) || value === undefined) return;
    const refuse = (code: string) => context.issues.push({ code: "custom", input: undefined, path: ["value"], params: { code } });
    if (!value.bare) refuse("number-without-unit");
    else if (op === "divide" && value.sign === 0) refuse("divide-by-zero");
  })
  .transform(({ op, value }): StripLine => (scales(op) ? { op, factor: value.value } : { op, length: value }));

export const lineLimit = 100;
export const spaceLimit = 100;

export const conversionsInput = calculatorInput({
  value: lengthField({ sign: "any", description: "The length to say in every form", example: "8' 3 5/16\"" }).optional(),
  strip: z.array(stripLine).min(1).max(lineLimit).optional().meta({ description: "Tape arithmetic, line by line, in place of `value`; its total is said in every form" }),
  spaces: numberField({ minimum: 2, maximum: spaceLimit, whole: true, description: "Divide the length into this many equal spaces and mark each from zero", example: 5 }).optional(),
});

export type ConversionsInput = z.output<typeof conversionsInput>;
