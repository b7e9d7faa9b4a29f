import "server-only";
import { spend, type Quota } from "@/lib/services/limiter";
import { Problem } from "./problem";

/**
 * Charges a call to whoever makes it and writes what is left into the headers, so that a refusal carries them too
 * (draft-ietf-httpapi-ratelimit-headers). `t` says when all of the quota is back or, refused, when the same call passes.
 *
 * @throws Problem quota-spent
 */
export async function spendQuota(quota: Quota, key: string, cost: number, headers: Record<string, string>): Promise<void> {
  const spent = await spend(quota, key, cost);
  if (spent === null) return;
  const { policy, limit, remaining, passed, seconds } = spent;
  headers["RateLimit-Policy"] = `"${policy}";q=${limit};w=60`;
  headers["RateLimit"] = `"${policy}";r=${remaining};t=${seconds}`;
  if (!passed) throw new Problem("quota-spent", { headers: { "Retry-After": String(seconds) }, params: { seconds, limit } });
}
