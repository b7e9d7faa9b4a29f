import "server-only";
import { randomUUID } from "node:crypto";
import { Problem } from "./problem";
import { problemResponse } from "./problem-response";

/** The answer to any method at an address that is none. */
export function unknownAddress(request: Request): Response {
  return problemResponse(new Problem("not-found"), request, { "Request-Id": randomUUID() });
}
