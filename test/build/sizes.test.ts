/** What a user downloads, gzipped, against its budget: each file, and all that a page needs to open. */
import { readdirSync, readFileSync } from "node:fs";
import { gzipSync } from "node:zlib";
import { describe, expect, it } from "vitest";
import { scriptsOf, stylesOf } from "./page-files";

/** kB of 1000 bytes. The sheet carries the grid engine, 1.7 MB of it, and only opens in a browser. */
const BUDGETS: Readonly<Record<string, number>> = {
  "functions.js": 60,
  "functions.json": 30,
  "taskpane.js": 120,
  "taskpane.css": 8,
  "picture.js": 30,
  "picture.css": 2,
  "sheet.js": 2000,
  "sheet.css": 20,
  "help.html": 40,
  "help.css": 3,
};

/** Parts of the grid engine that it asks for when it needs them; the bundler numbers them. */
const ENGINE_PART = /^sheet\.\d+\.js$/;
const ENGINE_PART_BUDGET = 40;

/** `asks`: what a page fetches by itself before it is of use. */
const PAGES: readonly { readonly page: string; readonly asks: readonly string[]; readonly budget: number }[] =
  [
    { page: "taskpane.html", asks: [], budget: 180 },
    {
      page: "sheet.html",
      asks: [
        "functions.js",
        "functions.json",
        "samples/index.json",
        "samples/furnace-log.json",
        "samples/furnace-log.csv",
      ],
      budget: 2100,
    },
    { page: "help.html", asks: [], budget: 43 },
  ];

const kilobytes = (file: string): number =>
  gzipSync(readFileSync(`dist/${file}`), { level: 9 }).length / 1000;

describe("the size, gzipped, of", () => {
  it.each(Object.entries(BUDGETS))("%s is at most %d kB", (file, budget) => {
    expect(kilobytes(file)).toBeLessThanOrEqual(budget);
  });

  it.each(readdirSync("dist").filter((file) => ENGINE_PART.test(file)))(
    `%s, a part of the grid engine, is at most ${ENGINE_PART_BUDGET} kB`,
    (file) => {
      expect(kilobytes(file)).toBeLessThanOrEqual(ENGINE_PART_BUDGET);
    },
  );

  it.each(PAGES)("$page with all that it needs to open is at most $budget kB", ({ page, asks, budget }) => {
    const text = readFileSync(`dist/${page}`, "utf8");
    const files = new Set([page, ...stylesOf(text), ...scriptsOf(text), ...asks]);
    expect(files.size).toBeGreaterThan(1);
    const together = [...files].reduce((sum, file) => sum + kilobytes(file), 0);
    expect(together).toBeLessThanOrEqual(budget);
  });
});

it("every script and style sheet that ships has a budget", () => {
  const shipped = readdirSync("dist").filter((file) => /\.(js|css)$/.test(file) && !ENGINE_PART.test(file));
  expect(Object.keys(BUDGETS)).toEqual(expect.arrayContaining(shipped));
});
