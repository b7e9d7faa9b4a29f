import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const path = "/calculators/fit";
const verdict = (page: Page) => page.locator(".verdict-title");
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });
const reading = (page: Page, label: string) => page.getByRole("textbox", { name: new RegExp(`${label}$`) });
const row = (page: Page, table: string, name: string) => page.locator(`section[aria-labelledby="${table}-title"]`).getByRole("row", { name: new RegExp(`^${name}`) });
const long = `${path}?corners.A.x=0&corners.A.y=0&corners.B.x=337&corners.B.y=0&corners.C.x=337&corners.C.y=288&corners.D.x=0&corners.D.y=288&size.length=335&size.width=287&inset=1%2F2+in`;

test("a racked slab: the plan is turned on it, and each corner gets its two offsets @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type the slab and the plan");
  await field(page, "Slab length A-B").fill("28 ft");
  await field(page, "Slab width A-D").fill("24 ft");
  await reading(page, "Diagonal A-C").fill("443 5/16");
  await reading(page, "Diagonal B-D").fill("441 13/16");
  await field(page, "Wanted length A-B").fill(`27' 10"`);
  await field(page, "Wanted width A-D").fill(`23' 10"`);
  await field(page, "Wanted inset").fill("1");
  // The unit tests' HiGHS judge: worst 0.26493 in.
  await expect(verdict(page)).toHaveText(`Off by 1/4" at most`);
  await expect(row(page, "offsets", "A")).toContainText(`A-B 1 1/4"`);
  await expect(row(page, "offsets", "B")).toContainText(`A-B 3/4"`);
  await expect(page.locator(".way")).toHaveCount(3);
  await expect(page.locator(".way").nth(2)).toContainText(`Diagonals 1 1/2" apart`);
  await expect(page).toHaveURL(/size\.length=27%27\+10%22/);
  expect(found).toEqual([]);
});

test("a slab an inch too long shares it between its ends; another way is one tap away @phone", async ({ page }) => {
  await page.goto(long);
  await expect(verdict(page)).toHaveText(`Off by 1/2" at most`);
  await expect(row(page, "offsets", "A")).toContainText(`D-A 1"`);
  await expect(page.locator(".plan-stretches")).toContainText("shy of the edge");
  await page.getByRole("button", { name: "Take “Follow the concrete”" }).click();
  await expect(verdict(page)).toHaveText("Follows the concrete");
  await expect(page).toHaveURL(/mode=follow/);
  await page.getByText("Why nothing does better").waitFor({ state: "detached" });
});

test("a plan too big for the slab says by how much, and an overhang allowed lets it pass", async ({ page }) => {
  await page.goto(long.replace("size.length=335", "size.length=338"));
  await expect(verdict(page)).toHaveText(`Does not fit: overhangs 1/2"`);
  await field(page, "Overhang allowed").fill("1/2");
  await expect(verdict(page)).toHaveText(`Off by 1" at most`); // 1/2 wanted, 1/2 over
});

test("a bolt is told from the chalk, and goes on to the rule with it", async ({ page }) => {
  await page.goto(long);
  await page.getByText("Bolts in the concrete").click();
  await page.getByRole("button", { name: "Add a bolt" }).click();
  await expect(field(page, "Along, bolt 1")).toBeFocused();
  await field(page, "Along, bolt 1").fill("2 ft");
  await field(page, "In from edge, bolt 1").fill("2 3/4");
  await expect(row(page, "bolts-found", "1")).toContainText(`1' 11"`); // 24 − 1
  await expect(row(page, "bolts-found", "1")).toContainText(`2 1/4"`); // domain.md N07
  await expect(page.getByRole("link", { name: "Check the bolts of A-B" })).toHaveAttribute("href", /anchors\?mode=check/);
});

test("what is missing is asked for beside its field @phone", async ({ page }) => {
  await page.goto(path);
  await page.getByRole("button", { name: "Calculate" }).click();
  await expect(page.getByRole("alert").filter({ hasText: /another look/ })).toBeVisible();
  await expect(page.locator(".field-error").first()).toContainText("Give the slab");
});

test("in Spanish the same, in the words of the trade @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(`/es${long}`);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Acomodo");
  await expect(verdict(page)).toHaveText(`Difiere 1/2" cuando más`);
  await expect(page.locator(".way-title")).toHaveText(["Mantener un muro", "Mejor acomodo", "Seguir el concreto"]);
  expect(found).toEqual([]);
});

test("every worked example opens with its answer", async ({ page }) => {
  await page.goto(path);
  const links = await page.locator("#examples a").evaluateAll((found) => found.map((link) => link.getAttribute("href") ?? ""));
  expect(links).toHaveLength(3);
  for (const link of links) {
    await page.goto(link);
    await expect(verdict(page)).not.toHaveText("Type the slab and the plan");
  }
});

test("nothing a screen reader would stumble over @phone", async ({ page }) => {
  await page.goto(long);
  await expect(verdict(page)).toHaveText(`Off by 1/2" at most`);
  await page.getByText("Why nothing does better").click();
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("the form is answered by the server @phone", async ({ page }) => {
    await page.goto(path);
    await page.locator("#field-length").fill("28 ft");
    await page.locator("#field-width").fill("24 ft");
    await page.locator("#field-diagonals-ac").fill("443 5/16");
    await page.locator("#field-diagonals-bd").fill("441 13/16");
    await page.locator("#field-size-length").fill("27' 10\"");
    await page.locator("#field-size-width").fill("23' 10\"");
    await page.locator("#field-inset").fill("1");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/\/calculators\/fit\/answer\?/);
    await expect(verdict(page)).toHaveText(`Off by 1/4" at most`);
  });
});
