import path from "node:path";
import { Failure } from "../lib/failure.mjs";
import { run } from "../lib/run.mjs";
import { root } from "../lib/settings.mjs";

/** Runs a TypeScript file of this folder in a process of its own and answers the JSON on the last line it prints. */
export async function fromTypescript(file) {
  const { code, output } = await run(process.execPath, ["--import", "tsx", path.join(root, "scripts", "bench", file)], { cwd: root, signal: AbortSignal.timeout(120_000) });
  if (code !== 0) throw new Failure(`scripts/bench/${file} did not finish: the lines above say why.`, { details: output });
  return JSON.parse(output.trimEnd().split("\n").at(-1));
}
