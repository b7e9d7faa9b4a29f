import { defineConfig, devices } from "@playwright/test";

/**
 * The end-to-end tests, in the distribution's Chromium against the built site that `npm test` started.
 * Every test runs on a desktop screen; one whose title says @phone runs on a phone as well, and @phone-only there alone.
 */
export default defineConfig({
  testDir: "tests/e2e",
  outputDir: "test-results",
  fullyParallel: true,
  workers: 2,
  retries: 0,
  timeout: 45_000,
  expect: { timeout: 10_000 },
  forbidOnly: Boolean(process.env.CI),
  use: {
    baseURL: process.env.E2E_BASE_URL ?? "http://localhost:3000",
    locale: "en-US",
    serviceWorkers: "block", // a test that is not about working without signal must not fetch the whole site behind its page
    trace: "off",
    screenshot: "only-on-failure",
    launchOptions: {
      executablePath: "/usr/bin/chromium",
      // No sandbox, since tests may run as root; little shared memory, as in a container; the rest keeps Chromium from calling home.
      args: ["--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking", "--disable-component-update", "--disable-sync", "--disable-dev-shm-usage"],
    },
  },
  projects: [
    { name: "desktop", grepInvert: /@phone-only/, use: { ...devices["Desktop Chrome"], viewport: { width: 1280, height: 900 } } },
    { name: "phone", grep: /@phone/, use: { ...devices["Pixel 7"], viewport: { width: 390, height: 844 } } },
  ],
});
