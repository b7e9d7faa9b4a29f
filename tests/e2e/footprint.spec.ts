import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const path = "/calculators/footprint";
const verdict = (page: Page) => page.locator(".verdict-title");
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });
const row = (page: Page, table: string, name: string) => page.locator(`section[aria-labelledby="${table}-title"]`).getByRole("row", { name: new RegExp(`^${name}`) });
const walk = (text: string) => `${path}?by=walk&walk=${encodeURIComponent(text)}`;

test("an L walked run by run closes, and its chalk lines and check pulls follow @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type the first runs");
  for (const [number, length] of [[1, "40 ft"], [2, "20 ft"]] as const) await field(page, `Run ${number}`).fill(length);
  await field(page, "Run 3").fill("16 ft");
  await page.getByRole("group", { name: "Run 4 goes" }).getByRole("radio", { name: "North" }).check();
  await field(page, "Run 4").fill("12 ft");
  await page.getByRole("button", { name: "Add a run" }).click();
  await expect(field(page, "Run 5")).toBeFocused();
  await field(page, "Run 5").fill("24 ft");
  await expect(page.getByRole("group", { name: "Run 5 goes" }).getByRole("radio", { name: "West" })).toBeChecked();
  await page.getByRole("button", { name: "Add a run" }).click();
  await field(page, "Run 6").fill("32 ft");
  await expect(verdict(page)).toHaveText("The walk closes"); // domain.md V05
  await expect(page.locator(".verdict-body")).toHaveText(`1,088 sq ft, 144' 0" round.`);
  await page.getByRole("radio", { name: "1/2 in" }).check();
  await expect(row(page, "lines", "A-B")).toContainText(`39' 11"`);
  await expect(row(page, "corners", "D")).toContainText("inside");
  await expect(row(page, "checks", "A-D")).toContainText(`31' 2 7/8"`); // √(288² + 240²) = 374.892
  await expect(page).toHaveURL(/runs\.5\.length=32\+ft/);
  await page.reload();
  await expect(verdict(page)).toHaveText("The walk closes");
  expect(found).toEqual([]);
});

test("a run an inch short is told, with each run that could be the one @phone", async ({ page }) => {
  await page.goto(walk("E 40 ft, N 20 ft, W 15' 11\", N 12 ft, W 24 ft, S 32 ft"));
  await expect(verdict(page)).toHaveText(`Misses by 1"`); // V06
  await expect(page.locator(".verdict-body")).toContainText("One part in 1,727.");
  await expect(page.locator(".plan-notes")).toContainText(`Run 3 alone would have to be 16' 0".`);
});

test("a plan can be tapped out corner by corner, and taken back @phone", async ({ page }) => {
  await page.goto(path);
  await page.getByText("Tap the plan out").click();
  const pad = page.locator("svg.plan-pad");
  await pad.scrollIntoViewIfNeeded();
  const box = (await pad.boundingBox())!;
  const tap = (column: number, line: number) => pad.click({ position: { x: (column / 16) * box.width, y: (line / 13) * box.height } });
  await tap(12, 11); // ten squares of 2 ft to the east
  await expect(field(page, "Run 1")).toHaveValue("20 ft");
  await tap(12, 3);
  await tap(2, 3);
  await expect(field(page, "Run 3")).toHaveValue("20 ft");
  await expect(verdict(page)).toHaveText("The walk closes"); // the last run is added
  await expect(page.locator(".plan-notes")).toContainText("The last run was left out");
  await page.getByRole("button", { name: "Take back the last run" }).click();
  await expect(field(page, "Run 3")).toHaveValue("");
});

test("pulls of a braced polygon: a loose corner is named, and the pull proposed fixes it @phone", async ({ page }) => {
  await page.goto(path);
  await page.getByRole("radio", { name: "Pulls" }).check();
  const pull = (name: string) => page.getByRole("textbox", { name: new RegExp(`${name}$`) });
  for (const [name, length] of [["A to B", "336"], ["B to C", "288"], ["C to D", "336"], ["D to A", "288"]] as const) await pull(name).fill(length);
  await expect(verdict(page)).toContainText("Not fixed");
  await pull("A to C").fill("443.3125");
  await expect(verdict(page)).toHaveText("Fixed, but nothing checks it");
  await pull("B to D").fill("441.8125");
  await expect(verdict(page)).toHaveText("Every corner is fixed"); // Q05
  await expect(row(page, "corners", "A")).toContainText("89.80°"); // domain.md 5.1: 89.8035
  await page.getByText("Each pull as adjusted").click();
  await expect(row(page, "adjusted", "A-C")).toContainText("-0.013 in"); // 443.3000 − 443.3125
});

test("a wrong leg is refused by its number, and what was typed stays @phone", async ({ page }) => {
  await page.goto(path);
  await page.getByRole("radio", { name: "As text" }).check();
  await field(page, "The walk").fill("E 40 ft, Q 20 ft");
  await page.getByRole("button", { name: "Calculate" }).click();
  await expect(page.getByRole("alert").filter({ hasText: /another look/ })).toBeVisible();
  await expect(page.locator(".field-error")).toContainText("Leg 2, “Q 20 ft”");
  await expect(field(page, "The walk")).toHaveValue("E 40 ft, Q 20 ft");
});

test("in Spanish the same, in the words of the trade @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(`/es${walk("este 40 pies, norte 20 pies, oeste 16 pies, norte 12 pies, oeste 24 pies, sur 32 pies")}`);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Planta");
  await expect(verdict(page)).toHaveText("El recorrido cierra");
  await expect(row(page, "lines", "C-D")).toContainText("O");
  await expect(row(page, "corners", "D")).toContainText("interior");
  expect(found).toEqual([]);
});

test("the plan goes on to the best fit with its corners", async ({ page }) => {
  await page.goto(walk("E 40 ft, N 20 ft, W 16 ft, N 12 ft, W 24 ft, S 32 ft"));
  await page.getByRole("link", { name: "Find the best fit" }).click();
  await expect(page).toHaveURL(/calculators\/fit\?.*corners\.D\.x=288\+in/);
  await expect(verdict(page)).toHaveText("Fits exactly");
});

test("every worked example opens with its answer", async ({ page }) => {
  await page.goto(path);
  const links = await page.locator("#examples a").evaluateAll((found) => found.map((link) => link.getAttribute("href") ?? ""));
  expect(links).toHaveLength(3);
  for (const link of links) {
    await page.goto(link);
    await expect(verdict(page)).not.toHaveText("Type the first runs");
  }
});

test("nothing a screen reader would stumble over @phone", async ({ page }) => {
  await page.goto(walk("E 40 ft, N 20 ft, W 15' 11\", N 12 ft, W 24 ft, S 32 ft"));
  await expect(verdict(page)).toHaveText(`Misses by 1"`);
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("the form is answered by the server @phone", async ({ page }) => {
    await page.goto(path);
    await page.locator("#field-runs-0-length").fill("28 ft");
    await page.locator("#field-runs-1-length").fill("21 ft");
    await page.locator("#field-runs-2-length").fill("28 ft");
    await page.locator("#field-runs-3-length").fill("21 ft");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/\/calculators\/footprint\/answer\?/);
    await expect(verdict(page)).toHaveText("The walk closes");
    await expect(row(page, "checks", "A-C")).toContainText(`35' 0"`); // 21-28-35
  });
});
