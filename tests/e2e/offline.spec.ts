import { createServer, request } from "node:http";
import type { AddressInfo } from "node:net";
import { expect, test, type BrowserContext, type Page } from "@playwright/test";

test.use({ serviceWorkers: "allow" });

/** One visit, until the worker has everything and answers for this page. */
async function visitOnce(page: Page, address = "/"): Promise<void> {
  await page.goto(address);
  await page.waitForFunction(() => navigator.serviceWorker.controller !== null, undefined, { timeout: 40_000 });
}

async function cut(context: BrowserContext): Promise<void> {
  await context.setOffline(true);
}

test("after one visit every calculator and the set answer without signal, by address, in both languages", async ({ page, context }) => {
  test.slow();
  await visitOnce(page);
  const sitemap = await (await page.request.get("/sitemap.xml")).text();
  const paths = [...sitemap.matchAll(/<loc>([^<]+)<\/loc>/g)].map(([, address]) => new URL(address!).pathname).filter((path) => !path.endsWith("/developers"));
  expect(paths).toContain("/es/set");
  await cut(context);
  for (const path of paths) {
    const response = await page.goto(path);
    expect(response?.status(), path).toBe(200);
    expect(response?.fromServiceWorker(), path).toBe(true);
    await expect(page.getByRole("heading", { level: 1 }).first(), path).toBeVisible();
  }
});

test("without signal a calculator opened by its address answers what the address says @phone", async ({ page, context }) => {
  await visitOnce(page);
  await cut(context);
  await page.goto("/calculators/squareness?length=28%27&width=22%27&burn=1%20in&diagonals.ac=428%209%2F16&diagonals.bd=428%201%2F16");
  await expect(page.locator(".verdict")).toContainText("1/2");
});

test("the job is done without signal, tapping from the first page on, and is there after a reload @phone", async ({ page, context }) => {
  test.slow();
  await visitOnce(page);
  await cut(context);
  await page.getByRole("link", { name: "Start a foundation" }).click();
  await page.getByLabel("Name of the foundation").fill("Lot 21");
  await page.getByRole("button", { name: "Start a set" }).click();
  const stage = async (name: string) => {
    if (!(await page.locator(".stage-rail").isVisible())) await page.locator(".set-place a").click();
    await page.locator(`.stage-rail a[href*="stage=${name}"]`).click();
  };
  await stage("concrete");
  await page.getByRole("textbox", { name: "Length A-B" }).fill("28'");
  await page.getByRole("textbox", { name: "Width A-D" }).fill("22'");
  await page.getByRole("textbox", { name: "Diagonal A-C" }).fill("427 5/16");
  await page.getByRole("textbox", { name: "Diagonal B-D" }).fill("427 5/16");
  await stage("chalk");
  // 28' less two insets of 7/16
  await expect(page.locator(".verdict-title")).toContainText("27' 11 1/8\"");
  await stage("recheck");
  await page.getByRole("textbox", { name: "Diagonal A-C" }).fill("426 1/16");
  await page.getByRole("textbox", { name: "Diagonal B-D" }).fill("426 1/16");
  await expect(page.locator(".verdict-title")).toBeVisible();
  await page.getByRole("button", { name: "Read it big" }).click();
  await expect(page.getByRole("dialog").getByText("Diagonals differ by")).toBeVisible();
  await page.getByRole("dialog").getByRole("button", { name: "Close" }).click();
  await stage("bolts");
  await expect(page.getByRole("textbox", { name: "Piece 1 ends" })).toHaveValue("335 1/8 in");
  await page.reload();
  await expect(page.getByRole("textbox", { name: "Piece 1 ends" })).toHaveValue("335 1/8 in");
  // The plates are planned by a worker, which has to be there without signal too.
  for (const name of ["plates", "takeoff", "marks"]) {
    await stage(name);
    await expect(page.locator(".verdict:not([data-tone=idle]) .verdict-title")).toBeVisible({ timeout: 30_000 });
  }
  if (!(await page.locator(".stage-rail").isVisible())) await page.locator(".set-place a").click();
  // 27' 11 1/8" at 16 in on centre: marks at 15 1/4, 31 1/4 … the 20th at 319 1/4 is the last before the end
  await expect(page.locator('.stage-rail a[href*="stage=marks"]')).toContainText("20 marks");
  await expect(page.locator(".set-plan svg.plan")).toHaveAccessibleName(/plate pieces.*joist marks/);
});

