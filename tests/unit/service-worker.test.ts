import { expect, test } from "vitest";
import { addressOfPage, filesNamedIn, filesNeededBy } from "../../scripts/lib/service-worker.mjs";

test.each([
  ["server/app/en.html", "/"],
  ["server/app/es.html", "/es"],
  ["server/app/en/calculators/inset.html", "/calculators/inset"],
  ["server/app/es/set.html", "/es/set"],
  ["server/app/en/set/texts/squareness.body", "/set/texts/squareness"],
  ["server/app/es/manifest.webmanifest.body", "/es/manifest.webmanifest"],
  ["server/app/manifest.webmanifest.body", "/manifest.webmanifest"],
])("%s is kept under %s", (file, address) => expect(addressOfPage(file)).toBe(address));

test.each(["server/app/en/developers.html", "server/app/es/missing.html", "server/app/_not-found.html", "server/app/sitemap.xml.body", "server/app/api/v1/openapi.json.body", "server/app/en.rsc", "static/chunks/a.js"])("%s is no page to keep", (file) =>
  expect(addressOfPage(file)).toBeNull(),
);

test("scripts are followed to those they fetch later, and styles to their fonts", () => {
  const files: Record<string, string> = {
    "page.html": '<script src="/_next/static/chunks/first.js"></script><link href="/_next/static/chunks/look.css">',
    "static/chunks/first.js": 'load("static/chunks/later-1~x.js"); load("static/chunks/gone.js")',
    "static/chunks/later-1~x.js": 'load("static/chunks/first.js")',
    "static/chunks/look.css": "@font-face{src:url(../media/archivo-s.p.1a.woff2)}",
    "static/media/archivo-s.p.1a.woff2": "",
  };
  const read = (file: string) => {
    const text = files[file];
    if (text === undefined) throw Object.assign(new Error(file), { code: "ENOENT" });
    return text;
  };
  expect([...filesNeededBy(["page.html"], read)].sort()).toEqual(["static/chunks/first.js", "static/chunks/later-1~x.js", "static/chunks/look.css", "static/media/archivo-s.p.1a.woff2"]);
});

test("names are found however they are written", () => expect([...filesNamedIn('a"static/chunks/0a.js"b/_next/static/media/f-s.p.woff2?x')]).toEqual(["static/chunks/0a.js", "static/media/f-s.p.woff2"]));
