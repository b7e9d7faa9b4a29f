import { type ChildProcess, spawn } from "node:child_process";
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { isFree } from "@/scripts/lib/ports.mjs";

/** A port below those the system lends to outgoing connections, which may take one between two starts. */
async function quietPort(): Promise<number> {
  for (;;) {
    const port = 20_000 + Math.floor(Math.random() * 12_000);
    if (await isFree(port)) return port;
  }
}

/** A data folder for one `npm start`, with the ports it is told to use. */
export async function startFolder() {
  const dataDir = mkdtempSync(path.join(os.tmpdir(), "sillwright-start-"));
  return { dataDir, port: await quietPort(), mariadbPort: await quietPort() };
}
export type StartFolder = Awaited<ReturnType<typeof startFolder>>;

/** `npm start` as a process, what it has printed so far, and how it ended. */
export class Start {
  readonly process: ChildProcess;
  output = "";
  ended: number | string | undefined;

  constructor({ dataDir, port, mariadbPort }: StartFolder, environment: Record<string, string> = {}) {
    this.process = spawn(process.execPath, ["scripts/start.mjs"], {
      env: {
        ...process.env, NODE_ENV: "production", DATABASE_URL: "", UPSTASH_REDIS_REST_URL: "", UPSTASH_REDIS_REST_TOKEN: "", SITE_URL: "",
        SILLWRIGHT_DATA_DIR: dataDir, PORT: String(port), MARIADB_PORT: String(mariadbPort), ...environment,
      },
    });
    const take = (chunk: Buffer) => (this.output += chunk.toString());
    this.process.stdout?.on("data", take);
    this.process.stderr?.on("data", take);
    this.process.once("exit", (code, signal) => (this.ended = signal ?? code ?? 0));
  }

  /** @throws Error with everything printed when `done` does not come true in time. */
  async until(done: () => boolean, seconds = 120): Promise<this> {
    for (const end = Date.now() + seconds * 1000; Date.now() < end; await pause(20)) if (done()) return this;
    throw new Error(`Not in ${seconds} s:\n${this.output}`);
  }

  running = () => this.until(() => {
    if (this.ended !== undefined) throw new Error(`It ended (${this.ended}):\n${this.output}`);
    return this.output.includes("Sillwright runs at");
  });

  end = async (signal: NodeJS.Signals) => {
    this.process.kill(signal);
    await this.until(() => this.ended !== undefined);
    return this.ended;
  };
}

/** The pids `npm start` has written down for its services. */
export function recorded({ dataDir }: StartFolder): { name: string; pid: number; leftovers: string[] }[] {
  const folder = path.join(dataDir, "run");
  if (!existsSync(folder)) return [];
  return readdirSync(folder).filter((file) => file !== "owner.json").map((file) => ({ name: file.replace(".json", ""), ...JSON.parse(readFileSync(path.join(folder, file), "utf8")) }));
}

export const isRunning = (pid: number) => existsSync(`/proc/${pid}`) && !/^State:\s+Z/m.test(readFileSync(`/proc/${pid}/status`, "utf8"));

/** Every process that works in the data folder, by its command line or its working folder, whether written down or not. */
export function processesOf({ dataDir }: StartFolder): number[] {
  return readdirSync("/proc").filter((name) => /^\d+$/.test(name)).map(Number).filter((pid) => {
    try {
      return readFileSync(`/proc/${pid}/cmdline`, "utf8").includes(dataDir) || readFileSync(`/proc/${pid}/environ`, "utf8").includes(`SILLWRIGHT_DATA_DIR=${dataDir}\0`);
    } catch {
      return false; // it has ended, or is not ours to look at
    }
  });
}

export const clear = ({ dataDir }: StartFolder) => rmSync(dataDir, { recursive: true, force: true });
