import { accessSync, constants, existsSync } from "node:fs";
import path from "node:path";
import { diskFull, Failure } from "./failure.mjs";
import { run } from "./run.mjs";

/** What the project takes from Debian, by the program that shows it is there. */
export const systemPackages = {
  mariadb: { package: "mariadb-server", programs: ["mariadbd", "mariadb-install-db"] },
  redis: { package: "redis-server", programs: ["redis-server"] },
  chromium: { package: "chromium", programs: ["chromium"] },
  curl: { package: "curl", programs: ["curl"] }, // the API's examples on the page are run as they stand
};

/** Debian's own way to say "install, but start nothing". */
const POLICY = "/usr/sbin/policy-rc.d";

/** The full path of a program, looking where Debian keeps servers too. */
export function findProgram(name, searchPath = process.env.PATH ?? "") {
  for (const folder of [...searchPath.split(":"), "/usr/sbin", "/usr/bin", "/usr/local/bin", "/usr/local/sbin"]) {
    const file = path.join(folder || ".", name);
    try {
      accessSync(file, constants.X_OK);
      return file;
    } catch {
      // Not in this folder.
    }
  }
  return undefined;
}

/**
 * Installs through apt those of `names` that are missing. The distribution's own services are kept from starting: the project
 * runs its own copies with their own data.
 * @throws Failure when there is no apt, or no right to use it.
 */
export async function ensureSystemPackages(names, { find = findProgram, execute = run, userId = process.getuid?.() ?? 0, policy = POLICY } = {}) {
  const missing = names.map((name) => systemPackages[name]).filter(({ programs }) => !programs.every((program) => find(program)));
  if (missing.length === 0) return "already here";
  const packages = missing.map((entry) => entry.package);
  const list = packages.join(" ");
  if (!find("apt-get"))
    throw new Failure(`${packages.join(" and ")} missing, and this machine has no apt: install them with its own package manager, or set DATABASE_URL and UPSTASH_REDIS_REST_URL to servers you have, and start again.`);
  const prefix = await rootPrefix({ find, execute, userId, list });
  const execPrefixed = (...command) => execute(...asRoot(prefix, command));
  const quiet = !existsSync(policy);
  if (quiet) await execPrefixed("sh", "-c", `printf '#!/bin/sh\\nexit 101\\n' > ${policy} && chmod 755 ${policy}`);
  try {
    const install = ["env", "DEBIAN_FRONTEND=noninteractive", "apt-get", "install", "-y", "--no-install-recommends", "-o", "DPkg::Lock::Timeout=120", ...packages];
    let result = await execPrefixed(...install);
    if (/dpkg --configure -a/.test(result.output)) {
      await execPrefixed("dpkg", "--configure", "-a"); // an installation that was cut short has to be finished first
      result = await execPrefixed(...install);
    }
    if (result.code !== 0) {
      const update = await execPrefixed("apt-get", "update"); // A fresh machine has no package lists, an old one stale ones.
      result = update.code === 0 ? await execPrefixed(...install) : update;
    }
    if (result.code !== 0) throw aptFailure(result.output, list);
  } finally {
    if (quiet) await execute(...asRoot(prefix, ["rm", "-f", policy]), { putsBack: true });
  }
  return `installed ${list}`;
}

function asRoot(prefix, [command, ...args]) {
  return prefix.length ? [prefix[0], [...prefix.slice(1), command, ...args]] : [command, args];
}

async function rootPrefix({ find, execute, userId, list }) {
  if (userId === 0) return [];
  const allowed = find("sudo") && (await execute("sudo", ["-n", "true"])).code === 0;
  if (allowed) return ["sudo", "-n"];
  throw new Failure(`${list} must be installed, and this account is neither root nor allowed to use sudo without a password: run "sudo apt-get install ${list}" once, or set DATABASE_URL and UPSTASH_REDIS_REST_URL to servers you have, and start again.`);
}

/** The sentence for what apt wrote when it failed. */
export function aptFailure(output, list) {
  const full = diskFull({ message: output }, "/var");
  if (full) return full;
  if (/Could not get lock|Unable to acquire/i.test(output))
    return new Failure("Another program is using apt: wait until it has finished and start again.", { details: output });
  if (/Could not resolve|Temporary failure resolving|Unable to connect|Failed to fetch|Connection/i.test(output))
    return new Failure(`apt cannot reach the package archive: connect this machine to the internet and start again, or install ${list} yourself.`, { details: output });
  return new Failure(`apt could not install ${list}: its last lines above say why; put that right and start again.`, { details: output });
}
