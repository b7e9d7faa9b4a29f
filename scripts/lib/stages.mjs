import path from "node:path";
import { build, buildId } from "./build.mjs";
import { playwrightCounts, vitestCounts } from "./counts.mjs";
import { freePort } from "./ports.mjs";
import { run } from "./run.mjs";
import { root } from "./settings.mjs";
import { placeSite, startSite } from "./standalone.mjs";

const MINUTE = 60_000;
const bin = (...parts) => path.join(root, "node_modules", ...parts);
const node = (file, args, { environment = {}, minutes = 10, show = false } = {}) =>
  run(process.execPath, [file, ...args], { cwd: root, show, env: { ...withoutColour(), ...environment }, signal: AbortSignal.timeout(minutes * MINUTE) });

/** Logs are read in files as often as on screens. Vitest takes any FORCE_COLOR, even 0, for a wish. */
function withoutColour() {
  const { FORCE_COLOR: _, ...rest } = process.env;
  return { ...rest, NO_COLOR: "1", VITE_CONFIG_NATIVE_IGNORE_WARNING: "true" };
}

const oneTest = ({ code, output }) => {
  if (code !== 0) console.log(output.trimEnd());
  return { passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, skipped: 0 };
};

export async function lint() {
  return oneTest(await node(bin("eslint", "bin", "eslint.js"), [".", "--max-warnings=0"]));
}

export async function types() {
  const routes = await node(bin("next", "dist", "bin", "next"), ["typegen"]); // a fresh clone lacks the types Next makes from the routes
  if (routes.code !== 0) return oneTest(routes);
  return oneTest(await node(bin("typescript", "bin", "tsc"), ["--noEmit", "-p", "."]));
}

/** Runs one of vitest.config.ts's projects. */
export async function vitest(project, { folder, environment, filters = [], minutes = environment.PROVE ? 120 : 15 }) {
  const report = path.join(folder.dataDir, `${project}.json`);
  const { code } = await node(bin("vitest", "vitest.mjs"), [
    "run", "--project", project, "--passWithNoTests", "--reporter=default", "--reporter=json", `--outputFile.json=${report}`, ...filters,
  ], { environment: { ...environment, NODE_ENV: "test" }, minutes, show: true });
  return vitestCounts(report, code);
}

/** A build that fails is one failed test; one that passes is only the ground for others. */
export async function buildSite() {
  try {
    await build(root);
    return { passed: 0, failed: 0, skipped: 0 };
  } catch (error) {
    console.log(error.details ?? "");
    console.log(error.message);
    return { passed: 0, failed: 1, skipped: 0 };
  }
}

/**
 * The built site in a folder outside the checkout, where nothing that the build left out can be found by accident. Limits are
 * wide, since all of the browser tests come from one address; the limiter has tests of its own.
 */
export async function siteForTests({ folder, environment, keep }) {
  const port = await freePort();
  const place = placeSite(root, path.join(folder.dataDir, "site"), buildId(root));
  return keep(await startSite({
    folder: place, port, runDir: folder.runDir, logDir: folder.logDir,
    environment: { ...environment, TRUST_PROXY: "1", ANONYMOUS_PER_MINUTE: "6000", LINKS_PER_MINUTE: "600", LOG_LEVEL: "warn" },
  }));
}

export async function e2e({ folder, environment, keep, filters = [] }) {
  const site = await siteForTests({ folder, environment, keep });
  const report = path.join(folder.dataDir, "e2e.json");
  const { code } = await node(bin("@playwright", "test", "cli.js"), ["test", "--pass-with-no-tests", process.env.CI ? "--reporter=dot,json" : "--reporter=line,json", ...filters], {
    environment: { ...environment, E2E_BASE_URL: site.address, PLAYWRIGHT_JSON_OUTPUT_NAME: report, PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD: "1" },
    minutes: 20,
    show: true,
  });
  const counts = playwrightCounts(report, code);
  if (counts.failed > 0) console.log(`The end of the site's log:\n${site.service.tail()}`);
  await site.stop();
  return counts;
}
