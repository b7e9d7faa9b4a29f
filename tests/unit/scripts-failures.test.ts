import { execFileSync } from "node:child_process";
import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { createServer, type Server } from "node:net";
import os from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { aptFailure, ensureSystemPackages } from "@/scripts/lib/apt.mjs";
import { checkDisk } from "@/scripts/lib/disk.mjs";
import { diskFull } from "@/scripts/lib/failure.mjs";
import { nodeTooOld } from "@/scripts/lib/node-version.mjs";
import { ensurePackages, packagesCurrent } from "@/scripts/lib/packages.mjs";
import { choosePort } from "@/scripts/lib/ports.mjs";
import { own } from "@/scripts/lib/processes.mjs";
import { settings } from "@/scripts/lib/settings.mjs";

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), "sillwright-failures-"));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

const nothingFound = () => undefined;
const found = (...names: string[]) => (name: string) => (names.includes(name) ? `/usr/bin/${name}` : undefined);
const answers = (output: string, code = 100) => async () => ({ code, killed: null, output });

describe("an unfit machine is told in one sentence what to do", () => {
  test("an old Node", () => {
    for (const version of ["12.22.0", "18.20.8", "20.8.1"]) expect(nodeTooOld(version)).toMatch(/^This is Node .* needs Node 20\.9 or newer: install it/);
    for (const version of ["20.9.0", "20.20.2", "22.12.0", "24.0.0"]) expect(nodeTooOld(version)).toBe("");
  });

  test("no room on the disk, before anything is written", async () => {
    await expect(checkDisk(path.join(folder, "not", "yet"), { measure: async () => ({ bavail: 10, bsize: 1024 * 1024 }) as never })).rejects.toThrow(/^Only 10 MB are free .* free some space/);
    await expect(checkDisk(folder)).resolves.toMatch(/MB free$/);
  });

  test("a disk that fills up meanwhile, whoever hits it first", () => {
    for (const error of [{ code: "ENOSPC" }, { message: "npm error code ENOSPC" }, { message: "MariaDB", details: "Error writing file './x' (Errcode: 28 \"No space left on device\")" }, { details: "[ERROR] InnoDB: preallocating 100663296 bytes for file ./ib_logfile101 failed with error 28" }])
      expect(diskFull(error, "/srv/sillwright")?.message).toBe("The disk that holds /srv/sillwright is full: free at least 2 GB there and start again.");
    expect(diskFull(new Error("28 rows"), "/srv")).toBeUndefined();
  });

  test("no apt", async () => {
    await expect(ensureSystemPackages(["mariadb", "redis"], { find: nothingFound, userId: 0 })).rejects.toThrow(/^mariadb-server and redis-server missing, and this machine has no apt: install them/);
  });

  test("neither root nor sudo", async () => {
    const asked: string[] = [];
    const execute = async (command: string, args: string[]) => (asked.push([command, ...args].join(" ")), { code: 1, killed: null, output: "" });
    await expect(ensureSystemPackages(["mariadb"], { find: found("apt-get", "sudo"), execute, userId: 1000 })).rejects.toThrow(/run "sudo apt-get install mariadb-server" once, or set DATABASE_URL/);
    expect(asked).toEqual(["sudo -n true"]);
    await expect(ensureSystemPackages(["mariadb"], { find: found("apt-get"), execute, userId: 1000 })).rejects.toThrow(/neither root nor allowed/);
  });

  test("an archive that cannot be reached, a lock that is held, a full disk under apt", () => {
    expect(aptFailure("Err:1 Could not resolve 'deb.example'", "chromium").message).toMatch(/^apt cannot reach the package archive: connect/);
    expect(aptFailure("E: Could not get lock /var/lib/dpkg/lock-frontend", "chromium").message).toMatch(/^Another program is using apt: wait/);
    expect(aptFailure("E: Write error - write (28: No space left on device)", "chromium").message).toMatch(/is full: free/);
    expect(aptFailure("E: Unable to locate package", "chromium").message).toMatch(/^apt could not install chromium/);
  });

  test("npm without a network, without the right to write, or not there", async () => {
    writeFileSync(path.join(folder, "package-lock.json"), '{"packages":{}}');
    await expect(ensurePackages(folder, { execute: answers("npm error code ENOTFOUND\nnpm error network request failed") })).rejects.toThrow(/^The npm registry cannot be reached: connect/);
    await expect(ensurePackages(folder, { execute: answers("npm error code EACCES") })).rejects.toThrow(/node_modules: make that folder yours/);
    await expect(ensurePackages(folder, { execute: answers("sh: 1: exec: npm: not found", 127) })).rejects.toThrow(/^npm is not on this machine/);
  });

  test("a port that is taken, a port that is none, an address of another machine", async () => {
    const server = await new Promise<Server>((resolve) => {
      const listening = createServer().listen(0, "127.0.0.1", () => resolve(listening));
    });
    const { port } = server.address() as { port: number };
    await expect(choosePort({ asked: port, variable: "PORT" })).rejects.toThrow(`Port ${port} is taken by another program: stop that program, or set PORT to another port.`);
    expect(await choosePort({ usual: port, variable: "PORT" })).toBeGreaterThan(port);
    server.close();
    expect(() => settings({ PORT: "http" })).toThrow('PORT is "http": set it to a port number from 1 to 65535, or leave it out.');
    await expect(choosePort({ usual: 3000, host: "192.0.2.1", variable: "PORT" })).rejects.toThrow(/^192\.0\.2\.1 is not an address of this machine: set HOST/); // TEST-NET-1 of RFC 5737
  });

  test("a hosted limiter without its token", () => {
    expect(() => settings({ UPSTASH_REDIS_REST_URL: "https://r.example" })).toThrow(/^UPSTASH_REDIS_REST_URL is set without UPSTASH_REDIS_REST_TOKEN/);
  });

  test("a start while another runs from the same folder; one that was killed is not in the way", () => {
    const release = own(folder, (pid: number) => `already runs as ${pid}`);
    expect(() => own(folder, (pid: number) => `already runs as ${pid}`)).toThrow(`already runs as ${process.pid}`);
    release();
    writeFileSync(path.join(folder, "owner.json"), JSON.stringify({ pid: process.pid, began: "an earlier boot 1" }));
    own(folder, () => "in the way")();
    writeFileSync(path.join(folder, "owner.json"), '{"pid":'); // cut short by the kill
    own(folder, () => "in the way")();
  });
});

