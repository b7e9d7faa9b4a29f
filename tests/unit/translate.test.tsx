import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, test } from "vitest";
import { loadMessages } from "@/lib/client/i18n/load-messages";
import { localePath, pathWithoutLocale } from "@/lib/client/i18n/locales";
import { createTranslate, type Messages } from "@/lib/client/i18n/translate";

const messages: Messages = {
  "test.plain": "Pull both diagonals.",
  "test.named": ["Move side ", ["side"], " ", ["length"], "."],
  "test.bold": ["Move it ", ["b", ["length"]], " toward ", ["corner"]],
};
const t = createTranslate("en", messages);
const html = (node: React.ReactNode) => renderToStaticMarkup(<>{node}</>);

describe("a translated sentence", () => {
  test("is plain text with its values", () => expect(t("test.named", { side: "CD", length: "5/16" })).toBe("Move side CD 5/16."));
  test("may carry elements as values", () => expect(html(t.rich("test.named", { side: "CD", length: <i>5/16</i> }))).toBe("Move side CD <i>5/16</i>."));
  test("may carry elements inside a tag", () => expect(html(t.rich("test.bold", { length: <i>5/16</i>, corner: "D" }))).toBe("Move it <b><i>5/16</i></b> toward D"));
  test("that does not exist fails where pages are built", () => expect(() => t("test.none")).toThrow('No message "test.none" in en'));
  test("can be asked for", () => expect([t.has("test.plain"), t.has("test.none")]).toEqual([true, false]));
});

test("compiled messages are plain JSON, fit to be a prop of a client component", () => {
  const loaded = loadMessages("es", ["common"]);
  expect(JSON.parse(JSON.stringify(loaded))).toEqual(loaded);
  expect(loaded["common.nav.calculators"]).toBe("Calculadoras");
});

test("a count is said in the language's own plural", () => {
  const spanish = createTranslate("es", loadMessages("es", ["common"]));
  expect([spanish("common.errors.title", { count: 1 }), spanish("common.errors.title", { count: 3 })]).toEqual(["Hay que revisar una cosa", "Hay que revisar 3 cosas"]);
});

test.each([
  ["en", "/", "/"],
  ["en", "/calculators/inset?inset=7%2F16", "/calculators/inset?inset=7%2F16"],
  ["es", "/", "/es"],
  ["es", "/?x=1", "/es?x=1"],
  ["es", "/calculators", "/es/calculators"],
] as const)("in %s the page %s stands at %s", (locale, path, address) => expect(localePath(locale, path)).toBe(address));

test.each([
  ["/", "/"],
  ["/es", "/"],
  ["/en", "/"],
  ["/es/terms", "/terms"],
  ["/en/terms", "/terms"],
  ["/terms", "/terms"],
  ["/escape", "/escape"],
])("the address %s is the page %s", (address, path) => expect(pathWithoutLocale(address)).toBe(path));
