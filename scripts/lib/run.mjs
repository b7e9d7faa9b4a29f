import { spawn } from "node:child_process";
import { rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { Failure } from "./failure.mjs";
import { identity } from "./processes.mjs";

let records;

/** Writes every command down in `folder` while it runs, so that the next start can end one that outlived a kill of this. */
export function recordRuns(folder) {
  records = folder;
}

/** @returns a function that strikes the command out again */
function writeDown(command, pid) {
  if (!records || !pid) return () => {};
  const file = path.join(records, `${path.basename(command)}-${pid}.json`);
  writeFileSync(file, JSON.stringify(identity(pid)));
  return () => rmSync(file, { force: true });
}

/**
 * Runs a command to its end and answers its exit code and output. `show` prints the output as it comes.
 * The command gets a process group of its own, so that stopping it stops what it started.
 */
export function run(command, args, { cwd, env = process.env, show = false, signal } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd, env, stdio: ["ignore", "pipe", "pipe"], detached: true });
    const strikeOut = writeDown(command, child.pid);
    const chunks = [];
    const keep = (stream) => (chunk) => {
      chunks.push(chunk);
      if (show) stream.write(chunk);
    };
    child.stdout.on("data", keep(process.stdout));
    child.stderr.on("data", keep(process.stderr));
    const stop = () => {
      try {
        process.kill(-child.pid, "SIGTERM");
      } catch {
        // It has ended already.
      }
    };
    running.add(stop);
    signal?.addEventListener("abort", stop, { once: true });
    child.on("error", (error) => {
      strikeOut();
      running.delete(stop);
      reject(error);
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

/** Ends every command `run` still waits for. */
export function stopRunning() {
  for (const stop of running) stop();
}

/** Runs a command that must succeed. @throws Failure with its output and `sentence`. */
export async function mustRun(sentence, command, args, options) {
  const { code, output } = await run(command, args, options);
  if (code !== 0) throw new Failure(sentence, { details: options?.show ? "" : output });
  return output;
}
