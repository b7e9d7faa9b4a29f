/** Run once by Next when a server starts: an environment that is not complete ends it here, with everything that is missing. */
export async function register(): Promise<void> {
  const { env } = await import("@/lib/env");
  void env.DATABASE_URL;
}
