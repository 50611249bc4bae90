/**
 * The parts of the code that are mutated, each with the tests that reach it from its sources. What runs on the built
 * bundle would not see a mutant, and the browser tests would take days.
 */
export interface Area {
  readonly mutate: readonly string[];
  readonly tests: readonly string[];
}

const core = (folder: string, tests: readonly string[]): Area => ({
  mutate: [`src/core/${folder}/**/*.ts`],
  tests: [`test/core/${folder}/*.test.ts`, ...tests],
});

export const areas: Readonly<Record<string, Area>> = {
  numeric: core("numeric", [
    "test/published/{strd-polynomials,strd-univariate,gum,distributions}.test.ts",
    "test/core/calibration/deviation.test.ts",
    "test/core/uncertainty/{budget,evaluate}.test.ts",
  ]),
  thermoelectric: {
    // The couples are data: each coefficient is held by the published tables, not by a test of its own.
    mutate: ["src/core/thermoelectric/**/*.ts", "!src/core/thermoelectric/couples/**"],
    tests: [
      "test/core/reference-functions.test.ts",
      "test/core/thermoelectric/*.test.ts",
      "test/published/{emf-tables,inverse-approximations,conversions,landmarks,scale-differences}.test.ts",
      "test/properties/thermoelectric.test.ts",
    ],
  },
  junction: core("junction", [
    "test/published/{conversions,platinum}.test.ts",
    "test/properties/junction.test.ts",
  ]),
  calibration: core("calibration", [
    "test/published/{calibration,strd-polynomials}.test.ts",
    "test/properties/calibration.test.ts",
    "test/functions/correct.test.ts",
  ]),
  conformity: core("conformity", [
    "test/published/{decision-rules,tolerances}.test.ts",
    "test/properties/conformity.test.ts",
    "test/functions/judge.test.ts",
  ]),
  uncertainty: core("uncertainty", [
    "test/published/{ea-4-02,gum,strd-univariate}.test.ts",
    "test/properties/uncertainty.test.ts",
    "test/functions/weigh.test.ts",
  ]),
  log: core("log", ["test/properties/{log,logged}.test.ts", "test/functions/screen.test.ts"]),
  survey: core("survey", [
    "test/published/lethality.test.ts",
    "test/properties/{survey,logged}.test.ts",
    "test/functions/survey.test.ts",
  ]),
  words: {
    mutate: ["src/core/errors.ts", "src/core/units.ts"],
    tests: ["test/core/{messages,units}.test.ts", "test/functions/*.test.ts"],
  },
  coercion: {
    mutate: [
      "src/functions/*.ts",
      "src/functions/{arguments,cellwise,kinds}/**/*.ts",
      // Lists, and the hand-over to Excel, which the tests of the built bundle hold.
      "!src/functions/{index,associate,families,version}.ts",
    ],
    tests: ["test/functions/*.test.ts", "test/properties/{cells,logged}.test.ts"],
  },
};
