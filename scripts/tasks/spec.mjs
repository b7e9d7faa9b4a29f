import path from "node:path";
import { Failure } from "../lib/failure.mjs";
import { lifecycle } from "../lib/lifecycle.mjs";
import { ensurePackages } from "../lib/packages.mjs";
import { run } from "../lib/run.mjs";
import { root } from "../lib/settings.mjs";
import { step } from "../lib/steps.mjs";

await lifecycle(async () => {
  await step("Packages from npm", () => ensurePackages(root));
  const generator = path.join(root, "scripts", "spec", "generate.mjs");
  const { code } = await run(process.execPath, ["--conditions=react-server", "--import", "tsx", generator, ...process.argv.slice(2)], { cwd: root, show: true });
  if (code !== 0) throw new Failure("The OpenAPI document could not be made: the lines above say why.");
});
