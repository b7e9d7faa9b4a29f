import { openBrowser, phone } from "./browser.mjs";
import { timePresses } from "./key-press.mjs";
import { atMost, percentile, row } from "./table.mjs";

const [few, many] = [20, 200];
const slowDown = 4;
const frames = 90;

/** A set whose first wall has 200 bolts, beside one with 20, on a phone's screen at a quarter of this machine's speed: one station edited, then the whole page scrolled. */
export async function manyBolts(site) {
  const browser = await openBrowser();
  try {
    const small = await editSet(browser, site, few);
    const large = await editSet(browser, site, many);
    const p95 = ({ times }) => percentile(times, 0.95);
    return [
      row(`key press to next paint in a set with ${few} bolts, p95`, `${p95(small).toFixed(0)} ms`),
      row(`key press to next paint in a set with ${many} bolts, p50`, `${percentile(large.times, 0.5).toFixed(0)} ms`),
      atMost(`key press to next paint in a set with ${many} bolts, p95`, p95(large), 100, " ms", 0),
      atMost(`that with ${many} bolts over that with ${few}, p50`, percentile(large.times, 0.5) / percentile(small.times, 0.5), many / few),
      atMost(`frame to frame while ${many} bolts scroll, ${slowDown}× slow-down, p95`, percentile(large.gaps, 0.95), 34, " ms", 0),
    ];
  } finally {
    await browser.close();
  }
}

async function editSet(browser, site, bolts) {
  const context = await browser.newContext({ ...phone, serviceWorkers: "block" });
  const page = await context.newPage();
  await page.goto(`${site.address}/set`, { waitUntil: "networkidle" });
  await page.locator(".set-list, form").first().waitFor();
  await page.getByLabel("Name of the foundation").fill("Two hundred bolts");
  await page.getByRole("button", { name: "Start a set" }).click();
  await page.locator('.stage-rail a[href*="stage=bolts"]').click();
  await page.locator(".calculator-form").waitFor();
  await page.getByRole("radio", { name: "In the concrete" }).click({ force: true });
  await page.getByRole("textbox", { name: "Piece 1 ends" }).fill("400 ft");
  await page.getByText("Paste bolts as text").click();
  await page.locator("#paste-bolts").fill(Array.from({ length: bolts }, (_, bolt) => `${8 + 24 * bolt}, 2 3/4`).join("\n"));
  await page.getByRole("button", { name: "Use these lines" }).click();
  const middle = page.getByRole("textbox", { name: `Bolt ${bolts / 2} station`, exact: true });
  await middle.waitFor();
  await middle.focus();
  const times = await timePresses(page);
  const gaps = await scroll(page);
  await context.close();
  return { times, gaps };
}

/** Milliseconds from frame to frame, the page moved a third of a screen at each. */
function scroll(page) {
  return page.evaluate(
    (count) =>
      new Promise((resolve) => {
        const gaps = [];
        let last = 0;
        const step = (time) => {
          if (last > 0) gaps.push(time - last);
          last = time;
          if (gaps.length >= count) return resolve(gaps);
          scrollBy(0, innerHeight / 3);
          if (scrollY + innerHeight >= document.documentElement.scrollHeight - 2) scrollTo(0, 0);
          requestAnimationFrame(step);
        };
        requestAnimationFrame(step);
      }),
    frames,
  );
}
