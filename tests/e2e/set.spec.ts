import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { readFile } from "node:fs/promises";

/** Opens a stage from wherever the set stands. */
async function openStage(page: Page, stage: string): Promise<void> {
  const all = page.locator(".set-place a");
  if (!(await page.locator(".stage-rail").isVisible())) await all.click();
  await page.locator(`.stage-rail a[href*="stage=${stage}"]`).click();
  await expect(page.locator(".calculator-form")).toBeVisible();
}

async function startSet(page: Page, name: string, address = "/set"): Promise<void> {
  await page.goto(address);
  await page.getByLabel("Name of the foundation").fill(name);
  await page.getByRole("button", { name: "Start a set" }).click();
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(name);
}

/** The slab of product.md's own example: 28 by 22 ft, burned an inch, racked. */
async function readConcrete(page: Page): Promise<void> {
  await openStage(page, "concrete");
  await page.getByRole("textbox", { name: "Length A-B" }).fill("28'");
  await page.getByRole("textbox", { name: "Width A-D" }).fill("22'");
  await page.getByRole("radio", { name: "1 in", exact: true }).check({ force: true });
  await page.getByRole("textbox", { name: "Diagonal A-C" }).fill("428 9/16");
  await page.getByRole("textbox", { name: "Diagonal B-D" }).fill("428 1/16");
}

const stageState = (page: Page, stage: string) => page.locator(`.stage-rail a[href*="stage=${stage}"] .stage-state`);

async function overview(page: Page): Promise<void> {
  if (!(await page.locator(".stage-rail").isVisible())) await page.locator(".set-place a").click();
}

test("a carpenter does the job stage by stage, each fed by the one before, and finds it all after a reload @phone", async ({ page }) => {
  await startSet(page, "Lot 14, garage");
  await readConcrete(page);
  // domain.md's worked slab: AC 427 9/16, BD 427 1/16 after the burn, so the diagonals differ by 1/2 in
  await expect(page.locator(".verdict")).toContainText("1/2");
  await openStage(page, "chalk");
  await expect(page.getByRole("textbox", { name: "Slab length A-B" })).toHaveValue("336 in");
  // 28' less two insets of 7/16 is 27' 11 1/8", 22' less the same 21' 11 1/8"
  await expect(page.locator(".verdict-title")).toContainText("27' 11 1/8\"");
  await openStage(page, "recheck");
  await expect(page.getByRole("textbox", { name: "Length A-B" })).toHaveValue("335 1/8 in");
  await page.getByRole("textbox", { name: "Diagonal A-C" }).fill("427 1/16");
  await page.getByRole("textbox", { name: "Diagonal B-D" }).fill("427 1/16");
  await expect(page.locator(".verdict-title")).toBeVisible();
  await openStage(page, "bolts");
  await page.getByRole("radio", { name: "AB", exact: true }).focus();
  await page.keyboard.press("ArrowRight");
  await expect(page.getByRole("radio", { name: "BC", exact: true })).toBeFocused();
  await expect(page.getByRole("textbox", { name: "Piece 1 ends" })).toHaveValue("263 1/8 in");
  await page.reload();
  await expect(page.getByRole("textbox", { name: "Piece 1 ends" })).toHaveValue("263 1/8 in");
  await overview(page);
  await expect(stageState(page, "chalk")).toHaveText("Done");
  await expect(page.locator(".stage-rail")).toContainText("27' 11 1/8\" by 21' 11 1/8\"");
  await expect(page.locator(".set-plan svg.plan")).toHaveAccessibleName(/slab edge, chalk lines/);
});

