import { defineConfig } from "vitest/config";

/**
 * Two projects: everything that runs in Node, in parallel; then the browser tests, one file after the other, since
 * they share one browser and each grid needs a core for itself. Both work on what `npm run build` made.
 */
export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: "unit",
          include: ["test/**/*.test.ts"],
          exclude: ["test/browser/**"],
          setupFiles: ["test/custom-functions-runtime.ts", "test/property-seed.ts"],
          testTimeout: 30_000,
          sequence: { groupOrder: 0 },
        },
      },
      {
        test: {
          name: "browser",
          include: ["test/browser/**/*.test.ts"],
          globalSetup: ["test/browser/setup/global-setup.ts"],
          maxWorkers: 1,
          // Under memory pressure the browser's own protocol loses an answer now and then ("promise was collected").
          retry: 1,
          testTimeout: 60_000,
          hookTimeout: 60_000,
          sequence: { groupOrder: 1 },
        },
      },
    ],
  },
});
