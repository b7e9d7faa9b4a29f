import { task } from "./lib/node-version.mjs";

task("bench");
