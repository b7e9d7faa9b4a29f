import { mkdirSync } from "node:fs";
import path from "node:path";
import { ensureSystemPackages } from "./apt.mjs";
import { checkDisk } from "./disk.mjs";
import { diskFull, Failure } from "./failure.mjs";
import { loadEnvFile } from "./env-file.mjs";
import { ensurePackages } from "./packages.mjs";
import { choosePort } from "./ports.mjs";
import { endLeftovers, own } from "./processes.mjs";
import { recordRuns } from "./run.mjs";
import { servicesNeeded } from "./services.mjs";
import { root, settings } from "./settings.mjs";
import { step } from "./steps.mjs";

function makeFolder(folder) {
  try {
    mkdirSync(folder, { recursive: true, mode: 0o700 });
  } catch (error) {
    throw diskFull(error, folder) ?? new Failure(`The folder ${folder} cannot be made (${error.code}): make its parent writable for this account, or set SILLWRIGHT_DATA_DIR to another folder, and start again.`);
  }
}

/**
 * Everything before the first service: room on the disk, one start at a time, what a killed start left running, the asked port,
 * packages. Answers the settings.
 */
export async function prepare(keep, { environment = process.env } = {}) {
  loadEnvFile(path.join(root, ".env"), environment);
  const read = settings(environment);
  await step("Disk", () => checkDisk(read.dataDir));
  makeFolder(read.dataDir);
  const release = own(read.runDir, (pid) => `Sillwright already runs from this folder (process ${pid}): stop that one first, with Ctrl-C where it runs or kill ${pid}.`);
  keep({ stop: release });
  recordRuns(read.runDir);
  await step("Leftovers", () => endLeftovers(read.runDir));
  // Asked early: nobody should wait for an installation to hear that the port is taken.
  if (read.port) await choosePort({ asked: read.port, host: read.host, variable: "PORT" });
  await step("Packages from npm", () => ensurePackages(root));
  const needed = servicesNeeded(read);
  if (needed.length > 0) await step("Packages from Debian", () => ensureSystemPackages(needed));
  return read;
}
