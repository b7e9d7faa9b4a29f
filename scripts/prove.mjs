import { task } from "./lib/node-version.mjs";

task("prove");
