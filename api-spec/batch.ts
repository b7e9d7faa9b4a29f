import { z } from "zod";
import { operations } from "@/calculators";
import { problemAnswer } from "./problem";

export const batchLimit = 100;
export const operationPaths = [...operations.keys()] as [string, ...string[]];

/** One calculation by its operation's path under /api/v1, wherever one is named in a body. */
export const calculationRequest = {
  operation: z.enum(operationPaths, { error: (issue) => (issue.input === undefined ? "required" : undefined) }).meta({ description: "Path of the operation under /api/v1" }),
  input: z.record(z.string(), z.unknown()).meta({ description: "What that operation takes" }),
};

const batchItem = z.strictObject(calculationRequest);

export const batchInput = z
  .strictObject({
    items: z.array(batchItem).min(1).max(batchLimit).meta({ description: "Up to 100 calculations, 60 without a key; each counts as one" }),
  })
  .meta({ id: "BatchInput" });

/** What is checked before the items are: each item is then read on its own, since each fails alone. */
export const batchEnvelope = z.strictObject({ items: z.array(z.unknown()).min(1).max(batchLimit) });
export { batchItem };

const answered = z.strictObject({ status: z.literal(200), answer: z.record(z.string(), z.unknown()).meta({ description: "What that operation answers" }) });
const failed = z.strictObject({ status: z.int().min(400).max(599).meta({ description: "What the operation alone would have answered" }), problem: problemAnswer });

export const batchAnswer = z
  .strictObject({ items: z.array(z.union([answered, failed])).meta({ description: "One for each item of the request, in its order" }) })
  .meta({ id: "BatchAnswer" });

export type BatchAnswer = z.output<typeof batchAnswer>;
