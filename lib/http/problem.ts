import "server-only";
import { type ProblemCode } from "@/api-spec/problems";
import type { Issue } from "@/calculators/schema";

interface ProblemDetails {
  /** Every faulty field, for `invalid-fields`. */
  issues?: readonly Issue[];
  /** Headers of the answer, such as `Allow`. */
  headers?: Readonly<Record<string, string>>;
  /** Figures its sentence needs. */
  params?: Readonly<Record<string, string | number>>;
}

/** A failure with a code of the table in `api-spec/problems.ts`. Services and handlers throw it; `endpoint` alone catches. */
export class Problem extends Error {
  override readonly name = "Problem";
  readonly issues: readonly Issue[] | undefined;
  readonly headers: Readonly<Record<string, string>>;
  readonly params: Readonly<Record<string, string | number>>;

  constructor(
    readonly code: ProblemCode,
    { issues, headers = {}, params = {} }: ProblemDetails = {},
  ) {
    super(code);
    this.issues = issues;
    this.headers = headers;
    this.params = params;
  }
}
