import { openBrowser, pagesOf, phone, untilAnswered } from "./browser.mjs";
import { atMost, percentile, row } from "./table.mjs";

const presses = 60;
const slowDown = 4;
/** A quick typist; the answer to one key is still being worked out when the next comes. */
const pause = 90;

/** On a phone's screen at a quarter of this machine's speed: from a key press to the end of the next frame. */
export async function keyPresses(site, examples) {
  const browser = await openBrowser();
  try {
    const rows = [];
    const all = [];
    for (const { calculator, page: address } of pagesOf(examples)) {
      const times = await typeOn(browser, site.address + address);
      all.push(...times);
      rows.push(row(`key press to next paint on ${calculator}, p50`, `${percentile(times, 0.5).toFixed(0)} ms`));
      rows.push(atMost(`key press to next paint on ${calculator}, p95`, percentile(times, 0.95), 50, " ms", 0));
    }
    return [...rows, atMost("key press to next paint on all, p95", percentile(all, 0.95), 50, " ms", 0)];
  } finally {
    await browser.close();
  }
}

async function typeOn(browser, address) {
  const context = await browser.newContext(phone);
  try {
    const page = await context.newPage();
    await page.goto(address, { waitUntil: "networkidle" });
    await untilAnswered(page);
    await page.locator("form .length-input").first().focus();
    return await timePresses(page);
  } finally {
    await context.close();
  }
}

/** Milliseconds from key to paint, of digits typed and taken back in the field that has the focus, at a quarter of the speed. */
export async function timePresses(page) {
  await page.keyboard.press("End");
  const session = await page.context().newCDPSession(page);
  await session.send("Emulation.setCPUThrottlingRate", { rate: slowDown });
  await page.evaluate(() => {
    window.paints = [];
    addEventListener(
      "keydown",
      ({ timeStamp }) =>
        requestAnimationFrame(() => {
          const channel = new MessageChannel(); // its message is handled once the frame is drawn
          channel.port1.onmessage = () => window.paints.push(performance.now() - timeStamp);
          channel.port2.postMessage(0);
        }),
      { capture: true },
    );
  });
  for (let press = 0; press < presses; press += 1) {
    await page.keyboard.press(press % 2 === 0 ? "Backspace" : String((press % 8) + 1));
    await page.waitForTimeout(pause);
  }
  await page.waitForFunction((count) => window.paints.length >= count, presses, { timeout: 20_000 });
  return await page.evaluate(() => window.paints);
}
