import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { endLeftovers, identity, isAlive, startService } from "@/scripts/lib/processes.mjs";
import { recordRuns, run } from "@/scripts/lib/run.mjs";
import { isRunning } from "../setup/started-site";

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), "sillwright-processes-"));
});
afterEach(() => {
  recordRuns(undefined);
  rmSync(folder, { recursive: true, force: true });
});

const service = (script: string, more: object = {}) => startService({ name: "probe", command: "/bin/sh", args: ["-c", script], runDir: folder, logDir: folder, ...more });
const written = async (file: string) => {
  while (!existsSync(path.join(folder, file))) await pause(5);
  return JSON.parse(readFileSync(path.join(folder, file), "utf8"));
};

describe("a service", () => {
  test("writes itself down before it begins, exactly as the next start will look for it", async () => {
    const left = path.join(folder, "it's \"left\"");
    const probe = service("sleep 30", { leftovers: [left] });
    expect(await written("probe.json")).toEqual({ ...identity(probe.pid), leftovers: [left] });
    await probe.stop();
    expect([isRunning(probe.pid), existsSync(path.join(folder, "probe.json"))]).toEqual([false, false]);
  });

  test("has what it printed in its log, and how it ended", async () => {
    const probe = service("echo out; echo err >&2; exit 3");
    expect(await probe.exited).toBe("code 3");
    expect(probe.tail()).toBe("out\nerr");
  });

  test("that does not listen is ended by force, with what it started", async () => {
    const probe = service("trap '' TERM; sleep 30 & echo $!; wait; sleep 30", { within: 200 });
    while (!probe.tail()) await pause(10);
    const child = Number(probe.tail());
    await probe.stop();
    expect([isRunning(probe.pid), isRunning(child)]).toEqual([false, false]);
  });
});

describe("what a killed start left", () => {
  test("is ended even when only the children of what was written down are left", async () => {
    const probe = service("sleep 30 & echo $!; sleep 0.3");
    const record = await written("probe.json");
    await probe.exited;
    const child = Number(probe.tail());
    writeFileSync(path.join(folder, "probe.json"), JSON.stringify(record)); // as after a kill, when nobody struck it out
    expect([isAlive(record), isRunning(child)]).toEqual([false, true]);
    expect(await endLeftovers(folder)).toBe("ended probe left by a start that was killed");
    expect([isRunning(child), readdirSync(folder).filter((file) => file.endsWith(".json"))]).toEqual([false, []]);
  });

  test("a command such as an installation is among", async () => {
    recordRuns(folder);
    const running = run("sh", ["-c", "sleep 30; exit 5"]);
    while (!readdirSync(folder).some((file) => file.endsWith(".json"))) await pause(5);
    expect(await endLeftovers(folder)).toBe("ended sh left by a start that was killed");
    expect((await running).killed).toBe("SIGTERM");
  });

  test("is nothing when the pid has gone to a stranger", async () => {
    const { pid } = process;
    writeFileSync(path.join(folder, "probe.json"), JSON.stringify({ pid, began: identity(pid).began?.replace(/\d+$/, "1"), leftovers: [] }));
    expect(await endLeftovers(folder)).toBe("nothing left from before");
  });
});

test("a command that does not listen is ended by force when its time is up", { timeout: 15_000 }, async () => {
  const { code, killed } = await run("sh", ["-c", "trap '' TERM; sleep 30 & wait; sleep 30"], { signal: AbortSignal.timeout(300) });
  expect([code, killed]).toEqual([1, "SIGKILL"]);
});

test("a command's code and output are answered, and a program that is not there has the code a shell gives", async () => {
  expect(await run("sh", ["-c", "echo a; echo b >&2; exit 4"])).toEqual({ code: 4, killed: null, output: expect.stringMatching(/a\nb|b\na/) });
  expect((await run("no-such-program", [])).code).toBe(127);
  recordRuns(folder);
  expect((await run("no-such-program", [])).code).toBe(127);
  expect(readdirSync(folder)).toEqual([]);
});
