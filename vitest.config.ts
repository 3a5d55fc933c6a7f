import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const alias = { "~": fileURLToPath(new URL("./app", import.meta.url)) };

export default defineConfig({
  resolve: { alias },
  test: {
    testTimeout: 120_000,
    hookTimeout: 120_000,
    projects: [
      {
        extends: true,
        test: {
          name: "unit", sequence: { groupOrder: 0 },
          include: ["app/**/*.test.ts", "app/**/*.test.tsx", "tests/**/*.test.ts"],
          exclude: ["tests/server/**", "tests/journeys/**", "node_modules/**", "build/**"],
        },
      },
      {
        extends: true,
        // One file after the other: they share the demo studio in the test database.
        test: { name: "server", sequence: { groupOrder: 1 }, include: ["tests/server/**/*.test.ts"], fileParallelism: false, maxWorkers: 1 },
      },
    ],
  },
});
