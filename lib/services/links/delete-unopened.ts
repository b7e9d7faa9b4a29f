import "server-only";
import { Op } from "sequelize";
import { database } from "@/lib/database";
import { errorSummary, log } from "@/lib/services/log";
import { ShortLink } from "@/models";

/** Rows deleted by one statement, so that none holds its locks for long. */
const atOnce = 1_000;
const every = 24 * 60 * 60 * 1000;
const soon = 60_000;

/** A year after a link was last opened, counted in days so that a leap day shortens nothing. */
export const keptDays = 366;
export const deletedAfter = (lastOpenedAt: Date) => new Date(lastOpenedAt.getTime() + keptDays * 24 * 60 * 60 * 1000);

/** Deletes every link that nobody has opened for a year, and answers how many. */
export async function deleteUnopenedLinks(now = new Date()): Promise<number> {
  database();
  const before = new Date(now.getTime() - keptDays * 24 * 60 * 60 * 1000);
  let total = 0;
  for (;;) {
    const deleted = await ShortLink.destroy({ where: { lastOpenedAt: { [Op.lt]: before } }, limit: atOnce });
    total += deleted;
    if (deleted < atOnce) return total;
  }
}

/** Deletes once a day for as long as the process runs. Several processes may do so beside each other: whoever is later finds nothing. */
export function startDeletingLinks(): void {
  const run = () => {
    deleteUnopenedLinks().then(
      (deleted) => deleted > 0 && log().info({ deleted }, "links not opened for a year were deleted"),
      (error: unknown) => log().warn({ error: errorSummary(error) }, "links not opened for a year could not be deleted"),
    );
  };
  setTimeout(run, soon).unref();
  setInterval(run, every).unref();
}
