import "server-only";
import type { Drawn } from "./reserve";

interface Entry {
  /** Taken from the store and not yet given out. */
  leased: number;
  leaseEnds: number;
  /** What the store held when last asked. */
  left: number;
  fullAt: number;
  /** A call of this cost or more is refused until then: a bucket fills by time alone. */
  refusedCost: number;
  refusedUntil: number;
  /** Calls in this second and in the one before. */
  second: number;
  calls: number;
  callsBefore: number;
}

const fresh = (): Entry => ({ leased: 0, leaseEnds: 0, left: 0, fullAt: 0, refusedCost: Infinity, refusedUntil: 0, second: 0, calls: 0, callsBefore: 0 });

export interface Store {
  draw(key: string, cost: number): Promise<Drawn>;
  giveBack(key: string, tokens: number): Promise<void>;
}

const leaseTime = 1_000;

/**
 * Spares the store what this process knows already: that a bucket it found empty still is, and, on plans so large that asking
 * for each call would cost more than the calculation, a tenth of a second's worth taken in one go by whoever asks often.
 * Plans under ten calls a second are never leased: there every call counts, and counts in one place.
 */
export class LocalShare {
  private readonly entries = new Map<string, Entry>();
  private readonly mostLeased: number;

  constructor(
    private readonly store: Store,
    perMinute: number,
    private readonly mostKeys = 10_000,
  ) {
    this.mostLeased = Math.floor(perMinute / 600);
  }

  async draw(key: string, cost: number, now = Date.now()): Promise<Drawn> {
    const entry = this.entryOf(key);
    count(entry, now);
    if (now < entry.refusedUntil && cost >= entry.refusedCost) return { passed: false, tokens: entry.left, wait: entry.refusedUntil - now };
    if (entry.leased >= cost && now < entry.leaseEnds) {
      entry.leased -= cost;
      return { passed: true, tokens: entry.left + entry.leased, wait: Math.max(0, entry.fullAt - now) };
    }
    if (entry.leased > 0) {
      const unused = entry.leased;
      entry.leased = 0;
      await this.store.giveBack(key, unused);
    }
    const extra = Math.min(this.mostLeased, Math.floor(Math.max(entry.calls, entry.callsBefore) / 10));
    if (extra > 0) {
      const drawn = await this.store.draw(key, cost + extra);
      if (drawn.passed) return lease(entry, drawn, extra);
    }
    const drawn = await this.store.draw(key, cost);
    if (drawn.passed) return lease(entry, drawn, 0);
    const asked = Date.now();
    Object.assign(entry, { left: drawn.tokens, refusedCost: cost, refusedUntil: asked + drawn.wait });
    return drawn;
  }

  /** Kept in order of use, so that the one used longest ago goes first. */
  private entryOf(key: string): Entry {
    const entry = this.entries.get(key) ?? fresh();
    this.entries.delete(key);
    this.entries.set(key, entry);
    if (this.entries.size > this.mostKeys) this.entries.delete(this.entries.keys().next().value!);
    return entry;
  }

  get size(): number {
    return this.entries.size;
  }
}

function count(entry: Entry, now: number): void {
  const second = Math.floor(now / 1000);
  if (second !== entry.second) Object.assign(entry, { callsBefore: second === entry.second + 1 ? entry.calls : 0, calls: 0, second });
  entry.calls += 1;
}

function lease(entry: Entry, drawn: Drawn, extra: number): Drawn {
  const now = Date.now();
  entry.leased += extra;
  entry.leaseEnds = now + leaseTime;
  entry.left = drawn.tokens;
  entry.fullAt = now + drawn.wait;
  return { ...drawn, tokens: drawn.tokens + entry.leased };
}
