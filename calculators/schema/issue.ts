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
  return error.issues.flatMap(translate);
}

function translate(issue: z.core.$ZodIssue): Issue[] {
  const at = (code: string, params: Issue["params"] = {}): Issue[] => [{ pointer: pointerTo(issue.path), code, params }];
  switch (issue.code) {
    case "custom":
      return at(String(issue.params?.code ?? issue.message), (issue.params?.params ?? {}) as Issue["params"]);
    case "unrecognized_keys":
      return issue.keys.map((key) => ({ pointer: pointerTo([...issue.path, key]), code: "unknown-field", params: { field: key } }));
    case "invalid_type":
      return issue.message.endsWith("received undefined") ? at("required") : at(`expected-${issue.expected}`);
    case "invalid_union":
      return at(issue.message);
    case "invalid_value":
      return at("not-one-of", { options: issue.values.map(String).join(", ") });
    case "too_small":
      return at(issue.origin === "array" ? "too-few" : "too-small", { minimum: Number(issue.minimum) });
    case "too_big":
      return at(issue.origin === "array" ? "too-many" : "too-big", { maximum: Number(issue.maximum) });
    default:
      return at("not-valid");
  }
}
