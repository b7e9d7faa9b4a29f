import { spawn } from "node:child_process";
import { closeSync, existsSync, mkdirSync, openSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import path from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { Failure } from "./failure.mjs";

const bootId = () => readFileSync("/proc/sys/kernel/random/boot_id", "utf8").trim();

/** What the kernel says of a process that is not a zombie: its group, and when it began in ticks since boot. */
function kernelSays(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    const fields = stat.slice(stat.lastIndexOf(")") + 2).split(" "); // the name before it may hold spaces
    return fields[0] === "Z" ? undefined : { group: Number(fields[2]), ticks: fields[19] };
  } catch {
    return undefined;
  }
}

/** When a process began: with the pid it names one process and no later one. */
function beginning(pid) {
  const said = kernelSays(pid);
  return said && `${bootId()} ${said.ticks}`;
}

/** What identifies a process after we are gone; kept in a file under the data folder. */
export const identity = (pid) => ({ pid, began: beginning(pid) });

/** Whether the process that was written down is still the one that runs under this pid. */
export const isAlive = ({ pid, began }) => began !== undefined && beginning(pid) === began;

/**
 * Whether anything is left of the process and the group it led. When another process has its pid by now, the group was gone
 * before; while members are left the kernel gives the pid to nobody.
 */
function isLeft(record) {
  if (isAlive(record)) return true;
  if (!record.began?.startsWith(bootId()) || kernelSays(record.pid)) return false;
  return readdirSync("/proc").some((name) => /^\d+$/.test(name) && kernelSays(name)?.group === record.pid);
}

function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal);
  } catch {
    // It has ended.
  }
}

/** Asks the process and what it started to end, waits, and ends them by force when they have not. */
async function end(record, within) {
  for (const [signal, time] of [["SIGTERM", within], ["SIGKILL", 5_000]]) {
    if (!isLeft(record)) return;
    signalGroup(record.pid, signal);
    for (const until = Date.now() + time; isLeft(record) && Date.now() < until; ) await pause(25);
  }
}

const tail = (file, lines = 25) => {
  try {
    return readFileSync(file, "utf8").trimEnd().split("\n").slice(-lines).join("\n");
  } catch {
    return "";
  }
};

const live = new Set();
let stopped = false;

/** Ends every service that is still up, the last begun first, and lets no other begin. */
export async function stopServices() {
  stopped = true;
  for (const service of [...live].reverse()) await service.stop();
}

const WRITE_DOWN = `
read -r stat < /proc/$$/stat
read -r boot < /proc/sys/kernel/random/boot_id
began() { shift 19; printf '%s %s' "$boot" "$1"; }
printf '{"pid":%s,"began":"%s","leftovers":%s}' "$$" "$(began \${stat##*) })" "$2" > "$1.new" && mv "$1.new" "$1"
shift 2
exec "$@"`;

/**
 * A command that writes itself down before it becomes the program: were we to do it, a kill between the start and the writing
 * would leave a program nobody knows of.
 */
export const writingItselfDown = (recordFile, leftovers, command, args) => ["/bin/sh", ["-c", WRITE_DOWN, "sh", recordFile, JSON.stringify(leftovers), command, ...args]];

/**
 * Starts a long-running program with a log file and a record of its pid, in a session of its own: a Ctrl-C meant for us does not
 * reach it, so that we can end the site before its database.
 * @param {{ name: string, command: string, args: string[], env?: NodeJS.ProcessEnv, cwd?: string, runDir: string, logDir: string, within?: number, leftovers?: string[] }} what
 */
