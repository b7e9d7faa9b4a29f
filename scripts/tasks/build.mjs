import path from "node:path";
import { build } from "../lib/build.mjs";
import { lifecycle } from "../lib/lifecycle.mjs";
import { ensurePackages } from "../lib/packages.mjs";
import { root } from "../lib/settings.mjs";
import { step } from "../lib/steps.mjs";
import { loadEnvFile } from "../lib/env-file.mjs";

await lifecycle(async () => {
  loadEnvFile(path.join(root, ".env"));
  await step("Packages from npm", () => ensurePackages(root));
  await step("Build", () => build(root, { show: true, force: process.argv.includes("--force") }));
});
