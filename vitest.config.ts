import { defineConfig } from "vitest/config";

export default defineConfig({
  resolve: {
    alias: {
      "@": import.meta.dirname,
      // `server-only` throws outside a server bundle; tests are the server.
      "server-only": `${import.meta.dirname}/node_modules/server-only/empty.js`,
    },
  },
  test: {
    include: ["{lib,db,emails,components,docker,tests}/**/*.test.{ts,tsx}"],
    globalSetup: ["tests/setup/global.ts"],
    setupFiles: ["tests/setup/worker.ts"],
    pool: "forks",
    maxWorkers: 2,
    // Ends what hangs; a small busy machine may take its time.
    testTimeout: 120_000,
    hookTimeout: 120_000,
  },
});
