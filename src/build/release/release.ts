// Makes the files of a version. Commits nothing.

import { readFileSync, writeFileSync } from "node:fs";
import { resolve } from "node:path";
import { closed } from "../contract/changelog";
import { builtVersion, freezeVersion } from "../contract/freeze";
import { folder, frozenRecords } from "../contract/frozen";
import type { ReleaseOptions } from "./options";
import { versionSet } from "./places";
import { refusals } from "./refusals";

export interface Surroundings {
  root: string;
  /** "2026-07-01". */
  today: string;
  /** What `git status --porcelain` says. */
  uncommitted: () => string;
  /** Generates and builds anew. */
  build: () => void;
}

export type Outcome = { said: string[] } | { refused: string[] };

export function release(
  { version: wanted, check }: ReleaseOptions,
  { root, today, uncommitted, build }: Surroundings,
): Outcome {
  const read = (file: string) => readFileSync(resolve(root, file), "utf8");
  const write = (file: string, text: string) => writeFileSync(resolve(root, file), text);
  const { version } = JSON.parse(read("package.json")) as { version: string };
  const { functions } = builtVersion(root);
  const changelog = read("CHANGELOG.md");
  const records = frozenRecords(root);
  const set = versionSet(read, version, wanted);
  const refused = [
    ...refusals(wanted, { uncommitted: uncommitted(), version, changelog, functions, records }),
    ...("missing" in set ? set.missing : []),
  ];
  if (refused.length > 0 || "missing" in set) return { refused };
  const steps = [
    `version ${version === wanted ? `${wanted} stays` : `${version} becomes ${wanted}`} in ${set.changed.map(({ file }) => file).join(", ")}`,
    "everything derived is generated and built anew",
    `results are frozen in ${folder}/${wanted}.json and ${wanted}.xlsx`,
    `CHANGELOG.md: the section of ${wanted} is closed with ${today}`,
  ];
  if (check)
    return { said: ["Nothing stands in the way. Without --check:", ...steps.map((step) => `- ${step}`)] };
  for (const { file, text } of set.changed) write(file, text);
  build();
  const frozen = freezeVersion(root);
  // Looked at before, so this is a fault of ours; what was written so far can be taken back.
  if ("refused" in frozen) return { refused: [frozen.refused, "Take the changes back with: git restore ."] };
  write("CHANGELOG.md", closed(changelog, wanted, today));
  return { said: ["Done:", ...steps.map((step) => `- ${step}`), frozen.done, ...next(wanted)] };
}

const next = (version: string): string[] => [
  "Now:",
  "- look through: git diff",
  "- test everything: bash .ci/run (it wants the changes committed)",
  `- commit: git add -A && git commit -m "Version ${version}"`,
  `- mark it: git tag v${version}`,
  "- make what is handed out: npm run package -- --address https://…",
];
