import { beforeAll, describe, expect, test, vi } from "vitest";
import { problemAnswer, problems, type ProblemCode } from "@/api-spec";
import { operations } from "@/calculators";
import { call, documented, moduleOf, stranger, type RouteModule } from "@/tests/setup/api-routes";

/** Every documented route is put through all of this; a new one needs no line here. */
const routes = await Promise.all(documented.map(async (address) => ({ address, module: await moduleOf(address) })));
const posting = routes.filter(({ module }) => module.POST?.problems !== undefined);
const withQuota = routes.flatMap(({ address, module }) => ["POST", "GET"].filter((method) => module[method]?.quota && module[method]?.quota !== "none").map((method) => ({ address, method, quota: module[method]!.quota! })));
const methods = ["GET", "HEAD", "POST", "PUT", "PATCH", "DELETE", "OPTIONS"];
const served = (module: RouteModule) => methods.filter((method) => module[method]?.problems !== undefined);

/** Reads a refusal and holds it to everything that all refusals promise. */
async function refusal(response: Response, code: ProblemCode) {
  const body = problemAnswer.parse(await response.json());
  expect([response.status, body.code, body.status]).toEqual([problems[code].status, code, problems[code].status]);
  expect(response.headers.get("content-type")).toBe("application/problem+json; charset=utf-8");
  expect(response.headers.get("cache-control")).toBe("no-store");
  expect(response.headers.get("vary")).toBe("Accept-Language");
  expect(body.requestId).toBe(response.headers.get("request-id"));
  expect(body.type).toMatch(new RegExp(`^https?://[^/]+/problems/${code}$`));
  for (const text of [body.title, body.detail]) expect(text).not.toMatch(/[{}]|undefined/);
  return body;
}

/** An input that the route takes. */
const goodBody = (address: string): object => {
  const operation = operations.get(address.replace("/api/v1/", ""));
  if (operation) return operation.examples[0]!.input;
  const [path, some] = [...operations][0]!;
  const calculation = { operation: path, input: some.examples[0]!.input };
  return address.endsWith("/batch") ? { items: [calculation] } : calculation;
};

beforeAll(() => {
  expect(posting.length).toBeGreaterThanOrEqual(operations.size + 2);
});

describe.each(posting)("POST $address", ({ address, module }) => {
  const post = (body: BodyInit | object | undefined, headers = {}, from?: string) => call(address, "POST", { body, headers, from });

  test("answers a good body as JSON that nobody keeps", async () => {
    const response = await post(goodBody(address), { "content-type": "application/json; charset=utf-8" });
    expect(response.status).toBe(module.POST!.status);
    expect(response.headers.get("content-type")).toBe("application/json; charset=utf-8");
    expect(response.headers.get("cache-control")).toBe("no-store");
    expect(response.headers.get("request-id")).toMatch(/^[0-9a-f-]{36}$/);
    expect(response.headers.get("ratelimit")).toMatch(/^"anonymous(-links)?";r=\d+;t=\d+$/);
    expect(await response.json()).toBeTypeOf("object");
  });

  test.each(["", "{", "[1,", "{'a': 1}", '{"a": 012}', "\u0000"])("tells of a body that is no JSON: %j", async (body) => {
    const { errors } = await refusal(await post(body), "malformed-json");
    expect(errors).toBeUndefined();
  });

  test.each([{ "content-type": "text/plain" }, { "content-type": "application/x-www-form-urlencoded" }, { "content-type": "" }, { "content-encoding": "gzip" }])("tells of a body that is not sent as JSON: %j", async (headers) => {
    const response = await post("{}", headers);
    await refusal(response, "unsupported-media-type");
    expect(response.headers.get("accept")).toBe("application/json");
  });

  test("stops reading a body that is too large, whether it says so or goes on and on", async () => {
    await refusal(await post("{}", { "content-length": String(256 * 1024 + 1) }), "body-too-large");
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        sent += 4096;
        controller.enqueue(new Uint8Array(4096).fill(32));
      },
    });
    await refusal(await post(endless), "body-too-large");
    expect(sent).toBeLessThanOrEqual(256 * 1024 + 3 * 4096);
  });

  test.each([["[]", "expected-object"], ["null", "expected-object"], ['"x"', "expected-object"], ["7", "expected-object"]])("tells that the body is no object: %s", async (body, code) => {
    const { errors } = await refusal(await post(body), "invalid-fields");
    expect(errors).toEqual([{ pointer: "", code, detail: expect.any(String) }]);
  });

  test("tells of each field it does not know by its own pointer", async () => {
    const { errors } = await refusal(await post({ ...goodBody(address), nope: 1, "a/b~c": 2 }), "invalid-fields");
    expect(errors?.map(({ pointer, code }) => [pointer, code])).toEqual([["/nope", "unknown-field"], ["/a~1b~0c", "unknown-field"]]);
  });

  test("is not taken in by names that reach for an object's prototype", async () => {
    const text = JSON.stringify(goodBody(address)).replace("{", '{"__proto__": {"polluted": true}, "constructor": 1, ');
    const response = await post(text);
    expect((await refusal(response, "invalid-fields")).errors?.map(({ code }) => code)).toContain("unknown-field");
    expect(({} as { polluted?: boolean }).polluted).toBeUndefined();
  });

  test("tells of every missing field, in the language asked for, with the same codes", async () => {
    const english = await refusal(await post({}), "invalid-fields");
    const spanish = await refusal(await post({}, { "accept-language": "es-MX, en;q=0.5" }), "invalid-fields");
    const said = (body: typeof english) => body.errors!.map(({ pointer, code }) => [pointer, code]);
    expect(said(spanish)).toEqual(said(english));
    expect(english.errors!.length).toBeGreaterThan(0);
    expect(spanish.title).not.toBe(english.title);
    expect(spanish.type).toBe(english.type);
    for (const { detail } of [...english.errors!, ...spanish.errors!]) expect(detail).toMatch(/\S/);
  });

  test("opens itself to pages of other sites, refusals included, or to none of them", async () => {
    const allowed = module.POST!.open ? "*" : null;
    for (const response of [await post(goodBody(address)), await post("{"), await call(address, "OPTIONS"), await call(address, "PUT")]) {
      expect(response.headers.get("access-control-allow-origin")).toBe(allowed);
      expect(response.headers.get("access-control-allow-credentials")).toBeNull();
    }
    const preflight = await call(address, "OPTIONS", { headers: { origin: "https://elsewhere.example", "access-control-request-method": "POST", "access-control-request-headers": "content-type" } });
    expect(preflight.status).toBe(204);
    expect(preflight.headers.get("access-control-allow-methods")).toBe(module.POST!.open ? "POST" : null);
    if (module.POST!.open) expect(preflight.headers.get("access-control-allow-headers")).toMatch(/Content-Type/i);
  });

  test("logs an error nobody expected under the request's id, and answers it without detail", async () => {
    const { log } = await import("@/lib/services/log");
    const logged = vi.spyOn(log(), "error").mockReturnValue(undefined as never);
    const broken = vi.spyOn(Request.prototype, "text").mockRejectedValueOnce(new TypeError("wires crossed at 28' 7"));
    const response = await post("{}", { "content-length": "2" });
    broken.mockRestore();
    const body = await refusal(response, "internal");
    expect(JSON.stringify(body)).not.toContain("wires");
    expect(logged).toHaveBeenCalledTimes(1);
    expect(logged.mock.calls[0]![0]).toMatchObject({ requestId: body.requestId, error: { name: "TypeError", message: "wires crossed at 28' 7", stack: expect.stringContaining("at ") } });
    logged.mockRestore();
  });
});

