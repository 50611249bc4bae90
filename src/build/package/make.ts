// Makes the folder and the zip that are put on a web server.

import { cpSync, mkdirSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { zipSync } from "fflate";
import { checkManifest } from "../manifest/check";
import { DEVELOPMENT_ADDRESS } from "../metadata";
import { hostingNote } from "./hosting";
import { copyOffice, withOwnOffice } from "./office";
import type { PackageOptions } from "./options";
import { ADDRESSED, readdressed, strayHelpAddresses } from "./readdressed";
import { addSamplesWithPane } from "./with-pane";

export interface Sources {
  /** The built files. */
  dist: string;
  /** The vendor's npm package. */
  officeJs: string;
  version: string;
  /** Where the package goes. */
  out: string;
}

export interface Package {
  folder: string;
  zip: string;
  files: number;
  bytes: number;
}

/** One moment for every file, so that the same files give the same zip. */
const moment = new Date(2026, 0, 1);

/** Makes it anew; throws with every fault found, and leaves nothing half made. */
export function makePackage(
  { address, offline, openPane }: PackageOptions,
  { dist, officeJs, version, out }: Sources,
): Package {
  const name = `beadline-${version}${offline ? "-offline" : ""}`;
  const folder = join(out, name);
  rmSync(folder, { recursive: true, force: true });
  rmSync(`${folder}.zip`, { force: true });
  mkdirSync(out, { recursive: true });
  cpSync(dist, folder, { recursive: true });
  const rewrite = (file: string, change: (text: string) => string) =>
    writeFileSync(join(folder, file), change(readFileSync(join(folder, file), "utf8")));
  for (const file of ADDRESSED) rewrite(file, (text) => readdressed(text, address));
  if (offline) {
    for (const file of filesIn(folder).filter((each) => each.endsWith(".html"))) rewrite(file, withOwnOffice);
    copyOffice(officeJs, folder);
  }
  if (openPane) addSamplesWithPane(folder, openPane);
  writeFileSync(join(folder, "HOSTING.txt"), hostingNote(address, version, offline, openPane));
  const faults = faultsOf(folder, address, version);
  if (faults.length > 0) {
    rmSync(folder, { recursive: true, force: true });
    throw new Error(`The package is not in order:\n${faults.join("\n")}`);
  }
  const contents = filesIn(folder).map(
    (file) => [`${name}/${file}`, readFileSync(join(folder, file))] as const,
  );
  const zip = `${folder}.zip`;
  writeFileSync(zip, zipSync(Object.fromEntries(contents), { mtime: moment, level: 9 }));
  return { folder, zip, files: contents.length, bytes: statSync(zip).size };
}

/** The manifest by the project's own checks, and no address of the development server anywhere. */
function faultsOf(folder: string, address: string, version: string): string[] {
  const files = new Set(filesIn(folder));
  const root = `${new URL(address).pathname.slice(1)}/`.replace(/^\/$/, "");
  const read = (path: string) => {
    const file = path.startsWith(root) ? path.slice(root.length) : path;
    return files.has(file) ? readFileSync(join(folder, file)) : undefined;
  };
  const text = (file: string) => readFileSync(join(folder, file), "utf8");
  const development = [...files]
    .filter((file) => !address.startsWith(DEVELOPMENT_ADDRESS) && /\.(html|js|css|json|xml|txt)$/.test(file))
    .filter((file) => !file.startsWith("office/") && text(file).includes(DEVELOPMENT_ADDRESS))
    .map((file) => `${file}: names ${DEVELOPMENT_ADDRESS}`);
  return [
    ...checkManifest(text("manifest.xml"), { packageVersion: version, read }).map(
      (fault) => `manifest.xml: ${fault}`,
    ),
    ...strayHelpAddresses(text("functions.json"), address),
    ...development,
  ];
}

/** Every file under a folder, by its path with slashes, in one order on every system. */
const filesIn = (folder: string): string[] =>
  readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) =>
      join(entry.parentPath, entry.name)
        .slice(folder.length + 1)
        .replaceAll("\\", "/"),
    )
    .sort();
