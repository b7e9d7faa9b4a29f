import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";

const path = "/calculators/inset";
const verdict = (page: Page) => page.locator(".verdict-title");
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });
const reading = (page: Page, label: string) => page.getByRole("textbox", { name: new RegExp(`${label}$`) });
const figure = (page: Page, label: string) => page.locator(".key-values dt", { hasText: label }).first().locator("+ dd");

test("a carpenter types the slab and the sheathing, and learns what to snap and what the tape must read @phone", async ({ page }) => {
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type the slab's two sides");
  await field(page, "Slab length A-B").fill("28 ft");
  await field(page, "Slab width A-D").fill("40 ft");
  await page.getByRole("radio", { name: "1/2 in" }).check();
  await expect(verdict(page)).toHaveText(`Snap 27' 11" by 39' 11"`); // domain.md N01
  await expect(figure(page, "Both diagonals")).toContainText(`48' 8 1/2"`);
  await page.getByRole("radio", { name: "7/16 in" }).check();
  await expect(figure(page, "Both diagonals")).toContainText(`48' 8 11/16"`); // N02
  await page.getByRole("radio", { name: "1 in", exact: true }).check();
  await expect(figure(page, "The tape must read")).toContainText(`48' 9 11/16"`);
  await expect(page).toHaveURL(/length=28\+ft&width=40\+ft.*burn=1\+in/);
  await page.reload();
  await expect(figure(page, "The tape must read")).toContainText(`48' 9 11/16"`);
});

test("a side of its own and veneer on one wall move that line alone @phone", async ({ page }) => {
  await page.goto(`${path}?length=28+ft&width=40+ft&inset=1/2+in`);
  await page.getByText("Sides on their own, veneer").click();
  await field(page, "Inset at B-C").fill("2");
  await expect(verdict(page)).toHaveText(`Snap 27' 9 1/2" by 39' 11"`); // 336 − 2 − 1/2
  await field(page, "Veneer setback").fill("4 1/2");
  await page.getByRole("checkbox", { name: "A-B", exact: true }).check();
  await expect(verdict(page)).toHaveText(`Snap 27' 9 1/2" by 39' 6 1/2"`); // 480 − 5 − 1/2
  await expect(page.getByRole("row", { name: /^A / })).toContainText(`A-B 5"`);
});

test("a line an inch off is flagged, and the chalk's lengths tell which pair @phone", async ({ page }) => {
  await page.goto(`${path}?length=28+ft&width=24+ft&inset=1/2+in&burn=1+in`);
  await reading(page, "Concrete A-C").fill("443 9/16");
  await reading(page, "Concrete B-D").fill("443 9/16");
  await reading(page, "Chalk A-C").fill("441 1/2"); // 335 by 286: 440.476, read burned
  await reading(page, "Chalk B-D").fill("441 1/2");
  await expect(verdict(page)).toHaveText("A mark is off");
  await expect(page.locator(".verdict-body")).toContainText(`A-B or C-D stands 1" too far in. Or: B-C or D-A stands`);
  await expect(page.locator(".verdict-body")).toContainText("Measure the chalk lines to tell which");
  for (const [side, length] of [["A-B", "336"], ["B-C", "287"], ["C-D", "336"], ["D-A", "287"]] as const) await page.getByLabel(`Chalk ${side}`, { exact: true }).fill(length);
  await expect(page.locator(".verdict-body")).toHaveText(`A-B or C-D stands 1" too far in. Measure the offsets from the slab again to tell which.`);
  await expect(page.locator(".findings li[data-tone=out]")).toHaveCount(2);
  await expect(page.locator("svg.plan").first()).toContainText("off?");
});

test("chalk that drops as it should is said to agree, and goes on to the recheck and the bolts", async ({ page }) => {
  await page.goto(`${path}?length=28+ft&width=24+ft&inset=1/2&slabDiagonals.ac=442+9/16&slabDiagonals.bd=442+9/16&chalkDiagonals.ac=441+1/8&chalkDiagonals.bd=441+1/8`);
  await expect(verdict(page)).toHaveText("The chalk agrees with the concrete");
  await expect(page.getByRole("link", { name: "Check the chalk for square" })).toHaveAttribute("href", /squareness\?length=335\+in&width=287\+in.*diagonals\.ac=441\+1%2F8/);
  await page.getByRole("link", { name: "Lay out bolts on A-B" }).click();
  await expect(page).toHaveURL(/anchors\?mode=layout&pieces\.0=335\+in/);
});

test("what cannot be is refused beside its field, and what was typed stays @phone", async ({ page }) => {
  await page.goto(path);
  await field(page, "Slab length A-B").fill("28 7");
  await field(page, "Slab width A-D").fill("24 ft");
  await page.getByRole("button", { name: "Calculate" }).click();
  await expect(page.getByRole("alert").filter({ hasText: /another look/ })).toBeVisible();
  await expect(field(page, "Slab length A-B")).toHaveValue("28 7");
  await expect(field(page, "Slab length A-B")).toHaveAttribute("aria-invalid", "true");
  await field(page, "Slab length A-B").fill("28 ft");
  await field(page, "Inset").fill("13 ft");
  await expect(field(page, "Inset")).toHaveAttribute("aria-invalid", "true");
});

test("in Spanish and millimeters the same slab is told in their words @phone", async ({ page }) => {
  await page.goto(`/es${path}`);
  await page.locator("header").getByRole("radio", { name: /^mm/ }).check();
  await page.getByLabel("Largo de la losa A-B", { exact: true }).fill("8.534 m");
  await page.getByLabel("Ancho de la losa A-D", { exact: true }).fill("12192");
  await page.getByLabel("Retiro", { exact: true }).fill("11");
  await expect(verdict(page)).toHaveText("Trace 8512 mm por 12170 mm"); // 8534 − 22, 12192 − 22
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("the form is sent and answered, with the label chosen for the thickness @phone", async ({ page }) => {
    await page.goto(path);
    await field(page, "Slab length A-B").fill("28 ft");
    await field(page, "Slab width A-D").fill("40 ft");
    await field(page, "Inset").fill("");
    await page.locator('input[name="preset"][value="1/2 in"]').check({ force: true });
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/inset\/answer\?/);
    await expect(verdict(page)).toHaveText(`Snap 27' 11" by 39' 11"`);
    await expect(field(page, "Slab length A-B")).toHaveValue("28 ft");
  });
});

test("nothing on the page bars anyone, with and without an answer @phone", async ({ page }) => {
  test.slow();
  for (const query of ["", "?length=28+ft&width=24+ft&inset=1/2&burn=1&slabDiagonals.ac=443+9/16&slabDiagonals.bd=443+9/16&chalkDiagonals.ac=441+1/2&chalkDiagonals.bd=441+1/2"]) {
    await page.goto(path + query);
    await page.waitForTimeout(500);
    expect((await new AxeBuilder({ page }).analyze()).violations.map(({ id, nodes }) => `${id} ${nodes[0]?.html}`)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
  }
});
