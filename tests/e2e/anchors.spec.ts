import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";

const path = "/calculators/anchors";
const verdict = (page: Page) => page.locator(".verdict-title");
const body = (page: Page) => page.locator(".verdict-body");
const field = (page: Page, label: string) => page.getByLabel(label, { exact: true });
const findings = (page: Page) => page.locator(".findings li");

test("a carpenter lays out bolts for two pieces, each station from the corner and from the piece's end @phone", async ({ page }) => {
  await page.goto(path);
  await expect(verdict(page)).toHaveText("Type a piece's length");
  await field(page, "Piece 1").fill("10 ft");
  await field(page, "End distance").fill("12");
  await expect(verdict(page)).toHaveText("3 bolts");
  await expect(body(page)).toHaveText(`4' 0" apart, the first 1' 0" from the end.`); // domain.md B10
  await page.getByRole("button", { name: "Add a piece" }).click();
  await expect(field(page, "Piece 2")).toBeFocused();
  await field(page, "Piece 2").fill("8 ft");
  await expect(verdict(page)).toHaveText("5 bolts"); // B09: two more
  await expect(page.getByRole("row", { name: /^1 11' 0" 1' 0"/ })).toBeVisible();
  await page.getByLabel("Rule").selectOption("us-irc-seismic-3-storey");
  await expect(verdict(page)).toHaveText("6 bolts"); // B16: three in 8 ft
  await page.getByText("What this rule says").click();
  await expect(page.locator(".rule-figures")).toContainText("4 ftR403.1.6.1, read in the source");
  await expect(page.locator(".rule-figures")).toContainText("not stated by this rule");
});

test("bolts in the concrete are judged as they are typed, and the fewest to add are told @phone", async ({ page }) => {
  await page.goto(path);
  await page.getByRole("radio", { name: "In the concrete" }).check();
  await field(page, "Piece 1 ends").fill("16 ft");
  for (const [row, station] of ["8", "80", "184"].entries()) {
    await page.getByRole("button", { name: "Add a bolt" }).click();
    await field(page, `Bolt ${row + 1} station`).fill(station);
  }
  await expect(verdict(page)).toHaveText("1 thing to fix");
  await expect(findings(page)).toContainText([`Spacing. Bolts 2 and 3 are 8' 8" apart. At most 6' 0" is allowed.`]); // 184 − 80 = 104
  await expect(findings(page).first()).toContainText("R403.1.6, read in the source");
  await expect(body(page)).toHaveText(`Add one anchor, at 11' 0".`); // midway between 80 and 184
  await expect(page.locator("svg.plan").first()).toContainText(`8' 8"`);
  await page.getByRole("radio", { name: /2x6/ }).check();
  await field(page, "Bolt 3 offset").fill("1 1/2");
  await expect(findings(page).last()).toContainText(`Middle third. Bolt 3 at 15' 4" is 1 1/2" in from the plate's outer edge. The third's limit is 1 13/16".`); // B07
  await page.getByText("More about bolt 3").click();
  await page.getByRole("checkbox", { name: "Engineered: hold-down or strap" }).last().check();
  await expect(page.getByText("Bolt 3 is engineered: not judged, not counted, not moved.")).toBeVisible();
  await page.getByRole("button", { name: "Remove bolt 3" }).click();
  await expect(findings(page).first()).toContainText("Far from the end");
});

test("a survey pasted as text is taken from the slab and moved to the chalk @phone", async ({ page }) => {
  await page.goto(`${path}?mode=check&pieces.0.to=8+ft&plateWidth=5+1/2+in`);
  await page.getByText("Paste bolts as text").click();
  await page.locator("#paste-bolts").fill("station, offset, height\n12 1/2, 2 3/4, 2 1/2\n84 1/2, 2 3/4, 2 1/2\n40, 3, HD");
  await page.getByRole("button", { name: "Use these lines" }).click();
  await expect(field(page, "Bolt 2 station")).toHaveValue("84 1/2");
  await field(page, "Inset of this wall").fill("1/2");
  await expect(verdict(page)).toHaveText("The bolts pass"); // N07: 2 1/4 from the plate's edge
  await expect(page.getByText(/3 bolts were moved to the chalk: 1\/2" off the station, 1\/2" off the offset/)).toBeVisible();
});

test("figures from one's own drawings judge, and what they leave open is told", async ({ page }) => {
  await page.goto(`${path}?mode=check&pieces.0.to=8+ft&bolts.0.station=12&bolts.1.station=84`);
  await expect(verdict(page)).toHaveText("The bolts pass");
  await page.getByLabel("Rule").selectOption("From my drawings");
  await page.getByLabel("Greatest spacing").fill("4 ft");
  await expect(findings(page)).toContainText([`At most 4' 0" is allowed`]);
  await expect(page.locator(".silent")).toContainText("least end distance");
});

test("a layout goes on to its check after the pour, and passes it", async ({ page }) => {
  await page.goto(`${path}?mode=layout&pieces.0=16+ft&pieces.1=12+ft`);
  await expect(verdict(page)).toHaveText("7 bolts");
  await page.getByRole("link", { name: "Check these after the pour" }).click();
  await expect(page).toHaveURL(/mode=check/);
  await expect(verdict(page)).toHaveText("The bolts pass");
  await expect(field(page, "Bolt 7 station")).toHaveValue("328 in"); // 336 − 8
});

test("what cannot be is refused at its row, and what was typed stays @phone", async ({ page }) => {
  await page.goto(`${path}?mode=check&pieces.0.to=8+ft&bolts.0.station=1,234`);
  await page.getByRole("button", { name: "Calculate" }).click();
  await expect(field(page, "Bolt 1 station")).toHaveValue("1,234");
  await expect(field(page, "Bolt 1 station")).toHaveAttribute("aria-invalid", "true");
  await page.goto(`${path}?mode=layout&pieces.0=6`);
  await page.getByRole("button", { name: "Calculate" }).click();
  await expect(field(page, "Piece 1")).toHaveAttribute("aria-invalid", "true"); // B26
});

test("in Spanish the check speaks of pernos and soleras @phone", async ({ page }) => {
  await page.goto(`/es${path}?mode=check&pieces.0.to=16+ft&bolts.0.station=8&bolts.1.station=80&bolts.2.station=184`);
  await expect(verdict(page)).toHaveText("1 cosa por arreglar");
  await expect(findings(page)).toContainText([`Separación. Los pernos 2 y 3 están a 8' 8". Se permite 6' 0" cuando más.`]);
});

test.describe("without script", () => {
  test.use({ javaScriptEnabled: false });

  test("a layout is sent and answered @phone", async ({ page }) => {
    await page.goto(path);
    await field(page, "Piece 1").fill("10 ft");
    await field(page, "End distance").fill("12");
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(page).toHaveURL(/anchors\/answer\?/);
    await expect(verdict(page)).toHaveText("3 bolts");
  });

  test("bolts in the concrete are sent as rows or as pasted text", async ({ page }) => {
    await page.goto(path);
    await page.locator('input[name="mode"][value="check"]').check({ force: true });
    await page.getByRole("button", { name: "Calculate" }).click();
    await field(page, "Piece 1 ends").fill("16 ft");
    await page.getByText("Paste bolts as text").click();
    await page.locator("#paste-bolts").fill("8\n80\n184");
    await page.locator('input[name="measuredFrom"][value="chalk"]').check({ force: true });
    await page.getByRole("button", { name: "Calculate" }).click();
    await expect(verdict(page)).toHaveText("1 thing to fix");
    await expect(field(page, "Piece 1 ends")).toHaveValue("16 ft");
  });
});

test("nothing on the page bars anyone, in either mode @phone", async ({ page }) => {
  test.slow();
  for (const query of ["", "?mode=layout&pieces.0=16+ft", "?mode=check&pieces.0.to=16+ft&bolts.0.station=8&bolts.1.station=80&bolts.2.station=184&bolts.2.offset=1+1/2&plateWidth=5+1/2"]) {
    await page.goto(path + query);
    await page.waitForTimeout(500);
    expect((await new AxeBuilder({ page }).analyze()).violations.map(({ id, nodes }) => `${id} ${nodes[0]?.html}`)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
  }
});
