import "server-only";

/** Calculations may be asked by any page of any site. No cookie and no key travels along: a key in a page is a key given away. */
export const openHeaders: Readonly<Record<string, string>> = {
  "Access-Control-Allow-Origin": "*",
  "Access-Control-Expose-Headers": "Request-Id, RateLimit, RateLimit-Policy, Retry-After",
};

export function preflightHeaders(methods: string): Record<string, string> {
  return {
    ...openHeaders,
    "Access-Control-Allow-Methods": methods,
    "Access-Control-Allow-Headers": "Content-Type, Accept-Language",
    "Access-Control-Max-Age": "86400",
  };
}
