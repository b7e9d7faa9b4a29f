import { chromium, devices } from "@playwright/test";

/** Debian's Chromium; it stays on loopback. */
export const openBrowser = () =>
  chromium.launch({
    executablePath: "/usr/bin/chromium",
    args: ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync", "--disable-dev-shm-usage"],
  });

export const phone = { ...devices["Pixel 7"], viewport: { width: 390, height: 844 }, locale: "en-US" };

/** One page for each calculator, with its first worked example in the address. */
export const pagesOf = (examples) => [...new Map(examples.map((example) => [example.calculator, example])).values()];

/** The answer stands: the verdict is no longer waiting. */
export const untilAnswered = (page) => page.locator('.verdict:not([data-tone="idle"])').waitFor({ timeout: 20_000 });
