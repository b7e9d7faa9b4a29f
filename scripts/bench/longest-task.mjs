import { openBrowser, phone } from "./browser.mjs";
import { atMost } from "./table.mjs";

const slowDown = 4;
const walls = 40;
const boltsInEach = 6;

/** Forty walls in the address: some 200 bolts. */
const address = () => {
  const query = new URLSearchParams({ "stock.0.length": "16 ft", "stock.1.length": "12 ft", "stock.2.length": "10 ft", shortest: "24 in", timeLimit: "20" });
  for (let wall = 0; wall < walls; wall += 1) {
    query.set(`walls.${wall}.name`, `w${wall}x`);
    query.set(`walls.${wall}.length`, String(300 + 11 * wall));
    for (let bolt = 0; bolt < boltsInEach; bolt += 1) query.set(`walls.${wall}.bolts.${bolt}.station`, String(9 + 67 * bolt));
  }
  return `/calculators/plates?${query}`;
};

/** The longest task of the page's own thread while a worker plans a whole house and better plans come in, at a quarter of this machine's speed. */
export async function longestTask(site) {
  const browser = await openBrowser();
  try {
    const context = await browser.newContext(phone);
    const page = await context.newPage();
    await page.goto(site.address + address(), { waitUntil: "networkidle" });
    await page.locator('.verdict:not([data-tone="idle"])').waitFor({ timeout: 60_000 });
    const session = await context.newCDPSession(page);
    await session.send("Emulation.setCPUThrottlingRate", { rate: slowDown });
    await page.evaluate(() => {
      window.longest = 0;
      new PerformanceObserver((list) => list.getEntries().forEach(({ duration }) => (window.longest = Math.max(window.longest, duration)))).observe({ type: "longtask" });
    });
    await page.waitForTimeout(6_000);
    const longest = await page.evaluate(() => window.longest);
    return [atMost(`longest task while ${walls} walls are planned, ${slowDown}× slow-down`, longest, 50, " ms", 0)];
  } finally {
    await browser.close();
  }
}
