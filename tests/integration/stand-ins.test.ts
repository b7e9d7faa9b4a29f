import { Ratelimit } from "@upstash/ratelimit";
import { Redis } from "@upstash/redis";
import { beforeEach, describe, expect, test } from "vitest";

const url = process.env.UPSTASH_REDIS_REST_URL ?? "";
const token = process.env.UPSTASH_REDIS_REST_TOKEN ?? "";
const redis = new Redis({ url, token, responseEncoding: false });

const post = (path: string, body: string, headers: Record<string, string> = { authorization: `Bearer ${token}` }) => fetch(`${url}${path}`, { method: "POST", body, headers });

beforeEach(async () => {
  await redis.flushdb();
});

describe("the stand-in for Upstash, asked by the real client", () => {
  test("answers strings, numbers, nothing and lists", async () => {
    expect(await redis.set("a", "ñ 🧱")).toBe("OK");
    expect(await redis.get("a")).toBe("ñ 🧱");
    expect(await redis.get("b")).toBeNull();
    expect(await redis.incrby("n", 41)).toBe(41);
    await redis.rpush("l", "x", "y");
    expect(await redis.lrange("l", 0, -1)).toEqual(["x", "y"]);
  });

  test("answers a client that asks for encoded strings as well", async () => {
    const encoded = new Redis({ url, token });
    await encoded.set("a", "8′ 2½″");
    expect(await encoded.get("a")).toBe("8′ 2½″");
  });

  test("answers a pipeline in order, an error among the answers", async () => {
    const answers = await (await post("/pipeline", JSON.stringify([["SET", "k", "v"], ["INCR", "k"], ["GET", "k"]]))).json();
    expect(answers).toEqual([{ result: "OK" }, { error: expect.stringContaining("not an integer") }, { result: "v" }]);
  });

  test("runs a transaction as one", async () => {
    expect(await redis.multi().set("k", 1).incr("k").get("k").exec()).toEqual(["OK", 2, 2]);
  });

  test("runs a script that begins with a line of flags, which Redis 7.0 alone refuses", async () => {
    const script = "#!lua flags=allow-key-locking\nreturn ARGV[1]";
    expect(await redis.eval(script, [], ["here"])).toBe("here");
    const sha = await redis.scriptLoad(script);
    expect(await redis.evalsha(sha, [], ["again"])).toBe("again");
  });

  test("says NOSCRIPT for a script it has not seen, so that the client sends it whole", async () => {
    await expect(redis.evalsha("0".repeat(40), [], [])).rejects.toThrow("NOSCRIPT");
  });

  test("refuses a wrong token, a body that is not JSON, and a body that is no command", async () => {
    expect((await post("/", '["PING"]', { authorization: "Bearer wrong" })).status).toBe(401);
    expect((await post("/", '["PING"]', {})).status).toBe(401);
    expect((await post("/", "PING")).status).toBe(400);
    expect((await post("/", '{"a":1}')).status).toBe(400);
    expect((await post("/", "[[]]")).status).toBe(400);
    expect((await post("/nowhere", '["PING"]')).status).toBe(404);
  });

  test("carries many requests at once without mixing their answers", async () => {
    const answers = await Promise.all(Array.from({ length: 300 }, (_, index) => redis.eval("return ARGV[1]", [], [`v${index}`])));
    expect(answers).toEqual(Array.from({ length: 300 }, (_, index) => `v${index}`));
  });
});

describe("the limiter's token bucket on the stand-in", () => {
  const limiter = (refill: number, most: number) => new Ratelimit({ redis, limiter: Ratelimit.tokenBucket(refill, "1 s", most), prefix: "test", ephemeralCache: false, timeout: 5_000 });

  test("lets the bucket's content through and refuses the next", async () => {
    const bucket = limiter(1, 5);
    const answers = [];
    for (let call = 0; call < 6; call += 1) answers.push(await bucket.limit("someone"));
    expect(answers.map(({ success }) => success)).toEqual([true, true, true, true, true, false]);
    expect(answers[0]).toMatchObject({ limit: 5, remaining: 4 });
    expect(await bucket.limit("another")).toMatchObject({ success: true });
  });

  test("charges a call its weight, and a refused call nothing", async () => {
    const bucket = limiter(1, 10);
    expect(await bucket.limit("batch", { rate: 8 })).toMatchObject({ success: true, remaining: 2 });
    expect((await bucket.limit("batch", { rate: 8 })).success).toBe(false);
    expect((await bucket.limit("batch", { rate: 2 })).success).toBe(true);
  });

  test("lets no more through than the bucket holds when all ask at once", async () => {
    const bucket = new Ratelimit({ redis, limiter: Ratelimit.tokenBucket(1, "60 s", 20), prefix: "test", ephemeralCache: false, timeout: 5_000 });
    const answers = await Promise.all(Array.from({ length: 60 }, () => bucket.limit("crowd")));
    expect(answers.filter(({ success }) => success)).toHaveLength(20);
  });
});
