import path from "node:path";
import { Failure } from "./failure.mjs";
import { mustRun } from "./run.mjs";
import { root } from "./settings.mjs";

const LOCK = "sillwright migrations";

/** What to do about an address that does not answer as a database of ours should. */
function unreachable(error, url) {
  const shown = url.replace(/:[^:@/]*@/, ":…@");
  const code = error.cause?.code ?? error.code ?? "";
  if (code === "ER_ACCESS_DENIED_ERROR" || code === "ER_DBACCESS_DENIED_ERROR")
    return new Failure(`MariaDB refuses the user of DATABASE_URL (${shown}): correct user and password, or grant the user that database, and start again.`);
  if (code === "ER_BAD_DB_ERROR")
    return new Failure(`The database of DATABASE_URL (${shown}) does not exist: create it with CREATE DATABASE … CHARACTER SET utf8mb4, and start again.`);
  return new Failure(`No MariaDB answers at DATABASE_URL (${shown}): start it or correct the address, and start again.`, { details: error.message });
}

/**
 * Brings the tables up to date. One runner at a time, since several machines may start together: MariaDB cannot undo a change to
 * its tables, so two at once would leave neither done.
 */
export async function migrate(url) {
  const { default: mariadb } = await import("mariadb");
  const connection = await mariadb.createConnection(url).catch((error) => {
    throw unreachable(error, url);
  });
  try {
    const [{ charset }] = await connection.query("SELECT @@character_set_database AS charset");
    if (charset !== "utf8mb4")
      throw new Failure(`The database of DATABASE_URL is ${charset}: run ALTER DATABASE … CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci and start again.`);
    const [{ got }] = await connection.query("SELECT GET_LOCK(?, 120) AS got", [LOCK]);
    if (Number(got) !== 1) throw new Failure("Another start is changing the database's tables and has not finished in two minutes: wait for it and start again.");
    const cli = path.join(root, "node_modules", "sequelize-cli", "lib", "sequelize");
    const output = await mustRun("A migration failed: the lines above say which and why; put that right and start again.", process.execPath, [cli, "db:migrate"], {
      cwd: root,
      env: { ...process.env, DATABASE_URL: url, NODE_ENV: "production" },
    });
    const done = output.match(/: migrated/g)?.length ?? 0;
    return done === 0 ? "up to date" : `${done} applied`;
  } finally {
    await connection.end();
  }
}
