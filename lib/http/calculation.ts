import "server-only";
import type { z } from "zod";
import type { Operation } from "@/calculators/schema";
import { endpoint } from "./endpoint";

/** The route of one operation: its own schema, its own function, open to every page. */
export function calculation<Input extends z.ZodType, Answer extends z.ZodType>(operation: Operation<Input, Answer>) {
  return endpoint({ access: "anyone", quota: "calculation", open: true, body: operation.input, handle: ({ body }) => operation.calculate(body as z.output<Input>) });
}