describe.each(routes)("$address", ({ address, module }) => {
  test("refuses every method it does not serve and says which it does", async () => {
    const own = served(module);
    const allow = methods.filter((method) => own.includes(method) || method === "OPTIONS" || (method === "HEAD" && own.includes("GET"))).join(", ");
    for (const method of methods) {
      if (own.includes(method)) continue;
      if (method === "HEAD" && own.includes("GET")) {
        expect(module.HEAD).toBeUndefined(); // Next answers it from GET
        continue;
      }
      const response = await call(address, method, { params: { id: "0000000000" } });
      expect(response.headers.get("allow")).toBe(allow);
      if (method === "OPTIONS") expect(response.status).toBe(204);
      else await refusal(response, "method-not-allowed");
    }
  });
});

describe.each(withQuota)("$method $address, once the quota is spent,", ({ address, method, quota }) => {
  test("refuses with the policy, what is left and when to come back", async () => {
    const from = stranger();
    const first = [...operations][0]!;
    const spend = (): Promise<Response> =>
      quota === "link"
        ? call("/api/v1/links", "POST", { body: goodBody("/api/v1/links"), from })
        : call("/api/v1/batch", "POST", { body: { items: Array.from({ length: 60 }, () => ({ operation: first[0], input: first[1].examples[0]!.input })) }, from });
    for (let times = quota === "link" ? 10 : 1; times > 0; times -= 1) expect((await spend()).status).toBeLessThan(300);
    const body = method === "POST" ? goodBody(address) : undefined;
    const response = await call(address, method, { body, from, params: { id: "0000000000" } });
    await refusal(response, "quota-spent");
    const policy = quota === "link" ? "anonymous-links" : "anonymous";
    expect(response.headers.get("ratelimit-policy")).toBe(`"${policy}";q=${quota === "link" ? 10 : 60};w=60`);
    const seconds = response.headers.get("retry-after");
    expect(seconds).toMatch(/^[1-6]$/);
    expect(response.headers.get("ratelimit")).toBe(`"${policy}";r=0;t=${seconds}`);
    expect((await call(address, method, { body, params: { id: "0000000000" } })).status).not.toBe(429); // others go on
  });
});

describe("an address that is none", () => {
  test.each(methods)("is told so, asked by %s", async (method) => {
    await refusal(await call("/api/[[...path]]", method, { body: method === "GET" || method === "HEAD" ? undefined : "{" }), "not-found");
  });

  test("is what the bench's route is, unless the environment opens it", async () => {
    for (const method of methods) await refusal(await call("/api/health/echo", method), "not-found");
  });
});
