import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const path = "/calculators/plates";
const verdict = (page: Page) => page.locator(".verdict-title");
const field = (page: Page, label: string | RegExp) => page.getByRole("textbox", { name: label });
const bolts = (wall: number, stations: readonly number[]) => stations.map((station, row) => `walls.${wall}.bolts.${row}.station=${station}`).join("&");
/** Bolts 64 in apart never stand 7 to 24 in apart astride a joint (domain.md B01, B03): one is added; 16 ft and 12 ft are 28 ft. */
const wall = `${path}?walls.0.name=ab&walls.0.length=28+ft&${bolts(0, [8, 72, 136, 200, 264, 328])}&stock.0.length=16+ft&stock.1.length=12+ft&shortest=24+in`;

test("a wall is jointed, cut and bored, and told what is proved @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type a wall and a board");
  await page.goto(wall);
  await expect(verdict(page)).toHaveText("2 boards, 2 pieces, 1 anchor to add");
  await expect(page.locator(".verdict-body")).toContainText("No joints would take fewer anchors. No boards are cheaper.");
  await expect(page.locator('section[aria-labelledby="joints-title"]')).toContainText(`16' 0"`);
  await expect(page.locator(".cut-list > li").first()).toContainText("whole, no cut");
  await expect(page.locator('section[aria-labelledby="holes-title"]').getByRole("row").filter({ hasText: "AB2" })).toContainText(`8"`); // 200 − 192
  await expect(page.getByText("Why a joint costs an anchor")).toBeVisible();
  expect(found).toEqual([]);
});

test("typing goes on while the plan is worked out, and the plan follows @phone", async ({ page }) => {
  await page.goto(path);
  await field(page, /^Wall 1 length/).fill("10 ft");
  await expect(verdict(page)).toContainText("1 board, 1 piece");
  await page.getByText("Bolts: none yet").click();
  await page.getByRole("button", { name: "Add a bolt" }).click();
  await expect(field(page, "Bolt 1 station")).toBeFocused();
  await field(page, "Bolt 1 station").fill("8");
  await expect(verdict(page)).toHaveText("1 board, 1 piece, 2 anchors to add");
  await page.getByLabel(/paste one bolt a line/).fill("60\n112");
  await page.getByRole("button", { name: "Use these lines" }).click();
  await expect(verdict(page)).toHaveText("1 board, 1 piece, no anchor to add");
});

test("forty walls are looked at for as long as one likes, and the best so far can be taken", async ({ page }) => {
  const walls = Array.from({ length: 40 }, (_, index) => `walls.${index}.name=w${index}x&walls.${index}.length=${400 + 7 * index}&${bolts(index, Array.from({ length: 6 }, (__, at) => 9 + at * 67))}`).join("&");
  await page.goto(`${path}?${walls}&stock.0.length=16+ft&stock.1.length=10+ft&shortest=24+in&timeLimit=20`);
  await page.getByRole("button", { name: "Take this one" }).click({ timeout: 30_000 });
  await expect(page.getByRole("progressbar")).toHaveCount(0);
  await expect(verdict(page)).toContainText("boards");
});

test("a wall that cannot keep the rule says which joint, and which board would do", async ({ page }) => {
  await page.goto(`${path}?walls.0.name=ab&walls.0.length=30+ft&${bolts(0, Array.from({ length: 60 }, (_, index) => 5 + index * 6))}&stock.0.length=16+ft`);
  await page.getByRole("button", { name: "Calculate" }).click();
  await expect(page.getByText("joint 1 finds no place clear of the bolts").first()).toBeVisible();
  await expect(page.getByText(`a board that gives 30' 0"`).first()).toBeVisible();
});

test("the cut list alone: a kerf keeps two halves from one board (C06)", async ({ page }) => {
  await page.goto(`${path}?planFrom=pieces&pieces.0.length=72&pieces.0.count=2&stock.0.length=144&kerf=1%2F8`);
  await expect(verdict(page)).toHaveText("2 boards for 2 pieces");
  await field(page, /^Saw kerf/).fill("0");
  await expect(verdict(page)).toHaveText("1 board for 2 pieces");
});

test("the plan goes on to the takeoff with its quantities", async ({ page }) => {
  await page.goto(wall);
  await page.getByRole("link", { name: "On to the takeoff" }).click();
  await expect(verdict(page)).toHaveText("2 boards to order");
  await expect(page.locator(".takeoff-list tbody tr").filter({ has: page.getByRole("rowheader", { name: /^Nut/ }) })).toContainText("7 pieces"); // six bolts and the added anchor
});

test("in Spanish the same, in the words of the trade @phone", async ({ page }) => {
  const found = complaints(page);
  await page.goto(`/es${wall}`);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Soleras");
  await expect(verdict(page)).toHaveText("2 tablas, 2 piezas, 1 anclaje por agregar");
  expect(found).toEqual([]);
});

test("nothing a screen reader would stumble over @phone", async ({ page }) => {
  await page.goto(wall);
  await expect(verdict(page)).toContainText("2 boards");
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("the form is answered by the server @phone", async ({ page }) => {
    await page.goto(path);
    await page.locator("#field-walls-0-length").fill("28 ft");
    await page.locator("details").filter({ hasText: "Bolts: none yet" }).locator("summary").click();
    await page.locator("#paste-bolts-0").fill("8\n72\n136\n200\n264\n328");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/\/calculators\/plates\/answer\?/);
    await expect(verdict(page)).toHaveText("2 boards, 2 pieces, 1 anchor to add");
  });
});
