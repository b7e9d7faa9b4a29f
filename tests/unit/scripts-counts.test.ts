import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { closingLine, playwrightCounts, sum, vitestCounts } from "@/scripts/lib/counts.mjs";

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), "sillwright-counts-"));
});
afterEach(() => rmSync(folder, { recursive: true }));
const report = (content: object) => {
  const file = path.join(folder, "report.json");
  writeFileSync(file, JSON.stringify(content));
  return file;
};
const vitest = (over: object) => report({ numPassedTests: 3, numFailedTests: 0, numPendingTests: 1, numTodoTests: 0, testResults: [], ...over });
const playwright = (stats: object, errors: object[] = []) => report({ stats: { expected: 4, unexpected: 0, flaky: 0, skipped: 0, ...stats }, errors });

test("passed, failed and skipped tests are counted as their runner reports them", () => {
  expect(vitestCounts(vitest({ numFailedTests: 2 }), 1)).toEqual({ passed: 3, failed: 2, skipped: 1 });
  expect(playwrightCounts(playwright({ unexpected: 1, skipped: 2 }), 1)).toEqual({ passed: 4, failed: 1, skipped: 2 });
});

test("a file that could not be loaded, a runner that failed without a failed test, and one that wrote nothing are failures", () => {
  expect(vitestCounts(vitest({ testResults: [{ status: "failed", assertionResults: [] }, { status: "passed", assertionResults: [] }] }), 1).failed).toBe(1);
  expect(vitestCounts(vitest({}), 1).failed).toBe(1);
  expect(playwrightCounts(playwright({}, [{ message: "no browser" }]), 1).failed).toBe(1);
  expect(playwrightCounts(playwright({}), 1).failed).toBe(1);
  expect(vitestCounts(path.join(folder, "absent.json"), 0)).toEqual({ passed: 0, failed: 1, skipped: 0 });
  expect(playwrightCounts(path.join(folder, "absent.json"), 0)).toEqual({ passed: 0, failed: 1, skipped: 0 });
});

test("a test that passed only at a second try is a failure", () => {
  expect(playwrightCounts(playwright({ flaky: 1 }), 0)).toEqual({ passed: 4, failed: 1, skipped: 0 });
});

test("the closing line is the plain one, summed over all stages", () => {
  expect(closingLine(sum([{ passed: 1, failed: 0, skipped: 4 }, { passed: 41, failed: 2, skipped: 0 }]))).toBe("42 passed, 2 failed");
});
