import "server-only";
import { bucketFor, waitFor, type BucketShape } from "./bucket-shape";

interface Held {
  tokens: number;
  refilledAt: number;
}

/** What a bucket answered: `tokens` left, and the milliseconds until it is full, or, refused, until the same call passes. */
export interface Drawn {
  passed: boolean;
  tokens: number;
  wait: number;
}

/**
 * The limit in this process while the shared one is away: bounded in what it lets through and in the memory it takes. A call that
 * costs more than the bucket holds passes when the bucket is full and is paid off afterwards, so that a batch is slowed
 * and not refused for ever.
 */
export class Reserve {
  readonly shape: BucketShape;
  private readonly held = new Map<string, Held>();

  constructor(
    readonly perMinute: number,
    private readonly mostKeys = 10_000,
  ) {
    this.shape = bucketFor(perMinute);
  }

  draw(key: string, cost: number, now: number): Drawn {
    const { capacity, refill, interval } = this.shape;
    const found = this.held.get(key);
    const steps = found === undefined ? 0 : Math.max(0, Math.floor((now - found.refilledAt) / interval));
    const tokens = found === undefined ? capacity : Math.min(capacity, found.tokens + steps * refill);
    const refilledAt = found === undefined || tokens === capacity ? now : found.refilledAt + steps * interval;
    const needed = Math.min(cost, capacity);
    if (tokens < needed) return { passed: false, tokens, wait: refilledAt + waitFor(this.shape, tokens, needed) - now };
    const left = tokens - cost;
    // Deleted first, so that the map stays in order of use and the one used longest ago is the first.
    this.held.delete(key);
    this.held.set(key, { tokens: left, refilledAt });
    if (this.held.size > this.mostKeys) this.held.delete(this.held.keys().next().value!);
    return { passed: true, tokens: left, wait: refilledAt + waitFor(this.shape, left, capacity) - now };
  }

  get size(): number {
    return this.held.size;
  }
}
