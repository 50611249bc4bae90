/** Which settings the spike filter takes, and what counts as a spike at the very limit. */
import { describe, expect, it } from "vitest";
import { despiker } from "../../../src/core/log";
import { smallestStep } from "../../../src/core/log/despike";
import { column, given, refusal } from "./record";

const despike = (readings: Float64Array, half?: number, threshold?: number) =>
  given(despiker(half, threshold))(readings);

describe("the settings of the spike filter", () => {
  it("are a half window from 1 to 1000 scans and a threshold above 0", () => {
    for (const half of [0, -1, 2.5, 1001, Number.NaN]) {
      const named = Number.isNaN(half) ? "(not a number)" : half;
      expect(refusal(despiker(half))).toBe(`#VALUE! half window ${named} is no whole number from 1 to 1000`);
    }
    expect(refusal(despiker(3, 0))).toBe("#VALUE! threshold: 0 or an empty cell");
    expect(refusal(despiker(3, -1))).toBe("#VALUE! threshold -1 is not above 0");
    expect(refusal(despiker(3, Number.NaN))).toBe("#VALUE! threshold (not a number) is not above 0");
    const spiky = column(1, 2, 50, 2, 1, 2);
    expect(despike(spiky, 1000)[2]).toBe(2);
    expect(despike(spiky, 1, 1e-9)[2]).toBe(2);
  });

  it("are a half window of 3 and a threshold of 3 when left out", () => {
    const record = column(5, 6, 5, 7, 30, 6, 5, 7, 6, 5, 9, 5);
    expect(despike(record)).toEqual(despike(record, 3, 3));
  });
});

describe("a spike", () => {
  /** Steps of 1 about a level of 0, the fourth reading apart from it: deviation 1.4826 · 1, threshold 2. */
  const apart = (by: number) => column(-1, 0, 1, by, -1, 0, 1);

  it("lies further off than threshold × 1.4826 × the median distance, and not at it", () => {
    // Window of seven: median 0 for a spike upward of its place … distances 0 0 1 1 1 1 and the spike: median 1.
    const limit = 2 * 1.4826;
    expect(despike(apart(limit), 3, 2)[3]).toBe(limit);
    expect(despike(apart(limit + 1e-8), 3, 2)[3]).toBe(0);
    expect(despike(apart(-limit), 3, 2)[3]).toBe(-limit);
    expect(despike(apart(-limit - 1e-8), 3, 2)[3]).toBe(0);
  });

  it("lies further off than threshold × the smallest step where the window has no spread", () => {
    const flat = (by: number) => column(10, 10, 10, 10 + by, 10, 10, 10, 11);
    expect(despike(flat(3), 3, 3)[3]).toBe(13);
    expect(despike(flat(3.5), 3, 3)[3]).toBe(10);
    expect(despike(flat(-3.5), 3, 3)[3]).toBe(10);
  });

  it("is known among three readings, and not between two", () => {
    expect(despike(column(5, 90, 6, 5), 1, 1)).toEqual(column(5, 6, 6, 5));
    expect(despike(column(5, 90, undefined, 6, 5), 1, 1).slice(0, 2)).toEqual(column(5, 90));
    // Both lie half a step from their median, which a threshold below one half would count as far.
    expect(despike(column(1, 2), 1, 0.4)).toEqual(column(1, 2));
  });

  it("is looked for among the scans within the half window and no others", () => {
    // The level changes at index 5: with a half window of 2 the fifth reading has 3 of its own, with 1 it has 2.
    const record = column(0, 0.1, 0, 0.1, 0, 50, 50.1, 50, 50.1);
    expect(despike(record, 2)).toEqual(record);
    const one = column(0, 0.1, 0, 50, 0.1, 0, 0.1);
    expect(despike(one, 1)[3]).toBe(0.1);
  });
});

describe("the smallest step", () => {
  it("is the least change that is more than rounding", () => {
    expect(smallestStep(column(1, 4, 2, 7))).toBe(2);
    expect(smallestStep(column(1, undefined, 4, 4 + 1e-10, 9))).toBe(3);
    expect(smallestStep(column(0, 2e-9))).toBe(2e-9);
    expect(smallestStep(column(0, 1e-9))).toBe(0);
    expect(smallestStep(column(0.5, 0.5))).toBe(0);
    expect(smallestStep(column())).toBe(0);
  });
});
