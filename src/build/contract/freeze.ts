// Freezes what the built version gives, or says why it may not.

import { readFileSync, writeFileSync } from "node:fs";
import { resolve } from "node:path";
import type { Catalogue } from "../../catalogue/catalogue";
import { loadBuiltFunctions } from "../built-functions";
import { callsToFreeze } from "./calls";
import { isUnreleased, unannounced } from "./changelog";
import { folder, frozenRecords, isFrozen } from "./frozen";
import {
  type FrozenCall,
  type Functions,
  keyOf,
  printed,
  resultOf,
  sameResult,
  type VersionRecord,
} from "./record";
import { contractWorkbook } from "./workbook";

/**
 * Calls of the records before a version that now give something else, and did not when the last of them was frozen.
 * Until the version is set, what was built calls itself by another.
 */
export function changedCalls(
  built: Functions,
  records: readonly VersionRecord[],
  version: string,
  builtAs = version,
): Pick<FrozenCall, "id" | "given">[] {
  const earlier = records.filter((record) => record.version !== version);
  const known = new Set(earlier.flatMap(({ changed }) => changed.map(keyOf)));
  return earlier.flatMap((record) =>
    record.calls
      .filter(
        (call) =>
          !known.has(keyOf(call)) &&
          !sameResult(call.result, resultOf(built, call), [record.version, builtAs]),
      )
      .map(({ id, given }) => ({ id, given })),
  );
}

export interface Built {
  catalogue: Catalogue;
  functions: Functions;
}

/** The catalogue and the functions as they were built last. */
export function builtVersion(root: string): Built {
  const read = (file: string) => readFileSync(resolve(root, file), "utf8");
  return {
    catalogue: JSON.parse(read("src/catalogue/catalogue.json")) as Catalogue,
    functions: loadBuiltFunctions(read("dist/functions.js")),
  };
}

/** Writes the record and the workbook of the version at hand. */
export function freezeVersion(root: string): { done: string } | { refused: string } {
  const { catalogue, functions: built } = builtVersion(root);
  const { version, functions } = catalogue;
  const changelog = readFileSync(resolve(root, "CHANGELOG.md"), "utf8");
  const changed = changedCalls(built, frozenRecords(root), version);
  const silent = unannounced(
    changed.map(({ id }) => id),
    changelog,
    version,
  );
  if (silent.length > 0) {
    return {
      refused: `Results of ${silent.join(", ")} changed; "Results changed" of ${version} in CHANGELOG.md must say so.`,
    };
  }
  if (isFrozen(version, root) && !isUnreleased(changelog, version))
    return { refused: `${version} has been released and its record is frozen: set the next version first.` };
  const calls = callsToFreeze(functions).map((call) => ({ ...call, result: resultOf(built, call) }));
  const record: VersionRecord = {
    version,
    functions: functions.map(({ id, parameters }) => ({
      id,
      parameters: parameters.map(({ name, optional }) => ({ name, optional })),
    })),
    calls,
    changed,
  };
  writeFileSync(resolve(root, folder, `${version}.json`), printed(record));
  writeFileSync(resolve(root, folder, `${version}.xlsx`), contractWorkbook(catalogue, built));
  return {
    done: `${version}: ${functions.length} functions, ${calls.length} calls, ${changed.length} of them changed.`,
  };
}
