// `npm run release -- 0.2.0`: everything that a new version needs but the commit.

import { execFileSync, execSync } from "node:child_process";
import { root } from "../sources";
import { readReleaseOptions, USAGE } from "./options";
import { release } from "./release";

const today = (now = new Date()): string =>
  [now.getFullYear(), now.getMonth() + 1, now.getDate()]
    .map((part) => String(part).padStart(2, "0"))
    .join("-");

function run(words: readonly string[]): number {
  const options = readReleaseOptions(words);
  if ("help" in options) {
    console.log(USAGE);
    return 0;
  }
  if ("refused" in options) {
    console.error(`${options.refused}\n\n${USAGE}`);
    return 2;
  }
  const outcome = release(options, {
    root,
    today: today(),
    uncommitted: () => execFileSync("git", ["status", "--porcelain"], { cwd: root, encoding: "utf8" }),
    build: () => execSync("npm run build", { cwd: root, stdio: "inherit" }),
  });
  if ("refused" in outcome) {
    console.error(`${options.version} cannot be released:\n${outcome.refused.join("\n")}`);
    return 1;
  }
  console.log(outcome.said.join("\n"));
  return 0;
}

process.exitCode = run(process.argv.slice(2));
