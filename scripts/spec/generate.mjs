import { existsSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { root } from "../lib/settings.mjs";
import { buildDocument } from "./build-document.ts";

/** `npm run spec` writes the OpenAPI document; with --check it only says whether the one that is checked in is still true. */
const file = path.join(root, "api-spec", "openapi.json");

async function main() {
  const text = `${JSON.stringify(await buildDocument(root), null, 2)}\n`;
  if (existsSync(file) && readFileSync(file, "utf8") === text) return console.log("api-spec/openapi.json is as the sources say.");
  if (process.argv.includes("--check")) throw new Error("api-spec/openapi.json is not what the sources say now: run npm run spec and look at the difference.");
  writeFileSync(file, text);
  console.log("api-spec/openapi.json is written anew.");
}

await main().catch((error) => {
  console.error(error.message); // its stack holds whole files as the loader made them
  process.exitCode = 1;
});
process.exit();
