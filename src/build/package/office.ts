// Office.js beside the pane, for plants without internet. Its vendor supports only its own address; its licence
// allows copies, unchanged, as part of an add-in for its own products.

import { copyFileSync, mkdirSync, readdirSync } from "node:fs";
import { dirname, join } from "node:path";

/** What the built pages name; replaced by the copy. */
const HOSTED = "https://appsforoffice.microsoft.com";
const FOLDER = "office";

/** Of the package's 86 MB what its office.js asks for when Excel is the host: no other program, no debug copies. */
const needed = [
  /^office\.js$/,
  /^o15apptofilemappingtable\.js$/,
  /^excel(?!.*\.debug\.js$)[\w.-]*\.js$/,
  /^custom-functions-runtime\.js$/,
  /^telemetry\/oteljs(_agave)?\.js$/,
  /^[a-z]{2,3}(-[a-z0-9]+)+\/office_strings\.js$/,
];

export function officeFiles(distribution: string): string[] {
  return readdirSync(distribution, { recursive: true, encoding: "utf8" })
    .map((file) => file.replaceAll("\\", "/"))
    .filter((file) => needed.some((pattern) => pattern.test(file)))
    .sort();
}

/** Copies them under `office/` of the folder, with their licence. */
export function copyOffice(officeJs: string, folder: string): void {
  const distribution = join(officeJs, "dist");
  for (const file of officeFiles(distribution)) {
    const target = join(folder, FOLDER, file);
    mkdirSync(dirname(target), { recursive: true });
    copyFileSync(join(distribution, file), target);
  }
  copyFileSync(join(officeJs, "LICENSE.md"), join(folder, FOLDER, "LICENSE.md"));
}

/** A page that loads the copy, and may load nothing from elsewhere. */
export const withOwnOffice = (page: string): string =>
  page.replaceAll(`${HOSTED}/lib/1/hosted/`, `${FOLDER}/`).replaceAll(` ${HOSTED}`, "");
