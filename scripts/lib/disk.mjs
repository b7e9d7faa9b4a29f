import { statfs } from "node:fs/promises";
import { existsSync } from "node:fs";
import path from "node:path";
import { Failure } from "./failure.mjs";

const MEBIBYTE = 1024 * 1024;

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
