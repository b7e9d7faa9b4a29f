import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { problems, type ProblemCode } from "@/api-spec";
import document from "@/api-spec/openapi.json";
import { operations } from "@/calculators";
import { listRules } from "@/calculators/rules";
import { database } from "@/lib/database";
import { call, stranger } from "@/tests/setup/api-routes";
import { validatorOf } from "@/tests/setup/openapi-validator";

type Documented = { responses: Record<string, { $ref?: string; headers?: object; content?: Record<string, { schema: { $ref: string } }> }> };
const paths = document.paths as unknown as Record<string, Record<string, Documented>>;
const shared = document.components.responses as unknown as Record<string, Documented["responses"][string]>;

/** Holds a live answer to what the document says of that address, status, media type, headers and body. */
async function holds(address: string, method: "get" | "post", response: Response): Promise<unknown> {
  const said = paths[address]?.[method]?.responses[String(response.status)];
  expect(said, `${method} ${address} answers ${response.status}, which is not documented`).toBeDefined();
  const documented = said!.$ref ? shared[said!.$ref.split("/").at(-1)!]! : said!;
  const type = response.headers.get("content-type")!.split(";")[0]!;
  const body: unknown = await response.json();
  expect(Object.keys(documented.content!)).toEqual([type]);
  expect(validatorOf(documented.content![type]!.schema.$ref)(body), `${method} ${address} ${response.status}`).toEqual([]);
  for (const name of Object.keys(documented.headers ?? {})) expect(response.headers.get(name), `${address} ${response.status} ${name}`).toBeTruthy();
  return body;
}

beforeAll(() => void database());
afterAll(() => database().close());

describe.each([...operations.values()])("POST /v1/$path answers as documented", ({ path, examples }) => {
  test.each(examples.map((example) => [example.id, example] as const))("%s", async (_, { input, answer }) => {
    const response = await call(`/api/v1/${path}`, "POST", { body: input });
    expect(response.status).toBe(200);
    expect(await holds(`/v1/${path}`, "post", response)).toMatchObject(answer);
  });
});

const calculation = { operation: "insets", input: { length: "28 ft", width: "24 ft", inset: "7/16" } };

/** One way to meet each problem, for any route that documents it. */
const ways: Partial<Record<ProblemCode, (address: string) => Promise<Response>>> = {
  "malformed-json": (address) => call(`/api${address}`, "POST", { body: "{" }),
  "body-too-large": (address) => call(`/api${address}`, "POST", { body: "{}", headers: { "content-length": "999999" } }),
  "unsupported-media-type": (address) => call(`/api${address}`, "POST", { body: "{}", headers: { "content-type": "text/plain" } }),
  "invalid-fields": (address) => call(`/api${address}`, "POST", { body: { nope: 1 } }),
  "quota-spent": async (address) => {
    const from = stranger();
    if (address === "/v1/links") for (let times = 0; times < 10; times += 1) await call("/api/v1/links", "POST", { body: "{", from });
    else await call("/api/v1/batch", "POST", { body: { items: Array.from({ length: 60 }, () => ({})) }, from });
    const method = paths[address]!.get ? "GET" : "POST";
    return call(`/api${address.replace("{id}", "[id]")}`, method, { body: method === "POST" ? calculation : undefined, from, params: { id: "0000000000" } });
  },
  "not-found": (address) => call(`/api${address.replace("{id}", "[id]")}`, "GET", { params: { id: "0000000000" } }),
};

const each = Object.entries(paths).flatMap(([address, methods]) =>
  Object.entries(methods).flatMap(([method, { responses }]) =>
    (Object.keys(ways) as ProblemCode[]).filter((code) => responses[String(problems[code].status)] !== undefined).map((code) => ({ address, method: method as "get" | "post", code })),
  ),
);

test.each(each)("$method $address answers $code as documented", async ({ address, method, code }) => {
  const response = await ways[code]!(address);
  expect(response.status).toBe(problems[code].status);
  expect(await holds(address, method, response)).toMatchObject({ code });
});

test("a batch answers as documented, each item as its operation would alone", async () => {
  const items = [...operations.values()].map(({ path, examples }) => ({ operation: path, input: examples[0]!.input }));
  const wrong = [{ operation: "nothing", input: {} }, { operation: "insets" }, 7, { ...calculation, extra: 1 }, { operation: "insets", input: { length: "28 7" } }];
  const response = await call("/api/v1/batch", "POST", { body: { items: [...items, ...wrong] } });
  const body = (await holds("/v1/batch", "post", response)) as { items: { status: number; answer?: object; problem?: { errors: { pointer: string; code: string }[] } }[] };
  expect(body.items.map(({ status }) => status)).toEqual([...items.map(() => 200), ...wrong.map(() => 422)]);
  for (const [index, { operation, input }] of items.entries()) expect(body.items[index]!.answer).toEqual(await (await call(`/api/v1/${operation}`, "POST", { body: input })).json());
  const first = items.length;
  const told = body.items.slice(first).map(({ problem }) => problem!.errors.map(({ pointer, code }) => `${pointer} ${code}`));
  expect(told[0]).toEqual([`/items/${first}/operation not-one-of`]);
  expect(told[1]).toEqual([`/items/${first + 1}/input required`]);
  expect(told[2]).toEqual([`/items/${first + 2} expected-object`]);
  expect(told[3]).toEqual([`/items/${first + 3}/extra unknown-field`]);
  expect(told[4]).toContain(`/items/${first + 4}/input/length two-readings`);
});

test("links, rules and health answer as documented", async () => {
  const made = await call("/api/v1/links", "POST", { body: calculation });
  const { id } = (await holds("/v1/links", "post", made)) as { id: string };
  await holds("/v1/links/{id}", "get", await call("/api/v1/links/[id]", "GET", { params: { id } }));
  expect(await holds("/v1/rules", "get", await call("/api/v1/rules", "GET"))).toEqual(JSON.parse(JSON.stringify(listRules())));
  await holds("/health/live", "get", await call("/api/health/live", "GET"));
  await holds("/health/ready", "get", await call("/api/health/ready", "GET"));
});
