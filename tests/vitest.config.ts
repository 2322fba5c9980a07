import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

// `unit` needs nothing but Node. `api` needs PostgreSQL: the global set-up starts a cluster of its own for it.
export default defineConfig({
  test: {
    root: fileURLToPath(new URL("..", import.meta.url)),
    environment: "node",
    projects: [
      {
        extends: true,
        test: {
          name: "unit",
          include: [
            "{packages/*,server,app,db}/src/**/*.test.{ts,tsx}",
            "server/local/**/*.test.ts",
            "tests/{published,properties,architecture,helpers,run}/**/*.test.ts",
          ],
        },
      },
      {
        extends: true,
        test: {
          name: "api",
          include: ["tests/api/**/*.test.ts", "db/*.test.ts"],
          globalSetup: ["tests/globalSetup.ts"],
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
    ],
    coverage: {
      provider: "v8",
      include: ["packages/kinematics/src/**", "server/src/**"],
      reporter: ["text-summary"],
    },
  },
});
