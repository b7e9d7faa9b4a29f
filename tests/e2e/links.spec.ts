import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { createConnection } from "mariadb";
import { encode } from "uqr";

const input = { length: "28 ft", width: "24 ft", diagonals: { ac: "444 5/16", bd: "442 13/16" }, burn: "1 in", tolerance: "1/4" };
const address = "/calculators/squareness?length=28+ft&width=24+ft&diagonals.ac=444+5%2F16&diagonals.bd=442+13%2F16&burn=1+in&tolerance=1%2F4";

async function made(page: Page, body: object = { operation: "squareness", input }) {
  const response = await page.request.post("/api/v1/links", { data: body });
  expect(response.status()).toBe(201);
  return (await response.json()) as { id: string; url: string };
}

/** Changes a kept link behind the site's back, as an older calculator would have left it. */
async function age(id: string, change: (row: { answer: Record<string, { text: string }> }) => object) {
  const url = new URL(process.env.DATABASE_URL!);
  const connection = await createConnection({ host: url.hostname, port: Number(url.port), user: url.username, password: decodeURIComponent(url.password), database: url.pathname.slice(1) });
  try {
    const [row] = (await connection.query("SELECT answer FROM short_links WHERE id = ?", [id])) as [{ answer: unknown }];
    const answer = (typeof row.answer === "string" ? JSON.parse(row.answer) : row.answer) as Record<string, { text: string }>;
    await connection.query("UPDATE short_links SET version = '0.9.0', answer = ? WHERE id = ?", [JSON.stringify(change({ answer })), id]);
  } finally {
    await connection.end();
  }
}

test("a carpenter sends a check to a phone, opens it there, and goes on in the calculator @phone", async ({ page }) => {
  await page.goto(address);
  await page.getByRole("button", { name: "Send to a phone" }).click();
  const sent = page.getByRole("region", { name: "Send to a phone" });
  const link = sent.getByRole("link");
  await expect(link).toBeVisible();
  const url = (await link.getAttribute("href"))!;
  expect(url).toMatch(/^http:\/\/[^/]+\/c\/[0-9A-Za-z]{10}$/);

  // The square code holds that very address: module by module as the encoder makes it, dark on white, with a margin of four.
  const code = sent.getByRole("img");
  const { size, data } = encode(url, { ecc: "M", border: 0 });
  expect(await code.getAttribute("viewBox")).toBe(`0 0 ${size + 8} ${size + 8}`);
  const path = (await code.locator("path").getAttribute("d"))!;
  expect(path.match(/M\d+ \d+/g)).toEqual(data.flatMap((row, y) => row.flatMap((dark, x) => (dark ? [`M${x + 4} ${y + 4}`] : []))));

  await page.goto(url);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText("Check for square");
  await expect(page.getByText("Diagonals, AC")).toBeVisible();
  await expect(page.locator("dl").nth(1)).toContainText("out of the limit");
  await page.getByRole("link", { name: "Open in the calculator" }).click();
  await expect(page).toHaveURL(/\/calculators\/squareness\?/);
  await expect(page.locator('[name="diagonals.ac"]')).toHaveValue("444 5/16");
});

test("a link that was made is copied, and what changes afterwards asks for another", async ({ page, context }) => {
  await context.grantPermissions(["clipboard-read", "clipboard-write"]);
  await page.goto(address);
  await page.getByRole("button", { name: "Send to a phone" }).click();
  const sent = page.getByRole("region", { name: "Send to a phone" });
  const url = (await sent.getByRole("link").getAttribute("href"))!;
  await sent.getByRole("button", { name: "Copy the link" }).click();
  await expect(sent.getByRole("button")).toHaveText("Link copied");
  expect(await page.evaluate(() => navigator.clipboard.readText())).toBe(url);
  await page.locator('[name="diagonals.ac"]').fill("444 1/4");
  await expect(sent.getByRole("status")).toContainText("changed since");
  await sent.getByRole("button", { name: "Make the link" }).click();
  await expect(sent.getByRole("link")).not.toHaveAttribute("href", url);
});

test("a link that cannot be made says why, and that the address holds the same", async ({ page }) => {
  await page.goto(address);
  await page.route("**/api/v1/links", (route) => route.abort());
  await page.getByRole("button", { name: "Send to a phone" }).click();
  const sent = page.getByRole("region", { name: "Send to a phone" });
  await expect(sent.getByRole("status")).toContainText("No connection");
  await page.unroute("**/api/v1/links");
  await page.route("**/api/v1/links", (route) => route.fulfill({ status: 429, contentType: "application/problem+json", body: JSON.stringify({ code: "quota-spent", detail: "Try again in 6 seconds." }) }));
  await sent.getByRole("button", { name: "Make the link" }).click();
  await expect(sent.getByRole("status")).toContainText("Try again in 6 seconds.");
  await page.unroute("**/api/v1/links");
  await sent.getByRole("button", { name: "Make the link" }).click();
  await expect(sent.getByRole("link")).toBeVisible();
});

test("a link opened with a newer calculator says so, and shows both answers where they differ", async ({ page }) => {
  const same = await made(page);
  await age(same.id, ({ answer }) => answer);
  await page.goto(`/c/${same.id}`);
  await expect(page.getByText("gives the same answer")).toBeVisible();
  await expect(page.getByRole("table")).toHaveCount(0);

  const other = await made(page);
  await age(other.id, ({ answer }) => ({ ...answer, difference: { ...answer.difference, text: '1 7/16"' } }));
  await page.goto(`/c/${other.id}`);
  await expect(page.getByText("Both answers are below")).toBeVisible();
  const row = page.getByRole("row", { name: /Difference of the diagonals/ });
  await expect(row.getByRole("cell").nth(0)).toHaveText('1 7/16"');
  await expect(row.getByRole("cell").nth(1)).toHaveText('1 1/2"');
});

test("a kept calculation is for whoever has its address: not for search engines, and not told to other sites", async ({ page }) => {
  const { id } = await made(page);
  for (const prefix of ["", "/es"]) {
    const response = (await page.goto(`${prefix}/c/${id}`))!;
    expect(response.headers()["referrer-policy"]).toBe("no-referrer");
    expect(response.headers()["x-robots-tag"]).toBe("noindex, nofollow");
    expect(response.headers()["content-security-policy"]).toMatch(/script-src 'self' 'nonce-/);
    await expect(page.locator('meta[name="robots"]')).toHaveAttribute("content", /noindex/);
    await expect(page.locator('meta[name="referrer"]')).toHaveAttribute("content", "no-referrer");
  }
  expect((await page.goto("/c/0000000000"))!.status()).toBe(404);
});

test("a kept calculation passes axe in both languages and fits a phone @phone", async ({ page }) => {
  const { id } = await made(page);
  await age(id, ({ answer }) => ({ ...answer, difference: { ...answer.difference, text: '1 7/16"' } }));
  for (const prefix of ["", "/es"]) {
    await page.goto(`${prefix}/c/${id}`);
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id: rule, nodes }) => [rule, nodes.map(({ target }) => target)])).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0);
  }
});
