import { chmodSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { randomBytes } from "node:crypto";
import path from "node:path";

/** The passwords of the local services: made once, kept in the data folder for its owner's eyes only. */
export function localSecrets(dataDir) {
  const file = path.join(dataDir, "secrets.json");
  let known = {};
  try {
    known = JSON.parse(readFileSync(file, "utf8"));
  } catch {
    // The first start, or a file cut short: new passwords do no harm, MariaDB is told its user's at every start.
  }
  const secrets = {
    databasePassword: known.databasePassword ?? randomBytes(24).toString("base64url"),
    redisToken: known.redisToken ?? randomBytes(24).toString("base64url"),
  };
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
  writeFileSync(file, JSON.stringify(secrets), { mode: 0o600 });
  chmodSync(file, 0o600);
  return secrets;
}
