import { cpSync, existsSync, readdirSync, renameSync, rmSync, mkdirSync } from "node:fs";
import path from "node:path";
import { startService, untilReady } from "./processes.mjs";

/**
 * Copies the built site to `<folder>/<name>`, so that a later build does not take the files from under a running site, and
 * removes what earlier builds left there. A copy that is whole already is kept.
 */
export function placeSite(root, folder, name) {
  const site = path.join(folder, name);
  mkdirSync(folder, { recursive: true });
  if (!existsSync(site)) {
    const unfinished = `${site}.unfinished`;
    rmSync(unfinished, { recursive: true, force: true });
    cpSync(path.join(root, ".next", "standalone"), unfinished, { recursive: true, verbatimSymlinks: true });
    renameSync(unfinished, site);
  }
  for (const other of readdirSync(folder)) if (other !== name) rmSync(path.join(folder, other), { recursive: true, force: true });
  return site;
}

/** Where a browser on this machine finds a site that listens on `host`. */
export const addressOf = (host, port) => `http://${["127.0.0.1", "0.0.0.0", "::", "::1"].includes(host) ? "localhost" : host}:${port}`;

/** Starts the built site in its own process and waits until it answers. `environment` is added to what every site gets. */
export async function startSite(options) {
  const { folder, host = "127.0.0.1", port, environment, keepAlive = "65000", runDir, logDir, name = "site" } = options;
  const address = addressOf(host, port);
  const service = startService({
    name,
    command: process.execPath,
    args: ["server.js"],
    cwd: folder,
    env: {
      ...process.env, SITE_URL: address, ...environment,
      NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1", PORT: String(port), HOSTNAME: host, KEEP_ALIVE_TIMEOUT: keepAlive,
    },
    runDir,
    logDir,
    within: 15_000,
  });
  const reach = `http://${["0.0.0.0", "::"].includes(host) ? "127.0.0.1" : host.includes(":") ? `[${host}]` : host}:${port}/api/health/live`;
  try {
    await untilReady(service, () => fetch(reach, { signal: AbortSignal.timeout(2_000) }).then(({ status }) => status < 500, () => false));
  } catch (error) {
    await service.stop();
    throw error;
  }
  return { service, stop: service.stop, again: () => startSite(options), address, note: address };
}
