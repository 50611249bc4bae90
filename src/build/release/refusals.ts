// Why a version may not be released now, each reason in a sentence.

import { isReadyToClose, isUnreleased, unannounced } from "../contract/changelog";
import { changedCalls } from "../contract/freeze";
import { order } from "../contract/frozen";
import type { Functions, VersionRecord } from "../contract/record";

export interface State {
  /** What `git status --porcelain` says: nothing where everything is committed. */
  uncommitted: string;
  /** Of package.json. */
  version: string;
  changelog: string;
  functions: Functions;
  records: readonly VersionRecord[];
}

export function refusals(wanted: string, state: State): string[] {
  const { uncommitted, version, changelog, functions, records } = state;
  const found: string[] = [];
  if (uncommitted !== "") found.push(`These are not committed:\n${uncommitted.trimEnd()}`);
  const isHigher = order(wanted) > order(version) || (wanted === version && isUnreleased(changelog, version));
  if (!isHigher) {
    found.push(
      wanted === version
        ? `${version} has been released already.`
        : `${wanted} is not higher than ${version}, the version at hand.`,
    );
  }
  if (!isReadyToClose(changelog, wanted)) {
    found.push(
      `CHANGELOG.md must begin with the open section "## ${wanted} – unreleased", and say under "### Results changed" what changed, or that nothing did.`,
    );
  }
  const changed = changedCalls(functions, records, wanted, version).map(({ id }) => id);
  const silent = unannounced(changed, changelog, wanted);
  if (silent.length > 0) {
    found.push(
      `Results of ${silent.join(", ")} changed, and "Results changed" of ${wanted} in CHANGELOG.md does not name ${silent.length === 1 ? "it" : "them"}.`,
    );
  }
  return found;
}
