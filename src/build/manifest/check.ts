// Checks manifest.xml without asking any service: `npx tsx src/build/manifest/check.ts`. Tells every fault, one a line.

import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { parse } from "./element";
import { checkIcons, type ReadAsset } from "./icons";
import { checkIdentity } from "./identity";
import { checkOrder } from "./order";
import { checkAddresses, checkLengths, checkReferences } from "./resources";
import { checkRuntime } from "./runtime";

export interface Surroundings {
  packageVersion: string;
  read: ReadAsset;
}

/** Every fault of the manifest as a sentence; an empty list when it is in order. */
export function checkManifest(xml: string, { packageVersion, read }: Surroundings): string[] {
  let root: ReturnType<typeof parse>;
  try {
    root = parse(xml);
  } catch (error) {
    return [error instanceof Error ? error.message : String(error)];
  }
  if (root.name !== "OfficeApp" || root.attributes["xsi:type"] !== "TaskPaneApp") {
    return ["the manifest must be an <OfficeApp> of xsi:type TaskPaneApp"];
  }
  return [
    ...checkOrder(root),
    ...checkIdentity(root, packageVersion),
    ...checkReferences(root),
    ...checkLengths(root),
    ...checkAddresses(root),
    ...checkIcons(root, read),
    ...checkRuntime(root),
  ];
}

/** The project's own surroundings: package.json's version, and src/assets as the hosted folder assets/. */
export function projectSurroundings(root: string): Surroundings {
  const { version } = JSON.parse(readFileSync(join(root, "package.json"), "utf8")) as { version: string };
  const read = (path: string) => {
    const file = join(root, "src", path);
    return existsSync(file) ? readFileSync(file) : undefined;
  };
  return { packageVersion: version, read };
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href) {
  const root = fileURLToPath(new URL("../../../", import.meta.url));
  const faults = checkManifest(readFileSync(join(root, "manifest.xml"), "utf8"), projectSurroundings(root));
  for (const fault of faults) console.error(`manifest.xml: ${fault}`);
  if (faults.length > 0) process.exitCode = 1;
  else console.log("manifest.xml is in order.");
}
