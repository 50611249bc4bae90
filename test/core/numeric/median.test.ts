/** The moving window against its definition: everything in it sorted anew. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { MedianWindow, medianInPlace } from "../../../src/core/numeric/median";

/** Without a negative zero, whose place among zeros is nobody's business. */
const wide = fc.double({ min: -2000, max: 2000, noNaN: true }).map((x) => x + 0);
/** Tenths, as loggers write them: many are the same, and distances to both sides tie. */
const tenths = fc.integer({ min: -20, max: 20 }).map((x) => x / 10);

function middle(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const half = Math.floor(sorted.length / 2);
  const upper = sorted[half] as number;
  return sorted.length % 2 === 1 ? upper : ((sorted[half - 1] as number) + upper) / 2;
}

/** Moves a window of so many along the record and compares at every `stride`-th place, to the last bit. */
function expectMedians(record: readonly number[], length: number, stride: number): void {
  const window = new MedianWindow(length);
  record.forEach((value, i) => {
    if (i >= length) window.remove(record[i - length] as number);
    window.add(value);
    if (i % stride !== 0) return;
    const inside = record.slice(Math.max(0, i + 1 - length), i + 1);
    const median = middle(inside);
    expect(window.size).toBe(inside.length);
    expect(window.median()).toBe(median);
    for (const centre of [median, value, median - 0.05]) {
      expect(window.medianDistance(centre)).toBe(middle(inside.map((x) => Math.abs(x - centre))));
    }
  });
}

describe("the moving window", () => {
  it("gives the median, and the median distance from any centre, of what is in it", () => {
    const records = fc.array(fc.oneof(wide, tenths), { minLength: 1, maxLength: 60 });
    fc.assert(
      fc.property(records, fc.integer({ min: 1, max: 12 }), (record, length) =>
        expectMedians(record, length, 1),
      ),
    );
  });

  it("gives the same when it is long enough to move in blocks", () => {
    const records = fc.array(fc.oneof(wide, tenths), { minLength: 2600, maxLength: 2600, size: "max" });
    fc.assert(
      fc.property(records, fc.integer({ min: 500, max: 2001 }), (record, length) =>
        expectMedians(record, length, 97),
      ),
      { numRuns: 10 },
    );
  });

  it("stays in order when the record only rises or only falls", () => {
    const rising = Array.from({ length: 1500 }, (_, i) => i / 8);
    expectMedians(rising, 601, 13);
    expectMedians([...rising].reverse(), 600, 13);
  });

  it("is empty again when cleared", () => {
    const window = new MedianWindow(3);
    for (const value of [5, 7, 9]) window.add(value);
    window.clear();
    window.add(1);
    expect([window.size, window.median(), window.medianDistance(1)]).toEqual([1, 1, 0]);
  });
});

describe("the median of a set", () => {
  it("is the middle one, the mean of the middle two, or NaN", () => {
    expect(medianInPlace(Float64Array.of(9, 1, 5))).toBe(5);
    expect(medianInPlace(Float64Array.of(9, 1, 5, 2))).toBe(3.5);
    expect(medianInPlace(new Float64Array())).toBeNaN();
  });
});
