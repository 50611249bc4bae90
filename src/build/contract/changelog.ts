/** What the changelog says of a version. */

const section = (text: string, heading: RegExp, end: RegExp): string => {
  const start = text.search(heading);
  if (start < 0) return "";
  const rest = text.slice(start).replace(/^.*\n/, "");
  const stop = rest.search(end);
  return stop < 0 ? rest : rest.slice(0, stop);
};

const escaped = (version: string): string => version.replaceAll(".", "\\.");

const sectionOf = (changelog: string, version: string): string =>
  section(changelog, new RegExp(`^## ${escaped(version)}\\b`, "m"), /^## /m);

/** The words under "Results changed" of that version. */
export const resultsChanged = (changelog: string, version: string): string =>
  section(sectionOf(changelog, version), /^### Results changed/m, /^### /m);

/** Functions whose results changed without a word about them, by their names. */
export function unannounced(changedIds: readonly string[], changelog: string, version: string): string[] {
  const said = resultsChanged(changelog, version);
  return [...new Set(changedIds)].filter((id) => !new RegExp(`\\b${id}\\b`).test(said));
}

export const isUnreleased = (changelog: string, version: string): boolean =>
  new RegExp(`^## ${escaped(version)}\\b.*unreleased`, "m").test(changelog);

/** The section on top is this version's, still open, and says something of its results, be it that none changed. */
export const isReadyToClose = (changelog: string, version: string): boolean =>
  isUnreleased(changelog.slice(Math.max(0, changelog.search(/^## /m))).split("\n", 1)[0]!, version) &&
  resultsChanged(changelog, version).trim() !== "";

/** With the day on which the version was released in place of "unreleased". */
export const closed = (changelog: string, version: string, day: string): string =>
  changelog.replace(new RegExp(`^(## ${escaped(version)}\\b.*)unreleased`, "m"), `$1${day}`);
