// `npm run package -- --address https://host/path`: what was built, ready to be hosted there.

import { existsSync, readFileSync } from "node:fs";
import { relative, resolve } from "node:path";
import { root } from "../sources";
import { makePackage } from "./make";
import { readPackageOptions, USAGE } from "./options";

function run(words: readonly string[]): number {
  const options = readPackageOptions(words);
  if ("help" in options) {
    console.log(USAGE);
    return 0;
  }
  if ("refused" in options) {
    console.error(`${options.refused}\n\n${USAGE}`);
    return 2;
  }
  const dist = resolve(root, "dist");
  if (!existsSync(resolve(dist, "taskpane.html"))) {
    console.error("There is nothing built yet: run `npm run build` first.");
    return 1;
  }
  const { version } = JSON.parse(readFileSync(resolve(root, "package.json"), "utf8")) as { version: string };
  const officeJs = resolve(root, "node_modules/@microsoft/office-js");
  try {
    const made = makePackage(options, { dist, officeJs, version, out: resolve(root, "package") });
    const size = (made.bytes / 1_000_000).toFixed(1);
    console.log(
      `${relative(root, made.folder)}/ holds ${made.files} files for ${options.address}/ (zipped ${size} MB).`,
    );
    console.log(
      `${relative(root, made.zip)} is the same. HOSTING.txt in it says what to do. The manifest is in order.`,
    );
    return 0;
  } catch (failure) {
    console.error(failure instanceof Error ? failure.message : failure);
    return 1;
  }
}

process.exitCode = run(process.argv.slice(2));
