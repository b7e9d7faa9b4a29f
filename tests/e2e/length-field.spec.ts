import { expect, test, type Locator, type Page } from "@playwright/test";

/** Any page with a length field and a blade serves: this is the shortest. */
const address = "/calculators/conversions";
const field = (page: Page): Locator => page.getByRole("textbox", { name: "Length", exact: true });
const echo = (page: Page): Locator => page.locator("#field-value-echo");
const blade = (page: Page): Locator => page.getByRole("slider", { name: "Tape blade for Length" });

test.beforeEach(async ({ page }) => {
  await page.goto(address);
  await expect(field(page)).toBeEditable();
});

test("a bare number is echoed in feet and inches as it is typed @phone", async ({ page }) => {
  await field(page).pressSequentially("113");
  await expect(echo(page)).toHaveText(`9' 5"`);
  await field(page).fill(`28' 7 1/2"`);
  await expect(echo(page)).toHaveText("343 1/2 in");
  await field(page).fill("28 7");
  await expect(echo(page)).toHaveText("");
});

test("a tap on a graduation sets the fraction, and the buttons and keys move it by one @phone", async ({ page }) => {
  await field(page).fill("428 9/16");
  const face = blade(page);
  await expect(face).toHaveAttribute("aria-valuetext", "428 9/16");
  const box = (await face.boundingBox())!;
  // Nine parts of sixteen lie between 7.2 and 92.8 per cent of the blade; half an inch in the middle.
  await face.click({ position: { x: box.width / 2, y: 40 } });
  await expect(field(page)).toHaveValue("428 1/2");
  await page.getByRole("button", { name: "Length: One graduation more" }).click();
  await expect(field(page)).toHaveValue("428 9/16");
  await page.getByRole("button", { name: "Length: One graduation less" }).click();
  await expect(field(page)).toHaveValue("428 1/2");
  await face.focus();
  await page.keyboard.press("ArrowRight");
  await expect(field(page)).toHaveValue("428 9/16");
  await page.keyboard.press("PageDown");
  await expect(field(page)).toHaveValue("427 9/16");
});

test("the slim row types the marks a phone's keypad lacks, and the field keeps the focus @phone-only", async ({ page }) => {
  const row = page.getByRole("group", { name: "Insert a mark" }).first();
  await expect(row).toBeHidden();
  await field(page).tap();
  await expect(row).toBeVisible();
  await page.keyboard.type("28");
  await row.getByRole("button", { name: "Insert feet" }).tap();
  await page.keyboard.type("7");
  await row.getByRole("button", { name: "Insert a space" }).tap();
  await page.keyboard.type("1");
  await row.getByRole("button", { name: "Insert fraction bar" }).tap();
  await page.keyboard.type("2");
  await row.getByRole("button", { name: "Insert inches" }).tap();
  await expect(field(page)).toBeFocused();
  await expect(field(page)).toHaveValue(`28' 7 1/2"`);
  await page.getByRole("heading", { level: 1 }).tap();
  await expect(row).toBeHidden();
});

test("another unit keeps what was typed to mean the same length @phone", async ({ page }) => {
  await field(page).fill("336");
  await expect(echo(page)).toHaveText(`28' 0"`);
  await page.getByRole("radio", { name: "mm, millimeters" }).check({ force: true });
  await expect(field(page)).toHaveValue(/^336 ?(in|")$/);
  await expect(echo(page)).toHaveText("8534 mm");
});

test("the field asks for a decimal keypad, and is text", async ({ page }) => {
  await expect(field(page)).toHaveAttribute("inputmode", "decimal");
  await expect(field(page)).toHaveAttribute("type", "text");
  await expect(field(page)).toHaveAttribute("autocomplete", "off");
});
