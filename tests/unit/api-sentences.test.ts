import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { z } from "zod";
import { answerTo, issuesOf } from "@/calculators/schema";
import { operations } from "@/calculators";
import { problemCodes } from "@/api-spec";
import { apiTranslate, issueSentence } from "@/lib/http/sentences";
import { locales } from "@/lib/client/i18n/locales";

const sources = readdirSync("calculators", { recursive: true, encoding: "utf8" }).filter((file) => file.endsWith(".ts")).map((file) => readFileSync(path.join("calculators", file), "utf8"));

/** Every code the core's sources name: of lengths, of the shared fields, and those a calculator throws or refuses with. */
function codesNamed(): Set<string> {
  const codes = new Set<string>();
  const patterns = [/\brefuse\("([a-z-]+)"/g, /\borRequired\("([a-z-]+)"/g, /\borCode\("([a-z-]+)"/g, /LengthError\("([a-z-]+)"/g, /\bcode: "([a-z-]+)"[^}]*params/g, /pointer[^{}]*code: "([a-z-]+)"/g, /\bat\("([a-z-]+)"/g, /\bissue\([^()]*"([a-z-]+)"/g];
  for (const source of sources) for (const pattern of patterns) for (const [, code] of source.matchAll(pattern)) codes.add(code!);
  for (const other of ["custom", "bc", "cd"]) codes.delete(other); // zod's own word for all of ours, and sides given to a function of that name
  return codes;
}

/** A figure for whatever a sentence asks for. */
const params = new Proxy({} as Record<string, number>, { get: () => 1, has: () => true });

describe.each(locales)("in %s", (locale) => {
  const t = apiTranslate(locale);

  test("every code the core can give has a sentence that says what to type instead", () => {
    const codes = codesNamed();
    expect(codes.size).toBeGreaterThan(30);
    expect([...codes].filter((code) => !t.has(`errors.${code}`)).join()).toBe("");
    for (const code of codes) expect(t(`errors.${code}`, params), code).toMatch(/^\S.*[.!]$/);
  });

  test("every problem has a title, a sentence, a cause and a remedy", () => {
    for (const code of problemCodes) for (const part of ["title", "detail", "cause", "remedy"]) expect(t.has(`developers.problems.${code}.${part}`), `${code} ${part}`).toBe(true);
  });
});

/** Values that no field of any calculator is meant for. */
const wrong = [undefined, null, true, [], {}, "", " ", "x", "-1", "0", "28 7", "1/0", "3 5/4", "99999 ft", "9".repeat(70), 1e308, -1, 0, 0.1, [null], { nope: 1 }];

test("whatever is sent to any field of any calculator, each fault it is told has a sentence", () => {
  const t = apiTranslate("en");
  const unsaid = new Set<string>();
  for (const operation of operations.values()) {
    const schema = z.toJSONSchema(operation.input, { target: "openapi-3.0", io: "input" }) as { properties: Record<string, unknown> };
    for (const { input } of operation.examples) {
      for (const field of Object.keys(schema.properties)) {
        for (const value of wrong) {
          for (const { code, params: figures } of answerTo(operation, { ...input, [field]: value }).issues) {
            if (!t.has(`errors.${code}`)) unsaid.add(code);
            else expect(t(`errors.${code}`, { example: "12 ft", ...figures }), code).not.toMatch(/undefined/); // and its figures are all there
          }
        }
      }
    }
    for (const value of wrong) {
      const parsed = operation.input.safeParse(value);
      if (!parsed.success) for (const { code } of issuesOf(parsed.error)) if (!t.has(`errors.${code}`)) unsaid.add(code);
    }
  }
  expect([...unsaid].join()).toBe("");
});

test("a code without a sentence, or without a figure its sentence asks for, is answered with the general one: a refusal never fails", () => {
  const general = apiTranslate("en")("errors.not-valid");
  expect(issueSentence(apiTranslate("en"), { pointer: "", code: "yet-unknown", params: {} })).toBe(general);
  expect(issueSentence(apiTranslate("en"), { pointer: "", code: "two-readings", params: {} })).toBe(general);
});
