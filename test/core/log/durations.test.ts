/** How finely durations are told apart. */
import { describe, expect, it } from "vitest";
import { longer, medianInterval, roundedMinutes, timeGrid } from "../../../src/core/log/time-grid";
import { column, given, grid, refusal } from "./record";

describe("a duration", () => {
  it("is longer than another by more than half a millionth of a minute", () => {
    expect(longer(1.000001, 1)).toBe(true);
    expect(longer(1.0000006, 1)).toBe(true);
    expect(longer(1.0000004, 1)).toBe(false);
    expect(longer(5e-7, 0)).toBe(false);
    expect(longer(1, 2)).toBe(false);
  });

  it("is given to a millionth of a minute", () => {
    expect(roundedMinutes(1.23456749)).toBe(1.234567);
    expect(roundedMinutes(1.2345675001)).toBe(1.234568);
  });
});

describe("the usual interval", () => {
  it("is the median of the rising ones", () => {
    expect(medianInterval(column(0, 1, 3, 6))).toBe(2);
    expect(medianInterval(column(0, 1, 1, 1, 3, 3, 9))).toBe(2);
    expect(medianInterval(column(0, 5))).toBe(5);
  });

  it("is none where the times never rise", () => {
    for (const times of [column(), column(3), column(3, 3), column(3, 2)]) {
      expect(medianInterval(times)).toBeNaN();
    }
  });
});

describe("a grid", () => {
  it("holds the time from the scan before, 0 for the first, and the longest that is no gap", () => {
    const found = grid(column(5, 7, 7, 9, 20));
    expect([...found.elapsed]).toEqual([0, 2, 0, 2, 11]);
    expect([...found.gap]).toEqual([0, 0, 0, 0, 1]);
    expect(found.maxGap).toBe(6);
    expect(grid(column(5, 7), 1.5).maxGap).toBe(1.5);
    expect([...grid(column(5, 7), 1.5).gap]).toEqual([0, 1]);
  });

  it("of one scan, or of one moment, has no gap", () => {
    expect([...grid(column(5)).gap]).toEqual([0]);
    expect([...grid(column(5, 5)).gap]).toEqual([0, 0]);
  });

  it("names the row of a time that is missing, the first included, or falls", () => {
    expect(refusal(timeGrid(column(undefined, 2)))).toBe("#VALUE! time missing in row 1");
    expect(refusal(timeGrid(column(1, Number.POSITIVE_INFINITY)))).toBe("#VALUE! time missing in row 2");
    expect(refusal(timeGrid(column(10, 20, 15)))).toBe(
      "#VALUE! time in row 3 falls below the row before: midnight or a clock change? TIMELINE repairs it",
    );
    expect(given(timeGrid(column(10, 10))).times).toEqual(column(10, 10));
  });
});
