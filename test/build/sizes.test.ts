/** What a user downloads, gzipped, against its budget. */
import { readFileSync } from "node:fs";
import { gzipSync } from "node:zlib";
import { describe, expect, it } from "vitest";

/** kB of 1000 bytes. The sheet carries the grid engine, 1.7 MB of it, and only opens in a browser. */
const BUDGETS: Readonly<Record<string, number>> = {
  "functions.js": 60,
  "taskpane.js": 120,
  "taskpane.css": 8,
  "functions.json": 30,
  "sheet.js": 2000,
};

describe("the size, gzipped, of", () => {
  it.each(Object.entries(BUDGETS))("%s is at most %d kB", (file, budget) => {
    const size = gzipSync(readFileSync(`dist/${file}`), { level: 9 }).length;
    expect(size / 1000).toBeLessThanOrEqual(budget);
  });
});
