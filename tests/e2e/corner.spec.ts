import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const path = "/calculators/corner";
const verdict = (page: Page) => page.locator(".verdict-title");
const body = (page: Page) => page.locator(".verdict-body");
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });
const figure = (page: Page, label: string) => page.locator(".key-values dt", { hasText: label }).first().locator("+ dd");

test("a carpenter types two legs, and learns what the tape must read and the triangle that fits @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type two legs");
  await field(page, "First leg").pressSequentially("28 ft");
  await field(page, "Second leg").pressSequentially("22 ft");
  await expect(verdict(page)).toHaveText(`Must read 35' 7 5/16"`); // √(336² + 264²) = 427.308
  await expect(body(page)).toContainText(`Or 28-21-35, counted in feet: 28' 0" out on the first leg, 21' 0" on the second, and 35' 0" on the tape between.`);
  await page.getByRole("radio", { name: "1 in", exact: true }).check({ force: true });
  await expect(verdict(page)).toHaveText(`Must read 35' 8 5/16"`);
  await expect(figure(page, "Triangle reads, burned 1 in")).toHaveText(`35' 1"`);
  await expect(figure(page, "That is")).toHaveText("3-4-5, 7 times");
  await expect(page.locator("svg.plan").first()).toContainText("21");
  await expect(page).toHaveURL(/legs\.0=28\+ft&legs\.1=22\+ft&burn=1\+in/);
  await page.reload();
  await expect(verdict(page)).toHaveText(`Must read 35' 8 5/16"`);
  expect(found).toEqual([]);
});

test("the second leg alone is not taken for the first", async ({ page }) => {
  await page.goto(path);
  await field(page, "Second leg").fill("22 ft");
  await page.getByRole("button", { name: "Calculate" }).click();
  await expect(page.locator('.error-summary a[href="#field-legs-0"]')).toBeVisible();
  await expect(page.locator('.error-summary a[href="#field-legs-1"]')).toHaveCount(0);
  await field(page, "First leg").fill("28 ft");
  await expect(verdict(page)).toHaveText(`Must read 35' 7 5/16"`);
});

test("legs too short for a 3-4-5 say so", async ({ page }) => {
  await page.goto(`${path}?legs.0=2+ft&legs.1=3+ft`);
  await expect(verdict(page)).toHaveText(`Must read 3' 7 1/4"`); // √(24² + 36²) = 43.267
  await expect(body(page)).toContainText("too short for a 3-4-5");
});

test("in Spanish and in millimeters, in whole 100 mm @phone", async ({ page }) => {
  const found = complaints(page);
  await page.addInitScript(() => localStorage.setItem("sillwright.settings", JSON.stringify({ units: "mm" })));
  await page.goto(`/es${path}`);
  await field(page, "Primer cateto").fill("6000");
  await field(page, "Segundo cateto").fill("8000");
  await expect(verdict(page)).toHaveText("Debe leer 10000 mm"); // D01 in metres
  await expect(body(page)).toContainText("O 60-80-100, contado en 100 mm");
  expect(found).toEqual([]);
});

test("the corner goes on to check for square", async ({ page }) => {
  await page.goto(`${path}?legs.0=28+ft&legs.1=22+ft&burn=1+in`);
  await page.getByRole("link", { name: "On to check for square" }).click();
  await expect(page).toHaveURL(/squareness\?length=336\+in&width=264\+in&burn=1\+in/);
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
    await page.locator("#field-legs-0").fill("12 ft");
    await page.locator("#field-legs-1").fill("16 ft");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/\/calculators\/corner\/answer\?/);
    await expect(verdict(page)).toHaveText(`Must read 20' 0"`); // D02
  });

  test("a blank leg is asked for", async ({ page }) => {
    await page.goto(`${path}/answer?legs.1=16+ft`);
    await expect(page.locator("#field-legs-0-error")).toContainText("Fill this in.");
    await expect(page.locator("#field-legs-1")).toHaveValue("16 ft");
  });
});

for (const [address, theme] of [[`${path}?legs.0=28+ft&legs.1=22+ft&burn=1+in`, "light"], [`/es${path}?legs.0=28+ft&legs.1=22+ft`, "dark"]] as const) {
  test(`${address.split("?")[0]} passes axe up to AAA contrast in the theme ${theme} @phone`, async ({ page }) => {
    await page.addInitScript((chosen) => localStorage.setItem("sillwright.settings", JSON.stringify({ theme: chosen })), theme);
    await page.goto(address);
    await expect(page.locator(".verdict")).not.toHaveAttribute("data-tone", "idle");
    for (const details of await page.locator("details.disclosure > summary").all()) await details.click();
    const { violations } = await new AxeBuilder({ page }).withTags(["wcag2a", "wcag2aa", "wcag2aaa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"]).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => String(target)).join(", ")}`)).toEqual([]);
  });
}
