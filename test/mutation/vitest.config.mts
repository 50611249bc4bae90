import { defineConfig } from "vitest/config";
import { areas } from "./areas.ts";

const area = areas[process.env.MUTATION_AREA ?? ""];
if (area === undefined) throw new Error(`MUTATION_AREA is one of ${Object.keys(areas).join(", ")}.`);

/** For `npm run mutation`: only the tests that reach the area, and of those the quick ones that need no build. */
export default defineConfig({
  test: {
    include: [...area.tests],
    exclude: ["test/functions/{examples,long-columns,surface}.test.ts", "test/**/*-long.test.ts"],
    setupFiles: ["test/custom-functions-runtime.ts", "test/property-seed.ts", "test/mutation/fewer-cases.ts"],
    testTimeout: 120_000,
  },
});
