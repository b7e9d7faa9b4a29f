import { z } from "zod";
import { calculatorInput, lengthField } from "../schema";

export const cornerInput = calculatorInput({
  legs: z
    .array(lengthField({ description: "From the corner along one line", example: "28 ft" }))
    .length(2)
    .meta({ description: "The two legs from the corner, the first along the line that is held" }),
  burn: lengthField({ sign: "not-negative", description: "Where the tape will be held", example: "1" }).optional(),
});

export type CornerInput = z.output<typeof cornerInput>;
