import { stopServices } from "./processes.mjs";
import { stopRunning } from "./run.mjs";
import { report } from "./steps.mjs";

/**
 * Runs a script's whole work and sees to it that nothing it started outlives it: not on success, not on failure, not on Ctrl-C.
 * `work` gets `keep(thing)`, which remembers anything with a `stop()`; they are stopped last first. It answers the exit code, or
 * `{ code, lastWords }` whose words are printed when everything has stopped.
 */
export async function lifecycle(work) {
  const kept = [];
  let stopping;
  const stopAll = () =>
    (stopping ??= (async () => {
      await stopRunning();
      await stopServices(); // Those that are not ready yet are nobody's to keep, and must end too.
      for (const thing of kept.reverse()) {
        try {
          await thing.stop();
        } catch (error) {
          report(error);
        }
      }
    })());

  const codes = { SIGINT: 130, SIGTERM: 143, SIGHUP: 129 };
  for (const [signal, code] of Object.entries(codes)) {
    process.on(signal, () => {
      if (stopping) return; // the second Ctrl-C: we are at it
      if (process.stdout.isTTY) console.log("\nStopping …");
      void stopAll().then(() => process.exit(code));
    });
  }

  let result;
  try {
    result = (await work((thing) => (kept.push(thing), thing), () => stopping !== undefined)) ?? 0;
  } catch (error) {
    if (stopping) return; // a step that our own stop cut short
    report(error);
    result = 1;
  }
  if (stopping) return;
  await stopAll();
  const { code, lastWords } = typeof result === "object" ? result : { code: result };
  if (lastWords) console.log(lastWords);
  process.exitCode = code;
  setTimeout(() => process.exit(code), 1_000).unref(); // Output is written out first; nothing may hold us longer.
}
