import { existsSync, readFileSync } from "node:fs";
import path from "node:path";
import { diskFull, Failure } from "./failure.mjs";
import { NOT_FOUND, run } from "./run.mjs";

const readJson = (file) => JSON.parse(readFileSync(file, "utf8"));

/** Whether node_modules holds exactly what package-lock.json names for this machine. */
export function packagesCurrent(root) {
  const list = path.join(root, "node_modules", ".package-lock.json"); // npm's own, written when an installation is complete
  if (!existsSync(list)) return false;
  const wanted = readJson(path.join(root, "package-lock.json")).packages;
  const present = readJson(list).packages;
  return Object.entries(wanted).every(([name, { version, optional, link }]) => {
    if (name === "" || link) return true;
    return present[name] ? present[name].version === version : Boolean(optional);
  });
}

/** Installs the packages of package-lock.json unless they are there. @throws Failure that says what to do. */
export async function ensurePackages(root, { execute = run } = {}) {
  if (packagesCurrent(root)) return "already here";
  // Playwright must not fetch a browser of its own: the tests use the distribution's Chromium.
  const env = { ...process.env, PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD: "1", NODE_ENV: "development" };
  const { code, output } = await execute("npm", ["ci", "--no-audit", "--no-fund"], { cwd: root, env });
  if (code === NOT_FOUND) throw new Failure("npm is not on this machine: install it with Node (nodejs.org) and start again.");
  if (code !== 0) throw packagesFailure(output, root);
  return "installed";
}

/** The sentence for what `npm ci` wrote when it failed. */
export function packagesFailure(output, root) {
  const full = diskFull({ message: output }, root);
  if (full) return full;
  if (/ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ECONNRESET|ETIMEDOUT|ENETUNREACH|network/i.test(output))
    return new Failure("The npm registry cannot be reached: connect this machine to the internet (or set npm's registry or proxy) and start again.", { details: output });
  if (/EACCES|EPERM/.test(output))
    return new Failure(`npm may not write to ${root}/node_modules: make that folder yours (chown) and start again.`, { details: output });
  return new Failure("npm ci failed: its last lines above say why; put that right and start again.", { details: output });
}
