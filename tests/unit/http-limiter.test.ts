import fc from "fast-check";
import { describe, expect, test, vi } from "vitest";
import { bucketFor, waitFor } from "@/lib/services/limiter/bucket-shape";
import { LocalShare } from "@/lib/services/limiter/local-share";
import { Reserve, type Drawn } from "@/lib/services/limiter/reserve";
import { StoreHealth } from "@/lib/services/limiter/store-health";

describe("a bucket for so many a minute", () => {
  test("gains no more than that in a minute, and no less than nine tenths of it", () => {
    fc.assert(
      fc.property(fc.oneof(fc.integer({ min: 1, max: 1_500 }), fc.integer({ min: 1, max: 1_000_000 })), (perMinute) => {
        const { capacity, refill, interval } = bucketFor(perMinute);
        const gained = (60_000 / interval) * refill;
        return capacity === perMinute && Number.isInteger(interval) && gained <= perMinute + 1e-9 && gained >= perMinute * 0.9;
      }),
      { numRuns: 2_000 },
    );
  });

  test("of 60 gains one each second", () => {
    expect(bucketFor(60)).toEqual({ capacity: 60, refill: 1, interval: 1000 });
  });

  test("says how long it takes to hold enough", () => {
    expect(waitFor(bucketFor(60), 3, 10)).toBe(7000);
    expect(waitFor(bucketFor(60), 3, 3)).toBe(0);
  });
});

describe("the limit in the process", () => {
  const draws = fc.array(fc.record({ cost: fc.integer({ min: 1, max: 5 }), after: fc.integer({ min: 0, max: 20_000 }) }), { maxLength: 200 });

  test("never lets through more than one bucket and its refills", () => {
    fc.assert(
      fc.property(draws, (calls) => {
        const reserve = new Reserve(15);
        let now = 1_000_000;
        const began = now;
        let through = 0;
        for (const { cost, after } of calls) {
          now += after;
          if (reserve.draw("someone", cost, now).passed) through += cost;
          expect(through).toBeLessThanOrEqual(15 + Math.floor((now - began) / 4000));
        }
      }),
    );
  });

  test("tells a refused caller exactly when the same call passes", () => {
    fc.assert(
      fc.property(draws, (calls) => {
        const reserve = new Reserve(15);
        let now = 1_000_000;
        for (const { cost, after } of calls) {
          now += after;
          const drawn = reserve.draw("someone", cost, now);
          if (drawn.passed) continue;
          expect(reserve.draw("someone", cost, now + drawn.wait - 1).passed).toBe(false);
          expect(reserve.draw("someone", cost, now + drawn.wait).passed).toBe(true);
          now += drawn.wait;
        }
      }),
    );
  });

  test("slows a batch larger than itself down instead of refusing it for ever", () => {
    const reserve = new Reserve(15);
    expect(reserve.draw("someone", 60, 0).passed).toBe(true);
    const refused = reserve.draw("someone", 60, 0);
    expect(refused).toMatchObject({ passed: false, wait: 240_000 }); // 60 at one each 4 s
    expect(reserve.draw("someone", 60, refused.wait).passed).toBe(true);
  });

  test("remembers a bounded number of addresses, those that asked last", () => {
    const reserve = new Reserve(15, 100);
    for (let number = 0; number < 1000; number += 1) reserve.draw(`address ${number}`, 15, 0);
    expect(reserve.size).toBe(100);
    expect(reserve.draw("address 999", 1, 0).passed).toBe(false);
  });
});

