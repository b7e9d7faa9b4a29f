import "server-only";
import { ConnectionError, DatabaseError } from "sequelize";
import { Problem } from "@/lib/http/problem";
import { errorSummary, log } from "@/lib/services/log";

/** A lock not had in time, a deadlock, a connection lost in the middle. */
const passing = new Set([1205, 1213, 45009, 45028]);

/**
 * Runs what needs MariaDB.
 *
 * @throws Problem not-ready when the database is away, so that whoever asked knows to come back.
 */
export async function withDatabase<Answer>(work: () => Promise<Answer>): Promise<Answer> {
  try {
    return await work();
  } catch (error) {
    if (!isAway(error)) throw error;
    log().warn({ error: errorSummary(error) }, "the database is away");
    throw new Problem("not-ready", { headers: { "Retry-After": "10" } });
  }
}

function isAway(error: unknown): boolean {
  if (error instanceof ConnectionError) return true;
  if (!(error instanceof DatabaseError)) return false;
  const { errno, fatal } = error.original as { errno?: number; fatal?: boolean };
  return fatal === true || (errno !== undefined && passing.has(errno));
}
