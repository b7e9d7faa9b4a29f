import { existsSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { calculators } from "@/calculators";
import { answerTo } from "@/calculators/schema";
import { stageCalculators } from "@/components/set/stage-calculators";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { adapterOf } from "@/lib/client/set/calculations";
import { readable } from "@/lib/client/set/readable";
import { readingsOf } from "@/lib/client/set/readings";
import { stagesWith } from "@/lib/client/set/stages";

const staged = calculators.filter(({ stage }) => stage !== null);

describe.each(staged.map((calculator) => [calculator.name, calculator] as const))("%s, a calculator of a stage,", (name, calculator) => {
  test("can be opened in a set", () => {
    expect(Object.keys(stageCalculators)).toContain(name);
    expect(existsSync(`components/calculators/${name}/${name}-calculator.tsx`)).toBe(true);
    expect(stagesWith(calculators.map((known) => known.name)).some(({ main, beside }) => [...main, ...beside].includes(name))).toBe(true);
  });

  test.each(calculator.operations.flatMap((operation) => operation.examples.map((example) => [example.id, operation, example] as const)))("tells its key figure, its layers and what it gives for the example %s, in both languages", (_, operation, { input }) => {
    const adapter = adapterOf(name)!;
    const { answer } = answerTo(operation, input);
    expect(answer).not.toBeNull();
    const asked = { unit: "in" as const, input, wall: "ab" };
    expect(adapter.operation(answer)).toBe(operation.path);
    const key = adapter.key(answer);
    for (const locale of ["en", "es"] as const) expect(getTranslate(locale, ["set"])(`set.key.${name}.${key.code}`, key.params)).not.toBe("");
    for (const text of Object.values(adapter.gives(answer, asked))) expect(text).not.toMatch(/undefined|NaN|null|e-\d/);
    expect(JSON.stringify(adapter.layers(answer, asked))).not.toContain("null,null");
  });
});

test.each([...calculators].filter(({ name }) => readable.includes(name)).flatMap(({ name, operations }) => operations.flatMap(({ examples }, index) => examples.map((example) => [name, example.id, index] as const))))(
  "the figures of %s, example %s, have names in both languages",
  async (name, id, index) => {
    const operation = calculators.find((calculator) => calculator.name === name)!.operations[index]!;
    const { answer } = answerTo(operation, operation.examples.find((example) => example.id === id)!.input);
    for (const { key, params, text } of await readingsOf(name, answer)) {
      expect(text).not.toBe("");
      for (const locale of ["en", "es"] as const) expect(getTranslate(locale, ["set"])(`set.readings.${key}`, params as Record<string, string | number>)).not.toBe("");
    }
  },
);

test("every calculator that has a page can be read big", () => expect(calculators.map(({ name }) => name).filter((name) => !readable.includes(name))).toEqual([]));
