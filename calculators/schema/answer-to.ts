import type { z } from "zod";
import { CalculationError, issuesOf, type Issue } from "./issue";
import type { Operation } from "./operation";

export type Answered<Answer> = { answer: Answer; issues: readonly [] } | { answer: null; issues: readonly Issue[] };

/** Asks an operation and hands back every fault instead of throwing: for pages, batches and whoever goes on either way. */
export function answerTo<Input extends z.ZodType, Answer extends z.ZodType>(operation: Operation<Input, Answer>, request: unknown): Answered<z.output<Answer>> {
  const parsed = operation.input.safeParse(request);
  if (!parsed.success) return { answer: null, issues: issuesOf(parsed.error) };
  try {
    return { answer: operation.calculate(parsed.data), issues: [] };
  } catch (error) {
    if (error instanceof CalculationError) return { answer: null, issues: error.issues };
    throw error;
  }
}
