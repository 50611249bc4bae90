/**
 * `npm run contract`, a step of every release: freezes what the built version gives. Refuses when a result differs
 * from an earlier version's and "Results changed" of the changelog does not name its function, and when the version
 * has been released already.
 */
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { resolve } from "node:path";
import { loadBuiltFunctions } from "../../src/build/built-functions";
import type { Catalogue } from "../../src/catalogue/catalogue";
import { callsToFreeze } from "./calls";
import { isUnreleased, unannounced } from "./changelog";
import { keyOf, printed, resultOf, sameResult, type VersionRecord } from "./record";
import { folder, frozenRecords } from "./records";

const read = (file: string): string => readFileSync(file, "utf8");

const { functions, version } = JSON.parse(read("src/catalogue/catalogue.json")) as Catalogue;
const changelog = read("CHANGELOG.md");
const file = resolve(folder, `${version}.json`);
const built = loadBuiltFunctions(read("dist/functions.js"));
const calls = callsToFreeze(functions).map((call) => ({ ...call, result: resultOf(built, call) }));

const earlier = frozenRecords().filter((record) => record.version !== version);
const allowed = new Set(earlier.flatMap(({ changed }) => changed.map(keyOf)));
const changed = earlier
  .flatMap((record) =>
    record.calls.filter(
      (call) =>
        !allowed.has(keyOf(call)) &&
        !sameResult(call.result, resultOf(built, call), [record.version, version]),
    ),
  )
  .map(({ id, given }) => ({ id, given }));

const silent = unannounced(
  changed.map(({ id }) => id),
  changelog,
  version,
);
if (silent.length > 0) {
  console.error(
    `Results of ${silent.join(", ")} changed; "Results changed" of ${version} in CHANGELOG.md must say so.`,
  );
  process.exitCode = 1;
} else if (existsSync(file) && !isUnreleased(changelog, version)) {
  console.error(`${version} has been released and its record is frozen: set the next version first.`);
  process.exitCode = 1;
} else {
  const record: VersionRecord = {
    version,
    functions: functions.map(({ id, parameters }) => ({
      id,
      parameters: parameters.map(({ name, optional }) => ({ name, optional })),
    })),
    calls,
    changed,
  };
  writeFileSync(file, printed(record));
  console.log(
    `${version}: ${functions.length} functions, ${calls.length} calls, ${changed.length} of them changed.`,
  );
}
