import { defineConfig } from "vitest/config";

export default defineConfig({
  test: {
    include: ["tests/**/*.test.ts"],
    exclude: ["tests/hosts/**", "node_modules/**"],
    globalSetup: ["tests/global-setup.ts"],
    testTimeout: 60_000,
  },
});
