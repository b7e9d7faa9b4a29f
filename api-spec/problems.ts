/**
 * Everything that can go wrong with a request: code and status. Answers, OpenAPI document, pages at `/problems/<code>` and
 * messages (`developers.problems.<code>`: title, detail, cause, remedy) all follow this table.
 */
export const problems = {
  "malformed-json": { status: 400 },
  "not-found": { status: 404 },
  "method-not-allowed": { status: 405 },
  "body-too-large": { status: 413 },
  "unsupported-media-type": { status: 415 },
  "invalid-fields": { status: 422 },
  "quota-spent": { status: 429 },
  internal: { status: 500 },
  "not-ready": { status: 503 },
} as const satisfies Record<string, { status: number }>;

export type ProblemCode = keyof typeof problems;
export type ProblemStatus = (typeof problems)[ProblemCode]["status"];
export const problemCodes = Object.keys(problems) as ProblemCode[];

/** Where a problem is explained, under the site's address. Codes and addresses never change with language. */
export const problemPath = (code: ProblemCode) => `/problems/${code}`;
