import { existsSync, readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, test } from "vitest";
import { z } from "zod";
import { calculatorOf, calculators, operations } from "@/calculators";
import { answerTo } from "@/calculators/schema";
import { catalogue, type MessageTree, type Namespace } from "@/lib/client/i18n/catalogue";
import { locales } from "@/lib/client/i18n/locales";

const root = process.cwd();
const named = calculators.map((calculator) => [calculator.name, calculator] as const);
const examples = calculators.flatMap((calculator) =>
  calculator.operations.flatMap((operation) => operation.examples.map((example) => ({ calculator, operation, example, label: `${operation.path} ${example.id}` }))),
);

/** The message at a dotted key, or undefined. */
function messageAt(tree: MessageTree | string | undefined, key: string): string | undefined {
  const found = key.split(".").reduce<MessageTree | string | undefined>((node, step) => (typeof node === "object" ? node[step] : undefined), tree);
  return typeof found === "string" ? found : undefined;
}

describe("the registry", () => {
  test("lists what is built, in the order of the job, each once", () => {
    expect(calculators.map(({ name }) => name)).toEqual(["squareness", "footprint", "level", "corner", "inset", "fit", "anchors", "plates", "takeoff", "marks", "conversions"]);
    const stages = calculators.flatMap(({ stage }) => (stage === null ? [] : [stage]));
    expect(stages).toEqual([...stages].sort((a, b) => a - b));
    for (const stage of stages) expect(stage).toSatisfy((value: number) => Number.isInteger(value) && value >= 1 && value <= 7);
  });

  test("no two operations share a path or an id, and each leads back to its calculator", () => {
    const all = calculators.flatMap((calculator) => calculator.operations.map((operation) => ({ calculator, operation })));
    expect(new Set(all.map(({ operation }) => operation.path)).size).toBe(all.length);
    expect(new Set(all.map(({ operation }) => operation.id)).size).toBe(all.length);
    for (const { calculator, operation } of all) {
      expect(operations.get(operation.path)).toBe(operation);
      expect(calculatorOf(operation.path)).toBe(calculator);
    }
    expect([...operations.keys()].sort()).toEqual(["anchors/check", "anchors/layout", "conversions", "corners", "fits", "footprints", "insets", "levels", "marks", "plates", "squareness", "takeoffs"]); // product.md's table
  });

  // A new calculator is a folder, a line in the registry, a reference file and a page text: style.md
  test.each(named)("%s has its folder, its reference file, its two pages, and its page text in both languages", (name, calculator) => {
    const missing = [
      `calculators/${name}/index.ts`,
      ...["page.tsx", "answer/page.tsx"].map((page) => `app/[locale]/calculators/${name}/${page}`),
      `components/calculators/${name}/core.ts`,
    ].filter((path) => !existsSync(join(root, path)));
    if (![`${name}.ts`, `${name}-rows.ts`].some((file) => existsSync(join(root, "tests/reference", file)))) missing.push(`tests/reference/${name}.ts`);
    const texts = ["title", "intro", "description", "method.1", "showMe.1", ...calculator.operations.flatMap((operation) => operation.examples.map(({ id }) => `examples.${id}`))];
    for (const locale of locales) {
      for (const text of texts) if (!messageAt(catalogue[locale][name as Namespace], `page.${text}`)?.trim()) missing.push(`lib/client/messages/${locale}/${name}.json page.${text}`);
      if (!messageAt(catalogue[locale].common, `calculators.${name}`)) missing.push(`lib/client/messages/${locale}/common.json calculators.${name}`);
      for (const caution of calculator.cautions) if (!messageAt(catalogue[locale].cautions, caution)) missing.push(`lib/client/messages/${locale}/cautions.json ${caution}`);
    }
    expect(missing).toEqual([]);
  });

  test.each(named)("%s has a version, sources with their standing, and examples", (_name, calculator) => {
    expect(calculator.version).toMatch(/^\d+\.\d+\.\d+$/);
    expect(calculator.sources.length).toBeGreaterThan(0);
    for (const source of calculator.sources) {
      expect(source.title.trim()).not.toBe("");
      expect(["read", "second-hand", "memory", "derived", "practice"]).toContain(source.status);
      if (source.address !== undefined) expect(new URL(source.address).protocol).toBe("https:");
    }
    if (calculator.stage !== null) expect(calculator.cautions.length).toBeGreaterThan(0); // every step of the job has some
    for (const operation of calculator.operations) expect(operation.examples.length).toBeGreaterThan(0);
    const ids = calculator.operations.flatMap((operation) => operation.examples.map(({ id }) => id));
    expect(new Set(ids).size).toBe(ids.length);
  });

  test.each(named)("the function of %s says in its docstring what units, what source and an example", (name, calculator) => {
    for (const { calculate } of calculator.operations) {
      const comment = docstringOf(name, calculate.name);
      expect(comment, `${name}: a docstring before ${calculate.name}`).toBeDefined();
      for (const word of ["Units:", "Source:", "@example"]) expect(comment, `${calculate.name} in ${name}`).toContain(word);
    }
  });

  test.each(named)("schemas of %s can be written down as JSON Schema, every field described", (_name, calculator) => {
    for (const operation of calculator.operations) {
      const input = z.toJSONSchema(operation.input, { io: "input", target: "openapi-3.0", unrepresentable: "throw" }) as { type?: string; properties?: Record<string, { description?: string }>; additionalProperties?: boolean };
      expect(input.type).toBe("object");
      expect(input.additionalProperties).toBe(false);
      expect(Object.keys(input.properties ?? {})).toEqual(expect.arrayContaining(["unit", "precision"]));
      expect(() => z.toJSONSchema(operation.answer, { io: "output", target: "openapi-3.0" })).not.toThrow();
    }
  });
});

describe("worked examples", () => {
  test.each(examples)("$label gives what its source says", ({ operation, example }) => {
    const { answer, issues } = answerTo(operation, example.input);
    expect(issues).toEqual([]);
    expect(answer).toMatchObject(example.answer);
    expect(example.source.trim()).not.toBe("");
  });

  test.each(examples)("$label answers plain JSON in the documented shape", ({ operation, example }) => {
    const { answer } = answerTo(operation, example.input);
    expect(operation.answer.parse(answer)).toEqual(answer);
    expect(JSON.parse(JSON.stringify(answer))).toEqual(answer);
  });

  test.each(examples)("$label answers the same twice, and leaves its input alone", ({ operation, example }) => {
    const before = JSON.stringify(example.input);
    expect(answerTo(operation, example.input)).toEqual(answerTo(operation, example.input));
    expect(JSON.stringify(example.input)).toBe(before);
  });
});

/** The comment right before the function's declaration, wherever in the calculator's folder that is. */
function docstringOf(name: string, functionName: string): string | undefined {
  const folder = join(root, "calculators", name);
  const sources = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((file) => file.endsWith(".ts"));
  for (const file of sources) {
    const text = readFileSync(join(folder, file), "utf8");
    const declared = new RegExp(`/\\*\\*((?:(?!\\*/)[\\s\\S])*)\\*/\\s*export (?:function|const) ${functionName}\\b`).exec(text);
    if (declared !== null) return declared[1];
  }
  return undefined;
}
