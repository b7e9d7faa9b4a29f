import "server-only";
import type { Redis } from "@upstash/redis";
import { log } from "@/lib/services/log";
import { LocalShare } from "./local-share";
import { Reserve, type Drawn } from "./reserve";
import { Shared } from "./shared";
import { StoreHealth } from "./store-health";

/** While the store is away each process lets this share of the plan through: less than open, more than shut. */
export const reducedShare = 1 / 4;

/** What a call cost and what is left, as the headers tell it. */
export interface Spent {
  policy: string;
  /** Calculations a minute under this policy. */
  limit: number;
  remaining: number;
  passed: boolean;
  /** Whole seconds: until all of it is back, or, refused, until the same call passes. */
  seconds: number;
}

export interface Limiter {
  readonly perMinute: number;
  /** Whether the smaller limit in the process stands in. */
  readonly reduced: boolean;
  spend(key: string, cost: number): Promise<Spent>;
}

export function makeLimiter({ policy, perMinute, redis }: { policy: string; perMinute: number; redis: Redis }): Limiter {
  const shared = new Shared(redis, `sillwright:${policy}`, perMinute);
  const share = new LocalShare(shared, perMinute);
  const reserve = new Reserve(Math.max(1, Math.floor(perMinute * reducedShare)));
  // A key of its own, so that asking whether the store is back costs nobody a calculation.
  const health = new StoreHealth(async () => void (await shared.draw("probe", 1)), (error) => log().warn({ policy, reason: reasonOf(error) }, "the limiter's store is away; a smaller limit in this process stands in"));

  const fromReserve = (key: string, cost: number) => told(`${policy}-reduced`, reserve.perMinute, reserve.draw(key, cost, Date.now()));
  return {
    perMinute,
    get reduced() {
      return health.away;
    },
    async spend(key, cost) {
      if (health.away) {
        health.look();
        return fromReserve(key, cost);
      }
      try {
        return told(policy, perMinute, await share.draw(key, cost));
      } catch (error) {
        health.failed(error);
        return fromReserve(key, cost);
      }
    },
  };
}

function told(policy: string, limit: number, { passed, tokens, wait }: Drawn): Spent {
  return { policy, limit, remaining: Math.max(0, tokens), passed, seconds: Math.max(passed ? 0 : 1, Math.ceil(wait / 1000)) };
}

/** The innermost cause: what the network said, not what we made of it. */
function reasonOf(error: unknown): string {
  if (!(error instanceof Error)) return "unknown";
  if (error.cause instanceof Error) return reasonOf(error.cause);
  const { code } = error as { code?: string };
  return code ?? error.message;
}
