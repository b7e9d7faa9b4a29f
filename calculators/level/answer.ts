import { z } from "zod";
import { lengthAnswer } from "../schema";
import { presetIds } from "./tolerances";

const point = z.strictObject({
  index: z.number().meta({ description: "Its place among all readings, from 0, in the order given" }),
  setup: z.number().meta({ description: "Its set-up, from 0" }),
  wall: z.string().nullable(),
  station: lengthAnswer.nullable(),
  x: z.number().nullable().meta({ description: "Plan place, inches; null where it cannot be told" }),
  y: z.number().nullable(),
  elevation: lengthAnswer,
  shim: lengthAnswer.meta({ description: "Up to the highest point" }),
  turn: z.boolean(),
});

const limit = z.strictObject({ difference: lengthAnswer, within: lengthAnswer.nullable() });
const pair = z.strictObject({ a: z.number(), b: z.number(), difference: lengthAnswer, distance: lengthAnswer.nullable(), limit: lengthAnswer, within: lengthAnswer.nullable(), ok: z.boolean().nullable().meta({ description: "null: how far apart they stand cannot be told" }) });

export const levelAnswer = z
  .strictObject({
    high: point.meta({ description: "The highest point: the datum" }),
    low: point,
    spread: lengthAnswer.meta({ description: "From the highest to the lowest" }),
    shims: z.array(z.strictObject({ index: z.number(), wall: z.string().nullable(), station: lengthAnswer.nullable(), shim: lengthAnswer })).meta({ description: "At every reading, from the highest point: plates are raised, concrete is not lowered" }),
    points: z.array(point),
    instruments: z.array(z.strictObject({ height: lengthAnswer, on: z.enum(["benchmark", "turn"]) })).meta({ description: "Height of the instrument at each set-up" }),
    misclosure: lengthAnswer.nullable().meta({ description: "The benchmark as shot again, less what it is; null when it was not" }),
    closes: z.boolean().nullable(),
    closingTolerance: lengthAnswer,
    arithmeticCheck: z.strictObject({ backsights: lengthAnswer, foresights: lengthAnswer, difference: lengthAnswer, rise: lengthAnswer, ok: z.boolean() }).meta({ description: "Sum of backsights less sum of foresights is the last elevation less the first: it proves the sums, not the shots" }),
    verdict: z.enum(["within", "out", "unknown"]).nullable().meta({ description: "By pairs at plan distance; unknown when a pair over a limit cannot be placed; null when no tolerance was given" }),
    tolerance: z.strictObject({ id: z.enum(presetIds).nullable(), limits: z.array(limit) }).nullable(),
    pairs: z.array(pair).meta({ description: "The pairs nearest to a limit or past it, worst first" }),
    pairsOut: z.number(),
    falls: z.array(z.strictObject({ from: z.number(), to: z.number(), fall: lengthAnswer.meta({ description: "Positive: the second is lower" }), distance: lengthAnswer.nullable(), oneIn: z.number().nullable() })).meta({ description: "From each station to the next along its wall" }),
    unplaced: z.array(z.number()).meta({ description: "Readings whose plan place cannot be told" }),
  })
  .meta({ id: "Level" });

export type LevelAnswer = z.output<typeof levelAnswer>;
