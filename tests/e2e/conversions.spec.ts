import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const path = "/calculators/conversions";
const verdict = (page: Page) => page.locator(".verdict-title");
const form = (page: Page, name: string) => page.getByRole("row", { name });
const strip = (...lines: [op: string, value: string][]) => new URLSearchParams(lines.flatMap(([op, value], row) => [[`strip.${row}.op`, op], [`strip.${row}.value`, value]])).toString();

test("a decimal foot from a plan is told as the tape shows it, with the error of every form @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type a length");
  await page.getByLabel("Length", { exact: true }).fill("5.1719 ft");
  await expect(verdict(page)).toHaveText(`5' 2 1/16" strong`); // domain.md U08, Glencoe
  await expect(form(page, "Decimal feet")).toContainText("5.1719 ftexact");
  await expect(form(page, "Feet and inches")).toContainText(`5' 2 1/16"-0.0003 in`); // 62.0625 − 62.0628
  await expect(form(page, "Millimeters")).toContainText("1576.4 mm+0.0002 in");
  await expect(page).toHaveURL(/value=5\.1719\+ft/);
  expect(found).toEqual([]);
});

test("a strip keeps every line with its running total, and any line can be changed @phone", async ({ page }) => {
  await page.goto(path);
  await page.getByLabel("Length", { exact: true }).fill("13.89");
  await page.getByRole("button", { name: "Times" }).click();
  const factor = page.getByLabel("Line 2: plain number");
  await expect(factor).toBeFocused();
  await factor.fill("8");
  await expect(verdict(page)).toHaveText(`9' 3 1/8" scant`); // D20, NAVEDTRA 14044
  await page.getByRole("button", { name: "Take away" }).click();
  await page.getByLabel("Line 3: length").fill("3 1/8");
  await page.getByRole("button", { name: "Halve" }).click();
  await expect(page.getByLabel("Line 4: plain number")).toHaveValue("2");
  await expect(page.locator(".strip-total")).toHaveText([`total 9' 3 1/8"`, `total 9' 0"`, `total 4' 6"`]);
  await page.getByLabel("Line 1: length").fill("12");
  await expect(page.locator(".strip-total")).toHaveText([`total 8' 0"`, `total 7' 8 7/8"`, `total 3' 10 7/16"`]); // 96, 92 7/8, 46 7/16
  await page.getByLabel("Line 2: what to do").selectOption("Divide by");
  await expect(page.locator(".strip-total").first()).toHaveText(`total 1 1/2"`);
  await expect(page).toHaveURL(/strip\.1\.op=divide/);
  await page.reload();
  await expect(page.locator(".strip-total").first()).toHaveText(`total 1 1/2"`);
  for (const line of [4, 3, 2]) await page.getByRole("button", { name: `Remove line ${line}` }).click();
  await expect(page.getByLabel("Length", { exact: true })).toHaveValue("12");
  await expect(verdict(page)).toHaveText(`1' 0"`);
});

test("a line just added leaves the totals above it standing", async ({ page }) => {
  await page.goto(`${path}?${strip(["add", "17.69"], ["times", "10 1/3"])}`);
  await expect(verdict(page)).toHaveText(`15' 2 13/16" scant`); // D22
  await page.getByRole("group", { name: "Work on from this length" }).getByRole("button", { name: "Add" }).click();
  await expect(page.getByLabel("Line 3: length")).toBeFocused();
  await expect(verdict(page)).toHaveText(`15' 2 13/16" scant`);
});

test("equal spaces are marked from zero", async ({ page }) => {
  await page.goto(`${path}?value=120&spaces=7`);
  await expect(page.getByRole("heading", { name: /7 spaces of/ })).toHaveText(`7 spaces of 1' 5 1/8" strong`);
  await expect(page.locator(".spaces-marks li").last()).toHaveText(`710' 0"`);
});

