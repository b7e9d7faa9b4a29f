import { testRun } from "../lib/test-run.mjs";

const ALL = ["build", "lint", "types", "unit", "integration", "start", "e2e"];

/** `npm test` runs everything; `npm test -- e2e tests/e2e/corner.spec.ts` runs the stages named, with what else is said as a filter. */
const args = process.argv.slice(2);
const named = args.filter((arg) => ALL.includes(arg));
const filters = args.filter((arg) => !ALL.includes(arg));
const wanted = named.length === 0 ? ALL : ALL.filter((name) => named.includes(name) || (name === "build" && (named.includes("e2e") || named.includes("start"))));
await testRun(wanted, { filters });