describe("a machine that lacks something", () => {
  test("gets only what is missing, after a fresh list, with the distribution's services kept from starting", async () => {
    const asked: string[] = [];
    let lists = false;
    const execute = async (command: string, args: string[]) => {
      const line = [command, ...args].join(" ");
      asked.push(line);
      if (line.includes("apt-get update")) lists = true;
      return { code: line.includes("apt-get install") && !lists ? 100 : 0, killed: null, output: "" };
    };
    const policy = path.join(folder, "policy-rc.d");
    const note = await ensureSystemPackages(["mariadb", "redis", "chromium"], { find: found("apt-get", "sudo", "redis-server"), execute, userId: 1000, policy });
    expect(note).toBe("installed mariadb-server chromium");
    expect(asked).toEqual([
      "sudo -n true",
      expect.stringContaining(`exit 101\\n' > ${policy}`),
      expect.stringMatching(/^sudo -n env .*apt-get install .* mariadb-server chromium$/),
      "sudo -n apt-get update",
      expect.stringMatching(/^sudo -n env .*apt-get install .* mariadb-server chromium$/),
      `sudo -n rm -f ${policy}`,
    ]);
  });

  test("asks apt for nothing when everything is there", async () => {
    expect(await ensureSystemPackages(["mariadb", "redis"], { find: found("mariadbd", "mariadb-install-db", "redis-server"), execute: () => Promise.reject(new Error("asked")) })).toBe("already here");
  });

  test("installs packages when there are none or the lock file names others, and else does not", async () => {
    const lock = (version: string) => JSON.stringify({ packages: { "": {}, "node_modules/a": { version }, "node_modules/b": { version: "1.0.0", optional: true } } });
    writeFileSync(path.join(folder, "package-lock.json"), lock("1.0.0"));
    expect(packagesCurrent(folder)).toBe(false);
    let installs = 0;
    const execute = async (command: string, args: string[]) => {
      expect([command, ...args].slice(0, 2)).toEqual(["npm", "ci"]);
      installs += 1;
      mkdirSync(path.join(folder, "node_modules"), { recursive: true });
      writeFileSync(path.join(folder, "node_modules", ".package-lock.json"), lock("1.0.0").replace('"node_modules/b":{"version":"1.0.0","optional":true}', '"node_modules/c":{"version":"1.0.0"}'));
      return { code: 0, killed: null, output: "" };
    };
    expect(await ensurePackages(folder, { execute })).toBe("installed");
    expect(await ensurePackages(folder, { execute })).toBe("already here");
    writeFileSync(path.join(folder, "package-lock.json"), lock("1.0.1"));
    expect(packagesCurrent(folder)).toBe(false);
    expect(installs).toBe(1);
  });
});

test("an old Node gets as far as its sentence: the launcher and what it imports are plain JavaScript without imports", () => {
  const source = execFileSync("cat", ["scripts/start.mjs", "scripts/lib/node-version.mjs"], { encoding: "utf8" });
  expect(source.match(/^import .*$/gm)).toEqual(['import { task } from "./lib/node-version.mjs";']);
  expect(source.replace(/\/\*\*.*\*\/|\/\/.*/g, "")).not.toMatch(/\?\?|\?\.|=>|\bawait\b|`/);
});

test("a fresh clone gets as far as installing its packages: until then no task loads one", () => {
  const files = new Set<string>();
  const packages = new Set<string>();
  const follow = (file: string) => {
    if (files.has(file)) return;
    files.add(file);
    for (const [, from = ""] of readFileSync(file, "utf8").matchAll(/^import .*?from "([^"]+)"/gm)) {
      if (from.startsWith(".")) follow(path.resolve(path.dirname(file), from));
      else if (!from.startsWith("node:")) packages.add(`${from} in ${file}`);
    }
  };
  for (const name of readdirSync("scripts/tasks")) follow(path.resolve("scripts/tasks", name));
  expect(files.size).toBeGreaterThan(20);
  expect([...packages]).toEqual([]);
});
