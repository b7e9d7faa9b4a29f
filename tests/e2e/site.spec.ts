import AxeBuilder from "@axe-core/playwright";
import { expect, test, type Page } from "@playwright/test";
import { complaints } from "../setup/complaints";

const paths = ["/", "/calculators", "/privacy", "/terms", "/accessibility", "/contact"];
const addresses = paths.flatMap((path) => [path, path === "/" ? "/es" : `/es${path}`]);

/** On a phone the language and the display are behind the menu. */
async function openMenu(page: Page): Promise<void> {
  const menu = page.locator(".site-menu > summary");
  if (await menu.isVisible()) await menu.click();
}

for (const address of addresses) {
  test(`${address} opens without a complaint, with a title of its own and the other language named @phone`, async ({ page }) => {
    const found = complaints(page);
    const response = await page.goto(address, { waitUntil: "networkidle" });
    expect(response?.status()).toBe(200);
    const locale = address.startsWith("/es") ? "es" : "en";
    await expect(page.locator("html")).toHaveAttribute("lang", locale);
    await expect(page.getByRole("heading", { level: 1 })).toHaveCount(1);
    expect(await page.title()).toContain("Sillwright");
    await expect(page.locator(`link[rel=alternate][hreflang=${locale === "en" ? "es" : "en"}]`)).toHaveCount(1);
    expect(found).toEqual([]);
  });

  test(`${address} is sent without a style attribute or element, since its policy would refuse them`, async ({ request }) => {
    const html = await (await request.get(address)).text();
    expect(html).not.toMatch(/<[^>]+\sstyle=|<style/);
  });

  test(`${address} does not scroll sideways at 360 pixels, nor at 320`, async ({ page }) => {
    for (const width of [360, 320]) {
      await page.setViewportSize({ width, height: 740 });
      await page.goto(address);
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
    }
  });

  test(`every target of ${address} is at least 44 pixels each way @phone`, async ({ page }) => {
    await page.goto(address);
    await openMenu(page);
    expect(await smallTargets(page)).toEqual([]);
  });
}

