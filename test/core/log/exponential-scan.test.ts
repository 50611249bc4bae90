/** The scan of all rows at once against the straight-line fit on exp(−t/τ), row by row. */
import { describe, expect, it } from "vitest";
import { bestOfScan } from "../../../src/core/log/exponential-scan";
import { jitter } from "./record";

const mean = (values: Float64Array): number => values.reduce((sum, value) => sum + value, 0) / values.length;

/** Sum of the squared residuals of the best a + b·exp(−t/τ). */
function squares(times: Float64Array, values: Float64Array, timeConstant: number): number {
  const decay = times.map((t) => Math.exp(-(t - (times[0] as number)) / timeConstant));
  const [meanDecay, meanValue] = [mean(decay), mean(values)];
  const product = mean(decay.map((g, i) => (g - meanDecay) * ((values[i] as number) - meanValue)));
  const slope = product / mean(decay.map((g) => (g - meanDecay) ** 2));
  return decay.reduce(
    (sum, g, i) => sum + ((values[i] as number) - meanValue - slope * (g - meanDecay)) ** 2,
    0,
  );
}

/** Seconds with some stamped twice and some left out; level, then the response, with scatter. */
const times = Float64Array.from({ length: 150 }, (_, i) => 40_000 + i - (i % 11 === 4 ? 1 : 0));
const record = (from: number, to: number, tau: number, noise: number): Float64Array =>
  times.map((t, i) => (i < 60 ? from : to + (from - to) * Math.exp(-(t - 40_060) / tau)) + noise * jitter(i));

describe("where the search for a time constant begins", () => {
  it.each([
    ["a rising step", record(20, 100, 12, 0.3)],
    ["a falling step", record(1300, 900, 3, 0.05)],
    ["a small step at a high temperature", record(1300, 1300.5, 20, 0.001)],
    ["a slow one that the record does not finish", record(20, 100, 400, 0.2)],
    ["scatter alone", record(500, 500, 1, 2)],
  ])("in %s is no worse, from any row on, than the best of the scan", (_, values) => {
    const [shortest, longest] = [0.2, 1500];
    const scan: number[] = [];
    for (let tau = shortest; tau <= longest; tau *= 1.5) scan.push(tau);
    const found = bestOfScan(times, values, shortest, longest);
    for (let row = 0; row <= times.length - 5; row++) {
      const [after, readings] = [times.subarray(row), values.subarray(row)];
      const least = Math.min(...scan.map((tau) => squares(after, readings, tau)));
      expect(scan).toContain(found[row]);
      expect(squares(after, readings, found[row] as number)).toBeLessThanOrEqual(least * (1 + 1e-6));
    }
  });
});
