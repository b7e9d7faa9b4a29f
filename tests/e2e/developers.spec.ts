import { execFile } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { promisify } from "node:util";
import AxeBuilder from "@axe-core/playwright";
import { expect, test } from "@playwright/test";
import { problemCodes, problems } from "../../api-spec/problems";
import { codeExamples } from "../../components/developers/code-examples";
import { complaints } from "../setup/complaints";

const run = promisify(execFile);

test("the reference lists every operation, shows its fields, and calls the site it is read on, with a clean console", async ({ page, request }) => {
  const heard = complaints(page);
  await page.goto("/developers");
  const reference = page.locator(".api-reference");
  const document = (await (await request.get("/api/v1/openapi.json")).json()) as { paths: Record<string, object> };
  await expect(reference.locator(".opblock")).toHaveCount(Object.keys(document.paths).length);

  await reference.locator("#operations-Calculators-squareness").getByRole("button", { name: /\/v1\/squareness/ }).first().click();
  const operation = reference.locator("#operations-Calculators-squareness");
  await expect(operation.locator("textarea.body-param__text")).toContainText("diagonals");
  await operation.getByRole("button", { name: "Execute" }).click();
  await expect(operation.locator(".live-responses-table tr.response .response-col_status")).toContainText("200");
  await expect(operation.locator(".live-responses-table tr.response .response-col_description")).toContainText('"shape"');
  expect(heard).toEqual([]);
});

test("the reference shows each request's schema @phone-only", async ({ page }) => {
  await page.goto("/es/developers");
  const operation = page.locator("#operations-Calculators-insets");
  await operation.getByRole("button", { name: /\/v1\/insets/ }).first().click();
  await expect(operation.locator("textarea.body-param__text")).toBeVisible();
  expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0);
});

