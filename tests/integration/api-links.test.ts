import { afterAll, beforeAll, describe, expect, test, vi } from "vitest";
import { linkAnswer, madeLink } from "@/api-spec";
import { calculatorOf, operations } from "@/calculators";
import { database } from "@/lib/database";
import { deleteUnopenedLinks, keptDays } from "@/lib/services/links/delete-unopened";
import { openLink } from "@/lib/services/links/open-link";
import { sameAnswer } from "@/lib/services/links/same-answer";
import { shortId } from "@/lib/services/links/short-id";
import { ShortLink } from "@/models";
import { call } from "@/tests/setup/api-routes";

const day = 24 * 60 * 60 * 1000;
const [path, operation] = [...operations].find(([name]) => name === "insets")!;
const { input } = operation.examples[0]!;
const make = (body: object) => call("/api/v1/links", "POST", { body });
const open = (id: string) => call("/api/v1/links/[id]", "GET", { params: { id } });
const made = async (body: object = { operation: path, input }) => madeLink.parse(await (await make(body)).json());

beforeAll(() => void database());
afterAll(() => database().close());

describe("a short link", () => {
  test("keeps calculator, operation, version, input and answer, and says where it is", async () => {
    const response = await make({ operation: path, input, language: "es" });
    expect(response.status).toBe(201);
    const link = madeLink.parse(await response.json());
    expect(link).toMatchObject({ calculator: "inset", operation: "insets", version: calculatorOf(path)!.version });
    expect(link.url).toMatch(new RegExp(`^https?://[^/]+/es/c/${link.id}$`));
    expect(response.headers.get("location")).toBe(`/api/v1/links/${link.id}`);
    const row = await ShortLink.findByPk(link.id, { rejectOnEmpty: true });
    expect(row.inputs).toEqual(input);
    expect(row.answer).toEqual(JSON.parse(JSON.stringify(operation.calculate(operation.input.parse(input)))));
    expect(Date.parse(link.deletedAfter) - Date.parse(link.createdAt)).toBeGreaterThanOrEqual(365 * day);
  });

  test.each([...operations].map(([name, { examples }]) => ({ name, input: examples[0]!.input })))("of $name opens to what was kept, and to nothing new while the calculator is the same", async ({ name, input: asked }) => {
    const { id } = await made({ operation: name, input: asked });
    const link = linkAnswer.parse(await (await open(id)).json());
    expect(link.input).toEqual(asked);
    expect(link.current).toEqual({ version: link.version, newer: false, differs: false, answer: null, errors: [] });
  });

  test("is not made of an input that the calculator refuses: each field is told under /input", async () => {
    const body = await (await make({ operation: path, input: { ...input, length: "28 7", nope: 1 } })).json();
    expect(body.errors.map(({ pointer, code }: { pointer: string; code: string }) => [pointer, code])).toEqual([["/input/length", "two-readings"], ["/input/nope", "unknown-field"]]);
  });

  test("is not made of an operation that is none", async () => {
    const body = await (await make({ operation: "toString", input })).json();
    expect(body.errors).toEqual([{ pointer: "/operation", code: "not-one-of", detail: expect.stringContaining("insets") }]);
  });

  test("holds sixteen kibibytes and no more", async () => {
    const filled = (size: number) => JSON.stringify({ operation: path, input }).padEnd(size, " ");
    expect((await call("/api/v1/links", "POST", { body: filled(16 * 1024) })).status).toBe(201);
    const refused = await call("/api/v1/links", "POST", { body: filled(16 * 1024 + 1) });
    expect(refused.status).toBe(413);
    expect((await refused.json()).detail).toContain("16");
  });

  test.each(["0000000000", "short", "x".repeat(11), "' OR 1=1 --", "../../etc", "%00", ""])("with the id %j is not found", async (id) => {
    const response = await open(id);
    expect([response.status, (await response.json()).code]).toEqual([404, "not-found"]);
  });

  test("told apart by the case of its letters is another", async () => {
    const { id } = await made();
    const swapped = [...id].map((letter) => (letter === letter.toLowerCase() ? letter.toUpperCase() : letter.toLowerCase())).join("");
    if (swapped !== id) expect((await open(swapped)).status).toBe(404);
  });
});

