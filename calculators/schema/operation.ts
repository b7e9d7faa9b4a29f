import type { z } from "zod";

/** How far a figure's source was read: `read` in the text itself, `second-hand` quoted elsewhere, `memory`, `derived` by our arithmetic, `practice` in the trade without a standard. */
export type SourceStatus = "read" | "second-hand" | "memory" | "derived" | "practice";

/** `title` is the work's own name and is never translated; `clause` says where in it. */
export interface Source {
  title: string;
  clause?: string;
  status: SourceStatus;
  address?: string;
}

/** Cautions by code; their sentences are in the message files under `cautions`. */
export type Caution =
  | "code-governs"
  | "engineered-anchors"
  | "one-tape"
  | "recheck-before-cutting"
  | "bolt-caps"
  | "silica-dust"
  | "treated-wood"
  | "young-concrete"
  | "adhesive-anchors";

/** A worked example: shown on the page, sent by the API's documentation, run by a test. `id` names its sentence in the calculator's messages. */
export interface WorkedExample {
  id: string;
  input: Record<string, unknown>;
  /** Part of the answer that must come out, and where that figure is from. */
  answer: Record<string, unknown>;
  source: string;
}

/** One thing the API can be asked: `path` under /api/v1, and the pure function that answers it. */
export interface Operation<Input extends z.ZodType = z.ZodType, Answer extends z.ZodType = z.ZodType> {
  id: string;
  path: string;
  input: Input;
  answer: Answer;
  /** @throws CalculationError when fields that are each well formed cannot be true together. */
  calculate(input: z.output<Input>): z.output<Answer>;
  examples: readonly WorkedExample[];
}

/** Keeps an operation's own types while the registry sees them all alike. */
export function defineOperation<Input extends z.ZodType, Answer extends z.ZodType>(operation: Operation<Input, Answer>) {
  return operation;
}

export interface Calculator {
  /** The folder, and the page at /calculators/<name>. */
  name: string;
  /** Semantic version: the major changes when an answer to an old input does. */
  version: string;
  /** The stage of a set it belongs to, 1 to 7; null for those outside. */
  stage: number | null;
  operations: readonly Operation[];
  sources: readonly Source[];
  cautions: readonly Caution[];
}