for (const theme of ["light", "dark", "sun"]) {
  for (const address of ["/", "/es/calculators", "/accessibility", "/no-such-page"]) {
    test(`${address} passes axe up to AAA contrast in the theme ${theme}${theme === "light" ? " @phone" : ""}`, async ({ page }) => {
      await page.addInitScript((chosen) => localStorage.setItem("sillwright.settings", JSON.stringify({ theme: chosen })), theme);
      await page.goto(address);
      const { violations } = await new AxeBuilder({ page }).withTags(["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa", "best-practice"]).options({ rules: { "color-contrast-enhanced": { enabled: true } } }).analyze();
      expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(" ")}`)).toEqual([]);
    });
  }
}

/** Links inside a sentence are exempt (WCAG 2.5.5, inline); a radio's target is its label, a tile's link covers the tile. */
async function smallTargets(page: Page): Promise<string[]> {
  return page.evaluate(() =>
    [...document.querySelectorAll<HTMLElement>("a, button, summary, select, input, [role=slider]")]
      .filter((element) => element.checkVisibility({ visibilityProperty: true }) && !element.classList.contains("skip-link"))
      .filter((element) => !(element.tagName === "A" && element.closest("p, li") !== null && getComputedStyle(element).display === "inline" && element.closest(".tile") === null))
      .flatMap((element) => {
        const target = element.closest(".tile") ?? element.closest("label") ?? element;
        const { width, height } = target.getBoundingClientRect();
        return width >= 43.99 && height >= 43.99 ? [] : [`${element.tagName} ${element.textContent ?? ""} ${width}x${height}`];
      }),
  );
}

test("the language switch keeps the page and everything typed into its address @phone", async ({ page }) => {
  await page.goto("/calculators?unit=mm&note=28%27%207%201%2F2%22#top");
  await openMenu(page);
  await page.getByRole("link", { name: "ES, Español" }).filter({ visible: true }).click();
  await expect(page).toHaveURL(/\/es\/calculators\?unit=mm&note=28%27%207%201%2F2%22#top$/);
  await expect(page.locator("html")).toHaveAttribute("lang", "es");
  await openMenu(page);
  await page.getByRole("link", { name: "EN, English" }).filter({ visible: true }).click();
  await expect(page).toHaveURL(/[^s]\/calculators\?unit=mm&note=28%27%207%201%2F2%22#top$/);
});

test("a chosen display is there again before the page is painted, in every tab @phone", async ({ page, context }) => {
  await page.goto("/");
  await openMenu(page);
  if (await page.locator(".site-pop > summary").isVisible()) await page.locator(".site-pop > summary").click();
  await page.getByRole("radio", { name: "Sun, high contrast" }).filter({ visible: true }).check({ force: true });
  await expect(page.locator("html")).toHaveAttribute("data-theme", "sun");
  const other = await context.newPage();
  await other.addInitScript(() => {
    new MutationObserver((_, observer) => {
      if (document.body === null) return;
      document.documentElement.setAttribute("data-seen", document.documentElement.getAttribute("data-theme") ?? "none");
      observer.disconnect();
    }).observe(document, { childList: true, subtree: true });
  });
  await other.goto("/terms");
  await expect(other.locator("html")).toHaveAttribute("data-seen", "sun");
  expect(await other.evaluate(() => getComputedStyle(document.body).backgroundColor)).toBe("rgb(255, 255, 255)");
  await openMenu(other);
  if (await other.locator(".site-pop > summary").isVisible()) await other.locator(".site-pop > summary").click();
  await other.getByRole("radio", { name: "Dark", exact: true }).filter({ visible: true }).check({ force: true });
  await expect(page.locator("html")).toHaveAttribute("data-theme", "dark");
});

test("without a choice the page follows the device", async ({ page }) => {
  await page.emulateMedia({ colorScheme: "dark" });
  await page.goto("/");
  expect(await page.evaluate(() => getComputedStyle(document.body).backgroundColor)).toBe("rgb(17, 24, 31)"); // --page of the dark theme
});

test("paper is black on white whatever the screen shows", async ({ page }) => {
  for (const colorScheme of ["light", "dark"] as const) {
    await page.emulateMedia({ media: "print", colorScheme });
    await page.goto("/terms");
    expect(await page.evaluate(() => [getComputedStyle(document.body).color, getComputedStyle(document.body).backgroundColor])).toEqual(["rgb(0, 0, 0)", "rgb(255, 255, 255)"]);
    await expect(page.getByRole("banner")).toBeHidden();
  }
});

test("whoever asks the device for more contrast gets no grey text", async ({ page }) => {
  for (const colorScheme of ["light", "dark"] as const) {
    await page.emulateMedia({ contrast: "more", colorScheme });
    await page.goto("/terms");
    const [body, lead] = await page.evaluate(() => [getComputedStyle(document.body).color, getComputedStyle(document.querySelector(".lead")!).color]);
    expect(lead).toBe(body);
  }
});

test("an open menu closes on Escape and gives the focus back, and on a tap elsewhere @phone-only", async ({ page }) => {
  await page.goto("/");
  const menu = page.locator(".site-menu");
  await menu.locator("> summary").click();
  await page.keyboard.press("Tab");
  await page.keyboard.press("Escape");
  await expect(menu).not.toHaveAttribute("open");
  await expect(menu.locator("> summary")).toBeFocused();
  await menu.locator("> summary").click();
  await page.locator("footer").click({ position: { x: 5, y: 5 } });
  await expect(menu).not.toHaveAttribute("open");
});

test("the units of the device are kept @phone", async ({ page }) => {
  await page.goto("/");
  await page.getByRole("radio", { name: "mm, millimeters" }).check({ force: true });
  await page.goto("/es/calculators");
  await expect(page.getByRole("radio", { name: "mm, milímetros" })).toBeChecked();
  await expect(page.locator("html")).toHaveAttribute("data-units", "mm");
});

test("the keyboard reaches the content past the header in one key, and the header's menu by itself", async ({ page }) => {
  await page.goto("/calculators");
  await page.keyboard.press("Tab");
  const skip = page.getByRole("link", { name: "Skip to the content" });
  await expect(skip).toBeFocused();
  await expect(skip).toBeInViewport();
  await page.keyboard.press("Enter");
  await expect(page.locator("#main")).toBeFocused();
});

for (const address of ["/no-such-page", "/calculators/no-such-calculator", "/es/no-hay", "/no-such-file.png"]) {
  test(`${address} is answered 404 in words, in its language, without script`, async ({ browser, baseURL }) => {
    const context = await browser.newContext({ javaScriptEnabled: false, baseURL });
    const page = await context.newPage();
    const response = await page.goto(address);
    expect(response?.status()).toBe(404);
    await expect(page.getByRole("heading", { level: 1 })).toHaveText(address.startsWith("/es") ? "Aquí no hay página" : "No page here");
    await expect(page.locator("html")).toHaveAttribute("lang", address.startsWith("/es") ? "es" : "en");
    await context.close();
  });
}

test("an English address with its language written out leads to the one without", async ({ page }) => {
  await page.goto("/en/terms?x=1");
  await expect(page).toHaveURL(/[^n]\/terms\?x=1$/);
});

test("every page's policy forbids inline scripts and styles that it does not name", async ({ request }) => {
  for (const address of [...addresses, "/no-such-page"]) {
    const policy = (await request.get(address)).headers()["content-security-policy"] ?? "";
    expect(policy, address).toContain("script-src 'self' 'sha256-");
    expect(policy, address).not.toContain("unsafe");
  }
});

test("the sitemap names every public page in both languages, and each is there", async ({ request }) => {
  const sitemap = await (await request.get("/sitemap.xml")).text();
  const listed = [...sitemap.matchAll(/<loc>([^<]+)<\/loc>/g)].map(([, address]) => new URL(address!).pathname);
  for (const address of addresses) expect(listed).toContain(address);
  for (const address of listed) expect((await request.get(address)).status(), address).toBe(200);
  expect(await (await request.get("/robots.txt")).text()).toContain("Sitemap: ");
});

test("without script the pages can be read, and choices that need it are not shown", async ({ browser, baseURL }) => {
  const context = await browser.newContext({ javaScriptEnabled: false, baseURL });
  const page = await context.newPage();
  await page.goto("/");
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await expect(page.getByRole("link", { name: "ES, Español" })).toBeVisible();
  await expect(page.getByRole("radio", { name: "mm, millimeters" })).toBeHidden();
  await context.close();
});
