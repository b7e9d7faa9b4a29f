import { cpSync, existsSync, readdirSync, renameSync, rmSync, mkdirSync } from "node:fs";
import { get } from "node:http";
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

/** Whether the site answers, over a connection that is closed at once: one left open would hold up the site's end. */
function answers(url) {
  return new Promise((resolve) => {
    const request = get(url, { agent: false, timeout: 5_000 }, (response) => {
      response.resume();
      resolve(response.statusCode < 500);
    });
    request.once("timeout", () => request.destroy(new Error("no answer")));
    request.once("error", () => resolve(false));
  });
}

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
    within: 4_000, // far more than a request takes; a browser's idle connection may last longer, and need not be waited for
  });
  const reach = `http://${["0.0.0.0", "::"].includes(host) ? "127.0.0.1" : host.includes(":") ? `[${host}]` : host}:${port}/api/health/live`;
  try {
    await untilReady(service, () => answers(reach));
  } catch (error) {
    await service.stop();
    throw error;
  }
  return { service, stop: service.stop, again: () => startSite(options), address, note: address };
}
