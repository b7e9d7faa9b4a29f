import path from "node:path";
import { lifecycle } from "../lib/lifecycle.mjs";
import { migrate } from "../lib/migrate.mjs";
import { choosePort } from "../lib/ports.mjs";
import { prepare } from "../lib/prepare.mjs";
import { run } from "../lib/run.mjs";
import { seedDemo } from "../lib/seed.mjs";
import { startServices } from "../lib/services.mjs";
import { root } from "../lib/settings.mjs";
import { addressOf } from "../lib/standalone.mjs";
import { step } from "../lib/steps.mjs";

/** The same ground as `npm start`, with Next's development server on it. It has no per-page policy: those are made by a build. */
await lifecycle(async (keep) => {
  const own = await prepare(keep);
  const { environment } = await startServices(own, keep);
  await step("Tables", () => migrate(environment.DATABASE_URL));
  if (!own.databaseUrl) await step("Demo data", () => seedDemo(environment.DATABASE_URL));
  const port = await choosePort({ asked: own.port, usual: 3000, host: own.host, variable: "PORT" });
  const next = path.join(root, "node_modules", "next", "dist", "bin", "next");
  const { code } = await run(process.execPath, [next, "dev", "--port", String(port), "--hostname", own.host], {
    cwd: root,
    show: true,
    env: { ...process.env, SITE_URL: own.siteUrl ?? addressOf(own.host, port), ...environment, NODE_ENV: "development", NEXT_TELEMETRY_DISABLED: "1" },
  });
  return code;
});
