import { performance } from "node:perf_hooks";
import { diskFull, Failure } from "./failure.mjs";
import { settings } from "./settings.mjs";

const seconds = (since) => `${((performance.now() - since) / 1000).toFixed(1)} s`;

/** Runs one step and prints its line with the time it took. What `work` returns as text follows the name on that line. */
export async function step(name, work, print = console.log) {
  const began = performance.now();
  try {
    const result = await work();
    const note = typeof result === "string" ? `: ${result}` : result?.note ? `: ${result.note}` : "";
    print(`${`${name}${note}`.padEnd(72)} ${seconds(began).padStart(8)}`);
    return result;
  } catch (error) {
    print(`${`${name}: failed`.padEnd(72)} ${seconds(began).padStart(8)}`);
    throw diskFull(error, settings().root) ?? error;
  }
}

/** Shows a failure as its sentence and anything else with its stack. */
export function report(error, print = console.error) {
  if (error instanceof Failure) {
    if (error.details) print(error.details.trimEnd());
    print(error.message);
  } else {
    print(error?.stack ?? String(error));
  }
}
