import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const path = "/calculators/squareness";
const verdict = (page: Page) => page.locator(".verdict-title");
const body = (page: Page) => page.locator(".verdict-body");
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });
const reading = (page: Page, label: string) => page.getByRole("textbox", { name: new RegExp(`${label}$`) });
const figure = (page: Page, label: string) => page.locator(".key-values dt", { hasText: label }).first().locator("+ dd");
const racked = "length=28%27&width=22%27&burn=1+in&diagonals.ac=428+9/16&diagonals.bd=428+1/16&tolerance=practice-3-16";
const missedBurn = "sides.ab=481&sides.bc=361&sides.cd=481&sides.da=361&diagonals.ac=600&diagonals.bd=601&burn=1+in"; // Q07, AC read without its burn

test("a carpenter types two sides and both burned diagonals, and learns which side to move and what the tape must then read @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type sides and diagonals");
  await field(page, "Length A-B").pressSequentially("28'");
  await field(page, "Width A-D").pressSequentially("22 ft");
  await page.getByRole("radio", { name: "1 in", exact: true }).check({ force: true });
  await reading(page, "Diagonal A-C").pressSequentially("428 9/16");
  await reading(page, "Diagonal B-D").pressSequentially("428 1/16");
  // (427 9/16² − 427 1/16²) / (4 · 336) = 0.318 in; √(336² + 264²) = 427.308, read burned 428.308
  await expect(verdict(page)).toHaveText(`Diagonals differ by 1/2"`);
  await expect(body(page)).toContainText(`Move side C-D 5/16" toward D and pull again: both should read 428 5/16".`);
  await page.getByLabel("Your limit").selectOption(`3/16" between diagonals`);
  await expect(verdict(page)).toHaveText(`Out of square by 1/2"`);
  await expect(body(page)).toContainText(`Over your 3/16" limit for this slab.`);
  await expect(page.locator("svg.plan").first()).toContainText(`move C-D 5/16"`);
  await expect(page.getByText(/^Rack drawn \d+ times larger than it is\./)).toBeVisible();
  await expect(page.locator(".note").filter({ hasText: "What these readings prove" })).toContainText("a slab that tapers can hide behind equal diagonals");
  await expect(figure(page, "True diagonal")).toContainText(`35' 7 5/16"`);
  await expect(page).toHaveURL(/length=28%27&width=22\+ft&burn=1\+in&diagonals\.ac=428\+9%2F16.*tolerance=practice-3-16/);
  await page.reload();
  await expect(verdict(page)).toHaveText(`Out of square by 1/2"`);
  expect(found).toEqual([]);
});

test("each limit says what it allows on this very slab, and where it is from", async ({ page }) => {
  await page.goto(`${path}?length=28+ft&width=24+ft&diagonals.ac=443+5/16&diagonals.bd=441+13/16`);
  await expect(verdict(page)).toHaveText(`Diagonals differ by 1 1/2"`);
  await expect(page.getByLabel("Your limit")).toContainText(`12 by 16 ft triangle, 20 ft within 1/2": here 1 7/8"`); // 1.896, domain.md 2.2
  await page.getByLabel("Your limit").selectOption({ label: `12 by 16 ft triangle, 20 ft within 1/2": here 1 7/8"` });
  await expect(verdict(page)).toHaveText(`Within your limit: 1 1/2"`); // S07, just inside
  await expect(page.locator(".squareness-allows")).toHaveText(`Allows on this slab 1 7/8" between the diagonals and 1/4" between opposite sides (Remodeling performance standard, as quoted elsewhere).`);
  await page.getByLabel("Your limit").selectOption("Another length");
  await field(page, "Diagonals may differ by").fill("1");
  await expect(verdict(page)).toHaveText(`Out of square by 1 1/2"`);
  await expect(page).toHaveURL(/tolerance=other&toleranceOther=1/);
});

test("all four sides: equal diagonals, and yet tapered @phone", async ({ page }) => {
  await page.goto(path);
  await page.getByRole("radio", { name: "All four" }).check({ force: true });
  for (const [side, text] of [["A-B", "336"], ["B-C", "288"], ["C-D", "336 1/4"], ["D-A", "288"]] as const) await field(page, `Side ${side}`).fill(text);
  await reading(page, "Diagonal A-C").fill("442 1/2");
  await reading(page, "Diagonal B-D").fill("442 1/2");
  await expect(verdict(page)).toHaveText(`Tapered by 1/4"`); // Q06
  await expect(body(page)).toContainText("No move makes it square");
  await expect(page.locator(".note")).toContainText("The diagonals are equal, and yet it is not square");
  await expect(figure(page, "Corner A")).toHaveText("90.02°");
  await expect(page.getByRole("row", { name: /^A-C/ })).toContainText(`36' 10 9/16"+0.067`); // 442.5665
  await expect(page.getByRole("link", { name: "On to chalk lines, by the shorter sides" })).toHaveAttribute("href", /inset\?length=336\+in&width=288\+in/);
});

