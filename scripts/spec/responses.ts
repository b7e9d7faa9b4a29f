import { problems, problemPath, type ProblemCode } from "@/api-spec";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import type { Quota } from "@/lib/services/limiter";

const t = getTranslate("en", ["developers", "errors"]);
const text = (description: string, example: string) => ({ description, schema: { type: "string" }, example });
const whole = (description: string, example: number) => ({ description, schema: { type: "integer", minimum: 1 }, example });

export const headers = {
  RequestId: text("Names this request in our log", "0f8e7f0a-3f0d-4a39-9a55-4a1f0f6f2f0c"),
  RateLimitPolicy: text("The limit that applies: its name, how many, in how many seconds (draft-ietf-httpapi-ratelimit-headers)", '"anonymous";q=60;w=60'),
  RateLimit: text("What is left, and in how many seconds all of it is back or, refused, the same call passes", '"anonymous";r=59;t=1'),
  RetryAfter: whole("Whole seconds after which the same call passes", 1),
  Location: text("Where the thing that was made is found", "/api/v1/links/4fQ9zKc2Ls"),
};

const header = (name: keyof typeof headers) => ({ $ref: `#/components/headers/${name}` });
const quotaHeaders = (quota: Quota | "none") => (quota === "none" ? {} : { RateLimit: header("RateLimit"), "RateLimit-Policy": header("RateLimitPolicy") });

export const goodHeaders = (quota: Quota | "none", status: number) => ({
  "Request-Id": header("RequestId"),
  ...quotaHeaders(quota),
  ...(status === 201 && { Location: header("Location") }),
});

export const responseName = (code: ProblemCode) => code.split("-").map((word) => word.charAt(0).toUpperCase() + word.slice(1)).join("");

/** A problem as it is answered, with its words and an example. */
export function problemResponse(code: ProblemCode) {
  const { status } = problems[code];
  return {
    description: t(`developers.problems.${code}.title`),
    headers: { "Request-Id": header("RequestId"), ...(code === "quota-spent" && { ...quotaHeaders("calculation"), "Retry-After": header("RetryAfter") }), ...(code === "not-ready" && { "Retry-After": header("RetryAfter") }) },
    content: {
      "application/problem+json": {
        schema: { $ref: "#/components/schemas/Problem" },
        example: {
          type: `https://sillwright.example${problemPath(code)}`,
          title: t(`developers.problems.${code}.title`),
          status,
          detail: t(`developers.problems.${code}.detail`, { seconds: 1, limit: 60, kibibytes: 256, methods: "POST, OPTIONS" }),
          code,
          requestId: headers.RequestId.example,
          ...(code === "invalid-fields" && { errors: [{ pointer: "/length", code: "two-readings", detail: t("errors.two-readings", { first: "28' 7\"", second: "28 7/8\"" }) }] }),
        },
      },
    },
  };
}
