import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import { setTimeout as pause } from "node:timers/promises";
import { parseList } from "structured-headers";
import { afterEach, describe, expect, test, vi } from "vitest";
import { operations } from "@/calculators";
import { makeLimiter } from "@/lib/services/limiter/limiter";
import { makeStoreClient, storeClient } from "@/lib/services/limiter/store-client";
import { log } from "@/lib/services/log";
import { freePort } from "@/scripts/lib/ports.mjs";
import { call, stranger } from "@/tests/setup/api-routes";

const url = process.env.UPSTASH_REDIS_REST_URL ?? "";
const token = process.env.UPSTASH_REDIS_REST_TOKEN ?? "";
const [path, operation] = [...operations][0]!;
const input = operation.examples[0]!.input;
const batchOf = (count: number) => ({ items: Array.from({ length: count }, () => ({ operation: path, input })) });

let named = 0;
const limiterAt = (address: string, perMinute: number) => makeLimiter({ policy: `test-${process.pid}-${(named += 1)}`, perMinute, redis: makeStoreClient(address, token) });

const servers: Server[] = [];
afterEach(async () => {
  vi.restoreAllMocks();
  for (const server of servers.splice(0)) {
    server.closeAllConnections();
    await new Promise((closed) => server.close(closed));
  }
});

/** A store whose manners a test sets: `pass` hands on to the real one, `hang` never answers, `fail` answers 500. */
async function storeWithManners() {
  const manners = { mode: "pass" as "pass" | "hang" | "fail", asked: 0 };
  const server = createServer(async (request, response) => {
    manners.asked += 1;
    const chunks: Buffer[] = [];
    for await (const chunk of request) chunks.push(chunk as Buffer);
    if (manners.mode === "hang") return;
    if (manners.mode === "fail") return void response.writeHead(500).end('{"error":"ERR broken"}');
    const answer = await fetch(`${url}${request.url}`, { method: "POST", body: Buffer.concat(chunks), headers: { authorization: `Bearer ${token}` } });
    response.writeHead(answer.status, { "content-type": "application/json" }).end(await answer.text());
  });
  servers.push(server);
  await new Promise<void>((listening) => server.listen(0, "127.0.0.1", listening));
  return { manners, address: `http://127.0.0.1:${(server.address() as AddressInfo).port}` };
}

/** An address where nothing listens. */
const nowhere = async () => `http://127.0.0.1:${await freePort()}`;

const timed = async <Answer>(work: Promise<Answer>) => {
  const began = performance.now();
  return { answer: await work, took: performance.now() - began };
};

describe("the limit all processes share", () => {
  test("lets twenty of thirty through that ask at once from one address", async () => {
    const limiter = limiterAt(url, 20); // one more each 3 s: a busy machine has time to ask them all before
    const answers = await Promise.all(Array.from({ length: 30 }, () => limiter.spend("crowd", 1)));
    expect(answers.filter(({ passed }) => passed)).toHaveLength(20);
  });

  test("is one limit for two processes that ask at the same moment", async () => {
    const policy = `test-two-${process.pid}`;
    const [one, two] = [0, 1].map(() => makeLimiter({ policy, perMinute: 20, redis: makeStoreClient(url, token) }));
    const answers = await Promise.all(Array.from({ length: 40 }, (_, index) => (index % 2 ? one! : two!).spend("both", 1)));
    expect(answers.filter(({ passed }) => passed)).toHaveLength(20);
  });

  test.each([1, 30])("lets a call of cost %i through for certain once the seconds it was told are over", async (cost) => {
    const limiter = limiterAt(url, 600); // one each 100 ms
    expect((await limiter.spend("patient", 600)).passed).toBe(true);
    const refused = await limiter.spend("patient", cost);
    expect(refused).toMatchObject({ passed: false, seconds: Math.ceil(cost / 10) });
    await pause(refused.seconds * 1000);
    expect((await limiter.spend("patient", cost)).passed).toBe(true);
  });

  test("charges nothing for a call it refuses, however heavy", async () => {
    const limiter = limiterAt(url, 60);
    await limiter.spend("heavy", 50);
    for (let times = 0; times < 3; times += 1) expect(await limiter.spend("heavy", 40)).toMatchObject({ passed: false });
    expect(await limiter.spend("heavy", 10)).toMatchObject({ passed: true, remaining: 0 });
  });

  test("tells a refused batch what is left and how long until it fits", async () => {
    const limiter = limiterAt(url, 60);
    await limiter.spend("batch", 55);
    const refused = await limiter.spend("batch", 20);
    expect(refused.passed).toBe(false);
    expect(refused.remaining).toBe(5);
    expect(refused.seconds).toBeGreaterThanOrEqual(14); // 15 more at one a second, of which less than one has passed
    expect(refused.seconds).toBeLessThanOrEqual(15);
  });
});

