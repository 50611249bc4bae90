/** The arrows of the house plan, which no compiler checks. */
import { readdirSync, readFileSync } from "node:fs";
import { dirname, join, relative, resolve, sep } from "node:path";
import { describe, expect, it } from "vitest";

/** Which folders of src a folder may import from. `core` knows nobody; nobody knows the two pages. */
const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  core: [],
  functions: ["core"],
  catalogue: [],
  styles: [],
  sheets: ["catalogue"],
  workbooks: ["sheets"],
  taskpane: ["catalogue", "sheets", "styles"],
  "local-sheet": ["catalogue", "sheets", "styles", "taskpane", "workbooks"],
  build: ["core", "functions", "catalogue", "sheets", "workbooks"],
};

const src = resolve("src");

const files = readdirSync(src, { recursive: true, encoding: "utf8" })
  .filter((file) => file.endsWith(".ts") && !file.endsWith(".d.ts"))
  .map((file) => join(src, file));

const importsOf = (file: string): string[] =>
  [...readFileSync(file, "utf8").matchAll(/(?:from|import)\s*\(?\s*"(\.[^"]*)"/g)].map((match) =>
    resolve(dirname(file), match[1] as string),
  );

const folderOf = (path: string): string => relative(src, path).split(sep)[0] as string;

describe("the house plan", () => {
  it.each(Object.entries(MAY_IMPORT))("%s imports only from %j", (folder, allowed) => {
    const imported = files
      .filter((file) => folderOf(file) === folder)
      .flatMap((file) =>
        importsOf(file).map((target) => ({ file: relative(src, file), to: folderOf(target) })),
      )
      .filter(({ to }) => to !== folder && !allowed.includes(to));
    expect(imported).toEqual([]);
  });

  it("names every folder of src that holds code", () => {
    const folders = new Set(files.map(folderOf));
    expect([...folders].filter((folder) => !(folder in MAY_IMPORT))).toEqual([]);
  });

  it("lets functions into core by its one door", () => {
    const doors = files
      .filter((file) => folderOf(file) === "functions")
      .flatMap(importsOf)
      .filter((target) => folderOf(target) === "core");
    expect(new Set(doors)).toEqual(new Set([join(src, "core")]));
  });

  it("keeps every file of core and functions short enough to hold one concept", () => {
    const long = files
      .filter((file) => ["core", "functions"].includes(folderOf(file)))
      .filter((file) => readFileSync(file, "utf8").split("\n").length > 300);
    expect(long).toEqual([]);
  });
});
