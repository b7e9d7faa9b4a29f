import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const path = "/calculators/level";
const verdict = (page: Page) => page.locator(".verdict-title");
const field = (page: Page, label: string) => page.getByRole("textbox", { name: new RegExp(`${label}$`) });
const shims = (page: Page) => page.locator('section[aria-labelledby="shims-title"]');
/** domain.md E06: heights 0, −3/16, −1/2, −1/4 in, at the corners of 28 by 24 ft. */
const corners = ["ab", "bc", "cd", "da"].map((wall, row) => `setups.0.readings.${row}.wall=${wall}&setups.0.readings.${row}.station=0&setups.0.readings.${row}.rod=${["48", "48+3%2F16", "48+1%2F2", "48+1%2F4"][row]}`).join("&");
const four = `${path}?setups.0.backsight=48&${corners}&length=28+ft&width=24+ft`;

test("four corners get their shims from the highest, and pass a half inch in 20 ft @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type a backsight and a rod reading");
  await field(page, "Backsight").fill("48");
  await field(page, "Rod 1").fill("48");
  await expect(verdict(page)).toHaveText(`At 0"`);
  await page.getByRole("button", { name: "Add a reading" }).click();
  await expect(field(page, "Rod 2")).toBeFocused();
  await field(page, "Rod 2").fill("48 3/16");
  await expect(verdict(page)).toHaveText(`3/16" from high to low`);
  await page.goto(four);
  await expect(shims(page).getByRole("row", { name: /^3/ })).toContainText(`1/2" (lowest)`);
  await page.getByLabel("Tolerance", { exact: true }).selectOption("half-in-20-ft");
  await expect(verdict(page)).toHaveText(`Level within tolerance: 1/2"`);
  await expect(page).toHaveURL(/toleranceBy=half-in-20-ft/);
  expect(found).toEqual([]);
});

test("a closer limit names the pair that breaks it, and how far apart it stands", async ({ page }) => {
  await page.goto(`${four.replace("28+ft", "9+ft").replace("24+ft", "8+ft")}&toleranceBy=quarter-in-10-ft`);
  await expect(verdict(page)).toHaveText("One pair out of tolerance");
  await expect(page.locator(".findings li").first()).toContainText(`BC 0" and CD 0" differ by 5/16", 8' 0" apart.`);
});

test("readings pasted as text become rows", async ({ page }) => {
  await page.goto(`${path}?setups.0.backsight=48`);
  await page.getByText("Paste readings as text").click();
  await page.getByLabel(/One reading a line/).fill("wall, station, rod\nab, 0, 48\nab, 8 ft, 48 1/8");
  await page.getByRole("button", { name: "Use these lines" }).click();
  await expect(field(page, "Rod 2")).toHaveValue("48 1/8");
  await expect(verdict(page)).toHaveText(`1/8" from high to low`);
});

test("a benchmark that does not come back is told", async ({ page }) => {
  await page.goto(`${four}&benchmark.closing=48+1%2F2`);
  await expect(page.locator(".verdict-body")).toContainText("did not come back");
});

test("in Spanish the same, in the words of the trade @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(`/es${four}`);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Nivel");
  await expect(verdict(page)).toHaveText(`1/2" del más alto al más bajo`);
  expect(found).toEqual([]);
});

test("nothing a screen reader would stumble over @phone", async ({ page }) => {
  await page.goto(`${four}&toleranceBy=half-in-20-ft`);
  await expect(verdict(page)).toContainText("Level within");
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("the form is answered by the server @phone", async ({ page }) => {
    await page.goto(path);
    await page.locator("#field-setups-0-backsight").fill("48");
    await page.locator("#field-setups-0-readings-0-rod").fill("48 1/4");
    await page.locator('input[name="setups.0.readings.1.rod"]').fill("48");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/\/calculators\/level\/answer\?/);
    await expect(verdict(page)).toHaveText(`1/4" from high to low`);
  });
});
