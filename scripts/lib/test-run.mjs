import { performance } from "node:perf_hooks";
import { ensureSystemPackages } from "./apt.mjs";
import { closingLine, sum } from "./counts.mjs";
import { checkDisk } from "./disk.mjs";
import { lifecycle } from "./lifecycle.mjs";
import { ensurePackages } from "./packages.mjs";
import { root } from "./settings.mjs";
import { report, step } from "./steps.mjs";
import { throwawayFolder, throwawayServices } from "./throwaway.mjs";

const seconds = (since) => `${((performance.now() - since) / 1000).toFixed(1)} s`;

/**
 * A test run from a bare machine to the closing line. `names` are stages of `stages.mjs`; those that follow a stage they stand on
 * are counted as failed when it failed. Further arguments are handed to the test runners as filters.
 */
export function testRun(names, { filters = [], environment: extra = {} } = {}) {
  return lifecycle(async (keep) => {
    // Tests never touch services somebody pointed this shell at.
    for (const name of ["DATABASE_URL", "UPSTASH_REDIS_REST_URL", "UPSTASH_REDIS_REST_TOKEN", "SITE_URL", "PORT", "HOST", "MARIADB_PORT", "SILLWRIGHT_DATA_DIR"]) delete process.env[name];
    const counts = [];
    const closing = () => ({ code: sum(counts).failed > 0 ? 1 : 0, lastWords: closingLine(sum(counts)) });
    try {
      const began = performance.now();
      await step("Disk", () => checkDisk(root));
      await step("Packages from npm", () => ensurePackages(root));
      const services = ["mariadb", "redis", ...(names.includes("e2e") ? ["chromium", "curl"] : [])];
      await step("Packages from Debian", () => ensureSystemPackages(services));
      const folder = await throwawayFolder(keep);
      const { environment } = await throwawayServices(folder, keep);
      const { migrate } = await import("./migrate.mjs");
      await step("Tables", () => migrate(environment.DATABASE_URL));
      const stages = await import("./stages.mjs");
      const context = { folder, keep, filters, environment: { ...environment, ...extra } };
      const run = {
        lint: () => stages.lint(),
        types: () => stages.types(),
        build: () => stages.buildSite(),
        unit: () => stages.vitest("unit", context),
        integration: () => stages.vitest("integration", context),
        start: () => stages.vitest("start", context),
        e2e: () => stages.e2e(context),
      };
      let unbuilt = false;
      for (const name of names) {
        const start = performance.now();
        console.log(`\n── ${name}`);
        const needsBuild = name === "e2e" || name === "start";
        const count = needsBuild && unbuilt ? { passed: 0, failed: 1, skipped: 0 } : await run[name]();
        if (name === "build" && count.failed > 0) unbuilt = true;
        counts.push(count);
        const skipped = count.skipped > 0 ? `, ${count.skipped} skipped` : "";
        console.log(`── ${name}: ${closingLine(count)}${skipped} in ${seconds(start)}`);
      }
      console.log(`\nAll stages took ${seconds(began)}.`);
    } catch (error) {
      report(error, console.log);
      counts.push({ passed: 0, failed: 1, skipped: 0 });
    }
    return closing();
  });
}
