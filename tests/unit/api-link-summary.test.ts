import { describe, expect, test } from "vitest";
import { z } from "zod";
import { operations } from "@/calculators";
import { answerRows, inputRows, stepWord } from "@/components/links/summary-rows";
import { getTranslate } from "@/lib/client/i18n/load-messages";

const en = getTranslate("en", ["common", "links", "anchors"]);
const es = getTranslate("es", ["common", "links", "anchors"]);

type Json = { $ref?: string; anyOf?: Json[]; allOf?: Json[]; properties?: Record<string, Json>; items?: Json };

/** Every name a field of these inputs can have. */
function fieldNames(schema: Json | undefined, definitions: Record<string, Json>, names = new Set<string>()): Set<string> {
  if (schema === undefined || (schema.properties !== undefined && JSON.stringify(schema).includes("#/definitions/Length\""))) return names; // another calculator's answer, told in one line
  if (schema.$ref) return fieldNames(definitions[schema.$ref.split("/").at(-1)!], definitions, names);
  for (const way of [...(schema.anyOf ?? []), ...(schema.allOf ?? [])]) fieldNames(way, definitions, names);
  for (const [name, field] of Object.entries(schema.properties ?? {})) {
    names.add(name);
    fieldNames(field, definitions, names);
  }
  return fieldNames(schema.items, definitions, names);
}

describe.each([...operations.values()])("a kept calculation of $path", ({ path, input, answer, calculate, examples }) => {
  test("has a word in both languages for each field that can be typed", () => {
    const schema = z.toJSONSchema(input, { target: "openapi-3.0", io: "input" }) as Json & { definitions?: Record<string, Json> };
    for (const name of fieldNames(schema, schema.definitions ?? {})) {
      for (const t of [en, es]) expect([t.locale, stepWord(name, t) === name.toUpperCase() || t.has(`links.words.${name}`), name]).toEqual([t.locale, true, name]);
    }
  });

  test.each(examples.map((example) => [example.id, example] as const))("shows what was typed and what was answered: %s", (_, example) => {
    for (const t of [en, es]) {
      const typed = inputRows(example.input, t);
      const answered = answerRows(path, answer.parse(calculate(input.parse(example.input))) as Record<string, unknown>, t);
      expect(typed.length).toBeGreaterThan(0);
      expect(answered.length).toBeGreaterThan(0);
      for (const { label, text } of [...typed, ...answered]) expect(`${label} ${text}`).not.toMatch(/undefined|null|NaN|\[object|[a-z][A-Z]/);
    }
  });
});

test("a list is numbered as people count", () => {
  expect(inputRows({ bolts: [{ station: "8" }, { station: "80" }], diagonals: { ac: "1" } }, en).map(({ label, text }) => `${label}: ${text}`)).toEqual(["Bolts 1, Station: 8", "Bolts 2, Station: 80", "Diagonals, AC: 1"]);
});

test("an answer that no list of figures fits is shown by its first lengths and words", () => {
  const length = { in: 1, exact: "1", text: '1"', mm: 25.4, lean: "strong" };
  expect(answerRows("of a calculator yet to come", { verdict: "out", rack: { distance: length, x: 3 }, none: null }, en)).toEqual([
    { path: "verdict", label: "Verdict", text: "out of the limit" },
    { path: "rack.distance", label: "Rack, Distance", text: '1" strong' },
  ]);
});
