/** Figures in the README come from the evidence, or are held by the limits of the benchmark. */
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { limits } from "../bench/limits";
import { collectEvidence } from "./collect";
import { withFigures, withoutFigures } from "./readme";

const readme = readFileSync("README.md", "utf8");

/** "1043 of 1043", "1E-9", "13 digits": what only the evidence may say. */
const figures = (text: string): string[] => text.match(/\d+ of \d+|\d+ digits|\b\d(\.\d+)?E-\d+/g) ?? [];

describe("the README's figures of accuracy", () => {
  it("stand between the markers and nowhere else", () => {
    expect(figures(withoutFigures(readme))).toEqual([]);
    expect(figures(readme).length).toBeGreaterThan(8);
  });

  it("are written over when somebody types them", () => {
    const typed = readme.replace(/\d+ of \d+ values/, "9999 of 9999 values");
    expect(typed).not.toBe(readme);
    expect(withFigures(typed, collectEvidence())).toBe(readme);
  });

  it("need their markers", () => {
    expect(() => withFigures("# Beadline\n", collectEvidence())).toThrow("lost the markers of its figures");
  });
});

describe("the README's ratios of speed", () => {
  const rows = [...readme.matchAll(/^\| ([^|]+) \| (\d+(?:\.\d+)?) \|/gm)].map(([, what, ratio]) => ({
    what,
    ratio: Number(ratio),
  }));
  const held = Object.values(limits);

  it("are those of the benchmark, in its words", () => {
    expect(rows.map(({ what }) => what)).toEqual(held.map(({ what }) => what));
  });

  it.each(held)("keep within the benchmark's limit: $what, $limit", ({ what, limit }) => {
    const quoted = rows.find((row) => row.what === what)?.ratio ?? Number.NaN;
    expect(quoted).toBeGreaterThan(0);
    expect(quoted).toBeLessThanOrEqual(limit);
  });

  it("stand beside those limits", () => {
    const list = new Intl.ListFormat("en-GB").format(held.map(({ limit }) => String(limit)));
    expect(readme).toContain(list);
  });
});
