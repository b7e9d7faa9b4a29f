import { createHash } from "node:crypto";
import { cpSync, existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { writeSecurityHeaders } from "./csp.mjs";
import { Failure } from "./failure.mjs";
import { own } from "./processes.mjs";
import { run } from "./run.mjs";

/** All that a build is made from; a change to anything else leaves it fresh. */
export const SOURCES = [
  "api-spec", "app", "calculators", "components", "lib", "models", "public", "package-lock.json", "next.config.mjs", "tsconfig.json",
  "tailwind.config.ts", "postcss.config.mjs", "proxy.ts", "instrumentation.ts", "scripts/lib/build.mjs", "scripts/lib/csp.mjs", "scripts/lib/service-worker.mjs",
];
const stampFile = (root) => path.join(root, ".next", "sillwright-build.json");

/**
 * A hash over every source and over what else goes into the pages.
 * @param {string} root
 * @param {Record<string, string | undefined>} environment
 */
export function sourceHash(root, environment = process.env) {
  const hash = createHash("sha256");
  hash.update(`node ${process.versions.node.split(".")[0]}\0${environment.SITE_URL ?? ""}\0`);
  const visit = (relative) => {
    const full = path.join(root, relative);
    let entries;
    try {
      entries = readdirSync(full, { withFileTypes: true });
    } catch (error) {
      if (error.code === "ENOENT") return;
      if (error.code !== "ENOTDIR") throw error;
      hash.update(`${relative}\0`).update(readFileSync(full)).update("\0");
      return;
    }
    entries.map(({ name }) => name).sort().forEach((name) => visit(path.join(relative, name)));
  };
  SOURCES.forEach(visit);
  return hash.digest("hex");
}

/** Whether the last build was made from these very sources and is complete. */
export function buildCurrent(root, hash = sourceHash(root)) {
  try {
    return JSON.parse(readFileSync(stampFile(root), "utf8")).hash === hash && existsSync(path.join(root, ".next", "standalone", "server.js"));
  } catch {
    return false;
  }
}

/** Names one build: its copies are kept under it. */
export const buildId = (root) => readFileSync(path.join(root, ".next", "BUILD_ID"), "utf8").trim();

/** One build at a time in a checkout: the second waits, and then finds the first one's work. */
async function ownBuild(root) {
  for (let waited = 0; ; waited += 500) {
    try {
      return own(path.join(root, ".data", "build"), (pid) => `Another build of this folder runs as process ${pid} and has not finished in ten minutes: end it and start again.`);
    } catch (error) {
      if (!(error instanceof Failure) || waited >= 600_000) throw error;
      await pause(500);
    }
  }
}

/** Builds the standalone site unless the last build is fresh, with its security headers and static files in place. */
export async function build(root, { force = false, show = false } = {}) {
  const release = await ownBuild(root);
  try {
    const hash = sourceHash(root);
    if (!force && buildCurrent(root, hash)) return "fresh";
    rmSync(stampFile(root), { force: true });
    const next = path.join(root, "node_modules", "next", "dist", "bin", "next");
    const { code, output } = await run(process.execPath, [next, "build"], {
      cwd: root,
      env: { ...process.env, NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1", ...(show ? {} : { NO_COLOR: "1" }) },
      show,
    });
    if (code !== 0) throw new Failure("The site could not be built: the lines above say why; put that right and start again.", { details: show ? "" : output });
    const standalone = path.join(root, ".next", "standalone");
    if (!existsSync(path.join(standalone, "server.js")))
      throw new Failure('The build left no .next/standalone/server.js: next.config.mjs must say output: "standalone" and name this folder as its root.');
    const pages = writeSecurityHeaders([path.join(root, ".next"), path.join(standalone, ".next")]);
    // Next leaves these out of the standalone folder, and files added after the start would not be served.
    if (existsSync(path.join(root, "public"))) cpSync(path.join(root, "public"), path.join(standalone, "public"), { recursive: true });
    cpSync(path.join(root, ".next", "static"), path.join(standalone, ".next", "static"), { recursive: true });
    // By now the packages are there; this file is read before they are.
    const { writeServiceWorker } = await import("./service-worker.mjs");
    const kept = await writeServiceWorker(root, path.join(root, ".next"), path.join(standalone, "public"));
    // Next copies .env files along; the site gets its environment from whoever starts it.
    for (const file of readdirSync(standalone)) if (file.startsWith(".env")) rmSync(path.join(standalone, file));
    writeFileSync(stampFile(root), JSON.stringify({ hash, pages }));
    return `built, ${pages} static pages with their own policy, ${kept.files} files (${kept.kilobytes} kB) for use without signal`;
  } finally {
    release();
  }
}
