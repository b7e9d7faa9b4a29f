import { readFileSync, statSync } from "node:fs";
import { createServer } from "node:net";
import path from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import mariadb from "mariadb";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { isFree } from "@/scripts/lib/ports.mjs";
import { clear, isRunning, processesOf, recorded, Start, type StartFolder, startFolder } from "../setup/started-site";
import { runs } from "../setup/runs";

let folder: StartFolder;
const starts: Start[] = [];
const start = (environment?: Record<string, string>) => {
  const started = new Start(folder, environment);
  starts.push(started);
  return started;
};
const site = (address: string) => fetch(`http://localhost:${folder.port}${address}`);
const database = () => {
  const { databasePassword } = JSON.parse(readFileSync(path.join(folder.dataDir, "secrets.json"), "utf8"));
  return mariadb.createConnection({ host: "127.0.0.1", port: folder.mariadbPort, user: "sillwright", password: databasePassword, database: "sillwright" });
};

beforeEach(async () => {
  folder = await startFolder();
});
afterEach(async () => {
  for (const started of starts.splice(0)) if (started.ended === undefined) await started.end("SIGTERM");
  for (const pid of processesOf(folder)) process.kill(pid, "SIGKILL");
  clear(folder);
});

describe("npm start", () => {
  test("brings up everything, says each step with its time, answers, and leaves nothing behind at Ctrl-C; the next start takes seconds", async () => {
    const first = await start().running();
    for (const step of ["Disk", "Packages from npm", "MariaDB", "Redis behind the stand-in", "Tables", "Demo data", "Build", "Site"]) expect(first.output).toMatch(new RegExp(`^${step}.* \\d+\\.\\d s$`, "m"));
    expect(first.output).toContain(`Sillwright runs at http://localhost:${folder.port} after`);
    expect((await site("/api/health/live")).status).toBe(200);
    const home = await site("/");
    expect([home.status, home.headers.get("content-security-policy")]).toEqual([200, expect.stringMatching(/script-src 'self' 'sha256-/)]);
    expect((await site("/no/such/page")).headers.get("content-security-policy")).toContain("default-src 'none'");
    expect(statSync(path.join(folder.dataDir, "secrets.json")).mode & 0o777).toBe(0o600);
    expect(statSync(path.join(folder.dataDir, "mariadb-init.sql")).mode & 0o777).toBe(0o600);

    const services = recorded(folder);
    expect(services.map(({ name }) => name).sort()).toEqual(["bridge", "mariadb", "redis", "site"]);
    expect(await first.end("SIGINT")).toBe(130);
    expect(services.filter(({ pid }) => isRunning(pid))).toEqual([]);
    expect(processesOf(folder)).toEqual([]);
    expect(recorded(folder)).toEqual([]);
    expect(services.flatMap(({ leftovers }) => leftovers).filter((left) => statSync(left, { throwIfNoEntry: false }))).toEqual([]);
    expect(await isFree(folder.port)).toBe(true);

    const began = Date.now();
    await start().running();
    expect(Date.now() - began).toBeLessThan(20_000);
  });

  test("refuses a second start in the same folder and leaves the first alone", async () => {
    await start().running();
    const second = start({ PORT: "" });
    await second.until(() => second.ended !== undefined);
    expect([second.ended, second.output]).toEqual([1, expect.stringMatching(/already runs from this folder \(process \d+\): stop that one first/)]);
    expect((await site("/api/health/live")).status).toBe(200);
  });

  test("says so at once when the asked port is taken", async () => {
    const taken = createServer().listen(folder.port, "127.0.0.1");
    const refused = start();
    await refused.until(() => refused.ended !== undefined, 20);
    taken.close();
    expect([refused.ended, refused.output]).toEqual([1, expect.stringContaining(`Port ${folder.port} is taken by another program: stop that program, or set PORT to another port.`)]);
    expect(processesOf(folder)).toEqual([]);
  });

  test("recovers from being killed: what was acknowledged is there, what was left running is ended, and it answers again", async () => {
    const first = await start().running();
    const connection = await database();
    await connection.query("CREATE TABLE kept (id INT PRIMARY KEY)");
    await connection.query("INSERT INTO kept VALUES (1)");
    const services = recorded(folder);
    await first.end("SIGKILL");
    expect(services.every(({ pid }) => isRunning(pid))).toBe(true);
    await connection.query("INSERT INTO kept VALUES (2)");
    connection.destroy();
    process.kill(services.find(({ name }) => name === "mariadb")?.pid ?? 0, "SIGKILL");

    const second = await start().running();
    expect(second.output).toMatch(/Leftovers: ended site, bridge, redis(, mariadb)? left by a start that was killed/);
    expect(services.filter(({ pid }) => isRunning(pid))).toEqual([]);
    const again = await database();
    expect(await again.query("SELECT id FROM kept ORDER BY id")).toEqual([{ id: 1 }, { id: 2 }]);
    await again.end();
    expect((await site("/api/health/live")).status).toBe(200);
  });

  test("recovers from being killed at any moment of its start", async () => {
    for (let time = 0; time < runs(3); time += 1) {
      const killed = start();
      await pause(Math.random() * 2_500);
      await killed.end("SIGKILL");
    }
    await start().running();
    expect((await site("/api/health/live")).status).toBe(200);
    expect(recorded(folder)).toHaveLength(4);
  });

  test("leaves nothing behind at whatever moment of its start Ctrl-C comes", async () => {
    for (let time = 0; time < runs(3); time += 1) {
      const interrupted = start();
      await interrupted.until(() => interrupted.output.includes("Disk"));
      await pause(Math.random() * 2_500);
      expect(await interrupted.end("SIGINT")).toBe(130);
      expect([processesOf(folder), recorded(folder)]).toEqual([[], []]);
    }
  });

  test("never ends a process that only has the pid of one that was ours", async () => {
    const first = await start().running();
    await first.end("SIGTERM");
    const { writeFileSync } = await import("node:fs");
    writeFileSync(path.join(folder.dataDir, "run", "site.json"), JSON.stringify({ pid: process.pid, began: "an earlier boot 1", leftovers: [] }));
    expect((await start().running()).output).toContain("Leftovers: nothing left from before");
  });

  test("starts a killed MariaDB again, on the same port", async () => {
    const started = await start().running();
    const mariadbPid = recorded(folder).find(({ name }) => name === "mariadb")?.pid ?? 0;
    process.kill(mariadbPid, "SIGKILL");
    await started.until(() => started.output.includes("mariadb ended by itself (signal SIGKILL) and is started again."), 10);
    await started.until(() => recorded(folder).some(({ name, pid }) => name === "mariadb" && pid !== mariadbPid), 20);
    for (let attempt = 0; ; attempt += 1) {
      const connection = await database().catch(() => undefined);
      if (connection) {
        expect(await connection.query("SELECT 1 AS one")).toEqual([{ one: 1 }]);
        await connection.end();
        break;
      }
      expect(attempt).toBeLessThan(100);
      await pause(100);
    }
    expect((await site("/api/health/live")).status).toBe(200);
  });

  test("starts and installs no MariaDB and no Redis when it is pointed at ones that are there", async () => {
    const { DATABASE_URL = "", UPSTASH_REDIS_REST_URL = "", UPSTASH_REDIS_REST_TOKEN = "" } = process.env;
    const started = await start({ DATABASE_URL, UPSTASH_REDIS_REST_URL, UPSTASH_REDIS_REST_TOKEN }).running();
    expect(recorded(folder).map(({ name }) => name)).toEqual(["site"]);
    expect(started.output).not.toMatch(/MariaDB|Redis|Debian|Demo/);
    expect((await site("/api/health/live")).status).toBe(200);
  });
});

test("a site started by hand without its services' addresses ends at once and names all that is missing", async () => {
  await (await start().running()).end("SIGTERM");
  const { placeSite } = await import("@/scripts/lib/standalone.mjs");
  const { buildId } = await import("@/scripts/lib/build.mjs");
  const { spawnSync } = await import("node:child_process");
  const place = placeSite(process.cwd(), path.join(folder.dataDir, "by-hand"), buildId(process.cwd()));
  const { status, stdout, stderr } = spawnSync(process.execPath, ["server.js"], { cwd: place, encoding: "utf8", timeout: 20_000, env: { PATH: process.env.PATH ?? "", NODE_ENV: "production", PORT: String(folder.port), HOSTNAME: "127.0.0.1" } });
  expect([status, stdout + stderr]).toEqual([1, expect.stringMatching(/DATABASE_URL is missing; UPSTASH_REDIS_REST_URL is missing; UPSTASH_REDIS_REST_TOKEN is missing/)]);
});
