import { z } from "zod";
import { calculatorInput, lengthField } from "../schema";
import { tapeInput } from "./tape/input";
import { presetIds } from "./tolerance/presets";

/** Corners counter-clockwise from A; sides and diagonals are named by their two corners. */
export const sideNames = ["ab", "bc", "cd", "da"] as const;
export const diagonalNames = ["ac", "bd"] as const;
export const readingNames = [...sideNames, ...diagonalNames] as const;
export type Side = (typeof sideNames)[number];
export type Diagonal = (typeof diagonalNames)[number];
export type ReadingName = Side | Diagonal;

const reading = (name: string, example: string) => lengthField({ description: `${name} as the tape showed it, burn included`, example });
const burn = (description: string) => lengthField({ sign: "not-negative", description, example: "1" });
const burnOf = (name: string) => burn(`Burn of ${name}`).optional();
const limit = (description: string, example: string) => lengthField({ sign: "not-negative", description, example });

/** Two sizes; or, once a side is given, AB and DA, or all four when one of the far sides is. */
function missingSides({ length, width, sides }: Readonly<Record<string, unknown>>): PropertyKey[][] {
  const given: Readonly<Record<string, unknown>> = typeof sides === "object" && sides !== null ? { ...sides } : {};
  if (sideNames.every((name) => given[name] === undefined)) return [...(length === undefined ? [["length"]] : []), ...(width === undefined ? [["width"]] : [])];
  if (length !== undefined || width !== undefined) return [];
  const needed = given.bc !== undefined || given.cd !== undefined ? sideNames : (["ab", "da"] as const);
  return needed.filter((name) => given[name] === undefined).map((name) => ["sides", name]);
}

export const squarenessInput = calculatorInput({
  length: lengthField({ description: "Size of AB and CD, never burned; with `width`, in place of `sides`", example: "28 ft" }).optional(),
  width: lengthField({ description: "Size of BC and DA, never burned", example: "22 ft" }).optional(),
  sides: z
    .strictObject({
      ab: reading("AB", "28' 1\"").optional(),
      bc: reading("BC", "22' 1\"").optional(),
      cd: reading("CD", "28' 1\"").optional(),
      da: reading("DA", "22' 1\"").optional(),
    })
    .optional()
    .meta({ description: "Sides as read: AB and DA, or all four" }),
  diagonals: z
    .strictObject({ ac: reading("AC", "428 9/16"), bd: reading("BD", "428 1/16") })
    .meta({ description: "Both diagonals as read" }),
  burn: burn("Where the tape was held: taken off every reading, that is `sides` and `diagonals`").optional(),
  burns: z
    .strictObject({ ab: burnOf("AB"), bc: burnOf("BC"), cd: burnOf("CD"), da: burnOf("DA"), ac: burnOf("AC"), bd: burnOf("BD") })
    .optional()
    .meta({ description: "Another burn for one reading" }),
  tolerance: z
    .union([z.enum(presetIds), limit("Most that the diagonals may differ, and opposite sides", "3/16")], { error: (issue) => (issue.input === undefined ? "required" : "expected-length") })
    .optional()
    .meta({ description: `A length, or one of ${presetIds.join(", ")}`, examples: ["3/16"] }),
  taperTolerance: limit("Most that opposite sides may differ, where it is not the tolerance's own", "1/4").optional(),
  readingError: lengthField({ description: "How far a careful reading may be off", example: "1/8" }).optional(),
  tape: tapeInput.optional(),
}, missingSides);

export type SquarenessInput = z.output<typeof squarenessInput>;
