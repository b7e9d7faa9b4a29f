import "server-only";
import { Ratelimit } from "@upstash/ratelimit";
import type { Redis } from "@upstash/redis";
import { bucketFor, waitFor, type BucketShape } from "./bucket-shape";
import { inTime } from "./in-time";
import type { Drawn } from "./reserve";

/** The store did not answer, or not in time. */
export class StoreAway extends Error {
  override readonly name = "StoreAway";
}

/** The limit all processes share, kept in Redis by Upstash's token bucket. */
export class Shared {
  readonly shape: BucketShape;
  private readonly ratelimit: Ratelimit;

  constructor(redis: Redis, prefix: string, perMinute: number) {
    this.shape = bucketFor(perMinute);
    const { refill, interval, capacity } = this.shape;
    this.ratelimit = new Ratelimit({
      redis,
      limiter: Ratelimit.tokenBucket(refill, `${interval} ms`, capacity),
      prefix,
      ephemeralCache: false, // it grows without bound, and blocks an address after one heavy call that was refused
      timeout: 1_000, // ours is shorter and fairer, in-time.ts; this only ends what ours has given up
      analytics: false,
    });
  }

  /** @throws StoreAway */
  async draw(key: string, cost: number): Promise<Drawn> {
    const answer = await this.ask(() => this.ratelimit.limit(key, { rate: cost }));
    // Upstash lets everything through when its own time is over; that is for us to decide.
    if (answer.reason === "timeout") throw new StoreAway("no answer in time");
    const now = Date.now();
    const lastRefill = answer.reset - this.shape.interval;
    if (answer.success) return { passed: true, tokens: answer.remaining, wait: Math.max(0, lastRefill + waitFor(this.shape, answer.remaining, this.shape.capacity) - now) };
    if (cost === 1) return { passed: false, tokens: 0, wait: Math.max(1, answer.reset - now) };
    // A refusal does not say what is left, and a heavier call has to wait for more than the next refill.
    const left = await this.ask(() => this.ratelimit.getRemaining(key));
    const heldAt = left.reset - this.shape.interval;
    const held = Math.min(left.limit, left.remaining + Math.max(0, Math.floor((now - heldAt) / this.shape.interval)) * this.shape.refill);
    return { passed: false, tokens: Math.min(held, cost - 1), wait: Math.max(1, heldAt + waitFor(this.shape, left.remaining, cost) - now) };
  }

  /** @throws StoreAway */
  async giveBack(key: string, tokens: number): Promise<void> {
    await this.ask(() => this.ratelimit.limit(key, { rate: -tokens }));
  }

  private async ask<Answer>(question: () => Promise<Answer>): Promise<Answer> {
    try {
      return await inTime(question());
    } catch (error) {
      throw new StoreAway("the store failed", { cause: error });
    }
  }
}
