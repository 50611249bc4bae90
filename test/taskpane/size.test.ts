/** On what `npm run build` made: the pane opens beside somebody's work and must be there at once. */
import { readFileSync } from "node:fs";
import { gzipSync } from "node:zlib";
import { expect, it } from "vitest";

const size = (file: string) => gzipSync(readFileSync(`dist/${file}`)).length;

it("the pane with its plotting library is at most 120 kB zipped, and the library comes apart", () => {
  const [pane, picture] = [size("taskpane.js"), size("picture.js")];
  console.log(
    `taskpane.js ${(pane / 1000).toFixed(1)} kB zipped, picture.js ${(picture / 1000).toFixed(1)} kB`,
  );
  expect(pane + picture).toBeLessThanOrEqual(120_000);
  expect(readFileSync("dist/taskpane.html", "utf8")).not.toContain("picture.js");
});
