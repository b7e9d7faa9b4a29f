import "server-only";
import type { z } from "zod";
import { answerTo, inputFromQuery, type Operation } from "@/calculators/schema";
import { formFromQuery, queryFromForm } from "./form-fields";
import type { Initial } from "./use-calculator";

export type SearchParams = Record<string, string | string[] | undefined>;

/** The form that an answer page was sent, and its answer or issues: the same core, on the server, for browsers without script. */
export function answerOnServer<Input extends z.ZodType, Answer extends z.ZodType>(
  operation: Operation<Input, Answer>,
  searchParams: SearchParams,
  prepare: (input: Record<string, unknown>) => Record<string, unknown> = (input) => input,
): Initial<z.output<Answer>> {
  const form = formFromQuery(Object.entries(searchParams).flatMap(([name, value]): [string, string][] => (value === undefined ? [] : [[name, Array.isArray(value) ? (value[0] ?? "") : value]])));
  return { form, answered: answerTo(operation, prepare(inputFromQuery(queryFromForm(form)))) };
}