test("a missed burn names both diagonals and the pull that tells them apart @phone", async ({ page }) => {
  await page.goto(`${path}?${missedBurn}`);
  await expect(verdict(page)).toHaveText("These readings cannot all be right");
  await expect(body(page)).toHaveText(`A missed burn in A-C or B-D would explain it. Mark 12' 0" from B toward C and 16' 0" from B toward A, then pull from mark to mark.`);
  await expect(page.locator(".findings li")).toHaveCount(2);
  await expect(page.getByRole("row", { name: /^A-C/ }).first()).toContainText(`241"`); // a true 12-16-20, burned
  await expect(figure(page, "Readings miss closing by")).toHaveText("0.50 in");
  await expect(page.getByRole("link", { name: "On to chalk lines" })).toHaveCount(0);
  await reading(page, "Diagonal A-C").fill("601");
  await expect(verdict(page)).toHaveText("Sides and diagonals agree");
});

test("sizes go along to the four sides while nothing is burned", async ({ page }) => {
  await page.goto(`${path}?length=28+ft&width=24+ft&diagonals.ac=442+1/2&diagonals.bd=442+1/2`);
  await page.getByRole("radio", { name: "All four" }).check({ force: true });
  await expect(field(page, "Side A-B")).toHaveValue("28 ft");
  await expect(field(page, "Side D-A")).toHaveValue("24 ft");
  await expect(verdict(page)).toHaveText(/^Diagonals agree/); // two sides are enough until the others come
  await field(page, "Side B-C").fill("24 ft");
  await field(page, "Side C-D").fill("28 ft");
  await expect(verdict(page)).toHaveText("Sides and diagonals agree");
});

test("a burn of one's own, and a warm tape, are taken in", async ({ page }) => {
  await page.goto(`${path}?length=40+ft&width=30+ft&diagonals.ac=602&diagonals.bd=602`);
  await page.getByRole("radio", { name: "other" }).check({ force: true });
  await field(page, "Held at the mark").fill("2");
  await expect(verdict(page)).toHaveText(/^Diagonals agree/);
  await expect(figure(page, "Should read, burned 2")).toContainText(`602"`);
  await page.getByText("Steel tape correction").click();
  await field(page, "Temperature of the tape").fill("98");
  await expect(page.getByRole("row", { name: /^A-C/ })).toContainText("+0.116"); // T13: 0.0097 ft on 50 ft
});

