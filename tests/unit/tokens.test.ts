import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";

const css = readFileSync("app/styles/tokens.css", "utf8");

/** Every `selector { … }` that sets tokens, in the order of the file. */
const blocks = [...css.matchAll(/([^{}]+)\{([^{}]*--page[^{}]*)\}/g)].map(([, selector = "", body = ""]) => ({
  selector: selector.split("\n").at(-1)!.trim(),
  tokens: Object.fromEntries([...body.matchAll(/--([a-z0-9-]+): (#[0-9a-f]{6});/g)].map(([, name, value]) => [name!, value!])),
}));
const named = (selector: string) => blocks.find((block) => block.selector === selector)!.tokens;
const themes = { light: named(":root"), dark: named('html[data-theme="dark"]'), sun: named('html[data-theme="sun"]') };

/** WCAG 2.2, relative luminance and contrast ratio, as its definitions give them. */
function luminance(hex: string): number {
  const [red, green, blue] = [1, 3, 5].map((at) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * red! + 0.7152 * green! + 0.0722 * blue!;
}
function contrast(one: string, other: string): number {
  const [light, dark] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (light! + 0.05) / (dark! + 0.05);
}

const surfaces = ["page", "sheet", "field"];
const texts = ["ink", "ink-2", "chalk", "keel", "plumb", "amber"];
const softs = ["chalk", "keel", "plumb", "amber"];
const textPairs = [
  ...surfaces.flatMap((surface) => texts.map((text) => [text, surface])),
  ...softs.flatMap((soft) => [[soft, `${soft}-soft`], ["ink", `${soft}-soft`], ["ink-2", `${soft}-soft`]]),
  ["ink", "concrete"], ["ink", "blade"], ["on-chalk", "chalk"], ["on-ink", "ink"], ["on-ink", "keel"], ["on-ink", "plumb"], ["on-ink", "amber"], ["band-ink", "band"], ["code-ink", "code"],
] as [string, string][];
const linePairs = [
  ...[...surfaces, "concrete"].flatMap((surface) => ["chalk-line", "edge-strong", "timber-edge", "steel", "keel", "ink"].map((line) => [line, surface])),
  ...[...surfaces, "blade"].map((surface) => ["edge", surface]),
  ["timber-edge", "timber"], ["steel", "timber"], ["chalk-line", "timber"], ["ink", "blade"], ["keel", "blade"],
  ["focus", "page"], ["focus", "sheet"], ["focus", "field"],
] as [string, string][];

test("black on white is 21 to 1", () => expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 10)); // WCAG 2.2, note to contrast ratio

describe.each(Object.entries(themes))("in the %s theme", (_, tokens) => {
  test.each(textPairs)("text %s on %s keeps 7 to 1", (text, surface) => expect(contrast(tokens[text]!, tokens[surface]!)).toBeGreaterThanOrEqual(7));
  test.each(linePairs)("lines %s on %s keep 3 to 1", (line, surface) => expect(contrast(tokens[line]!, tokens[surface]!)).toBeGreaterThanOrEqual(3));
});

test("every theme sets every token", () => {
  for (const tokens of Object.values(themes)) expect(Object.keys(tokens)).toEqual(Object.keys(themes.light));
});

test("dark by the device is dark by choice", () => expect(named("html:not([data-theme])")).toEqual(themes.dark));

test("the browser's own bar has the colors of the header", () => {
  const layout = readFileSync("app/[locale]/layout.tsx", "utf8");
  expect(layout).toContain(`color: "${themes.light.sheet}"`);
  expect(layout).toContain(`color: "${themes.dark.sheet}"`);
});
