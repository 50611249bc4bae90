/**
 * Our pages stripped to their weight: the same style sheets and scripts come from the same server and are parsed, but
 * no script does anything and nothing but a word is drawn. What a page takes beyond that is its own doing.
 */
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { scriptsOf, stylesOf } from "../build/page-files";

/** `extra`: scripts that the page asks for by itself. */
function stripped(dist: string, folder: string, name: string, extra: readonly string[]): void {
  const page = readFileSync(join(dist, name), "utf8");
  const styles = stylesOf(page);
  const scripts = [...new Set([...scriptsOf(page), ...extra])];
  for (const file of styles) writeFileSync(join(folder, file), readFileSync(join(dist, file)));
  for (const file of scripts) {
    const text = readFileSync(join(dist, file), "utf8");
    writeFileSync(join(folder, file), `function neverCalled() {\n${text}\n}\n`);
  }
  const head = [
    '<meta charset="utf-8">',
    ...styles.map((file) => `<link rel="stylesheet" href="${file}">`),
    ...scripts.map((file) => `<script defer src="${file}"></script>`),
  ];
  writeFileSync(
    join(folder, name),
    `<!doctype html><html><head>${head.join("\n")}</head><body>bare</body></html>\n`,
  );
}

/** Makes `sheet.html` and `taskpane.html` in a folder of their own, which `remove` takes away. */
export function barePages(dist: string): { readonly folder: string; remove(): void } {
  const folder = mkdtempSync(join(tmpdir(), "beadline-bare-"));
  stripped(dist, folder, "sheet.html", ["functions.js"]);
  stripped(dist, folder, "taskpane.html", []);
  return { folder, remove: () => rmSync(folder, { recursive: true }) };
}