describe("while the store", () => {
  const outages = [
    ["is down", async () => ({ address: await nowhere() })],
    ["hangs", async () => hanging("hang")],
    ["answers errors", async () => hanging("fail")],
  ] as const;
  async function hanging(mode: "hang" | "fail") {
    const store = await storeWithManners();
    store.manners.mode = mode;
    return store;
  }

  test.each(outages)("%s, calculations go on under a quarter of the plan, and no more", async (_, outage) => {
    vi.spyOn(log(), "warn").mockReturnValue(undefined as never);
    const limiter = limiterAt((await outage()).address, 60);
    const answers = [];
    for (let times = 0; times < 30; times += 1) answers.push(await limiter.spend("someone", 1));
    expect(answers.filter(({ passed }) => passed)).toHaveLength(15);
    for (const answer of answers) expect([answer.policy.endsWith("-reduced"), answer.limit]).toEqual([true, 15]);
    expect(limiter.reduced).toBe(true);
    expect((await limiter.spend("another", 1)).passed).toBe(true);
  });

  test("hangs, only those already waiting wait, and they for a fifth of a second", async () => {
    vi.spyOn(log(), "warn").mockReturnValue(undefined as never);
    const { address } = await hanging("hang");
    const limiter = limiterAt(address, 60);
    const first = await timed(limiter.spend("someone", 1));
    expect(first.took).toBeGreaterThan(150);
    const later = await timed(Promise.all(Array.from({ length: 100 }, () => limiter.spend("someone", 1))));
    expect(later.took).toBeLessThan(100);
  });

  test("is away, that is logged once, without the address of anybody", async () => {
    const warned = vi.spyOn(log(), "warn").mockReturnValue(undefined as never);
    const limiter = limiterAt(await nowhere(), 60);
    for (let times = 0; times < 50; times += 1) await limiter.spend("192.0.2.77", 1);
    expect(warned).toHaveBeenCalledTimes(1);
    expect(warned.mock.calls[0]![0]).toMatchObject({ reason: "ECONNREFUSED" });
    expect(JSON.stringify(warned.mock.calls)).not.toContain("192.0.2.77");
  });

  test("comes back, the whole plan does within seconds, and nobody waited to find out", async () => {
    vi.spyOn(log(), "warn").mockReturnValue(undefined as never);
    const { address, manners } = await storeWithManners();
    const limiter = limiterAt(address, 60);
    expect((await limiter.spend("someone", 1)).policy).not.toContain("reduced");
    manners.mode = "hang";
    expect((await limiter.spend("someone", 1)).policy).toContain("reduced");
    manners.mode = "pass";
    let slowest = 0;
    for (const end = Date.now() + 5_000; limiter.reduced && Date.now() < end; await pause(50)) slowest = Math.max(slowest, (await timed(limiter.spend("someone", 1))).took);
    expect(limiter.reduced).toBe(false);
    expect(slowest).toBeLessThan(100);
    expect(await limiter.spend("someone", 1)).toMatchObject({ limit: 60 });
  });
});

describe("the API under its limit", () => {
  test("says policy, rest and time as structured fields", async () => {
    const from = stranger();
    const response = await call(`/api/v1/${path}`, "POST", { body: input, from });
    const [[policy, policyParameters]] = parseList(response.headers.get("ratelimit-policy")!) as [[string, Map<string, number>]];
    const [[name, parameters]] = parseList(response.headers.get("ratelimit")!) as [[string, Map<string, number>]];
    expect([policy, name]).toEqual(["anonymous", "anonymous"]);
    expect(Object.fromEntries(policyParameters)).toEqual({ q: 60, w: 60 });
    expect(Object.fromEntries(parameters)).toEqual({ r: 59, t: 1 });
    expect(response.headers.get("retry-after")).toBeNull();
  });

  test("charges a batch its number of calculations, whatever becomes of them", async () => {
    const from = stranger();
    const items = [...batchOf(9).items, { operation: "nothing", input: {} }];
    const response = await call("/api/v1/batch", "POST", { body: { items }, from });
    expect(response.headers.get("ratelimit")).toMatch(/;r=50;/);
  });

  test("refuses a batch over sixty clearly and for nothing, and takes one of sixty", async () => {
    const from = stranger();
    const refused = await call("/api/v1/batch", "POST", { body: batchOf(61), from });
    expect(refused.status).toBe(422);
    expect((await refused.json()).errors).toEqual([{ pointer: "/items", code: "batch-over-quota", detail: expect.stringContaining("60") }]);
    expect((await call("/api/v1/batch", "POST", { body: batchOf(60), from })).status).toBe(200);
  });

  test("does not read bodies for nothing: a batch that cannot be read costs one", async () => {
    const from = stranger();
    await call("/api/v1/batch", "POST", { body: "{", from });
    expect((await call(`/api/v1/${path}`, "POST", { body: input, from })).headers.get("ratelimit")).toMatch(/;r=58;/);
  });

  test("counts an IPv6 line by its /64 and the same IPv4 address in both spellings", async () => {
    const rest = async (from: string) => Number(/;r=(\d+)/.exec((await call(`/api/v1/${path}`, "POST", { body: input, from })).headers.get("ratelimit")!)![1]);
    const line = `2001:db8:${process.pid.toString(16)}:1`;
    expect([await rest(`${line}::1`), await rest(`${line}:ffff::2`)]).toEqual([59, 58]);
    const plain = stranger();
    expect([await rest(plain), await rest(`::ffff:${plain}`)]).toEqual([59, 58]);
  });

  test("believes no X-Forwarded-For while no proxy is trusted", async () => {
    const from = stranger();
    for (const forwarded of ["1.1.1.1", "2.2.2.2"]) await call(`/api/v1/${path}`, "POST", { body: input, from, headers: { "x-forwarded-for": forwarded } });
    const third = await call(`/api/v1/${path}`, "POST", { body: input, from, headers: { "x-forwarded-for": "3.3.3.3" } });
    expect(third.headers.get("ratelimit")).toMatch(/;r=57;/);
  });

  test("keeps nothing of an address in the store for longer than its bucket needs to fill", async () => {
    const from = stranger();
    await call("/api/v1/batch", "POST", { body: batchOf(30), from });
    const keys = await storeClient().keys(`*${from}*`);
    expect(keys).toHaveLength(1);
    expect(await storeClient().pttl(keys[0]!)).toBeLessThanOrEqual(30_000);
  });
});
