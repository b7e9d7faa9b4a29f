import { z } from "zod";
import { checkFields, sharedFields } from "../anchors/fields";
import { calculatorInput, flagField, lengthField, numberField } from "../schema";

/** A wall's corners by its name: `ab` runs from A to B. */
const letters = Array.from({ length: 26 }, (_, index) => String.fromCharCode(65 + index));
const wallName = z.string().trim().min(1).max(24);

const bolt = checkFields.bolts.unwrap().element.extend({
  strap: flagField({ description: "A strap cast in beside the plate: engineered, and no hole is bored for it" }).optional(),
});

const wall = z.strictObject({
  name: wallName.meta({ description: "Of two corners, such as ab, or any other", examples: ["ab"] }),
  length: lengthField({ description: "Along the chalk line, corner to corner", example: "40 ft" }),
  bolts: z.array(bolt).max(200).default([]),
  openings: z
    .array(z.strictObject({ from: lengthField({ sign: "not-negative", description: "Station where the sill stops", example: "12 ft" }), to: lengthField({ description: "Station where it begins again", example: "21 ft" }) }))
    .max(20)
    .default([])
    .meta({ description: "Garage doors and the like: the sill's ends there are piece ends" }),
  steps: z.array(lengthField({ description: "Station of a step in height", example: "16 ft" })).max(20).default([]).meta({ description: "Steps in height: pieces end there" }),
  inset: lengthField({ sign: "any", description: "From slab edge to chalk line on this wall, where it differs", example: "7/16" }).optional(),
  joinsOffsetPanels: flagField({ description: "The whole wall is short and joins offset braced wall panels: the rule's short-wall exceptions may apply" }).optional(),
});

const stock = z.strictObject({
  length: lengthField({ description: "As the board lies there, untrimmed", example: "16 ft" }),
  price: numberField({ minimum: 0, maximum: 1_000_000, description: "Of one board; its length in inches when left out", example: 14.5 }).optional(),
  count: numberField({ minimum: 0, maximum: 10_000, whole: true, description: "How many there are; as many as wanted when left out", example: 12 }).optional(),
});

export const platesInput = calculatorInput({
  walls: z.array(wall).max(60).optional().meta({ description: "Walls whose sill is to be jointed, cut and bored" }),
  corners: z
    .strictObject(Object.fromEntries(letters.map((letter) => [letter, wallName.optional()])))
    .optional()
    .meta({ description: "Which wall's plate runs through at each corner, such as {A: \"ab\"}; the other butts against its side. Left out: both run to the corner" }),
  insideCorners: z.array(z.enum(letters as [string, ...string[]])).max(26).default([]).meta({ description: "Corners that point inward: there the plate that runs through goes past the corner by a plate's width" }),
  pieces: z
    .array(z.strictObject({ length: lengthField({ description: "Of one piece", example: "8 ft" }), count: numberField({ minimum: 1, maximum: 500, whole: true, description: "How many, 1 when left out", example: 2 }).optional() }))
    .max(200)
    .optional()
    .meta({ description: "Instead of walls: pieces to be cut, for the cut list alone" }),
  stock: z.array(stock).min(1).max(20).meta({ description: "Boards to cut from" }),
  kerf: lengthField({ sign: "not-negative", description: "Lost to each saw cut, 1/8 in when left out", example: "1/8" }).optional(),
  trim: lengthField({ sign: "not-negative", description: "Lost at each end of a board to square it, 0 when left out", example: "1/4" }).optional(),
  shortest: lengthField({ sign: "not-negative", description: "No joint makes a piece shorter than this", example: "24 in" }).optional(),
  plateWidth: lengthField({ description: "As measured, 5 1/2 in when left out", example: "5 1/2" }).optional(),
  rule: sharedFields.rule,
  diameter: sharedFields.diameter,
  endDistance: lengthField({ sign: "not-negative", description: "Where an added anchor best stands from a piece's end, 8 in when left out", example: "8 in" }).optional(),
  clearOfBolts: checkFields.clearOfBolts,
  bit: lengthField({ description: "Size of the bit for the holes; 1/16 in over the bolt when left out", example: "9/16" }).optional(),
  inset: lengthField({ sign: "any", description: "From slab edge to chalk line: needed for bolts measured from the slab", example: "7/16" }).optional(),
  timeLimit: numberField({ minimum: 0.05, maximum: 60, description: "Seconds to look for a better plan, 0.6 when left out; the API stops after 1", example: 0.6 }).optional(),
});

export type PlatesInput = z.output<typeof platesInput>;
export type WallInput = NonNullable<PlatesInput["walls"]>[number];
