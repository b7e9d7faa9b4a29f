import { readFileSync } from "node:fs";
import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const path = "/calculators/takeoff";
const verdict = (page: Page) => page.locator(".verdict-title");
const line = (page: Page, item: string) => page.locator(".takeoff-list tbody tr").filter({ has: page.getByRole("rowheader", { name: new RegExp(`^${item}`) }) });
const job = `${path}?lumber.0.length=16+ft&lumber.0.count=12&plateLength=180+ft&pieceCount=14&bolts=30&newAnchors=4`;

test("boards, sealer and hardware are listed as they are typed @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(path);
  await page.getByRole("textbox", { name: "Length 1" }).fill("16 ft");
  await page.getByRole("textbox", { name: "How many 1" }).fill("12");
  await expect(verdict(page)).toHaveText("12 boards to order");
  await page.getByRole("textbox", { name: /Sill plate in all/ }).fill("180 ft");
  await expect(line(page, "Sill sealer")).toContainText("4 rolls"); // 180 / 50
  await page.getByRole("textbox", { name: /^Bolts standing/ }).fill("30");
  await page.getByRole("textbox", { name: /^Waste/ }).fill("15");
  await expect(line(page, "Nut")).toContainText("35 pieces"); // 34.5
  await expect(verdict(page)).toHaveText("14 boards to order"); // 12 and 1.8 spare
  expect(found).toEqual([]);
});

test("the list goes down as a spreadsheet, in the page's language", async ({ page }) => {
  await page.goto(`/es${job}`);
  const [download] = await Promise.all([page.waitForEvent("download"), page.getByRole("button", { name: "Bajar como CSV" }).click()]);
  expect(download.suggestedFilename()).toBe("lista-solera.csv");
  const text = readFileSync((await download.path())!, "utf8");
  expect(text).toContain("Tabla tratada");
  expect(text.split("\r\n")).toHaveLength(9); // headings, seven lines, and the end
});

test("a letter to the supplier holds the list", async ({ page }) => {
  await page.goto(job);
  const letter = await page.getByRole("link", { name: "E-mail the list" }).getAttribute("href");
  expect(decodeURIComponent(letter!)).toContain("12 boards · Treated board, 16' 0\"");
});

test("nothing a screen reader would stumble over @phone", async ({ page }) => {
  await page.goto(job);
  await expect(verdict(page)).toHaveText("12 boards to order");
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("the form is answered by the server @phone", async ({ page }) => {
    await page.goto(path);
    await page.locator("#field-lumber-0-length").fill("16 ft");
    await page.locator("#field-lumber-0-count").fill("12");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/\/calculators\/takeoff\/answer\?/);
    await expect(verdict(page)).toHaveText("12 boards to order");
  });
});
