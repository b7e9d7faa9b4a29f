import "server-only";
import { randomUUID } from "node:crypto";
import { openHeaders, preflightHeaders } from "./cors";
import type { Endpoint } from "./endpoint";
import { methodHeader } from "./incoming-requests";
import { Problem } from "./problem";
import { problemResponse } from "./problem-response";

const methods = ["GET", "HEAD", "POST", "PUT", "PATCH", "DELETE", "OPTIONS"] as const;
type Method = (typeof methods)[number];
type Handler = (request: Request) => Response;

/**
 * All methods a route does not serve, for it to export beside those it does: Next's own answer to them has no Allow and
 * no body. HEAD stays Next's where there is a GET, which it asks and leaves the body out.
 */
export function otherMethods<Params>(served: Partial<Record<Method, Endpoint<Params>>>): Record<Method, Handler | undefined> {
  const handlers = Object.values(served);
  const open = handlers.some((handler) => handler.open);
  const names = methods.filter((method) => served[method] !== undefined || method === "OPTIONS" || (method === "HEAD" && served.GET !== undefined));
  const allow = names.join(", ");
  const preflight = open ? preflightHeaders(names.filter((name) => name !== "OPTIONS").join(", ")) : {};

  const refuse: Handler = (request) => problemResponse(new Problem("method-not-allowed", { headers: { Allow: allow }, params: { methods: allow } }), request, { "Request-Id": randomUUID(), ...(open && openHeaders) });
  const preflightAnswer = () => new Response(null, { status: 204, headers: { Allow: allow, "Request-Id": randomUUID(), "Cache-Control": "no-store", ...preflight } });
  const options: Handler = (request) => (request.headers.has(methodHeader) ? refuse(request) : preflightAnswer());
  const answerTo = (method: Method) => (method === "OPTIONS" ? options : names.includes(method) ? undefined : refuse);
  return Object.fromEntries(methods.map((method) => [method, answerTo(method)])) as Record<Method, Handler | undefined>;
}
