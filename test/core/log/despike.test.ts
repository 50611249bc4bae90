import { describe, expect, it } from "vitest";
import { despiker } from "../../../src/core/log";
import { column, given, jitter, refusal } from "./record";

const despike = (readings: Float64Array, halfWindow?: number, threshold?: number) =>
  given(despiker(halfWindow, threshold))(readings);

/** The filter again, window by window, with nothing kept between them. */
function plain(readings: Float64Array, half: number, threshold: number): Float64Array {
  const middle = (values: number[]): number => {
    const sorted = [...values].sort((a, b) => a - b);
    const n = sorted.length;
    return n % 2 === 1
      ? (sorted[(n - 1) / 2] as number)
      : ((sorted[n / 2 - 1] as number) + (sorted[n / 2] as number)) / 2;
  };
  const present = [...readings].filter((reading) => !Number.isNaN(reading));
  const steps = present.slice(1).map((reading, i) => Math.abs(reading - (present[i] as number)));
  const smallest = Math.min(...steps.filter((step) => step > 1e-9));
  return readings.map((reading, i) => {
    const window = [...readings.slice(Math.max(0, i - half), i + half + 1)].filter((x) => !Number.isNaN(x));
    if (Number.isNaN(reading) || window.length < 3) return reading;
    const median = middle(window);
    const deviation = Math.max(1.4826 * middle(window.map((x) => Math.abs(x - median))), smallest);
    const round = (x: number) => Math.round(x * 1e9);
    return round(Math.abs(reading - median)) > round(threshold * deviation) ? median : reading;
  });
}

describe("the spike filter", () => {
  const record = Float64Array.from({ length: 60 }, (_, i) => 100 + 3 * i + jitter(i));

  it("puts the median of its window in the place of a spike and leaves the rest bit-identical", () => {
    const spiky = Float64Array.from(record);
    spiky[20] = 500;
    const result = despike(spiky);
    expect(result[20]).toBe([...spiky.slice(17, 24)].sort((a, b) => a - b)[3]);
    spiky.forEach((reading, i) => {
      if (i !== 20) expect(result[i]).toBe(reading);
    });
  });

  it("works up to both ends", () => {
    const spiky = Float64Array.from(record);
    spiky[0] = -400;
    spiky[59] = 900;
    const result = despike(spiky);
    expect(result[0]).toBeLessThan(110);
    expect(result[0]).toBeGreaterThan(99);
    expect(result[59]).toBeGreaterThan(268);
    expect(result[59]).toBeLessThan(280);
  });

  it("leaves a ramp alone, ends included", () => {
    const ramp = Float64Array.from({ length: 30 }, (_, i) => 5 * i);
    expect(despike(ramp)).toEqual(ramp);
  });

  it("leaves the flicker of a coarse logger alone", () => {
    const flicker = column(900, 900, 900, 901, 900, 900, 900, 899, 900, 903, 900);
    expect(despike(flicker)).toEqual(flicker);
    const spike = column(900, 900, 900, 901, 900, 900, 900, 899, 900, 904, 900, 900);
    expect(despike(spike)[9]).toBe(900);
  });

  it("leaves out missing readings and keeps them missing", () => {
    const result = despike(column(20, 20.1, undefined, 80, 20.2, undefined, 20.1, 20));
    expect(result[2]).toBeNaN();
    expect(result[5]).toBeNaN();
    expect(result[3]).toBeCloseTo(20.1, 9);
  });

  it.each([
    [3, 3],
    [1, 2],
    [5, 4],
    [40, 3],
    [130, 3],
    [1000, 3],
  ])("agrees with a plain recomputation: half window %d, threshold %d", (half, threshold) => {
    const noisy = Float64Array.from({ length: 300 }, (_, i) =>
      i % 37 === 5
        ? Number.NaN
        : 50 + Math.round(10 * (jitter(i) + (i % 23 === 0 ? 8 * jitter(3 * i) : 0))) / 10,
    );
    expect(despike(noisy, half, threshold)).toEqual(plain(noisy, half, threshold));
  });

  it("uses its window anew for each column", () => {
    const filter = given(despiker());
    const spiky = column(1, 1.1, 1, 50, 1.1, 1, 1.1);
    expect(filter(spiky)).toEqual(filter(spiky));
  });

  it("takes columns that are short or empty", () => {
    expect(despike(column())).toEqual(column());
    expect(despike(column(5))).toEqual(column(5));
    expect(despike(column(5, 9000))).toEqual(column(5, 9000));
  });

  it("refuses settings that are none", () => {
    expect(refusal(despiker(0))).toMatch(/half window 0 is no whole number from 1 to 1000/);
    expect(refusal(despiker(2.5))).toMatch(/whole number/);
    expect(refusal(despiker(3, 0))).toBe("#VALUE! threshold: 0 or an empty cell");
    expect(refusal(despiker(3, -1))).toBe("#VALUE! threshold -1 is not above 0");
  });
});
