import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const at = (path: string) => fileURLToPath(new URL(path, import.meta.url));

export default defineConfig({
  resolve: {
    alias: [
      // Next's guard against importing server code into the browser means nothing here.
      { find: "server-only", replacement: at("tests/support/server-only.ts") },
      { find: /^@\//, replacement: at("./") },
    ],
  },
  test: {
    setupFiles: [at("tests/support/fast-check-seed.ts")],
    projects: [
      {
        extends: true,
        test: { name: "unit", include: ["tests/unit/**/*.test.{ts,tsx}", "tests/architecture/**/*.test.ts"] },
      },
      {
        extends: true,
        test: {
          name: "integration",
          include: ["tests/integration/**/*.test.ts"],
          testTimeout: 60_000,
          hookTimeout: 120_000,
          maxWorkers: 2,
        },
      },
    ],
  },
});