export function startService({ name, command, args, env = process.env, cwd, runDir, logDir, within = 10_000, leftovers = [] }) {
  if (stopped) throw new Failure(`${name} is not begun, since everything is being stopped.`);
  mkdirSync(runDir, { recursive: true });
  mkdirSync(logDir, { recursive: true });
  const logFile = path.join(logDir, `${name}.log`);
  const tooLong = existsSync(logFile) && statSync(logFile).size > 5_000_000;
  const log = openSync(logFile, tooLong ? "w" : "a", 0o600);
  const recordFile = path.join(runDir, `${name}.json`);
  const child = spawn(...writingItselfDown(recordFile, leftovers, command, args), { cwd, env, detached: true, stdio: ["ignore", log, log] });
  closeSync(log);
  const record = identity(child.pid ?? 0);
  const exited = new Promise((resolve) => {
    const done = (reason) => {
      service.ended = true;
      live.delete(service);
      rmSync(recordFile, { force: true });
      resolve(reason);
    };
    child.once("error", (error) => done(error.message));
    child.once("exit", (code, signal) => done(signal ? `signal ${signal}` : `code ${code}`));
  });
  const stop = async () => {
    service.stopping = true;
    if (!service.ended) {
      await end(record, within);
      await exited;
    }
    for (const folder of leftovers) rmSync(folder, { recursive: true, force: true });
  };
  const service = { name, pid: child.pid, logFile, ended: false, stopping: false, tail: () => tail(logFile), exited, stop };
  live.add(service);
  return service;
}

/** Waits until `ready` answers true. @throws Failure with the end of the service's log when it ends first or takes too long. */
export async function untilReady(service, ready, { seconds = 60, sentence } = {}) {
  const until = Date.now() + seconds * 1000;
  while (Date.now() < until) {
    if (service.ended) break;
    if (await ready()) return;
    await pause(50);
  }
  const how = service.ended ? `ended (${await service.exited})` : `did not answer within ${seconds} s`;
  throw new Failure(sentence ?? `${service.name} ${how}: the end of its log above says why; the whole is in ${service.logFile}.`, { details: service.tail() });
}

/**
 * Ends what an earlier start left running when it was killed. A pid is only believed when the process under it is the very one
 * that was written down.
 */
export async function endLeftovers(runDir) {
  if (!existsSync(runDir)) return "nothing left from before";
  const names = readdirSync(runDir).filter((file) => file.endsWith(".json") && file !== "owner.json");
  // Commands such as an installation go first, then the site, and the database last, as in a clean stop.
  const order = ["site", "bridge", "redis", "mariadb"];
  names.sort((a, b) => order.findIndex((name) => a.startsWith(name)) - order.findIndex((name) => b.startsWith(name)));
  const ended = [];
  for (const file of names) {
    const recordFile = path.join(runDir, file);
    let record;
    try {
      record = JSON.parse(readFileSync(recordFile, "utf8"));
    } catch {
      record = { pid: 0, leftovers: [] }; // cut short by the kill
    }
    if (isLeft(record)) {
      await end(record, file.startsWith("mariadb") ? 30_000 : 4_000);
      ended.push(file.slice(0, -5).replace(/-\d+$/, ""));
    }
    for (const folder of record.leftovers ?? []) rmSync(folder, { recursive: true, force: true });
    rmSync(recordFile, { force: true });
  }
  return ended.length ? `ended ${ended.join(", ")} left by a start that was killed` : "nothing left from before";
}

/** Makes this process the only one that works in `runDir`. @throws Failure when another does. */
export function own(runDir, sentence) {
  mkdirSync(runDir, { recursive: true });
  const file = path.join(runDir, "owner.json");
  for (let attempt = 0; attempt < 3; attempt += 1) {
    try {
      writeFileSync(file, JSON.stringify(identity(process.pid)), { flag: "wx" });
      return () => rmSync(file, { force: true });
    } catch (error) {
      if (error.code !== "EEXIST") throw error;
      let record = { pid: 0 };
      try {
        record = JSON.parse(readFileSync(file, "utf8"));
      } catch {
        // Cut short or just removed: taken over below.
      }
      if (isAlive(record)) throw new Failure(sentence(record.pid));
      rmSync(file, { force: true });
    }
  }
  throw new Failure(`${file} cannot be made ours: remove it and start again.`);
}
