import { describe, expect, test } from "vitest";
import { acceptedLocale } from "@/lib/http/accept-language";
import { Problem } from "@/lib/http/problem";
import { readJson } from "@/lib/http/read-json";
import { errorSummary } from "@/lib/services/log";

describe("the language of an answer", () => {
  test.each([
    [null, "en"],
    ["", "en"],
    ["es", "es"],
    ["es-US,es;q=0.9,en;q=0.8", "es"],
    ["en-US,en;q=0.9,es;q=0.8", "en"],
    ["fr, es;q=0.4, en;q=0.3", "es"],
    ["de", "en"],
    ["*", "en"],
    ["es;q=0", "en"],
    ["en;q=0.1, ES-mx ; q=0.7", "es"],
    ["es;q=abc, en;q=0.2", "en"],
  ])("%j is %s", (header, locale) => {
    expect(acceptedLocale(header)).toBe(locale);
    expect(acceptedLocale(header)).toBe(locale); // and so from memory
  });
});

const request = (body: BodyInit | null, headers: Record<string, string> = { "content-type": "application/json" }) =>
  new Request("http://localhost/", { method: "POST", body, headers, duplex: "half" } as RequestInit);
const codeOf = (promise: Promise<unknown>) => promise.then(() => "read", (error: unknown) => (error instanceof Problem ? error.code : String(error)));

describe("a body", () => {
  test.each(["application/json", "application/json; charset=utf-8", "Application/JSON;charset=UTF-8", 'application/json; charset="utf-8"', "application/json; profile=x"])("as %s is read", async (type) => {
    expect(await readJson(request('{"a":"8′ ½"}', { "content-type": type }))).toEqual({ a: "8′ ½" });
  });

  test.each([{}, { "content-type": "text/plain" }, { "content-type": "application/json; charset=latin1" }, { "content-type": "application/jsonp" }, { "content-type": "application/json", "content-encoding": "gzip" }])("with %j is not", async (headers) => {
    expect(await codeOf(readJson(request("{}", headers as Record<string, string>)))).toBe("unsupported-media-type");
  });

  test.each(["", "{", "{'a':1}", "NaN", '{"a":1,}', '{"a":1}{"b":2}'])("of %j is malformed", async (text) => {
    expect(await codeOf(readJson(request(text)))).toBe("malformed-json");
  });

  test("at the limit is read, and one byte more is not, said beforehand or not", async () => {
    const exact = JSON.stringify("x".repeat(98));
    expect(exact).toHaveLength(100);
    for (const headers of [{}, { "content-length": "100" }] as Record<string, string>[]) expect(await readJson(request(exact, { "content-type": "application/json", ...headers }), 100)).toHaveLength(98);
    for (const headers of [{}, { "content-length": "101" }] as Record<string, string>[]) expect(await codeOf(readJson(request(`${exact} `, { "content-type": "application/json", ...headers }), 100))).toBe("body-too-large");
  });

  test("that goes on and on is let go of at the limit", async () => {
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        sent += 1024;
        controller.enqueue(new Uint8Array(1024).fill(32));
      },
    });
    expect(await codeOf(readJson(request(endless), 64 * 1024))).toBe("body-too-large");
    expect(sent).toBeLessThanOrEqual(70 * 1024);
  });
});

test("the log of a database's error has neither the statement nor what people typed", () => {
  const original = Object.assign(new Error("(conn=7, no: 1406, SQLState: 22001) Data too long\nsql: INSERT INTO short_links VALUES (?) - parameters:['28 7']"), { code: "ER_DATA_TOO_LONG", sql: "INSERT '28 7'" });
  const error = Object.assign(new Error(original.message), { name: "SequelizeDatabaseError", original, sql: "INSERT '28 7'", parameters: ["28 7"] });
  const summary = errorSummary(error);
  expect(summary).toMatchObject({ name: "SequelizeDatabaseError", message: "(conn=7, no: 1406, SQLState: 22001) Data too long", cause: { code: "ER_DATA_TOO_LONG" } });
  expect(summary.stack).toContain("http-reading.test.ts");
  expect(JSON.stringify(summary)).not.toContain("28 7");
});
