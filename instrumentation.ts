/**
 * Run once by Next when a server starts: an environment that is not complete ends it here, with everything that is
 * missing. Then what runs beside the requests begins. */
export async function register(): Promise<void> {
  // A constant of the build, not of the environment: it keeps the check out of the edge bundle, which has no process to end.
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { checkEnvironment } = await import("@/lib/env");
  checkEnvironment();
  const { prepareRequests } = await import("@/lib/http/incoming-requests");
  prepareRequests();
  const { startDeletingLinks } = await import("@/lib/services/links/delete-unopened");
  startDeletingLinks();
}
