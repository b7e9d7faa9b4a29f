import { z } from "zod";
import { problemCodes } from "./problems";

const fieldProblem = z
  .strictObject({
    pointer: z.string().meta({ description: "Where in the body, as RFC 6901 says; empty for the body as a whole" }),
    code: z.string().meta({ description: "What is wrong; never changes with language" }),
    detail: z.string().meta({ description: "What to type instead, in the language of Accept-Language" }),
  })
  .meta({ id: "FieldProblem", description: "One faulty field", example: { pointer: "/diagonals/ac", code: "required", detail: "Fill this in." } });

/** RFC 9457, as every failure is answered. */
export const problemAnswer = z
  .strictObject({
    type: z.string().meta({ description: "A page that explains this kind of problem" }),
    title: z.string().meta({ description: "The kind of problem in words" }),
    status: z.int().min(400).max(599).meta({ description: "The status of the answer" }),
    detail: z.string().meta({ description: "What to do about it" }),
    code: z.enum(problemCodes).meta({ description: "The kind of problem; never changes with language" }),
    requestId: z.string().meta({ description: "Names this request in our log" }),
    errors: z.array(fieldProblem).optional().meta({ description: "Every faulty field, with code invalid-fields" }),
  })
  .meta({ id: "Problem", description: "Why there is no answer (RFC 9457)" });

export type ProblemAnswer = z.output<typeof problemAnswer>;
