import { testRun } from "../lib/test-run.mjs";

/** The long form: property and fuzz tests over many more cases, and start killed again and again. */
await testRun(["build", "unit", "integration", "start"], { filters: process.argv.slice(2), environment: { PROVE: "1" } });
