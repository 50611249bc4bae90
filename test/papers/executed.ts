/**
 * Where CI executes each command of the papers that is not a line of `.ci/run` as it stands. A command that neither
 * stands there nor here fails the test, as does an entry here that no paper needs.
 */

export interface Place {
  readonly file: string;
  /** What stands there, in a line of its own or in one. */
  readonly as: string;
}

const ci = (as: string): Place => ({ file: ".ci/run", as });

const packaged = ci("npm run package -- --address https://your.host/beadline");
const quickBench = ci("npm run bench -- --quick");
const dryRun = ci("npm run mutation -- --dry-run junction");

export const ELSEWHERE: Readonly<Record<string, Place>> = {
  "npm ci": ci("npm ci --no-audit --no-fund"),
  "npm test": ci("npm test -- --reporter=default"),
  "npm run build": { file: "package.json", as: '"test": "npm run build && ' },
  "npm run lint": ci("npm run lint -- --colors=off"),
  "npm start": ci('npx tsx test/papers/serves.ts "npm start"'),
  "npm start -- --port 5700": ci('npx tsx test/papers/serves.ts "npm start -- --port 5700"'),
  "npm run pictures": { file: "test/browser/pictures.test.ts", as: "`npm run pictures -- " },
  "npm run bench": quickBench,
  "npm run bench -- Screen": quickBench,
  // Hours; the dry run goes through everything but the mutants.
  "npm run mutation": dryRun,
  "npm run mutation -- survey log": dryRun,
  "npm run mutation -- --dry-run numeric": dryRun,
  "npm run package": packaged,
  "npm run package -- --address https://…": packaged,
  "npm run package -- --address https://host/path": packaged,
  "SEED=7 npx vitest run --project unit test/properties": ci(
    "SEED=7 npx vitest run --project unit test/properties/junction.test.ts",
  ),
};

/** What CI cannot execute, with the reason. */
export const NOT_HERE: Readonly<Record<string, string>> = {
  "bash .ci/run": "CI is this command.",
  "npx tsx src/build/icons.ts":
    "Two machines do not draw the same bytes; test/build/icons.test.ts tells when it must be run.",
};
