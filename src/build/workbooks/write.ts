// `npm run samples`: samples/*.xlsx from the plans and logs beside them. Part of `npm run generate`.

import { existsSync, readFileSync, writeFileSync } from "node:fs";
import { resolve } from "node:path";
import { pathToFileURL } from "node:url";
import { sampleFiles, sampleWorkbooks } from "../samples";
import { root } from "../sources";
import { workbookFiles } from ".";

/** Writes the files that differ. */
export function writeSampleWorkbooks(): void {
  const texts = sampleFiles();
  const read = (file: string) => {
    const text = texts[file];
    if (text === undefined) throw new Error(`There is no sample file ${file}`);
    return text;
  };
  for (const [file, bytes] of Object.entries(workbookFiles(sampleWorkbooks(), read))) {
    const path = resolve(root, "samples", file);
    if (existsSync(path) && readFileSync(path).equals(bytes)) continue;
    writeFileSync(path, bytes);
    console.log(`generated samples/${file}`);
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href) writeSampleWorkbooks();
