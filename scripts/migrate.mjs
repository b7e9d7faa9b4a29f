import { task } from "./lib/node-version.mjs";

task("migrate");
