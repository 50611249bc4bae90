// `npm run generate`: everything in the repository that is derived, from its one source each. CI runs it and fails
// when it changes a file.

import { existsSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { dirname, resolve } from "node:path";
import { catalogue } from "./catalogue";
import { helpPage } from "./help";
import { metadata } from "./metadata";
import { withFunctionTable } from "./readme";
import { sampleFiles } from "./samples";
import { documentedFunctions, root } from "./sources";
import { writeSampleWorkbooks } from "./workbooks/write";

/** Writes only what differs, so that file watchers stay quiet. */
function write(path: string, content: string): void {
  const file = resolve(root, path);
  if (existsSync(file) && readFileSync(file, "utf8") === content) return;
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, content);
  console.log(`generated ${path}`);
}

const json = (value: unknown): string => `${JSON.stringify(value, null, 2)}\n`;

const documented = documentedFunctions();
const made = catalogue(documented);

write("src/catalogue/catalogue.json", json(made));
write("src/catalogue/functions.json", json(await metadata(documented)));
write("src/help/help.html", helpPage(made));
for (const [file, text] of Object.entries(sampleFiles())) write(`samples/${file}`, text);
writeSampleWorkbooks();
write("README.md", withFunctionTable(readFileSync(resolve(root, "README.md"), "utf8"), made));
