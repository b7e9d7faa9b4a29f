import { z } from "zod";
import { platesAnswer } from "../plates/answer";
import { calculatorInput, flagField, lengthField, numberField } from "../schema";

const count = (description: string, example: number) => numberField({ minimum: 0, maximum: 100_000, whole: true, description, example }).optional();

export const takeoffInput = calculatorInput({
  // The plates answer, as it came: under `plates`, or with its fields beside `waste`.
  plates: platesAnswer.optional().meta({ description: "The plates answer as it came" }),
  ...platesAnswer.partial().omit({ boards: true }).shape,
  boards: platesAnswer.shape.boards.optional(),
  // Or quantities of one's own.
  lumber: z
    .array(z.strictObject({ length: lengthField({ description: "Of a board", example: "16 ft" }), count: numberField({ minimum: 1, maximum: 100_000, whole: true, description: "How many", example: 12 }) }))
    .max(40)
    .optional()
    .meta({ description: "Instead of a plates answer: boards by length" }),
  plateLength: lengthField({ description: "Sill plate in all; the boards' own length when left out", example: "136 ft" }).optional(),
  pieceCount: count("Plate pieces, each with two ends to treat", 14),
  bolts: count("Bolts that stand in the concrete: each takes a nut and a washer", 26),
  boltsToCast: count("Bolts still to be cast", 0),
  newAnchors: count("Anchors to be drilled in", 4),
  waste: numberField({ minimum: 0, maximum: 100, description: "Percent more than is needed", example: 5 }).optional(),
  plateWidth: lengthField({ description: "5 1/2 in when left out", example: "5 1/2" }).optional(),
  plateThickness: lengthField({ description: "1 1/2 in when left out", example: "1 1/2" }).optional(),
  diameter: lengthField({ description: "Of bolts and anchors, 1/2 in when left out", example: "1/2" }).optional(),
  plateWashers: flagField({ description: "3 by 3 by 0.229 in plate washers instead of round ones" }).optional(),
  sealerRoll: lengthField({ description: "Length of a roll of sill sealer, 50 ft when left out", example: "50 ft" }).optional(),
  anchorDepth: lengthField({ description: "Depth of a drilled anchor in the concrete; its approval governs. 7 in when left out", example: "7" }).optional(),
  anchorHole: lengthField({ description: "Diameter of its hole; 1/8 in over the rod when left out", example: "5/8" }).optional(),
  cartridge: numberField({ minimum: 1, maximum: 10_000, description: "Millilitres in a cartridge of adhesive, 280 when left out", example: 280 }).optional(),
  preservativeCan: numberField({ minimum: 1, maximum: 100_000, description: "Millilitres in a can of cut-end preservative, 946 (a US quart) when left out", example: 946 }).optional(),
  coverage: numberField({ minimum: 1, maximum: 10_000, description: "Square feet that a US gallon of it covers once, 100 when left out", example: 100 }).optional(),
});

export type TakeoffInput = z.output<typeof takeoffInput>;