test("a faulty line says what to type, beside it and in the summary, and keeps what was typed @phone", async ({ page }) => {
  await page.goto(`${path}?${strip(["add", "28 7"], ["times", "2 ft"], ["divide", "0"])}`);
  await page.getByRole("button", { name: "Calculate" }).click();
  await expect(page.getByRole("link", { name: /two ways/ })).toHaveAttribute("href", "#field-strip-0-value");
  await expect(page.getByLabel("Line 1: length")).toHaveValue("28 7");
  await expect(page.getByLabel("Line 1: length")).toHaveAccessibleDescription(/28' 7" or 28\.7/);
  await expect(page.getByLabel("Line 2: plain number")).toHaveAccessibleDescription(/plain number/);
  await expect(page.getByLabel("Line 3: plain number")).toHaveAccessibleDescription(/divided by 0/);
});

test("in millimeters a factor stays a factor, and bare inches keep their meaning", async ({ page }) => {
  await page.goto(`${path}?${strip(["add", "1"], ["times", "3"])}`);
  await expect(verdict(page)).toHaveText(`3"`);
  await page.getByRole("radio", { name: "mm, millimeters" }).filter({ visible: true }).check({ force: true });
  await expect(verdict(page)).toHaveText("76 mm strong"); // 76.2
  await expect(page.getByLabel("Line 1: length")).toHaveValue("1 in");
  await expect(page.getByLabel("Line 2: plain number")).toHaveValue("3");
  await expect(form(page, "Feet and inches")).toContainText(`3"exact`);
});

test("in Spanish the same, in the words of the trade @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(`/es${path}`);
  await page.getByLabel("Medida", { exact: true }).fill("8 pies 3 5/16 pulg");
  await expect(verdict(page)).toHaveText(`8' 3 5/16"`);
  await expect(form(page, "Pies decimales")).toContainText("8.2760 pies-0.0005 pulg"); // U06
  await page.getByRole("button", { name: "La mitad" }).click();
  await expect(verdict(page)).toHaveText(`4' 1 5/8" fuerte`); // 49 21/32, a tie to the even 10/16
  expect(found).toEqual([]);
});

test("every worked example opens with its answer", async ({ page }) => {
  await page.goto(path);
  const links = await page.locator("#examples a").evaluateAll((found) => found.map((link) => link.getAttribute("href") ?? ""));
  expect(links).toHaveLength(5);
  for (const link of links) {
    await page.goto(link);
    await expect(verdict(page)).not.toHaveText("Type a length");
  }
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("the form is answered by the server, lines left blank passed over @phone", async ({ page }) => {
    await page.goto(path);
    await page.locator("#field-value").fill("13.89");
    await page.locator("[name='strip.2.op']").selectOption("times");
    await page.locator("[name='strip.2.value']").fill("8");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/\/calculators\/conversions\/answer\?/);
    await expect(verdict(page)).toHaveText(`9' 3 1/8" scant`);
    await expect(page.locator("#field-strip-0-value")).toHaveValue("13.89");
    await expect(form(page, "Decimal feet")).toContainText("9.2600 ft");
  });

  test("a length alone stays one", async ({ page }) => {
    await page.goto(path);
    await page.locator("#field-value").fill("8.276 ft");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(verdict(page)).toHaveText(`8' 3 5/16" scant`); // 99.312 beside 99.3125
    await expect(page.locator("#field-value")).toHaveValue("8.276 ft");
  });

  test("a fault is told there too, in Spanish as well", async ({ page }) => {
    await page.goto(`/es${path}/answer?value=3-1/2`);
    await expect(page.locator(".field-error")).toContainText(`3' 0 1/2"`);
    await expect(page.locator("#field-value")).toHaveValue("3-1/2");
  });
});

for (const address of [`${path}?value=5.1719 ft&spaces=5`, `/es${path}?${strip(["add", "17.69"], ["times", "10 1/3"], ["divide", "0"])}`]) {
  for (const theme of ["light", "dark", "sun"]) {
    test(`${address.split("?")[0]} passes axe up to AAA contrast in the theme ${theme} @phone`, async ({ page }) => {
      await page.addInitScript((chosen) => localStorage.setItem("sillwright.settings", JSON.stringify({ theme: chosen })), theme);
      await page.goto(address);
      await page.waitForLoadState("networkidle");
      for (const details of await page.locator("details.disclosure > summary").all()) await details.click();
      const { violations } = await new AxeBuilder({ page }).withTags(["wcag2a", "wcag2aa", "wcag2aaa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"]).analyze();
      expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => String(target)).join(", ")}`)).toEqual([]);
    });
  }

  test(`${address.split("?")[0]} does not scroll sideways, and its targets are 44 pixels @phone`, async ({ page }) => {
    await page.goto(address);
    await page.waitForLoadState("networkidle");
    const small = await page.locator("main :is(button, input:not([type=hidden]), select, summary)").evaluateAll((found) =>
      found.filter((element) => element.checkVisibility() && (element.getBoundingClientRect().height < 44 || element.getBoundingClientRect().width < 44)).map((element) => element.outerHTML.slice(0, 90)),
    );
    expect(small).toEqual([]);
    for (const width of [390, 360, 320]) {
      await page.setViewportSize({ width, height: 740 });
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
    }
  });
}
