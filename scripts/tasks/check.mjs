import { testRun } from "../lib/test-run.mjs";

await testRun(["lint", "types", "unit", "integration"], { filters: process.argv.slice(2) });
