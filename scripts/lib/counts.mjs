import { readFileSync } from "node:fs";

const readReport = (file) => {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return undefined; // the runner did not get as far as writing it
  }
};

/** What a run of Vitest came to. A file that could not be loaded has no tests and still is a failure. */
export function vitestCounts(file, code) {
  const report = readReport(file);
  if (!report) return { passed: 0, failed: 1, skipped: 0 };
  const broken = report.testResults.filter(({ status, assertionResults }) => status === "failed" && !assertionResults.some((test) => test.status === "failed")).length;
  const failed = report.numFailedTests + broken;
  return { passed: report.numPassedTests, failed: failed === 0 && code !== 0 ? 1 : failed, skipped: report.numPendingTests + report.numTodoTests };
}

/** What a run of Playwright came to. One that passed only at a second try counts as failed: it will fail again. */
export function playwrightCounts(file, code) {
  const report = readReport(file);
  if (!report) return { passed: 0, failed: 1, skipped: 0 };
  const { expected, unexpected, flaky, skipped } = report.stats;
  const failed = unexpected + flaky + (report.errors?.length ?? 0);
  return { passed: expected, failed: failed === 0 && code !== 0 ? 1 : failed, skipped };
}

export const sum = (counts) =>
  counts.reduce((total, { passed, failed, skipped }) => ({ passed: total.passed + passed, failed: total.failed + failed, skipped: total.skipped + skipped }), { passed: 0, failed: 0, skipped: 0 });

/** The line a test run ends with. */
export const closingLine = ({ passed, failed }) => `${passed} passed, ${failed} failed`;
