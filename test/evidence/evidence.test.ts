/** Nothing falls short, and the committed pages say what is so today. */
import { existsSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { collectEvidence, shortfalls } from "./collect";
import { pages } from "./pages";

const evidence = collectEvidence();

describe("the evidence", () => {
  it("falls short nowhere", () => {
    expect(shortfalls(evidence)).toEqual([]);
  });

  it("leaves no source without values", () => {
    for (const { rows } of evidence.groups) expect(rows.length).toBeGreaterThan(0);
    expect(evidence.residuals.length).toBe(23);
  });

  it.each(Object.entries(pages(evidence)))("is what %s says: else run npm run evidence", (path, text) => {
    const committed = existsSync(path) ? readFileSync(path, "utf8") : "";
    // Not compared by toBe: a difference would print the whole page twice.
    expect(committed === text).toBe(true);
  });
});
