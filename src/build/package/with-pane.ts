// The samples once more, each with the parts that open the pane of the add-in this package installs.

import { mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import type { WorkbookPlan } from "../../sheets";
import { type PaneReference, writeWorkbook } from "../../workbooks";
import { at, parse } from "../manifest/element";
import { storedWorkbook } from "../workbooks";

/** From where the users' Excel has the add-in: given out by the administrator, or a shared folder. */
export type InstalledFrom = "central" | { share: string };

/** Which add-in it is, by the manifest that lies in the package. */
export function paneReference(manifest: string, catalogue: InstalledFrom): PaneReference {
  const root = parse(manifest);
  const [id, version] = ["Id", "Version"].map((name) => at(root, name)?.text ?? "") as [string, string];
  return catalogue === "central"
    ? { id, version, storeType: "EXCatalog", store: "EXCatalog" }
    : { id, version, storeType: "FileSystem", store: catalogue.share };
}

/** Writes `samples/with-pane/` into the folder of the package. */
export function addSamplesWithPane(folder: string, catalogue: InstalledFrom): void {
  const read = (file: string) => readFileSync(join(folder, "samples", file), "utf8");
  const opensPane = paneReference(readFileSync(join(folder, "manifest.xml"), "utf8"), catalogue);
  const target = join(folder, "samples/with-pane");
  mkdirSync(target, { recursive: true });
  for (const { file } of JSON.parse(read("index.json")) as { file: string }[]) {
    const plan = JSON.parse(read(file)) as WorkbookPlan;
    const bytes = writeWorkbook({ ...storedWorkbook(plan, read), opensPane });
    writeFileSync(join(target, file.replace(/\.json$/, ".xlsx")), bytes);
  }
}
