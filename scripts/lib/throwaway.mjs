import { mkdtempSync, readdirSync, rmSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { endLeftovers, own } from "./processes.mjs";
import { recordRuns } from "./run.mjs";
import { startServices } from "./services.mjs";

const PREFIX = "sillwright-test-";

/** Removes what test runs that were killed left behind; one that still runs is left alone. */
async function clearAbandoned() {
  for (const name of readdirSync(os.tmpdir()).filter((entry) => entry.startsWith(PREFIX))) {
    const folder = path.join(os.tmpdir(), name);
    const runDir = path.join(folder, "run");
    try {
      own(runDir, () => "in use")();
    } catch {
      continue;
    }
    await endLeftovers(runDir);
    rmSync(folder, { recursive: true, force: true });
  }
}

/** A data folder that lives as long as this process's tests. */
export async function throwawayFolder(keep) {
  await clearAbandoned();
  const dataDir = mkdtempSync(path.join(os.tmpdir(), PREFIX));
  const runDir = path.join(dataDir, "run");
  own(runDir, () => "in use");
  recordRuns(runDir);
  keep({ stop: async () => rmSync(dataDir, { recursive: true, force: true }) });
  return { dataDir, runDir, logDir: path.join(dataDir, "log") };
}

/**
 * MariaDB and the stand-in for Upstash on free loopback ports with nothing in them. Tests may make databases whose name begins
 * with `sillwright_`. The environment says that these are ours to fill and empty.
 */
export async function throwawayServices(folder, keep, print) {
  const { environment, started } = await startServices({ ...folder, extraGrants: ["GRANT ALL PRIVILEGES ON `sillwright\\_%`.*"] }, keep, print);
  return { environment: { ...environment, SILLWRIGHT_TEST_SERVICES: "throwaway" }, started };
}
