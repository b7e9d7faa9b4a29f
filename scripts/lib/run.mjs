import { spawn } from "node:child_process";
import { rmSync } from "node:fs";
import path from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { Failure } from "./failure.mjs";
import { writingItselfDown } from "./processes.mjs";

let records;
let commands = 0;
let stopped = false;

/** Writes every command down in `folder` while it runs, so that the next start can end one that outlived a kill of this. */
export function recordRuns(folder) {
  records = folder;
}

/** The exit code for a program that is not there, as a shell gives it. */
export const NOT_FOUND = 127;

/**
 * Runs a command to its end and answers its exit code and output. `show` prints the output as it comes.
 * The command gets a process group of its own, so that stopping it stops what it started. Once we are stopping no further
 * one begins, but for those that put something back.
 * @param {string} command
 * @param {string[]} args
 * @param {{ cwd?: string, env?: NodeJS.ProcessEnv, show?: boolean, signal?: AbortSignal, putsBack?: boolean }} [how]
 */
export function run(command, args, { cwd, env = process.env, show = false, signal, putsBack = false } = {}) {
  return new Promise((resolve, reject) => {
    if (stopped && !putsBack) return reject(new Failure(`${command} is not begun, since everything is being stopped.`));
    const recordFile = records && path.join(records, `${path.basename(command)}-${(commands += 1)}.json`);
    const what = recordFile ? writingItselfDown(recordFile, [], command, args) : [command, args];
    const child = spawn(...what, { cwd, env, stdio: ["ignore", "pipe", "pipe"], detached: true });
    const strikeOut = () => recordFile && rmSync(recordFile, { force: true });
    const chunks = [];
    const keep = (stream) => (chunk) => {
      chunks.push(chunk);
      if (show) stream.write(chunk);
    };
    child.stdout.on("data", keep(process.stdout));
    child.stderr.on("data", keep(process.stderr));
    const closed = new Promise((done) => child.once("close", done));
    const stop = async () => {
      for (const [how, time] of [["SIGTERM", 5_000], ["SIGKILL", 2_000]]) {
        try {
          process.kill(-child.pid, how);
        } catch {
          return; // It has ended already.
        }
        const ended = await Promise.race([closed.then(() => true), pause(time, false, { ref: false })]);
        if (ended) return;
      }
    };
    running.add(stop);
    signal?.addEventListener("abort", stop, { once: true });
    child.on("error", (error) => {
      strikeOut();
      running.delete(stop);
      if (error.code === "ENOENT") resolve({ code: NOT_FOUND, killed: null, output: error.message });
      else reject(error);
    });
    child.on("close", (code, killed) => {
      strikeOut();
      running.delete(stop);
      signal?.removeEventListener("abort", stop);
      resolve({ code: code ?? 1, killed, output: Buffer.concat(chunks).toString("utf8") });
    });
  });
}

const running = new Set();

/** Ends every command `run` still waits for, and lets no other begin. */
export async function stopRunning() {
  stopped = true;
  await Promise.all([...running].map((stop) => stop()));
}

/** Runs a command that must succeed. @throws Failure with its output and `sentence`. */
export async function mustRun(sentence, command, args, options) {
  const { code, output } = await run(command, args, options);
  if (code !== 0) throw new Failure(sentence, { details: options?.show ? "" : output });
  return output;
}