test("a reading changed later makes the chalk lines stale until the new values are used, and that can be undone @phone", async ({ page }) => {
  await startSet(page, "Lot 15");
  await readConcrete(page);
  await openStage(page, "chalk");
  await expect(page.locator(".verdict-title")).toContainText("27' 11 1/8\"");
  await openStage(page, "concrete");
  await page.getByRole("textbox", { name: "Length A-B" }).fill("28' 1\"");
  await page.getByRole("textbox", { name: "Diagonal A-C" }).fill("429 5/16");
  await page.getByRole("textbox", { name: "Diagonal B-D" }).fill("428 7/8");
  await overview(page);
  await expect(stageState(page, "chalk")).toHaveText("Readings changed");
  await openStage(page, "chalk");
  await expect(page.getByText("Chalk lines were computed from readings you have since changed.")).toBeVisible();
  await page.getByRole("button", { name: "Use the new values" }).click();
  // 28' 1" less 7/8 is 28' 0 1/8"
  await expect(page.locator(".verdict-title")).toContainText("28' 0 1/8\"");
  await expect(page.getByText("since changed")).toHaveCount(0);
  await page.getByRole("button", { name: "Undo the new values" }).click();
  await expect(page.getByRole("textbox", { name: "Slab length A-B" })).toHaveValue("336 in");
  await expect(page.getByText("Chalk lines were computed from readings you have since changed.")).toBeVisible();
});

test("two tabs on one set keep what each typed, and show it to each other", async ({ page, context }) => {
  await startSet(page, "Lot 16");
  await openStage(page, "concrete");
  const other = await context.newPage();
  await other.goto(page.url());
  await expect(other.getByRole("textbox", { name: "Width A-D" })).toBeVisible();
  await page.getByRole("textbox", { name: "Length A-B" }).fill("28'");
  await expect(other.getByRole("textbox", { name: "Length A-B" })).toHaveValue("28'");
  await other.getByRole("textbox", { name: "Width A-D" }).fill("22'");
  await expect(page.getByRole("textbox", { name: "Width A-D" })).toHaveValue("22'");
  await expect(page.getByRole("textbox", { name: "Length A-B" })).toHaveValue("28'");
  await page.reload();
  await expect(page.getByRole("textbox", { name: "Width A-D" })).toHaveValue("22'");
});

test("a tab killed a moment after the last key loses nothing", async ({ page, context }) => {
  await startSet(page, "Lot 17");
  await openStage(page, "concrete");
  await page.getByRole("textbox", { name: "Length A-B" }).pressSequentially("28' 7 1/2\"");
  const address = page.url();
  await page.waitForTimeout(400); // a write is on its way for some milliseconds, on a busy machine for more
  const session = await context.newCDPSession(page);
  await Promise.race([session.send("Page.crash").catch(() => undefined), page.waitForEvent("crash")]);
  const again = await context.newPage();
  await again.goto(address);
  await expect(again.getByRole("textbox", { name: "Length A-B" })).toHaveValue("28' 7 1/2\"");
});

test("a set is renamed, duplicated, deleted and brought back @phone", async ({ page }) => {
  await startSet(page, "Lot 18");
  await page.getByRole("button", { name: "Rename" }).click();
  await page.getByLabel("Name of the foundation").fill("Lot 18, shed");
  await page.getByRole("button", { name: "Save the name" }).click();
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Lot 18, shed");
  await page.getByRole("button", { name: "Duplicate" }).click();
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Lot 18, shed, copy");
  await page.getByRole("button", { name: "Delete" }).click();
  await expect(page.locator(".set-list").first()).not.toContainText("copy");
  await page.reload();
  await page.getByRole("button", { name: "Bring it back" }).click();
  await expect(page.getByRole("link", { name: "Lot 18, shed, copy" })).toBeVisible();
});

test("a set goes to a file and comes back from it whole, and a wrong file is told what is wrong with it", async ({ page, browser, baseURL }) => {
  await startSet(page, "Lot 19");
  await readConcrete(page);
  await expect(page.locator(".verdict")).toContainText("1/2");
  const [download] = await Promise.all([page.waitForEvent("download"), page.getByRole("button", { name: "Save as a file" }).click()]);
  expect(download.suggestedFilename()).toBe("sillwright-lot-19.json");
  const file = await readFile((await download.path())!);
  const context = await browser.newContext({ baseURL });
  const other = await context.newPage();
  await other.goto("/set");
  const chooser = other.locator('input[type="file"]');
  await chooser.setInputFiles({ name: "a.json", mimeType: "application/json", buffer: Buffer.from('{"format":"other"}') });
  await expect(other.getByText("This is not a set of Sillwright.")).toBeVisible();
  await chooser.setInputFiles({ name: "a.json", mimeType: "application/json", buffer: file });
  await expect(other.getByText("Lot 19 is open.")).toBeVisible();
  await other.getByRole("link", { name: "Lot 19" }).click();
  await openStage(other, "concrete");
  await expect(other.getByRole("textbox", { name: "Diagonal A-C" })).toHaveValue("428 9/16");
  await chooser.waitFor({ state: "detached" });
  await context.close();
});

