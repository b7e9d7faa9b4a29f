import { createHash } from "node:crypto";
import { NextResponse, type NextRequest } from "next/server";
import { settingsScript } from "@/lib/client/settings/settings-script";

/**
 * The content security policy of pages made at request time, by a nonce. Static pages carry hashes written after the build
 * (scripts/lib/csp.mjs); the API has no use for one and must not pay for this. Nothing is authorised here.
 */
const settingsHash = createHash("sha256").update(settingsScript, "utf8").digest("base64");
const isDevelopment = process.env.NODE_ENV === "development";

export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.randomUUID()).toString("base64");
  const policy = policyWith(nonce);
  // Next finds the nonce in the request's own policy and puts it on the scripts it writes.
  const headers = new Headers(request.headers);
  headers.set("Content-Security-Policy", policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set("Content-Security-Policy", policy);
  return response;
}

function policyWith(nonce: string): string {
  const directives = {
    "default-src": ["'none'"],
    // The script of the layout's head is the same on every page: its hash spares the layout from reading the nonce, which would make every page dynamic.
    "script-src": ["'self'", `'nonce-${nonce}'`, `'sha256-${settingsHash}'`, ...(isDevelopment ? ["'unsafe-eval'"] : [])],
    "style-src": ["'self'", ...(isDevelopment ? ["'unsafe-inline'"] : [])],
    "img-src": ["'self'", "data:"],
    "font-src": ["'self'"],
    "connect-src": ["'self'"],
    "manifest-src": ["'self'"],
    "worker-src": ["'self'"],
    "form-action": ["'self'"],
    "base-uri": ["'none'"],
    "frame-ancestors": ["'none'"],
    "object-src": ["'none'"],
  };
  return Object.entries(directives).map(([name, values]) => `${name} ${values.join(" ")}`).join("; ");
}

/** Exactly the dynamic pages, as asked for and as rewritten. */
export const config = {
  matcher: [
    "/calculators/:name/answer",
    "/es/calculators/:name/answer",
    "/en/calculators/:name/answer",
    "/c/:id",
    "/es/c/:id",
    "/en/c/:id",
  ],
};
