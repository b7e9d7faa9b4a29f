import "server-only";
import { Sequelize } from "sequelize";
import { env } from "@/lib/env";
import { defineModels } from "@/models";
import connection from "@/models/connection.cjs";

// One pool per process: a development server loads this module anew at every change and must not leave a pool behind each time.
const shared = globalThis as typeof globalThis & { sillwrightDatabase?: Sequelize };
let ready: Sequelize | undefined;

/** The connection pool with every model defined on it. Made at first use, so that a build needs no database. */
export function database(): Sequelize {
  if (ready) return ready;
  const sequelize = (shared.sillwrightDatabase ??= new Sequelize(env.DATABASE_URL, {
    ...connection,
    // Idle connections go long before the server's wait_timeout (600 s, models/connection.cjs) would cut them.
    pool: { max: env.DATABASE_POOL_SIZE, min: 0, idle: 60_000, evict: 10_000, acquire: 5_000 },
  }));
  defineModels(sequelize);
  return (ready = sequelize);
}
