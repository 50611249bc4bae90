import { defineConfig } from "vitest/config";

/**
 * For `npm run mutation`: the tests that reach `core/thermoelectric` and `functions/cellwise` from their sources. What
 * runs on the built bundle would not see a mutant, and browser tests would take days.
 */
export default defineConfig({
  test: {
    include: [
      "test/core/reference-functions.test.ts",
      "test/core/junction/*.test.ts",
      "test/published/{emf-tables,inverse-approximations,conversions,scale-differences}.test.ts",
      "test/properties/{thermoelectric,cells,junction}.test.ts",
      "test/functions/{bad-input,correct,judge}.test.ts",
    ],
    setupFiles: ["test/custom-functions-runtime.ts"],
    testTimeout: 30_000,
  },
});
