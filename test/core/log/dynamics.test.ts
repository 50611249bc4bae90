import { describe, expect, it } from "vitest";
import { rampRate, unlag } from "../../../src/core/log";
import { column, every, given, grid, jitter, refusal } from "./record";

describe("the ramp rate", () => {
  it("is the slope of a straight ramp everywhere, ends and gaps included", () => {
    const times = column(0, 1, 2, 3, 4, 20, 21, 22, 22.5, 23);
    const rates = given(
      rampRate(
        grid(times),
        times.map((t) => 30 + 4.5 * t),
      ),
    );
    for (const rate of rates) expect(rate).toBeCloseTo(4.5, 12);
  });

  it("is a least-squares line over five scans by default", () => {
    const times = every(2, 40);
    const temperatures = times.map((t, i) => 10 * Math.sin(t / 9) + jitter(i));
    const rates = given(rampRate(grid(times), temperatures));
    for (let i = 2; i < 38; i++) {
      // Five equal steps: the slope's weights are −2 −1 0 1 2 over 10.
      const plain =
        [-2, -1, 0, 1, 2].reduce((sum, k) => sum + k * (temperatures[i + k] as number), 0) / 10 / 2;
      expect(rates[i]).toBeCloseTo(plain, 12);
    }
  });

  it("takes a window from the caller, its edges included", () => {
    const start = 46083.3 * 1440;
    const times = every(1, 9).map((t) => start + t);
    const rates = given(rampRate(grid(times), column(0, 0, 0, 0, 1, 0, 0, 0, 9), 4));
    // The scan at index 6 sees those from 4 to 8.
    expect(rates[6]).toBeCloseTo((-2 * 1 + 2 * 9) / 10, 7);
  });

  it("has a window whose edges hold a scan that is off by the rounding of its time, and no more", () => {
    // Half a window is 2 minutes: 0, 1 and 9 °C at 0, 1 and 2 minutes rise by 4.5 °C/min, the first two by 1.
    const atStart = (last: number) => given(rampRate(grid(column(0, 1, last)), column(0, 1, 9), 4))[0];
    expect(atStart(2 + 4e-7)).toBeCloseTo(4.5, 5);
    expect(atStart(2 + 1e-6)).toBeCloseTo(1, 12);
  });

  it("has no value at a missing reading, nor where no second time is near", () => {
    const rates = given(rampRate(grid(column(0, 1, 2, 3, 60, 120)), column(1, undefined, 3, 4, 4, 5)));
    expect(rates[0]).toBeCloseTo(1, 12);
    expect(rates[1]).toBeNaN();
    expect(rates[4]).toBeNaN();
    expect(given(rampRate(grid(column(7, 7)), column(1, 2)))[0]).toBeNaN();
  });

  it("refuses a window that an empty cell would be, and a column of another length", () => {
    expect(refusal(rampRate(grid(every(1, 3)), column(1, 2, 3), 0))).toBe(
      "#VALUE! window: 0 or an empty cell",
    );
    expect(refusal(rampRate(grid(every(1, 3)), column(1, 2, 3), -2))).toBe(
      "#VALUE! window -2 min is not above 0",
    );
    expect(refusal(rampRate(grid(every(1, 3)), column(1, 2)))).toBe(
      "#VALUE! the record has 2 readings for 3 times",
    );
  });
});

describe("taking out the lag", () => {
  it("leaves a steady record bit-identical", () => {
    const steady = new Float64Array(20).fill(451.3);
    expect(given(unlag(grid(every(1, 20)), steady, 90))).toEqual(steady);
  });

  it("puts a lagging ramp where the furnace was: ahead by rate × time constant", () => {
    const times = every(0.5, 50);
    const lagging = times.map((t) => 20 + 5 * (t - 1.5)); // 90 s behind 20 + 5t
    const result = given(unlag(grid(times), lagging, 90));
    times.forEach((t, i) => {
      expect(result[i]).toBeCloseTo(20 + 5 * t, 9);
    });
  });

  it("brings a step response to its end value within the window's own error", () => {
    const times = every(1 / 60, 300); // a scan a second
    const response = times.map((t) => 800 - 780 * Math.exp((-t * 60) / 40));
    const result = given(unlag(grid(times), response, 40));
    // Slope of five points of an exponential: too steep by (h/τ)²·17/30; at the ends of the record off by h/τ.
    for (let i = 2; i < 298; i++)
      expect(Math.abs((result[i] as number) - 800)).toBeLessThan(780 * (1 / 40) ** 2);
  });

  it("takes the window that the rate takes, and refuses what it refuses", () => {
    const record = column(0, 0, 0, 0, 1, 0, 0, 0, 9);
    const result = given(unlag(grid(every(1, 9)), record, 60, 4));
    // The scan at index 6 sees those from 4 to 8.
    expect(result[6]).toBeCloseTo((-2 * 1 + 2 * 9) / 10, 12);
    expect(refusal(unlag(grid(every(1, 3)), column(1, 2), 60))).toBe(
      "#VALUE! the record has 2 readings for 3 times",
    );
  });

  it("refuses a time constant that is none", () => {
    expect(refusal(unlag(grid(every(1, 3)), column(1, 2, 3), 0))).toBe(
      "#VALUE! time constant: 0 or an empty cell",
    );
    expect(refusal(unlag(grid(every(1, 3)), column(1, 2, 3), -3))).toBe(
      "#VALUE! time constant -3 s is not above 0",
    );
  });
});
