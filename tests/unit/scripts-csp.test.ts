import { createHash } from "node:crypto";
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { inlineScripts, policyFor, writeSecurityHeaders } from "@/scripts/lib/csp.mjs";

const hash = (text: string) => `'sha256-${createHash("sha256").update(text).digest("base64")}'`;
const page = '<html><script src="/_next/a.js" async=""></script><script>one()</script><SCRIPT id="x">two("ñ")</SCRIPT><script type="application/ld+json">{"a":1}</script><script>one()</script><script></script></html>';
const directive = (policy: string, name: string) => policy.split("; ").find((part) => part.startsWith(`${name} `));

describe("a page's policy", () => {
  test("names the scripts written into it by hash, each once, and no other", () => {
    expect(inlineScripts(page)).toEqual(["one()", 'two("ñ")', "one()"]);
    expect(directive(policyFor(page, "/"), "script-src")).toBe(`script-src 'self' ${[hash("one()"), hash('two("ñ")')].sort().join(" ")}`);
  });

  test("matches the hash a browser prints for a known script", () => {
    // From the CSP3 recommendation's own example: alert('Hello, world.');
    expect(policyFor("<script>alert('Hello, world.');</script>", "/")).toContain("'sha256-qznLcsROx4GACP2dm0UCKCzCG+HiZ1guq6ZZDob/Tng='");
  });

  test("allows nothing inline and nothing from elsewhere", () => {
    const policy = policyFor(page, "/calculators/corner");
    expect(policy).not.toContain("unsafe");
    expect(policy).toContain("default-src 'none'");
    for (const name of ["base-uri", "frame-ancestors", "object-src"]) expect(directive(policy, name)).toBe(`${name} 'none'`);
    for (const name of ["style-src", "font-src", "connect-src", "form-action", "manifest-src", "worker-src"]) expect(directive(policy, name)).toBe(`${name} 'self'`);
  });

  test("lets the API reference alone write styles, in each language", () => {
    for (const address of ["/developers", "/en/developers", "/es/developers"]) {
      expect(directive(policyFor(page, address), "style-src")).toBe("style-src 'self' 'unsafe-inline'");
      expect(directive(policyFor(page, address), "script-src")).not.toContain("unsafe");
    }
    for (const address of ["/developers-x", "/en", "/es/calculators/developers"]) expect(policyFor(page, address)).not.toContain("unsafe");
  });
});

describe("after a build", () => {
  let folder: string;
  beforeEach(() => {
    folder = mkdtempSync(path.join(os.tmpdir(), "sillwright-csp-"));
    for (const build of ["a", "b"]) {
      mkdirSync(path.join(folder, build, "server/app/en"), { recursive: true });
      writeFileSync(path.join(folder, build, "server/app/en.html"), page);
      writeFileSync(path.join(folder, build, "server/app/en.meta"), JSON.stringify({ headers: { "x-next-cache-tags": "t" }, status: 200 }));
      writeFileSync(path.join(folder, build, "server/app/en/developers.html"), "<script>three()</script>");
    }
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  test("each prerendered page has its own policy beside it, what Next wrote there is kept, and doing it twice changes nothing", () => {
    const builds = [path.join(folder, "a"), path.join(folder, "b"), path.join(folder, "absent")];
    expect(writeSecurityHeaders(builds)).toBe(2);
    const read = () => ["a", "b"].flatMap((build) => ["en.meta", "en/developers.meta"].map((file) => readFileSync(path.join(folder, build, "server/app", file), "utf8")));
    const first = read();
    writeSecurityHeaders(builds);
    expect(read()).toEqual(first);
    const [home, developers] = first.map((text) => JSON.parse(text));
    expect(home).toEqual({ status: 200, headers: { "x-next-cache-tags": "t", "content-security-policy": policyFor(page, "/en") } });
    expect(developers.headers["content-security-policy"]).toContain(hash("three()"));
    expect(developers.headers["content-security-policy"]).toContain("'unsafe-inline'");
  });
});
