import "server-only";
import pino from "pino";
import { env } from "@/lib/env";

const root = () => pino({ level: env.LOG_LEVEL, base: undefined, timestamp: pino.stdTimeFunctions.isoTime });
let made: pino.Logger | undefined;

/** The process's log: one JSON object a line. Never given a body, a reading or an address with its query. */
export const log = (): pino.Logger => (made ??= root());

interface ErrorSummary {
  name: string;
  message: string;
  stack?: string;
  code?: string;
  cause?: ErrorSummary;
}

/**
 * All there is to know of an error save what people typed: the database's driver writes the statement and its values into its
 * messages, and Sequelize keeps them as properties.
 */
export function errorSummary(error: unknown, depth = 0): ErrorSummary {
  if (!(error instanceof Error)) return { name: typeof error, message: "something that is no Error was thrown" };
  const message = withoutStatement(error.message);
  const summary: ErrorSummary = { name: error.name, message };
  if (error.stack) summary.stack = error.stack.slice(error.stack.indexOf("\n    at "));
  const { code, cause, original } = error as { code?: unknown; cause?: unknown; original?: unknown };
  if (typeof code === "string") summary.code = code;
  const inner = cause ?? original;
  if (inner !== undefined && depth < 3) summary.cause = errorSummary(inner, depth + 1);
  return summary;
}

function withoutStatement(message: string): string {
  return message.split(/\nsql:| - parameters:/, 1)[0] ?? "";
}
