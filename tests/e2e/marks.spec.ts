import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const path = "/calculators/marks";
const verdict = (page: Page) => page.locator(".verdict-title");
const field = (page: Page, label: string) => page.getByRole("textbox", { name: new RegExp(`${label}$`) });
const rows = (page: Page) => page.locator('section[aria-labelledby="marks-title"] tbody tr');

test("16 in on center: marks from the end, the first at 15 1/4 (J01) @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type the wall's length");
  await field(page, "Length of the wall").fill("8 ft");
  await expect(verdict(page)).toHaveText("5 marks");
  await expect(rows(page).nth(1)).toContainText(`1' 3 1/4"`);
  await expect(rows(page).nth(4)).toContainText(`5' 3 1/4"`);
  await page.getByRole("radio", { name: "24 in" }).check();
  await expect(verdict(page)).toHaveText("3 marks");
  await expect(rows(page).nth(3)).toContainText(`5' 11 1/4"`); // 71 1/4, J02
  expect(found).toEqual([]);
});

test("19.2 in marks do not drift, and the page says what stepping would cost", async ({ page }) => {
  await page.goto(`${path}?length=9+ft&spacing=19.2`);
  await expect(rows(page).nth(5)).toContainText(`7' 11 1/4"`);
  await expect(page.getByText("Do not step it off")).toBeVisible();
});

test("a joist over a bolt is named, with the move that clears it @phone", async ({ page }) => {
  await page.goto(`${path}?length=20+ft&spacing=16+in`);
  await page.getByRole("button", { name: "Add a bolt" }).click();
  await expect(field(page, "Bolt 1")).toBeFocused();
  await field(page, "Bolt 1").fill("16");
  await expect(verdict(page)).toHaveText("14 marks, one joist hits");
  await expect(page.locator(".findings li").first()).toContainText(`Move it 1 7/16" toward the far end.`);
});

test("lapped joists get a column for the opposite wall", async ({ page }) => {
  await page.goto(`${path}?length=20+ft&spacing=16+in`);
  await page.getByText("Joists lap over a girder").click();
  await expect(rows(page).nth(1)).toContainText(`1' 1 3/4"`); // a thickness less than 1' 3 1/4"
  await expect(page).toHaveURL(/lapped=true/);
});

test("in Spanish and millimetres @phone", async ({ page }) => {
  const found = complaints(page);
  await page.addInitScript(() => localStorage.setItem("sillwright.settings", JSON.stringify({ units: "mm" })));
  await page.goto(`/es${path}?length=2.4+m&spacing=400+mm&thickness=38+mm&unit=mm&precision=1mm`);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Marcas de piso");
  await expect(rows(page).nth(1)).toContainText("381 mm");
  expect(found).toEqual([]);
});

test("nothing a screen reader would stumble over @phone", async ({ page }) => {
  await page.goto(`${path}?length=20+ft&spacing=16+in&bolts.0.station=16&lapped=true`);
  await expect(verdict(page)).toContainText("hits");
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("the form is answered by the server @phone", async ({ page }) => {
    await page.goto(path);
    await page.locator("#field-length").fill("8 ft");
    await page.locator('input[name="bolts.0.station"]').fill("16");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/\/calculators\/marks\/answer\?/);
    await expect(verdict(page)).toHaveText("5 marks, one joist hits");
  });
});
