import { mkdirSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { buildCurrent, sourceHash, SOURCES } from "@/scripts/lib/build.mjs";
import { placeSite } from "@/scripts/lib/standalone.mjs";

let root: string;
const write = (file: string, text: string) => {
  mkdirSync(path.dirname(path.join(root, file)), { recursive: true });
  writeFileSync(path.join(root, file), text);
};
beforeEach(() => {
  root = mkdtempSync(path.join(os.tmpdir(), "sillwright-build-"));
  write("app/page.tsx", "page");
  write("lib/client/messages/en/home.json", "{}");
  write("next.config.mjs", "config");
});
afterEach(() => rmSync(root, { recursive: true }));

describe("a build is stale", () => {
  test("when a source is changed, added, renamed or removed, or the site's address is another", () => {
    const seen = new Set([sourceHash(root, {})]);
    const differs = () => {
      const { size } = seen;
      seen.add(sourceHash(root, {}));
      return seen.size > size;
    };
    write("app/page.tsx", "page 2");
    expect(differs()).toBe(true);
    write("components/a.tsx", "");
    expect(differs()).toBe(true);
    rmSync(path.join(root, "components/a.tsx"));
    write("components/b.tsx", "");
    expect(differs()).toBe(true);
    rmSync(path.join(root, "lib"), { recursive: true });
    expect(differs()).toBe(true);
    expect(sourceHash(root, { SITE_URL: "https://layout.example.com" })).not.toBe(sourceHash(root, {}));
  });

  test("not when a test or a text about the project is changed", () => {
    const before = sourceHash(root, {});
    write("tests/unit/a.test.ts", "test");
    write("README.md", "read");
    write(".data/log/site.log", "log");
    expect(sourceHash(root, {})).toBe(before);
  });

  test("when it was never finished", () => {
    expect(buildCurrent(root)).toBe(false);
    write(".next/sillwright-build.json", JSON.stringify({ hash: sourceHash(root) }));
    expect(buildCurrent(root)).toBe(false);
    write(".next/standalone/server.js", "");
    expect(buildCurrent(root)).toBe(true);
    write("app/page.tsx", "page 3");
    expect(buildCurrent(root)).toBe(false);
  });

  test("by every folder and file of this checkout that can go into the site", () => {
    const others = [
      "node_modules", "scripts", "tests", "migrations", "README.md", "DEVELOPERS.md", "LICENSE", "package.json", "next-env.d.ts", "tsconfig.tsbuildinfo", "eslint.config.mjs",
      "vitest.config.ts", "playwright.config.ts", "next.openapi.json", "test-results", "playwright-report", "coverage",
    ];
    expect(readdirSync(".").filter((name) => !name.startsWith(".") && !SOURCES.includes(name) && !others.includes(name))).toEqual([]);
  });
});

test("a site is placed once per build, and what earlier builds left is removed", () => {
  write(".next/standalone/server.js", "first");
  const folder = path.join(root, ".data/site");
  const first = placeSite(root, folder, "one");
  expect(readdirSync(first)).toEqual(["server.js"]);
  write(".data/site/two.unfinished/server.js", "half");
  placeSite(root, folder, "two");
  expect(readdirSync(folder)).toEqual(["two"]);
});
