/** Nothing falls short, and what is committed says what is so today. */
import { existsSync, readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { collectEvidence, shortfalls } from "./collect";
import { committed } from "./committed";
import { publishedSets } from "./sets";

const evidence = collectEvidence();

describe("the evidence", () => {
  it("falls short nowhere", () => {
    expect(shortfalls(evidence)).toEqual([]);
  });

  it("leaves no source without values", () => {
    for (const { rows } of evidence.sets) expect(rows.length).toBeGreaterThan(0);
    expect(evidence.residuals).toHaveLength(23);
    expect(evidence.bands).toHaveLength(23);
  });

  it("has each source once", () => {
    const sources = evidence.sets.map(({ source }) => source);
    expect(sources).toEqual([...new Set(sources)]);
  });

  it("has every set of published values that there is", async () => {
    const files = readdirSync("test/published").filter((name) => /^[\w-]+\.ts$/.test(name));
    const exported = await Promise.all(files.map((name) => import(`../published/${name.slice(0, -3)}.ts`)));
    const sets = exported.flatMap((module: Record<string, unknown>) =>
      Object.entries(module).flatMap(([name, value]) => (name.endsWith("Sets") ? (value as unknown[]) : [])),
    );
    const found = sets.filter((set) => "values" in (set as object));
    expect(found).toHaveLength(publishedSets.length);
    expect(found.filter((set) => !publishedSets.includes(set as never))).toEqual([]);
  });

  it.each(Object.entries(committed(evidence)))("is what %s says: else run npm run evidence", (path, text) => {
    const page = existsSync(path) ? readFileSync(path, "utf8") : "";
    // Not compared by toBe: a difference would print the whole page twice.
    expect(page === text).toBe(true);
  });
});
