import type { z } from "zod";
import { operations } from "@/calculators";
import { rulesAnswer } from "@/calculators/rules";
import { batchAnswer, batchInput } from "./batch";
import { liveAnswer, readyAnswer } from "./health";
import { linkAnswer, linkInput, madeLink } from "./link";

/** What an address takes and answers, with requests that people may copy. */
export interface Documented {
  method: "get" | "post";
  /** Name of the request's schema in the document; answers are named by their own `id`. */
  inputName?: string;
  input?: z.ZodType;
  answer: z.ZodType;
  examples: readonly { id: string; summary: string; input: Record<string, unknown> }[];
}

const squareness = { operation: "squareness", input: { length: "28 ft", width: "24 ft", diagonals: { ac: "443 1/2", bd: "443 3/8" }, burn: "1", tolerance: "1/4" } };
const inset = { operation: "insets", input: { length: "28 ft", width: "24 ft", inset: "7/16" } };

const others: [string, Documented][] = [
  [
    "/v1/batch",
    {
      method: "post",
      inputName: "BatchInput",
      input: batchInput,
      answer: batchAnswer,
      examples: [{ id: "twoStages", summary: "A slab checked, its chalk lines, and one item that fails alone", input: { items: [squareness, inset, { operation: "insets", input: { ...inset.input, length: "28 7" } }] } }],
    },
  ],
  ["/v1/rules", { method: "get", answer: rulesAnswer, examples: [] }],
  ["/v1/links", { method: "post", inputName: "LinkInput", input: linkInput, answer: madeLink, examples: [{ id: "chalkLines", summary: "Chalk lines of a 28 by 24 ft slab, for a phone", input: { ...inset, language: "es" } }] }],
  ["/v1/links/{id}", { method: "get", answer: linkAnswer, examples: [] }],
  ["/health/live", { method: "get", answer: liveAnswer, examples: [] }],
  ["/health/ready", { method: "get", answer: readyAnswer, examples: [] }],
];

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** Every documented address by its path under /api: one for each operation of the registry, and the few that are no calculation. */
export const documentedRoutes: ReadonlyMap<string, Documented> = new Map([
  ...[...operations.values()].map(({ id, path, input, answer, examples }): [string, Documented] => [
    `/v1/${path}`,
    { method: "post", inputName: `${capital(id)}Input`, input, answer, examples: examples.map((example) => ({ id: example.id, summary: example.source, input: example.input })) },
  ]),
  ...others,
]);
