import { report } from "./steps.mjs";
import { stopRunning } from "./run.mjs";

/**
 * Runs a script's whole work and sees to it that nothing it started outlives it: not on success, not on failure, not on Ctrl-C.
 * `work` gets `keep(thing)`, which remembers anything with a `stop()`; they are stopped last first.
 */
export async function lifecycle(work) {
  const kept = [];
  let stopping;
  const stopAll = () =>
    (stopping ??= (async () => {
      stopRunning();
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

  let code;
  try {
    code = (await work((thing) => (kept.push(thing), thing), () => stopping !== undefined)) ?? 0;
  } catch (error) {
    if (stopping) return; // a step that our own stop cut short
    report(error);
    code = 1;
  }
  if (stopping) return;
  await stopAll();
  process.exit(code);
}
