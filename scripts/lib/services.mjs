import { mkdirSync } from "node:fs";
import { startMariadb } from "./mariadb.mjs";
import { startBridge, startRedis } from "./redis-bridge.mjs";
import { localSecrets } from "./secrets.mjs";
import { step } from "./steps.mjs";

/** Which of Debian's packages the local services need, given what is pointed elsewhere. */
export const servicesNeeded = ({ databaseUrl, redisUrl }) => [...(databaseUrl ? [] : ["mariadb"]), ...(redisUrl ? [] : ["redis"])];

/**
 * Starts the services that are not pointed elsewhere and answers the environment in which the site finds all of them.
 * `keep` gets each service with its `stop`.
 */
export async function startServices({ dataDir, runDir, logDir, mariadbPort, databaseUrl, redisUrl, redisToken, extraGrants }, keep, print) {
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  const secrets = localSecrets(dataDir);
  const environment = { DATABASE_URL: databaseUrl, UPSTASH_REDIS_REST_URL: redisUrl, UPSTASH_REDIS_REST_TOKEN: redisToken };
  const started = {};
  if (!databaseUrl) {
    started.mariadb = keep(await step("MariaDB", () => startMariadb({ dataDir, runDir, logDir, port: mariadbPort, password: secrets.databasePassword, extraGrants }), print));
    environment.DATABASE_URL = started.mariadb.url;
  }
  if (!redisUrl) {
    await step("Redis behind the stand-in for Upstash", async () => {
      started.redis = keep(await startRedis({ dataDir, runDir, logDir }));
      started.bridge = keep(await startBridge({ runDir, logDir, socket: started.redis.socket, token: secrets.redisToken }));
      return started.bridge;
    }, print);
    environment.UPSTASH_REDIS_REST_URL = started.bridge.url;
    environment.UPSTASH_REDIS_REST_TOKEN = secrets.redisToken;
  }
  return { environment, started };
}