describe("the store's health", () => {
  const set = () => {
    let now = 0;
    const probe = vi.fn<() => Promise<void>>();
    const report = vi.fn();
    const health = new StoreHealth(probe, report, () => now);
    return { health, probe, report, at: (moment: number) => (now = moment) };
  };

  test("is away after one failure, looks again after a second, and is back once a probe succeeds", async () => {
    const { health, probe, at } = set();
    health.failed(new Error("down"));
    expect(health.away).toBe(true);
    health.look();
    expect(probe).not.toHaveBeenCalled();
    at(1000);
    probe.mockResolvedValue();
    health.look();
    health.look();
    expect(probe).toHaveBeenCalledTimes(1);
    await vi.waitFor(() => expect(health.away).toBe(false));
  });

  test("is asked after ever more seldom, ten seconds apart at most", async () => {
    const { health, probe, at } = set();
    probe.mockRejectedValue(new Error("down"));
    health.failed(new Error("down"));
    const asked: number[] = [];
    for (let now = 0; now <= 60_000; now += 500) {
      at(now);
      const before = probe.mock.calls.length;
      health.look();
      if (probe.mock.calls.length > before) asked.push(now);
      await Promise.resolve().then(() => undefined).then(() => undefined).then(() => undefined);
    }
    expect(asked).toEqual([1000, 3000, 7000, 15_000, 25_000, 35_000, 45_000, 55_000]);
  });

  test("is reported once a minute", () => {
    const { health, report, at } = set();
    for (let now = 0; now < 180_000; now += 100) {
      at(now);
      health.failed(new Error("down"));
    }
    expect(report).toHaveBeenCalledTimes(3);
  });
});

describe("what a process keeps of the shared limit", () => {
  /** A bucket as the store has it, and how often it was asked. */
  function storeOf(capacity: number) {
    const state = { tokens: capacity, asked: 0 };
    const store = {
      draw: (_key: string, cost: number): Promise<Drawn> => {
        state.asked += 1;
        const passed = state.tokens >= cost;
        if (passed) state.tokens -= cost;
        return Promise.resolve({ passed, tokens: state.tokens, wait: passed ? 0 : 5_000 });
      },
      giveBack: (_key: string, tokens: number) => {
        state.asked += 1;
        state.tokens += tokens;
        return Promise.resolve();
      },
    };
    return { state, store };
  }

  test("is nothing on the plan of those without a key: each call is counted in the one place", async () => {
    const { state, store } = storeOf(60);
    const share = new LocalShare(store, 60);
    for (let call = 1; call <= 60; call += 1) {
      expect(await share.draw("someone", 1, 1000)).toMatchObject({ passed: true, tokens: 60 - call });
      expect(state).toEqual({ tokens: 60 - call, asked: call });
    }
  });

  test("is that a bucket it found empty still is, so that a flood of refused calls never reaches the store", async () => {
    const { state, store } = storeOf(0);
    const share = new LocalShare(store, 60);
    const now = Date.now();
    const first = await share.draw("someone", 1, now);
    for (let call = 0; call < 1000; call += 1) expect((await share.draw("someone", 1 + (call % 3), now + call)).passed).toBe(false);
    expect(state.asked).toBe(1);
    expect((await share.draw("someone", 1, now + 1000)).wait).toBeLessThanOrEqual(first.wait - 900);
    state.tokens = 1;
    expect((await share.draw("someone", 1, now + 5_100)).passed).toBe(true);
  });

  test("refuses no lighter call for a heavier one's sake", async () => {
    const { store } = storeOf(10);
    const share = new LocalShare(store, 60);
    expect((await share.draw("someone", 40)).passed).toBe(false);
    expect((await share.draw("someone", 10)).passed).toBe(true);
  });

  test("on a large plan is a tenth of a second's worth at a time, and never one more than the bucket held", async () => {
    const { state, store } = storeOf(6_000);
    const share = new LocalShare(store, 6_000);
    const now = Date.now();
    let passed = 0;
    for (let call = 0; call < 7_000; call += 1) passed += Number((await share.draw("someone", 1, now)).passed);
    expect(passed).toBe(6_000);
    expect(state.tokens).toBe(0);
    expect(state.asked).toBeLessThan(700);
  });

  test("is given back when nobody came for it within a second", async () => {
    const { state, store } = storeOf(6_000);
    const share = new LocalShare(store, 6_000);
    const now = Date.now();
    for (let call = 0; call < 205; call += 1) await share.draw("someone", 1, now);
    expect(state.tokens).toBeLessThan(6_000 - 205);
    await share.draw("someone", 1, now + 10_000);
    expect(state.tokens).toBe(6_000 - 206);
  });

  test("takes a bounded amount of memory", async () => {
    const share = new LocalShare(storeOf(1e9).store, 60, 100);
    for (let number = 0; number < 1000; number += 1) await share.draw(`address ${number}`, 1);
    expect(share.size).toBe(100);
  });
});
