import path from "node:path";
import { loadEnvFile } from "../lib/env-file.mjs";
import { Failure } from "../lib/failure.mjs";
import { lifecycle } from "../lib/lifecycle.mjs";
import { migrate } from "../lib/migrate.mjs";
import { root, settings } from "../lib/settings.mjs";
import { step } from "../lib/steps.mjs";

await lifecycle(async () => {
  loadEnvFile(path.join(root, ".env"));
  const { databaseUrl } = settings();
  if (!databaseUrl) throw new Failure("DATABASE_URL is not set: set it to the MariaDB whose tables are to be brought up to date. (npm start does this for its own.)");
  await step("Tables", () => migrate(databaseUrl));
});
