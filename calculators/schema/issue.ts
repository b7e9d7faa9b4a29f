import type { z } from "zod";

/** One fault of an input: where, what, and the figures its sentence needs. Codes never change with language. */
export interface Issue {
  /** RFC 6901, such as `/diagonals/ac`; empty for the input as a whole. */
  pointer: string;
  code: string;
  params: Readonly<Record<string, string | number>>;
}

/** Thrown by a calculator whose fields are each well formed but cannot be true together. */
export class CalculationError extends Error {
  override readonly name = "CalculationError";

  constructor(readonly issues: readonly Issue[]) {
    super(issues.map((issue) => `${issue.pointer} ${issue.code}`).join(", "));
  }
}

export function pointerTo(path: readonly PropertyKey[]): string {
  return path.map((step) => `/${String(step).replaceAll("~", "~0").replaceAll("/", "~1")}`).join("");
}

/** Every fault zod found, as ours: one issue a field, in the order of the fields. */
export function issuesOf(error: z.ZodError): Issue[] {
  const noInput = error.issues.find((issue) => issue.path.length === 0 && issue.code === "invalid_type");
  if (noInput !== undefined) return translate(noInput); // what is no object has no fields to speak of
  return error.issues.flatMap((issue) => translate(issue));
}

function translate(issue: z.core.$ZodIssue, above: readonly PropertyKey[] = []): Issue[] {
  const path = [...above, ...issue.path];
  const at = (code: string, params: Issue["params"] = {}): Issue[] => [{ pointer: pointerTo(path), code, params }];
  switch (issue.code) {
    case "custom":
      return at(String(issue.params?.code ?? issue.message), (issue.params?.params ?? {}) as Issue["params"]);
    case "unrecognized_keys":
      return issue.keys.map((key) => ({ pointer: pointerTo([...path, key]), code: "unknown-field", params: { field: key } }));
    case "invalid_type":
      return issue.message.endsWith("received undefined") ? at("required") : at(`expected-${issue.expected}`);
    case "invalid_union": {
      const meant = branchMeant(issue);
      return meant === undefined ? at(issue.message) : meant.flatMap((inner) => translate(inner, path));
    }
    case "invalid_value":
      return issue.message === "required" ? at("required") : at("not-one-of", { options: issue.values.map(String).join(", ") });
    case "too_small":
      return at(issue.origin === "array" ? "too-few" : "too-small", { minimum: Number(issue.minimum) });
    case "too_big":
      return at(issue.origin === "array" ? "too-many" : "too-big", { maximum: Number(issue.maximum) });
    default:
      return at("not-valid");
  }
}

/** The one way of a union that the input is of the right kind for, so that its own faults can be told; undefined when none is. */
function branchMeant(issue: z.core.$ZodIssueInvalidUnion): readonly z.core.$ZodIssue[] | undefined {
  const isOfAnotherKind = (inner: z.core.$ZodIssue) => inner.path.length === 0 && ["invalid_type", "invalid_value", "invalid_union"].includes(inner.code);
  return issue.errors.find((branch) => branch.length > 0 && !branch.some(isOfAnotherKind));
}
