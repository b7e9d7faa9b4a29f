import compile from "icu-minify/compile";
import * as fontkit from "fontkit";
import { describe, expect, test } from "vitest";
import { catalogue, namespaces, type MessageTree } from "@/lib/client/i18n/catalogue";

/** Every message of a language by its full key. */
function flatten(tree: MessageTree, prefix: string): [string, string][] {
  return Object.entries(tree).flatMap(([key, message]) => (typeof message === "string" ? [[`${prefix}.${key}`, message]] : flatten(message, `${prefix}.${key}`)));
}
const english = new Map(namespaces.flatMap((namespace) => flatten(catalogue.en[namespace], namespace)));
const spanish = new Map(namespaces.flatMap((namespace) => flatten(catalogue.es[namespace], namespace)));

/** The arguments and tags a compiled message asks for, with the choices of a select. */
function placeholders(message: unknown, found = new Set<string>()): Set<string> {
  if (!Array.isArray(message)) return found;
  for (const node of message) {
    if (!Array.isArray(node)) continue;
    const [name, type, detail] = node as [string, unknown, unknown];
    if (type === 1) found.add(`${name} one of ${Object.keys(detail as object).sort().join(", ")}`);
    else found.add(`${name}${type === undefined ? "" : typeof type === "number" && type !== 0 ? ` type ${type}` : " tag"}`);
    if (type === 1 || type === 2 || type === 3) for (const branch of Object.values(detail as object)) placeholders(branch, found);
    else if (typeof type !== "number" && type !== undefined) placeholders(node.slice(1), found);
  }
  return found;
}

test("both languages have the same keys", () => expect([...spanish.keys()].sort()).toEqual([...english.keys()].sort()));

test("no message is empty", () => {
  const empty = [...english, ...spanish].filter(([, message]) => message.trim() === "").map(([key]) => key);
  expect(empty).toEqual([]);
});

describe("every message", () => {
  test.each([...english.keys()])("%s is filled with the same values in both languages", (key) => {
    expect([...placeholders(compile(spanish.get(key) ?? ""))].sort()).toEqual([...placeholders(compile(english.get(key)!))].sort());
  });
});

test.each(["archivo", "atkinson-next", "atkinson-mono"])("every character of the messages is in the shipped font %s", (name) => {
  const font = fontkit.openSync(`app/fonts/${name}.woff2`);
  const characters = new Set([...english.values(), ...spanish.values()].join(""));
  const missing = [...characters].filter((character) => character !== "\n" && !font.hasGlyphForCodePoint(character.codePointAt(0)!));
  expect(missing).toEqual([]);
});

test("numbers are printed with a point in both languages", () => {
  // `es` alone prints 12.345,5; es-US prints 12,345.5 (ICU 78, looked up with Intl in Node 20)
  expect(new Intl.NumberFormat("es-US").format(12345.5)).toBe("12,345.5");
});
