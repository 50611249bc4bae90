/** For `npm run mutation` (test/mutation/run.ts), which says what is mutated and where the report goes. */
const { MUTATION_AREA, MUTATION_WORKERS } = process.env;

export default {
  testRunner: "vitest",
  plugins: ["@stryker-mutator/vitest-runner"],
  vitest: { configFile: "test/mutation/vitest.config.mts", related: false },
  coverageAnalysis: "perTest",
  // What runs once, while a module loads, is data nearly everywhere: the published values hold it.
  ignoreStatic: true,
  ignorePatterns: ["dist", "test/evidence/pages", "samples", ".cache"],
  tempDirName: `.cache/stryker-${MUTATION_AREA}`,
  reporters: ["clear-text", "json", "progress-append-only"],
  jsonReporter: { fileName: `.cache/mutation/${MUTATION_AREA}.json` },
  clearTextReporter: { logTests: false, allowColor: false },
  allowConsoleColors: false,
  timeoutMS: 10_000,
  timeoutFactor: 2,
  concurrency: Number(MUTATION_WORKERS ?? 2),
};
