import { fileURLToPath } from "node:url";
import path from "node:path";
import { Failure } from "./failure.mjs";

export const root = fileURLToPath(new URL("../../", import.meta.url)).replace(/\/$/, "");

const port = (name, value) => {
  if (value === undefined || value === "") return undefined;
  const number = Number(value);
  if (Number.isInteger(number) && number >= 1 && number <= 65_535) return number;
  throw new Failure(`${name} is "${value}": set it to a port number from 1 to 65535, or leave it out.`);
};

/**
 * What the scripts read from the environment; `lib/env.ts` holds the same names with their meaning.
 * @param {Record<string, string | undefined>} environment
 */
export function settings(environment = process.env) {
  const dataDir = path.resolve(root, environment.SILLWRIGHT_DATA_DIR || ".data");
  const given = (name) => environment[name] || undefined;
  if (given("UPSTASH_REDIS_REST_URL") && !given("UPSTASH_REDIS_REST_TOKEN"))
    throw new Failure("UPSTASH_REDIS_REST_URL is set without UPSTASH_REDIS_REST_TOKEN: set both, or neither to use the local stand-in.");
  return {
    root,
    dataDir,
    runDir: path.join(dataDir, "run"),
    logDir: path.join(dataDir, "log"),
    host: given("HOST") ?? "127.0.0.1",
    port: port("PORT", environment.PORT),
    mariadbPort: port("MARIADB_PORT", environment.MARIADB_PORT),
    databaseUrl: given("DATABASE_URL"),
    redisUrl: given("UPSTASH_REDIS_REST_URL"),
    redisToken: given("UPSTASH_REDIS_REST_TOKEN"),
    siteUrl: given("SITE_URL"),
    keepAlive: given("KEEP_ALIVE_TIMEOUT") ?? "65000",
  };
}