test("a page that needs signal says so in its language, and the way on works", async ({ page, context }) => {
  await visitOnce(page);
  await cut(context);
  await page.goto("/c/abcdefgh");
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("No signal, and this page needs it");
  await page.goto("/es/calculators/squareness/answer?length=28");
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Sin señal, y esta página la necesita");
  await page.getByRole("link", { name: "Ir a sus trazos" }).click();
  await expect(page.locator("html")).toHaveAttribute("lang", "es");
  await expect(page.getByRole("button", { name: "Empezar un trazo" })).toBeVisible();
});

test("the worker is asked for anew each time, keeps no answer of the API, and pages made at request time stay out of its caches", async ({ page }) => {
  const worker = await page.request.get("/sw.js");
  expect(worker.headers()["cache-control"]).toBe("no-cache");
  await visitOnce(page);
  await page.evaluate(() => fetch("/api/health/live"));
  await page.goto("/calculators/squareness/answer?length=28");
  const kept = await page.evaluate(async () => {
    const names = await caches.keys();
    return (await Promise.all(names.map(async (name) => (await (await caches.open(name)).keys()).map(({ url }) => new URL(url).pathname)))).flat();
  });
  expect(kept.length).toBeGreaterThan(50);
  expect(kept.filter((path) => /^\/(?:es\/)?(?:api|c)\/|\/answer$|^\/(?:es\/)?developers/.test(path))).toEqual([]);
});

/** The site behind an address of its own, whose worker can be replaced as by a new edition. */
async function siteWithEditions(baseURL: string): Promise<{ address: string; publish: () => void; close: () => void }> {
  let edition = "";
  const server = createServer((incoming, outgoing) => {
    const target = request(new URL(incoming.url ?? "/", baseURL), { method: incoming.method, headers: { ...incoming.headers, host: new URL(baseURL).host, "accept-encoding": "identity" } }, (answer) => {
      const headers = { ...answer.headers };
      const isWorker = incoming.url === "/sw.js";
      if (isWorker) for (const name of ["content-length", "etag", "last-modified"]) delete headers[name];
      outgoing.writeHead(answer.statusCode ?? 502, headers);
      if (!isWorker) return void answer.pipe(outgoing);
      answer.pipe(outgoing, { end: false });
      answer.on("end", () => outgoing.end(edition));
    });
    target.on("error", () => outgoing.destroy());
    incoming.pipe(target);
  });
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  return { address: `http://localhost:${(server.address() as AddressInfo).port}`, publish: () => (edition += "\n// another edition"), close: () => void server.close() };
}

test("a new version is offered, not forced: the page goes on until it is asked for, and other tabs are told", async ({ page, context, baseURL }) => {
  test.slow();
  const site = await siteWithEditions(baseURL!);
  await visitOnce(page, `${site.address}/set`);
  const other = await context.newPage();
  await other.goto(`${site.address}/calculators`);
  site.publish();
  await page.waitForTimeout(2_500); // the page registers a moment after it has loaded
  await page.evaluate(async () => void (await (await navigator.serviceWorker.getRegistration())!.update()));
  await expect(page.getByText("A new version of the site is ready.")).toBeVisible({ timeout: 30_000 });
  await page.getByLabel("Name of the foundation").fill("typed before");
  await expect(page.getByLabel("Name of the foundation")).toHaveValue("typed before");
  await Promise.all([page.waitForEvent("load"), page.getByRole("button", { name: "Use it now" }).click()]);
  await expect(page.getByText("A new version of the site is ready.")).toHaveCount(0);
  expect(await page.evaluate(async () => (await navigator.serviceWorker.getRegistration())?.waiting ?? null)).toBeNull();
  await expect(other.getByText("Another tab moved to the new version.")).toBeVisible();
  site.close();
});

test("the site can be installed: a manifest in each language, with its icons", async ({ page }) => {
  for (const [address, start] of [["/", "/set"], ["/es", "/es/set"]] as const) {
    await page.goto(address);
    const manifest = await (await page.request.get((await page.locator("link[rel=manifest]").getAttribute("href"))!)).json();
    expect([manifest.start_url, manifest.display]).toEqual([start, "standalone"]);
    for (const { src, sizes } of manifest.icons) expect((await page.request.get(src)).status(), `${src} ${sizes}`).toBe(200);
    expect(manifest.icons.map(({ sizes }: { sizes: string }) => sizes)).toEqual(expect.arrayContaining(["192x192", "512x512"]));
  }
});
