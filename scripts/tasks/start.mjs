import path from "node:path";
import { build, buildId } from "../lib/build.mjs";
import { lifecycle } from "../lib/lifecycle.mjs";
import { migrate } from "../lib/migrate.mjs";
import { choosePort } from "../lib/ports.mjs";
import { prepare } from "../lib/prepare.mjs";
import { seedDemo } from "../lib/seed.mjs";
import { startServices } from "../lib/services.mjs";
import { root } from "../lib/settings.mjs";
import { addressOf, placeSite, startSite } from "../lib/standalone.mjs";
import { step } from "../lib/steps.mjs";
import { supervise } from "../lib/supervise.mjs";

await lifecycle(async (keep, isStopping) => {
  const began = Date.now();
  const own = await prepare(keep);
  const { environment, started } = await startServices(own, keep);
  await step("Tables", () => migrate(environment.DATABASE_URL));
  if (!own.databaseUrl) await step("Demo data", () => seedDemo(environment.DATABASE_URL));
  await step("Build", () => build(root));

  const port = await choosePort({ asked: own.port, usual: 3000, host: own.host, variable: "PORT" });
  if (!own.port && port !== 3000) console.log(`Port 3000 is taken by another program, so the site takes ${port}. Set PORT to choose one yourself.`);
  const site = await step("Site", async () => {
    const folder = placeSite(root, path.join(own.dataDir, "site"), buildId(root));
    return keep(await startSite({ folder, host: own.host, port, environment: { SITE_URL: own.siteUrl ?? addressOf(own.host, port), ...environment }, keepAlive: own.keepAlive, runDir: own.runDir, logDir: own.logDir }));
  });

  const elsewhere = own.siteUrl && own.siteUrl !== site.address ? ` (for others: ${own.siteUrl})` : "";
  console.log(`\nSillwright runs at ${site.address}${elsewhere} after ${((Date.now() - began) / 1000).toFixed(1)} s. Logs are in ${path.relative(process.cwd(), own.logDir) || own.logDir}. Ctrl-C stops it.`);
  await supervise({ site, ...started }, isStopping);
});
