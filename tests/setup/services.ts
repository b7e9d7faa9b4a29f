import { migrate } from "@/scripts/lib/migrate.mjs";
import { throwawayFolder, throwawayServices } from "@/scripts/lib/throwaway.mjs";

/**
 * MariaDB and the limiter's store for the integration tests: those `npm test` has started, or, when Vitest is run by hand, ones of
 * their own that end with it. Services somebody pointed this shell at are never used.
 */
export default async function startServices(): Promise<(() => Promise<void>) | undefined> {
  if (process.env.SILLWRIGHT_TEST_SERVICES === "throwaway") return undefined;
  const kept: { stop(): Promise<void> }[] = [];
  const keep = <Thing extends { stop(): Promise<void> }>(thing: Thing): Thing => {
    kept.push(thing);
    return thing;
  };
  const stop = async () => {
    for (const thing of kept.reverse()) await thing.stop();
  };
  try {
    const folder = await throwawayFolder(keep);
    const { environment } = await throwawayServices(folder, keep, () => {});
    await migrate(environment.DATABASE_URL);
    Object.assign(process.env, environment);
  } catch (error) {
    await stop();
    throw error;
  }
  return stop;
}
