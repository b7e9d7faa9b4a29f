import { statfs } from "node:fs/promises";
import { existsSync } from "node:fs";
import path from "node:path";
import { Failure } from "./failure.mjs";

const LEAST_NODE = [20, 9];
const MEBIBYTE = 1024 * 1024;

/** @throws Failure when this Node cannot run Next 16. */
export function checkNode(version = process.versions.node) {
  const [major, minor] = version.split(".").map(Number);
  if (major > LEAST_NODE[0] || (major === LEAST_NODE[0] && minor >= LEAST_NODE[1])) return `Node ${version}`;
  throw new Failure(`This is Node ${version}, and Sillwright needs Node ${LEAST_NODE.join(".")} or newer: install it (Debian 12 users: from nodejs.org or nvm; .nvmrc names the version) and start again.`);
}

/** @throws Failure when the disk under `folder` has less free than an installation and a build take. */
export async function checkDisk(folder, { leastMebibytes = 1024, measure = statfs } = {}) {
  let there = folder;
  while (!existsSync(there) && path.dirname(there) !== there) there = path.dirname(there);
  const { bavail, bsize } = await measure(there);
  const free = Math.floor((bavail * bsize) / MEBIBYTE);
  if (free < leastMebibytes)
    throw new Failure(`Only ${free} MB are free on the disk that holds ${folder}, and ${leastMebibytes} MB are needed: free some space and start again.`);
  return `${free} MB free`;
}
