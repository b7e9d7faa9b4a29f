import path from "node:path";
import { staticPages } from "../bench/static-pages.mjs";
import { printTable } from "../bench/table.mjs";
import { batchOverSingle, requestsOverEcho } from "../bench/throughput.mjs";
import { fromTypescript } from "../bench/typescript.mjs";
import { ensureSystemPackages } from "../lib/apt.mjs";
import { build, buildId } from "../lib/build.mjs";
import { checkDisk } from "../lib/disk.mjs";
import { lifecycle } from "../lib/lifecycle.mjs";
import { migrate } from "../lib/migrate.mjs";
import { ensurePackages } from "../lib/packages.mjs";
import { freePort } from "../lib/ports.mjs";
import { root } from "../lib/settings.mjs";
import { placeSite, startSite } from "../lib/standalone.mjs";
import { step } from "../lib/steps.mjs";
import { throwawayFolder, throwawayServices } from "../lib/throwaway.mjs";

/**
 * The figures of the built site, in one run, on loopback alone, with services of its own that are thrown away. Absolute
 * requests a second depend on the machine and its mood; the aims are ratios, sizes and times felt at the screen.
 */
await lifecycle(async (keep) => {
  for (const name of ["DATABASE_URL", "UPSTASH_REDIS_REST_URL", "UPSTASH_REDIS_REST_TOKEN", "SITE_URL", "PORT", "HOST", "MARIADB_PORT", "SILLWRIGHT_DATA_DIR"]) delete process.env[name];
  await step("Disk", () => checkDisk(root));
  await step("Packages from npm", () => ensurePackages(root));
  // What drives the browser is a package itself, and is there only now.
  const { firstLoad } = await import("../bench/first-load.mjs");
  const { keyPresses } = await import("../bench/key-press.mjs");
  const { manyBolts } = await import("../bench/many-bolts.mjs");
  const { longestTask } = await import("../bench/longest-task.mjs");
  await step("Packages from Debian", () => ensureSystemPackages(["mariadb", "redis", "chromium"]));
  const folder = await throwawayFolder(keep);
  const { environment } = await throwawayServices(folder, keep);
  await step("Tables", () => migrate(environment.DATABASE_URL));
  await step("Build", () => build(root));
  const place = placeSite(root, path.join(folder.dataDir, "site"), buildId(root));

  /** The site with its limiter set, for as long as `work` runs. */
  const withSite = async (perMinute, work) => {
    const port = await freePort();
    const own = { BENCH: "1", LOG_LEVEL: "error", ANONYMOUS_PER_MINUTE: String(perMinute), LINKS_PER_MINUTE: "0" };
    const site = keep(await startSite({ folder: place, port, runDir: folder.runDir, logDir: folder.logDir, environment: { ...environment, ...own } }));
    try {
      return await work(site);
    } finally {
      await site.stop();
    }
  };

  const examples = await step("Worked examples", () => fromTypescript("examples.ts"));
  const rows = [];
  const measure = async (name, work) => rows.push(...(await step(name, work)));
  await withSite(0, async (site) => {
    await measure("Every public page", () => staticPages(site));
    await measure("First load of each calculator", () => firstLoad(site, examples));
    await measure("Key press to next paint", () => keyPresses(site, examples));
    await measure("Longest task while plates are planned", () => longestTask(site));
    await measure("A set with 200 bolts", () => manyBolts(site));
    await measure("Requests, limiter off", () => requestsOverEcho(site, examples, "limiter off"));
    await measure("Batches", () => batchOverSingle(site, examples));
  });
  // So many a minute that every call passes: what is measured is the asking, not the refusing.
  await withSite(1_000_000, (site) => measure("Requests, limiter on", () => requestsOverEcho(site, examples, "limiter on")));
  await measure("The parser", () => fromTypescript("parser.ts"));
  await measure("Plates", () => fromTypescript("plates.ts"));
  await measure("Solvers against size", () => fromTypescript("solvers.ts"));
  printTable(rows);
});
