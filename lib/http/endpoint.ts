import "server-only";
import { randomUUID } from "node:crypto";
import type { z } from "zod";
import type { ProblemCode } from "@/api-spec";
import type { Quota } from "@/lib/services/limiter";
import { mostAtOnce } from "@/lib/services/limiter";
import { authenticate, type Access, type Caller } from "./caller";
import { openHeaders } from "./cors";
import { Problem } from "./problem";
import { problemResponse } from "./problem-response";
import { spendQuota } from "./quota";
import { readJson } from "./read-json";

export interface Asked<Body, Params> {
  caller: Caller;
  body: Body;
  params: Params;
  request: Request;
  /** Names this request in the log. */
  requestId: string;
}

interface Route<Body extends z.ZodType | undefined, Params, Answer> {
  access: Access;
  quota: Quota | "none";
  /** What a call costs when that depends on its body; otherwise one. `pointer` is the list to shorten when it is too much. */
  cost?: { of(body: Body extends z.ZodType ? z.output<Body> : undefined): number; pointer: string };
  body?: Body;
  /** Bytes of the body at most. */
  limit?: number;
  /** Whether pages of other sites may ask. */
  open?: boolean;
  status?: number;
  /** What its handler may throw beyond what reading and charging can. */
  problems?: readonly ProblemCode[];
  /** Headers of a good answer. */
  headers?: (answer: Answer) => Record<string, string>;
  handle(asked: Asked<Body extends z.ZodType ? z.output<Body> : undefined, Params>): Answer | Promise<Answer>;
}

/** What Next gives a route handler; `params` is there for routes that have some. */
interface RouteContext<Params> {
  params: Promise<Params>;
}

export interface Endpoint<Params = unknown> {
  (request: Request, context: RouteContext<Params>): Promise<Response>;
  readonly open: boolean;
  /** Status of a good answer, and every problem it may answer instead: the OpenAPI document is made from these. */
  readonly status: number;
  readonly problems: readonly ProblemCode[];
  readonly quota: Quota | "none";
}

const json = "application/json; charset=utf-8";

/**
 * Every route of the API: who asks, may they, what, the answer. Handlers and services throw; here alone it is caught, and every
 * failure leaves as application/problem+json.
 */
export function endpoint<Params = unknown, Answer = unknown, Body extends z.ZodType | undefined = undefined>(route: Route<Body, Params, Answer>): Endpoint<Params> {
  type Read = Body extends z.ZodType ? z.output<Body> : undefined;
  const { access, quota, cost, limit, open = false, status = 200, handle } = route;
  const schema = route.body as z.ZodType<Read> | undefined;
  const common = { "Cache-Control": "no-store", ...(open && openHeaders) };

  /** The fields, or all that is wrong with them. */
  async function read(request: Request): Promise<Read> {
    if (schema === undefined) return undefined as Read;
    const parsed = schema.safeParse(await readJson(request, limit));
    if (parsed.success) return parsed.data;
    throw parsed.error;
  }

  async function respond(request: Request, context: RouteContext<Params>): Promise<Response> {
    const requestId = randomUUID();
    const headers: Record<string, string> = { "Request-Id": requestId, ...common };
    try {
      const caller = authenticate(request, access);
      if (quota !== "none" && cost === undefined) await spendQuota(quota, caller.address, 1, headers);
      let body: Read;
      try {
        body = await read(request);
      } catch (error) {
        if (quota !== "none" && cost !== undefined) await spendQuota(quota, caller.address, 1, headers); // nobody has us read for nothing
        throw error;
      }
      if (quota !== "none" && cost !== undefined) await spendQuota(quota, caller.address, allowedCost(quota, cost.of(body as never), cost.pointer), headers);
      const params = context?.params === undefined ? (undefined as Params) : await context.params;
      const answer = await handle({ caller, body, params, request, requestId } as never);
      return new Response(JSON.stringify(answer), { status, headers: { ...headers, "Content-Type": json, ...route.headers?.(answer) } });
    } catch (error) {
      return problemResponse(error, request, headers);
    }
  }
  const problems: ProblemCode[] = [
    ...(schema === undefined ? [] : (["malformed-json", "body-too-large", "unsupported-media-type", "invalid-fields"] as const)),
    ...(quota === "none" ? [] : (["quota-spent"] as const)),
    ...(route.problems ?? []),
    "internal",
  ];
  return Object.assign(respond, { open, status, quota, problems });
}

/** More than the bucket ever holds would be told to come back again and again. */
function allowedCost(quota: Quota, cost: number, pointer: string): number {
  const maximum = mostAtOnce(quota);
  if (cost <= maximum) return cost;
  throw new Problem("invalid-fields", { issues: [{ pointer, code: "batch-over-quota", params: { maximum } }] });
}