describe("a short link opened with a newer calculator", () => {
  const age = (id: string, values: object) => ShortLink.update(values, { where: { id } });

  test("that answers the same says that it is newer, and shows one answer", async () => {
    const { id } = await made();
    await age(id, { version: "0.9.0" });
    const link = linkAnswer.parse(await (await open(id)).json());
    expect(link.version).toBe("0.9.0");
    expect(link.current).toMatchObject({ version: calculatorOf(path)!.version, newer: true, differs: false, answer: null });
  });

  test("that answers otherwise gives both answers", async () => {
    const { id } = await made();
    const row = await ShortLink.findByPk(id, { rejectOnEmpty: true });
    const old = structuredClone(row.answer) as { diagonal: { text: string } };
    const { text } = old.diagonal;
    old.diagonal.text = "40' 0\"";
    await age(id, { version: "0.9.0", answer: old });
    const link = linkAnswer.parse(await (await open(id)).json());
    expect(link.current).toMatchObject({ newer: true, differs: true });
    expect(link.answer).toMatchObject({ diagonal: { text: "40' 0\"" } });
    expect(link.current.answer).toMatchObject({ diagonal: { text } });
  });

  test("that refuses the input now says why, and keeps the old answer", async () => {
    const { id } = await made();
    await age(id, { version: "0.9.0", inputs: { ...input, gone: "1" } });
    const link = linkAnswer.parse(await (await open(id)).json());
    expect(link.answer).toMatchObject({ lines: {} });
    expect(link.current).toMatchObject({ differs: true, answer: null, errors: [{ pointer: "/gone", code: "unknown-field" }] });
  });
});

test("answers are the same when texts are and numbers are to a billionth, whatever the order of their fields", () => {
  expect(sameAnswer({ a: 1, b: [0.1 + 0.2, "x"] }, { b: [0.3, "x"], a: 1 })).toBe(true);
  expect(sameAnswer({ in: 343.5 }, { in: 343.5001 })).toBe(false);
  expect(sameAnswer({ text: "5/16" }, { text: "3/8" })).toBe(false);
  expect(sameAnswer([1], { 0: 1 })).toBe(false);
  expect(sameAnswer({ a: undefined }, {})).toBe(false);
  expect(sameAnswer(null, {})).toBe(false);
});

test("ids are of ten letters and digits, each as likely as any other", () => {
  const counts = new Map<string, number>();
  const ids = new Set<string>();
  for (let number = 0; number < 20_000; number += 1) {
    const id = shortId();
    expect(id).toMatch(/^[0-9A-Za-z]{10}$/);
    ids.add(id);
    for (const letter of id) counts.set(letter, (counts.get(letter) ?? 0) + 1);
  }
  expect(ids.size).toBe(20_000);
  const expected = 200_000 / 62;
  const chiSquared = [...counts.values()].reduce((sum, count) => sum + (count - expected) ** 2 / expected, 0);
  expect(counts.size).toBe(62);
  expect(chiSquared).toBeLessThan(125); // 61 degrees of freedom: once in a million by chance (NIST/SEMATECH e-Handbook, 1.3.6.7.4, extrapolated)
});

describe("when a link was last opened", () => {
  test("is noted once a day at most", async () => {
    const { id } = await made();
    const row = await ShortLink.findByPk(id, { rejectOnEmpty: true });
    const opened = async (after: number) => {
      await openLink(id, new Date(row.lastOpenedAt.getTime() + after));
      return (await ShortLink.findByPk(id, { rejectOnEmpty: true })).lastOpenedAt.getTime() - row.lastOpenedAt.getTime();
    };
    expect(await opened(day / 2)).toBe(0);
    expect(await opened(2 * day)).toBe(2 * day);
    expect(await opened(2.5 * day)).toBe(2 * day);
  });

  test("decides when it is deleted: a year later and not before", async () => {
    const [kept, old] = [await made(), await made()];
    const now = new Date();
    await ShortLink.update({ lastOpenedAt: new Date(now.getTime() - keptDays * day - 1) }, { where: { id: old.id } });
    await ShortLink.update({ lastOpenedAt: new Date(now.getTime() - keptDays * day + 3_600_000) }, { where: { id: kept.id } });
    expect(await deleteUnopenedLinks(now)).toBe(1);
    expect(await ShortLink.findByPk(old.id)).toBeNull();
    expect(await ShortLink.findByPk(kept.id)).not.toBeNull();
  });

  test("is deleted in portions, however many there are", async () => {
    const long = new Date(Date.now() - 400 * day);
    const answer = {};
    await ShortLink.bulkCreate(Array.from({ length: 1500 }, () => ({ id: shortId(), calculator: "inset", operation: "insets", version: "1.0.0", locale: "en", inputs: {}, answer, lastOpenedAt: long })));
    const destroy = vi.spyOn(ShortLink, "destroy");
    expect(await deleteUnopenedLinks()).toBe(1500);
    expect(destroy).toHaveBeenCalledTimes(2);
  });
});
