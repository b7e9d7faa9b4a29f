import os from "node:os";
import path from "node:path";
import { Failure } from "../lib/failure.mjs";
import { run } from "../lib/run.mjs";
import { root } from "../lib/settings.mjs";
import { atLeast, atMost, median, row } from "./table.mjs";

const connections = 16;
const rounds = 4;
const seconds = 3;

/** Site and load each get a core where there are two, so that neither takes the other's. */
const cores = os.cpus().length > 1 ? { site: "0", load: "1" } : undefined;

async function pinSite({ service }) {
  if (cores) await run("taskset", ["-a", "-c", "-p", cores.site, String(service.pid)]);
}

async function load(url, body, lasting = seconds) {
  const args = [path.join(root, "scripts", "bench", "load.mjs"), JSON.stringify({ url, body, seconds: lasting, connections })];
  const [command, ...all] = cores ? ["taskset", "-c", cores.load, process.execPath, ...args] : [process.execPath, ...args];
  const { code, output } = await run(command, all, { cwd: root, signal: AbortSignal.timeout(60_000) });
  if (code !== 0) throw new Failure(`The load on ${url} did not finish: the lines above say why.`, { details: output });
  const result = JSON.parse(output.trimEnd().split("\n").at(-1));
  if (result.failed > 0) throw new Failure(`${result.failed} answers of ${url} were not good ones, so its speed says nothing.`);
  return result;
}

const exampleOf = (examples, operation) => {
  const found = examples.find((example) => example.path === operation);
  if (!found) throw new Failure(`No worked example of ${operation} is in the registry.`);
  return found.input;
};

/** `squareness` and a route that only reads and echoes the same body, turn about, so that a slow moment strikes both. */
export async function requestsOverEcho(site, examples, name) {
  await pinSite(site);
  const body = exampleOf(examples, "squareness");
  const [echo, asked] = ["/api/health/echo", "/api/v1/squareness"].map((address) => site.address + address);
  for (const url of [echo, asked]) await load(url, body, 2);
  const pairs = [];
  for (let round = 0; round < rounds; round += 1) pairs.push({ echo: await load(echo, body), asked: await load(asked, body) });
  const speed = (of) => median(pairs.map((pair) => pair[of].perSecond));
  const p99 = median(pairs.map((pair) => pair.asked.p99));
  return [
    row(`echo, ${name}`, `${speed("echo").toFixed(0)} requests/s`),
    row(`squareness, ${name}`, `${speed("asked").toFixed(0)} requests/s, p99 ${p99} ms`),
    atLeast(`squareness over echo, ${name}`, median(pairs.map((pair) => pair.asked.perSecond / pair.echo.perSecond)), 0.85),
  ];
}

/** What one calculation costs in a batch of 100, over what it costs alone. */
export async function batchOverSingle(site, examples) {
  await pinSite(site);
  const input = exampleOf(examples, "squareness");
  const batch = { items: Array.from({ length: 100 }, () => ({ operation: "squareness", input })) };
  const [single, many] = ["/api/v1/squareness", "/api/v1/batch"].map((address) => site.address + address);
  await load(many, batch, 2);
  const pairs = [];
  for (let round = 0; round < rounds; round += 1) pairs.push({ single: await load(single, input), many: await load(many, batch) });
  const ratio = median(pairs.map((pair) => pair.single.perSecond / (pair.many.perSecond * 100)));
  return [
    row("calculations in batches of 100", `${(median(pairs.map((pair) => pair.many.perSecond)) * 100).toFixed(0)} a second`),
    atMost("a calculation in a batch of 100, over one alone", ratio, 0.15),
  ];
}
