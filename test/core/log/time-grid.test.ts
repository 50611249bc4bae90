import { describe, expect, it } from "vitest";
import { timeGrid } from "../../../src/core/log";
import { column, every, grid, refusal } from "./record";

describe("a time grid", () => {
  it("calls three median intervals no gap, and more a gap", () => {
    expect([...grid(column(0, 2, 4, 10, 12, 18.01)).gap]).toEqual([0, 0, 0, 0, 0, 1]);
  });

  it("takes a longest gap from the caller", () => {
    expect([...grid(column(0, 2, 4, 10, 12), 5).gap]).toEqual([0, 0, 0, 1, 0]);
  });

  it("is not misled by the rounding of date-time serials", () => {
    const start = 46083.291666666664;
    const serials = [0, 2, 4, 6, 12, 18].map((minute) => start + minute / 1440);
    const times = Float64Array.from(serials, (serial) => serial * 1440);
    expect([...grid(times).gap]).toEqual([0, 0, 0, 0, 0, 0]);
  });

  it("allows equal times, which say nothing of the interval", () => {
    const { maxGap } = grid(column(0, 0, 1, 1, 2, 2, 3));
    expect(maxGap).toBe(3);
  });

  it("refuses a falling time, names its row and hints at the cause", () => {
    expect(refusal(timeGrid(column(10, 20, 15)))).toMatch(
      /^#VALUE! time in row 3 .*midnight or a clock change/,
    );
  });

  it("refuses a missing time, an empty log, and a gap limit that an empty cell would be", () => {
    expect(refusal(timeGrid(column(0, undefined, 2)))).toBe("#VALUE! time missing in row 2");
    expect(refusal(timeGrid(column()))).toBe("#N/A the log has no scan");
    expect(refusal(timeGrid(every(1, 3), 0))).toBe("#VALUE! max gap: 0 or an empty cell");
    expect(refusal(timeGrid(every(1, 3), -1))).toBe("#VALUE! max gap -1 min is not above 0");
  });
});
