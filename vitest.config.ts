import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url));

const shared = {
  resolve: {
    alias: [
      { find: /^@\//, replacement: here("./") },
      // It throws outside Next, on purpose; tests stand where the server stands.
      { find: "server-only", replacement: here("./tests/setup/nothing.ts") },
    ],
  },
};
const minutes = (count: number) => count * 60_000;

export default defineConfig({
  test: {
    projects: [
      { ...shared, test: { name: "unit", include: ["tests/unit/**/*.test.{ts,tsx}", "tests/reference/**/*.test.ts"], testTimeout: process.env.PROVE ? minutes(10) : 20_000 } },
      {
        ...shared,
        test: {
          name: "integration",
          include: ["tests/integration/**/*.test.ts"],
          globalSetup: ["tests/setup/services.ts"],
          fileParallelism: false, // they share one MariaDB and one limiter
          testTimeout: process.env.PROVE ? minutes(10) : 30_000,
          hookTimeout: 60_000,
        },
      },
      { ...shared, test: { name: "start", include: ["tests/start/**/*.test.ts"], fileParallelism: false, testTimeout: minutes(process.env.PROVE ? 20 : 5), hookTimeout: minutes(2) } },
    ],
  },
});