test("the page has a policy of its own, whose only looser parts are the reference's styles and pictures", async ({ request }) => {
  const policy = (await request.get("/developers")).headers()["content-security-policy"]!;
  expect(policy).toContain("style-src 'self' 'unsafe-inline'");
  expect(policy).toContain("img-src 'self' data:");
  expect(policy).not.toMatch(/script-src[^;]*'unsafe-/);
  expect((await request.get("/problems")).headers()["content-security-policy"]).not.toContain("unsafe-inline");
});

test.describe("each example on the page, as it stands there,", () => {
  const ownSite = (code: string, base: string) => code.replaceAll(/https?:\/\/[^\s/`'"]+(?=\/api\/)/g, base);

  test("runs against this site", async ({ page, baseURL }) => {
    await page.goto("/developers");
    const shown = await Promise.all(codeExamples("").map(async ({ id, language, code }) => ({ id, language, code, text: (await page.locator(`#example-${id}`).textContent())! })));
    const folder = mkdtempSync(path.join(os.tmpdir(), "sillwright-examples-"));
    try {
      const outputs: Record<string, string> = {};
      for (const { id, language, code, text } of shown) {
        expect(ownSite(text, "")).toBe(code); // one place holds them all
        const file = path.join(folder, `${id}.${language === "ts" ? "mts" : "sh"}`);
        writeFileSync(file, ownSite(text, baseURL!));
        outputs[id] = (await (language === "ts" ? run(process.execPath, ["--import", "tsx", file]) : run("sh", [file]))).stdout;
      }
      // domain.md S07: 1.5 in over 28 by 24 ft
      expect(JSON.parse(outputs.first!)).toMatchObject({ shape: "racked", verdict: "out", difference: { text: '1 1/2"' } });
      // domain.md N02 for the drop of 7/16 on each side: 28 ft less 7/8 in
      expect(outputs.typescript).toMatch(/^Snap AB at 27' 11 1\/8"; the diagonals must read \d+' \d+( \d+\/\d+)?"\.\n$/);
      expect(JSON.parse(outputs.batch!).items).toMatchObject([{ status: 200, answer: { triangle: { counts: [28, 21, 35] } } }, { status: 200, answer: { feetInches: { text: "28' 7 1/2\"" } } }]);
    } finally {
      rmSync(folder, { recursive: true, force: true });
    }
  });

  test("can be copied @phone", async ({ page, context }) => {
    await context.grantPermissions(["clipboard-read", "clipboard-write"]);
    await page.goto("/developers");
    const block = page.locator(".code-block").first();
    await block.getByRole("button", { name: "Copy" }).click();
    await expect(block.getByRole("button")).toHaveText("Copied");
    expect(await page.evaluate(() => navigator.clipboard.readText())).toBe(await block.locator("pre").textContent());
  });
});

test("every problem the API can answer leads to a page, in both languages", async ({ page, request }) => {
  for (const code of problemCodes) {
    for (const prefix of ["", "/es"]) {
      const response = await request.get(`${prefix}/problems/${code}`);
      expect(response.status(), `${prefix}/problems/${code}`).toBe(200);
      expect(await response.text()).toContain(String(problems[code].status));
    }
  }
  expect((await request.get("/problems/no-such-code")).status()).toBe(404);
  const { type } = (await (await request.get("/api/nowhere")).json()) as { type: string };
  await page.goto(new URL(type).pathname);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Nothing is at this address");
  await page.getByRole("link", { name: "All problems" }).click();
  await expect(page.locator("tbody tr")).toHaveCount(problemCodes.length);
});

test.describe("the running site", () => {
  const post = (body: string) => ({ data: Buffer.from(body), headers: { "content-type": "application/json" } });

  test("answers what Next alone would not: odd methods, odd addresses, too much, in our manner", async ({ request, baseURL }) => {
    for (const method of ["PROPFIND", "TRACE", "PUT", "DELETE"]) {
      const { stdout } = await run("curl", ["-s", "-i", "-X", method, `${baseURL}/api/v1/squareness`]);
      expect(stdout, method).toMatch(/^HTTP\/1.1 405[\s\S]*allow: POST, OPTIONS[\s\S]*"code":"method-not-allowed"/i);
    }
    for (const address of ["/api", "/api/v1", "/api/v1/squareness/x", "/api/v1/%zz", "/api/health/echo"]) {
      const { stdout } = await run("curl", ["-s", "-i", `${baseURL}${address}`]);
      expect(stdout, address).toMatch(/^HTTP\/1.1 404[\s\S]*application\/problem\+json[\s\S]*"code":"not-found"/i);
    }
    const large = await request.post("/api/v1/squareness", post(" ".repeat(2_000_000)));
    expect([large.status(), ((await large.json()) as { code: string }).code]).toEqual([413, "body-too-large"]);
    expect((await request.head("/api/v1/rules")).status()).toBe(200);
  });

  test("counts each address by itself, as its one proxy says, and nobody by what they say of themselves", async ({ request }) => {
    const left = async (forwarded: string, path: string, data: object) => {
      const response = await request.post(`/api/v1/${path}`, { data, headers: { "x-forwarded-for": forwarded } });
      return Number(/;r=(\d+)/.exec(response.headers()["ratelimit"]!)![1]);
    };
    const one = { value: "7/16" };
    const hundred = { items: Array.from({ length: 100 }, () => ({ operation: "conversions", input: one })) };
    const mine = `198.51.100.${Math.floor(Math.random() * 200)}`;
    const first = await left(mine, "conversions", one);
    await Promise.all(Array.from({ length: 20 }, (_, index) => left(`1.2.3.${index}, ${mine}`, "batch", hundred)));
    expect(await left(mine, "conversions", one)).toBeLessThan(first);
    expect(await left(`203.0.113.${Math.floor(Math.random() * 200)}`, "conversions", one)).toBe(first);
  });

  test("serves the document with a tag, and nothing again to whoever has it", async ({ request }) => {
    const first = await request.get("/api/v1/openapi.json");
    expect(((await first.json()) as { openapi: string }).openapi).toBe("3.0.3");
    expect(first.headers()["access-control-allow-origin"]).toBe("*");
    const tag = first.headers()["etag"]!.replace(/^W\//, "");
    expect((await request.get("/api/v1/openapi.json", { headers: { "if-none-match": tag } })).status()).toBe(304);
  });

  test("is ready and alive", async ({ request }) => {
    expect(await (await request.get("/api/health/ready")).json()).toMatchObject({ ready: true, database: "up" });
    expect(await (await request.get("/api/health/live")).json()).toEqual({ live: true });
  });
});

for (const address of ["/developers", "/es/developers", "/problems", "/es/problems/quota-spent"]) {
  test(`${address} passes axe and fits a phone @phone`, async ({ page }) => {
    await page.goto(address);
    if (address.endsWith("/developers")) await expect(page.locator(".api-reference .opblock").first()).toBeVisible();
    const { violations } = await new AxeBuilder({ page }).exclude(".api-reference").analyze();
    expect(violations.map(({ id, nodes }) => [id, nodes.map(({ target }) => target)])).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0);
  });
}
