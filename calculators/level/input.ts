import { z } from "zod";
import { calculatorInput, lengthField, numberField } from "../schema";
import { presetIds } from "./tolerances";

const place = (axis: string) => lengthField({ sign: "any", description: `Plan place, ${axis}`, example: "14 ft" });

const reading = z.strictObject({
  wall: z.string().trim().min(1).max(24).optional().meta({ description: "The wall it is on, such as ab", examples: ["ab"] }),
  station: lengthField({ sign: "any", description: "Along that wall from its first corner", example: "8 ft" }).optional(),
  x: place("x").optional(),
  y: place("y").optional(),
  rod: lengthField({ sign: "any", description: "What the rod showed: larger is lower", example: "4 ft 3 1/8 in" }),
  turn: z
    .union([z.boolean(), z.enum(["true", "false"])], { error: "expected-flag" })
    .transform((raw) => raw === true || raw === "true")
    .optional()
    .meta({ description: "The turning point that the next set-up's backsight is on; the benchmark when there is none" }),
});

export const levelInput = calculatorInput({
  setups: z
    .array(
      z.strictObject({
        backsight: lengthField({ sign: "any", description: "Rod on the benchmark, or on the turning point before", example: "4 ft" }),
        readings: z.array(reading).min(1).max(200),
      }),
    )
    .min(1)
    .max(20)
    .meta({ description: "Rod readings by set-up of the instrument" }),
  benchmark: z
    .strictObject({
      elevation: lengthField({ sign: "any", description: "Of the benchmark, 0 when left out", example: "100 ft" }).optional(),
      closing: lengthField({ sign: "any", description: "Rod on the benchmark, shot again from the last set-up", example: "4 ft 1/16 in" }).optional(),
    })
    .optional(),
  closingTolerance: lengthField({ sign: "not-negative", description: "The most the benchmark may come back off, 1/8 in when left out", example: "1/8" }).optional(),
  tolerance: z
    .union(
      [
        z.enum(presetIds),
        z
          .array(
            z.strictObject({
              difference: lengthField({ description: "Most that two points may differ", example: "1/4" }),
              within: lengthField({ description: "when no further apart than this; everywhere when left out", example: "10 ft" }).optional(),
            }),
          )
          .min(1)
          .max(6),
      ],
      { error: "expected-tolerance" },
    )
    .optional()
    .meta({ description: "A published tolerance by id, or limits of one's own", examples: ["half-in-20-ft"] }),
  corners: z
    .record(z.string(), z.strictObject({ x: place("x"), y: place("y") }))
    .optional()
    .meta({ description: "The plan's corners, to tell how far apart points of different walls are", examples: [{ A: { x: 0, y: 0 }, B: { x: 336, y: 0 }, C: { x: 336, y: 288 }, D: { x: 0, y: 288 } }] }),
  length: lengthField({ description: "Instead of corners: AB and CD of a rectangle", example: "28 ft" }).optional(),
  width: lengthField({ description: "BC and DA of a rectangle", example: "24 ft" }).optional(),
  mostPairs: numberField({ minimum: 1, maximum: 100, whole: true, description: "How many pairs to name, 12 when left out", example: 12 }).optional(),
});

export type LevelInput = z.output<typeof levelInput>;