test("without room on the device the page says so and keeps what is typed", async ({ page }) => {
  await page.addInitScript(() => {
    const put = IDBObjectStore.prototype.put;
    IDBObjectStore.prototype.put = function (this: IDBObjectStore, ...args: Parameters<typeof put>) {
      if (localStorage.getItem("full") !== null) throw new DOMException("no room", "QuotaExceededError");
      return put.apply(this, args);
    };
  });
  await startSet(page, "Lot 20");
  await openStage(page, "concrete");
  await page.evaluate(() => localStorage.setItem("full", "1"));
  await page.getByRole("textbox", { name: "Length A-B" }).fill("28'");
  await expect(page.getByText("This device has no room left.")).toBeVisible();
  await expect(page.getByRole("textbox", { name: "Length A-B" })).toHaveValue("28'");
  await page.evaluate(() => localStorage.removeItem("full"));
  await page.getByRole("textbox", { name: "Width A-D" }).fill("22'");
  await expect(page.getByText("This device has no room left.")).toHaveCount(0);
  await page.reload();
  await expect(page.getByRole("textbox", { name: "Length A-B" })).toHaveValue("28'");
});

test("a reading fills the screen, locks itself against wet hands and takes two taps to unlock @phone", async ({ page }) => {
  await page.clock.install();
  await page.goto("/calculators/squareness?length=28%27&width=22%27&burn=1%20in&diagonals.ac=428%209%2F16&diagonals.bd=428%201%2F16");
  await page.getByRole("button", { name: "Read it big" }).click();
  const reading = page.getByRole("dialog");
  await expect(reading.getByText("Diagonals differ by")).toBeVisible();
  await expect(reading.locator(".reading-figure > .sr-only")).toHaveText('1/2"');
  expect(await reading.evaluate((dialog) => dialog.getBoundingClientRect().height - innerHeight)).toBe(0);
  await reading.getByRole("button", { name: "Next", exact: true }).click();
  await expect(reading.getByText("Move CD toward D")).toBeVisible();
  await page.clock.fastForward(13_000);
  await expect(reading.getByRole("button", { name: "Next", exact: true })).toHaveCount(0);
  await reading.getByRole("button", { name: "Locked: tap to unlock" }).click();
  await page.clock.fastForward(6_000);
  // too late: the second tap is asked for anew
  await reading.getByRole("button", { name: "Locked: tap to unlock" }).click();
  await page.clock.fastForward(500);
  await reading.getByRole("button", { name: "Tap here to unlock" }).click({ delay: 400 });
  await reading.getByRole("button", { name: "Close" }).click();
  await expect(reading).toHaveCount(0);
});

for (const [address, open, figure] of [["/set", "Open the example", "Stages"], ["/es/set", "Abrir el ejemplo", "Etapas"]] as const) {
  test(`${address} passes axe, does not scroll sideways at 360 and keeps its targets large, list, set and stage @phone`, async ({ page }) => {
    await page.setViewportSize({ width: 360, height: 740 });
    await page.goto(address);
    const check = async () => {
      const { violations } = await new AxeBuilder({ page }).withTags(["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa", "best-practice"]).options({ rules: { "color-contrast-enhanced": { enabled: true } } }).analyze();
      expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(" ")}`)).toEqual([]);
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(360);
      const small = await page.evaluate(() => [...document.querySelectorAll<HTMLElement>("main a, main button, main summary, main select")].filter((element) => element.checkVisibility()).map((element) => [element.textContent, element.getBoundingClientRect()] as const).filter(([, { width, height }]) => width < 43.9 || height < 43.9).map(([text]) => text));
      expect(small).toEqual([]);
    };
    await page.getByRole("button", { name: open }).waitFor();
    await check();
    await page.getByRole("button", { name: open }).click();
    await expect(page.getByRole("navigation", { name: figure })).toBeVisible();
    await check();
    await openStage(page, "chalk");
    await expect(page.locator(".verdict-title")).toBeVisible();
    await check();
  });
}
