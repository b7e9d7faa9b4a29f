import { z } from "zod";
import { calculatorInput, lengthField, numberField } from "../schema";
import { perSide } from "../geometry/per-side";
import { readToward, type Toward } from "./toward";
import { walkCharacterLimit } from "./walk-text";

const required = (code: string) => ({ error: (issue: { input?: unknown }) => (issue.input === undefined ? "required" : code) });

export const towardField = z
  .string(required("toward-unknown"))
  .meta({ description: "A direction: N, east, noroeste …, a bearing N 45° 30' 15\" E, or an azimuth 135° 30'", examples: ["E"] })
  .transform((text, context): Toward => {
    const read = readToward(text);
    if (!("problem" in read) && read.rest.trim() === "") return read.toward;
    context.issues.push({ code: "custom", input: text, params: { code: "problem" in read ? read.problem : "toward-unknown", params: { found: text.slice(0, 40) } } });
    return z.NEVER;
  });

/** A corner, or a place on a side: both its corners. */
const pointField = z.string(required("point-unknown")).meta({ description: "A corner (A), or the middle of a side (AB)", examples: ["A"] });

const burn = (description: string) => lengthField({ sign: "not-negative", description, example: "1" });

export const mostRuns = 60;
export const mostReadings = 120;

export const footprintInput = calculatorInput({
  runs: z
    .array(
      z.strictObject({
        toward: towardField,
        length: lengthField({ description: "Length of the run", example: "40 ft" }),
        times: numberField({ minimum: 1, maximum: 100, whole: true, description: "How many times it is walked", example: 1 }).optional(),
      }),
    )
    .max(mostRuns)
    .optional()
    .meta({ description: "The plan's sides in order, walked round from A" }),
  walk: z
    .string()
    .optional()
    .meta({ description: `The same as text, legs parted by commas or lines; at most ${walkCharacterLimit} characters`, examples: ["E 40 ft, N 20 ft, W 16 ft, N 12 ft, W 24 ft, S 32 ft"] }),
  readings: z
    .array(z.strictObject({ from: pointField, to: pointField, reading: lengthField({ description: "What the tape showed, burn included; left out while it has not been pulled", example: "44' 8 11/16\"" }).optional() }))
    .max(mostReadings)
    .optional()
    .meta({ description: "Sides and diagonals of a braced polygon, at least 2n − 3 of them for n corners" }),
  inside: z.string().max(80).optional().meta({ description: "With readings: the inside corners, such as D or D, F. Without it the figure with the most usual corners is taken", examples: ["D"] }),
  burn: burn("Where the tape was held: taken off every reading").optional(),
  burns: z.record(z.string(), burn("Burn of one reading")).optional().meta({ description: "Another burn for one reading, by its two names: ac" }),
  readingError: lengthField({ description: "How far a reading may be off; 1/8 in unless given", example: "1/8" }).optional(),
  inset: perSide({ sign: "any", description: "From slab edge to chalk line, square to the edge; negative overhangs", example: "7/16" }).optional(),
  bows: z
    .array(
      z.strictObject({
        side: z.string(required("side-unknown")).meta({ description: "The side, such as ab", examples: ["ab"] }),
        station: lengthField({ sign: "not-negative", description: "Distance from the side's first corner; the middle unless given", example: "14 ft" }).optional(),
        outward: lengthField({ sign: "any", description: "How far the form stands outside a string from corner to corner; negative inside it", example: "3/8" }),
      }),
    )
    .max(mostReadings)
    .optional()
    .meta({ description: "Bowed forms: how far an edge departs from the straight between its corners" }),
});

export type FootprintInput = z.output<typeof footprintInput>;
