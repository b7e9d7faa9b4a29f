import type { Page } from "@playwright/test";

/** What the browser complains of while a page is open: a test asks that there be nothing. Playwright's own word that it keeps service workers out is none. */
export function complaints(page: Page): string[] {
  const found: string[] = [];
  page.on("console", (message) => {
    if (["error", "warning"].includes(message.type()) && !message.text().includes("blocked by Playwright")) found.push(message.text());
  });
  page.on("pageerror", (error) => found.push(error.message));
  return found;
}
