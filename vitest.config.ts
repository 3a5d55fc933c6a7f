import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

export default defineConfig({
  resolve: { alias: { "~": fileURLToPath(new URL("./app", import.meta.url)) } },
  test: {
    include: ["app/**/*.test.ts", "app/**/*.test.tsx", "tests/**/*.test.ts"],
    exclude: ["tests/journeys/**", "node_modules/**", "build/**"],
    testTimeout: 120_000,
    hookTimeout: 120_000,
  },
});