test("faults are told beside their fields and in the summary, and what was typed stays @phone", async ({ page }) => {
  await page.goto(path);
  await page.getByRole("button", { name: "Calculate" }).click();
  for (const id of ["length", "width", "diagonals-ac", "diagonals-bd"]) await expect(page.locator(`.error-summary a[href="#field-${id}"]`)).toBeVisible();
  await field(page, "Length A-B").fill("28 ft");
  await field(page, "Width A-D").fill("24 ft");
  await reading(page, "Diagonal A-C").fill("53 ft");
  await reading(page, "Diagonal B-D").fill("443");
  await expect(reading(page, "Diagonal A-C")).toHaveAccessibleDescription(/lies between 4' 0" and 52' 0"/);
  await expect(reading(page, "Diagonal A-C")).toHaveValue("53 ft");
});

test("in Spanish and in millimeters the same slab is judged the same @phone", async ({ page }) => {
  const found = complaints(page);
  await page.addInitScript(() => localStorage.setItem("sillwright.settings", JSON.stringify({ units: "mm" })));
  await page.goto(`/es${path}`);
  await field(page, "Largo A-B").fill("12000");
  await field(page, "Ancho A-D").fill("9000");
  await page.getByRole("radio", { name: "100 mm" }).check({ force: true });
  await reading(page, "Diagonal A-C").fill("15106");
  await reading(page, "Diagonal B-D").fill("15094");
  await expect(verdict(page)).toHaveText("Las diagonales difieren 12 mm");
  await expect(body(page)).toContainText("Mueva el lado C-D 8 mm hacia D y mida otra vez: las dos deben leer 15100 mm."); // 7.5, a tie to the even 8
  expect(found).toEqual([]);
});

test("what was found goes on to the chalk lines, and comes back for the recheck", async ({ page }) => {
  await page.goto(`${path}?${racked}`);
  await expect(page.getByRole("link", { name: "Moved it? Recheck" })).toHaveAttribute("href", /squareness\?length=28%27&width=22%27&burn=1\+in&tolerance=practice-3-16$/);
  await page.getByRole("link", { name: "On to chalk lines" }).click();
  await expect(page).toHaveURL(/inset\?length=336\+in&width=264\+in&burn=1\+in&slabDiagonals\.ac=428\+9%2F16/);
});

test("every worked example opens with its answer", async ({ page }) => {
  await page.goto(path);
  const links = await page.locator("#examples a").evaluateAll((all) => all.map((link) => link.getAttribute("href") ?? ""));
  expect(links).toHaveLength(4);
  for (const link of links) {
    await page.goto(link);
    await expect(page.locator(".verdict")).not.toHaveAttribute("data-tone", "idle");
  }
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("the form is answered by the server @phone", async ({ page }) => {
    await page.goto(path);
    await page.locator("#field-length").fill("28'");
    await page.locator("#field-width").fill("22'");
    await page.locator("input[name=burn][value='1 in']").check({ force: true });
    await page.locator("#field-diagonals-ac").fill("428 9/16");
    await page.locator("#field-diagonals-bd").fill("428 1/16");
    await page.locator("#field-tolerance").selectOption("practice-3-16");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/\/calculators\/squareness\/answer\?/);
    await expect(verdict(page)).toHaveText(`Out of square by 1/2"`);
    await expect(body(page)).toContainText(`both should read 428 5/16"`);
    await expect(page.locator("#field-diagonals-ac")).toHaveValue("428 9/16");
  });

  test("another burn and all four sides can be typed there too", async ({ page }) => {
    await page.goto(path);
    await expect(page.locator("#field-burn")).toBeHidden();
    await page.locator("input[name=burn][value=other]").check({ force: true });
    await page.locator("#field-burn").fill("2");
    await page.locator("noscript summary").click(); // Playwright's own text search passes over noscript
    for (const [side, text] of [["ab", "338"], ["bc", "290"], ["cd", "338 1/4"], ["da", "290"]] as const) await page.locator(`[name='sides.${side}']`).fill(text);
    await page.locator("#field-diagonals-ac").fill("444 1/2");
    await page.locator("#field-diagonals-bd").fill("444 1/2");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(verdict(page)).toHaveText(`Tapered by 1/4"`);
  });

  test("a fault is told there too", async ({ page }) => {
    await page.goto(`/es${path}/answer?length=28+ft&width=24+ft&diagonals.ac=3-1/2&diagonals.bd=443`);
    await expect(page.locator(".field-error")).toContainText(`3' 0 1/2"`);
    await expect(page.locator("#field-diagonals-ac")).toHaveValue("3-1/2");
  });
});

for (const [address, theme] of [[`${path}?${racked}`, "light"], [`/es${path}?${missedBurn}&tolerance=other&toleranceOther=1/8`, "dark"], [`${path}?${missedBurn}`, "sun"]] as const) {
  test(`${address.split("?")[0]} passes axe up to AAA contrast in the theme ${theme} @phone`, async ({ page }) => {
    await page.addInitScript((chosen) => localStorage.setItem("sillwright.settings", JSON.stringify({ theme: chosen })), theme);
    await page.goto(address);
    await expect(page.locator(".verdict")).not.toHaveAttribute("data-tone", "idle");
    for (const details of await page.locator("details.disclosure > summary").all()) if ((await details.locator("..").getAttribute("open")) === null) await details.click();
    const { violations } = await new AxeBuilder({ page }).withTags(["wcag2a", "wcag2aa", "wcag2aaa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"]).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => String(target)).join(", ")}`)).toEqual([]);
  });
}

test("nothing runs past the side of a narrow phone, and every target is large enough @phone-only", async ({ page }) => {
  await page.setViewportSize({ width: 360, height: 780 });
  await page.goto(`/es${path}?${missedBurn}&tolerance=triangle-12-16-20`);
  await expect(page.locator(".verdict")).not.toHaveAttribute("data-tone", "idle");
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(360);
  const small = await page.locator("main :is(a, button, select, summary, input[type=text], .seg-item)").evaluateAll((all) =>
    all.filter((target) => target.checkVisibility()).map((target) => ({ text: target.textContent?.trim().slice(0, 20), height: target.getBoundingClientRect().height })).filter(({ height }) => height > 0 && height < 44),
  );
  expect(small).toEqual([]);
});
