import { z } from "zod";
import { lengthAnswer } from "../schema";

export const cornerAnswer = z
  .strictObject({
    legs: z.strictObject({ first: lengthAnswer, second: lengthAnswer }).meta({ description: "The legs as they were understood" }),
    diagonal: lengthAnswer.meta({ description: "Between the ends of the legs when the corner is square" }),
    reading: lengthAnswer.meta({ description: "The same as the tape will show it, burn included" }),
    swingIn: z.number().meta({ description: "How far the second leg's end swings, in inches, when that reading is one graduation off" }),
    triangle: z
      .strictObject({
        a: lengthAnswer.meta({ description: "Along the first leg" }),
        b: lengthAnswer.meta({ description: "Along the second leg" }),
        c: lengthAnswer.meta({ description: "Between the two marks" }),
        reading: lengthAnswer.meta({ description: "c as the tape will show it, burn included" }),
        counts: z.array(z.int()).length(3).meta({ description: "a, b and c in whole units" }),
        unit: z.enum(["ft", "100 mm"]),
        primitive: z.array(z.int()).length(3).meta({ description: "The triple it is a multiple of, smallest first" }),
        times: z.int().meta({ description: "How many times that triple" }),
        swingIn: z.number().meta({ description: "How far the second leg's end swings when c is one graduation off" }),
      })
      .nullable()
      .meta({ description: "The largest whole-number triangle inside the legs; null where no 3-4-5 fits" }),
  })
  .meta({ id: "CornersAnswer" });

export type CornerAnswer = z.output<typeof cornerAnswer>;
