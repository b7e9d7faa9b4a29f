import "server-only";
import { ZodError } from "zod";
import type { ProblemAnswer } from "@/api-spec/problem";
import { problemPath, problems } from "@/api-spec/problems";
import { CalculationError, issuesOf } from "@/calculators/schema";
import { env } from "@/lib/env";
import { errorSummary, log } from "@/lib/services/log";
import { acceptedLocale } from "./accept-language";
import { Problem } from "./problem";
import { apiTranslate, issueSentence } from "./sentences";

/** Whatever was thrown, as a problem of our table. Faulty fields keep their pointers; `under` goes before each. */
export function problemOf(error: unknown, under = ""): Problem {
  if (error instanceof Problem) return error;
  const issues = error instanceof ZodError ? issuesOf(error) : error instanceof CalculationError ? error.issues : undefined;
  if (issues === undefined) return new Problem("internal");
  return new Problem("invalid-fields", { issues: under === "" ? issues : issues.map((issue) => ({ ...issue, pointer: `${under}${issue.pointer}` })) });
}

/** The body of a problem in the language asked for. */
export function problemBody(problem: Problem, acceptLanguage: string | null, requestId: string): ProblemAnswer {
  const t = apiTranslate(acceptedLocale(acceptLanguage));
  const { code, issues, params } = problem;
  return {
    type: `${env.SITE_URL}${problemPath(code)}`,
    title: t(`developers.problems.${code}.title`),
    status: problems[code].status,
    detail: t(`developers.problems.${code}.detail`, params),
    code,
    requestId,
    ...(issues && { errors: issues.map((issue) => ({ pointer: issue.pointer, code: issue.code, detail: issueSentence(t, issue) })) }),
  };
}

/** An unexpected error is logged whole under the request's id and answered without detail. */
export function logUnexpected(error: unknown, requestId: string): void {
  if (error instanceof Problem || error instanceof ZodError || error instanceof CalculationError) return;
  log().error({ requestId, error: errorSummary(error) }, "unexpected error");
}

export function problemResponse(error: unknown, request: Request, headers: Record<string, string>): Response {
  const requestId = headers["Request-Id"] ?? "";
  logUnexpected(error, requestId);
  const problem = problemOf(error);
  const acceptLanguage = request.headers.get("accept-language");
  return new Response(JSON.stringify(problemBody(problem, acceptLanguage, requestId)), {
    status: problems[problem.code].status,
    headers: {
      ...headers,
      ...problem.headers,
      "Content-Type": "application/problem+json; charset=utf-8",
      "Content-Language": acceptedLocale(acceptLanguage),
      "Cache-Control": "no-store",
      Vary: "Accept-Language",
    },
  });
}
