import "server-only";
import { env } from "@/lib/env";
import { makeLimiter, type Limiter, type Spent } from "./limiter";
import { storeClient } from "./store-client";

export { reducedShare, type Limiter, type Spent } from "./limiter";

/** What is limited: its policy's name in the headers, and how many a minute. */
const plans = {
  calculation: { policy: "anonymous", perMinute: () => env.ANONYMOUS_PER_MINUTE },
  link: { policy: "anonymous-links", perMinute: () => env.LINKS_PER_MINUTE },
} as const;

export type Quota = keyof typeof plans;

const limiters = new Map<Quota, Limiter | null>();

/** The limiter of a quota, or null where the environment switched it off. */
export function limiterOf(quota: Quota): Limiter | null {
  const known = limiters.get(quota);
  if (known !== undefined) return known;
  const { policy, perMinute } = plans[quota];
  const limiter = perMinute() === 0 ? null : makeLimiter({ policy, perMinute: perMinute(), redis: storeClient() });
  limiters.set(quota, limiter);
  return limiter;
}

/** Charges `cost` to `key`. Null where nothing is limited. */
export function spend(quota: Quota, key: string, cost: number): Promise<Spent> | null {
  return limiterOf(quota)?.spend(key, cost) ?? null;
}

/** The most one call may cost, since more never fits the bucket; Infinity where nothing is limited. */
export const mostAtOnce = (quota: Quota): number => limiterOf(quota)?.perMinute ?? Infinity;
