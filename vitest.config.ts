import { defineConfig } from "vitest/config";

export default defineConfig({
  test: {
    include: ["tests/{unit,ui,jobs,api,architecture,outside}/**/*.test.{ts,tsx}"],
    globalSetup: ["tests/setup/globalSetup.ts"],
    environment: "node",
    maxWorkers: 2,
    testTimeout: 30_000,
  },
});
