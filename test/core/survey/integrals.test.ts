import { describe, expect, it } from "vitest";
import { temperatureUnits } from "../../../src/core";
import { lethality, meanKinetic, timeAbove } from "../../../src/core/survey";
import { column, every, given, grid, jitter, refusal } from "../log/record";

describe("time above a temperature", () => {
  const minutes = (times: Float64Array, temperatures: Float64Array, threshold: number, maxGap?: number) =>
    given(timeAbove(grid(times, maxGap), temperatures, threshold));

  it("interpolates the crossings", () => {
    expect(minutes(column(0, 10, 20), column(100, 140, 120), 130)).toBe(2.5 + 5);
  });

  it("counts a record at the threshold, and a touch of it as no time", () => {
    expect(minutes(column(0, 10, 20), column(121, 121, 121), 121)).toBe(20);
    expect(minutes(column(0, 10, 20), column(100, 121, 100), 121)).toBe(0);
    expect(minutes(column(0, 10), column(0.1 + 0.2, 0.3), 0.3)).toBe(10);
  });

  it("adds nothing for a gap or beside a missing reading", () => {
    expect(
      minutes(column(0, 1, 2, 3, 10, 11, 12), column(130, 130, 130, 130, 130, undefined, 130), 121),
    ).toBe(3);
    expect(minutes(column(0, 1, 2, 3, 10), column(130, 130, 130, 130, 130), 121, 7)).toBe(10);
  });

  it("agrees with a fine plain sum", () => {
    const times = Float64Array.from({ length: 50 }, (_, i) => i + 0.4 * jitter(i));
    const temperatures = times.map((_, i) => 121 + 5 * jitter(3 * i));
    let sum = 0;
    const fine = 2000;
    for (let i = 1; i < 50; i++) {
      const [a, b] = [temperatures[i - 1]!, temperatures[i]!];
      for (let k = 0; k < fine; k++) {
        if (a + ((b - a) * (k + 0.5)) / fine > 121.3) sum += (times[i]! - times[i - 1]!) / fine;
      }
    }
    expect(Math.abs(minutes(times, temperatures, 121.3) - sum)).toBeLessThan(0.02);
  });

  it("takes a reading within 1E-9 of the unit's degree of the threshold as at it", () => {
    const fahrenheit = temperatureUnits.find(({ symbol }) => symbol === "F")!;
    // Half a step of the ninth decimal is 5E-10 °C, and 2.8E-10 °C in a sheet in °F.
    const below = column(121 - 4e-10, 121 - 4e-10);
    expect(timeAbove(grid(column(0, 10)), below, 121)).toBe(10);
    expect(timeAbove(grid(column(0, 10)), below, 121, fahrenheit)).toBe(0);
  });

  it("refuses a column of another length", () => {
    expect(refusal(timeAbove(grid(column(0, 10)), column(1, 2, 3), 0))).toBe(
      "#VALUE! the record has 3 readings for 2 times",
    );
  });

  it("is refused without two successive readings", () => {
    expect(refusal(timeAbove(grid(every(1, 3)), column(1, undefined, 1), 0))).toBe(
      "#N/A no two successive readings",
    );
  });
});

describe("lethality", () => {
  const F = (times: Float64Array, temperatures: Float64Array, more = {}, maxGap?: number) =>
    given(given(lethality({ reference: 121.1, z: 10, ...more }))(grid(times, maxGap), temperatures));

  const process = {
    times: Float64Array.from({ length: 40 }, (_, i) => i + 0.3 * jitter(i)),
    temperatures: Float64Array.from(
      { length: 40 },
      (_, i) => 100 + 24 * Math.sin((Math.PI * i) / 39) + jitter(i),
    ),
  };

  /** Midpoint sum of the rate along the straight lines between scans. */
  function plainStraight(threshold = Number.NEGATIVE_INFINITY, fine = 4000): number {
    const { times, temperatures } = process;
    let sum = 0;
    for (let i = 1; i < times.length; i++) {
      const [a, b] = [temperatures[i - 1]!, temperatures[i]!];
      for (let k = 0; k < fine; k++) {
        const t = a + ((b - a) * (k + 0.5)) / fine;
        if (t >= threshold) sum += ((times[i]! - times[i - 1]!) / fine) * 10 ** ((t - 121.1) / 10);
      }
    }
    return sum;
  }

  it("by straight temperature is the exact integral", () => {
    expect(F(process.times, process.temperatures).f).toBeCloseTo(plainStraight(), 7);
  });

  it("counts from the crossing of the threshold", () => {
    expect(
      Math.abs(F(process.times, process.temperatures, { threshold: 110 }).f - plainStraight(110)),
    ).toBeLessThan(1e-4);
  });

  it("by trapezoid is the plain sum of rates, those below the threshold 0", () => {
    const { times, temperatures } = process;
    const rate = (t: number, threshold: number) => (t >= threshold ? 10 ** ((t - 121.1) / 10) : 0);
    for (const threshold of [Number.NEGATIVE_INFINITY, 110]) {
      let sum = 0;
      for (let i = 1; i < times.length; i++) {
        sum +=
          ((times[i]! - times[i - 1]!) *
            (rate(temperatures[i - 1]!, threshold) + rate(temperatures[i]!, threshold))) /
          2;
      }
      const method = "trapezoid";
      expect(F(times, temperatures, threshold > 0 ? { method, threshold } : { method }).f).toBeCloseTo(
        sum,
        12,
      );
    }
  });

  it("by trapezoid is never less than by straight temperature: the rate is convex", () => {
    const straight = F(process.times, process.temperatures).f;
    expect(F(process.times, process.temperatures, { method: "trapezoid" }).f).toBeGreaterThan(straight);
  });

  it("runs up to its last value", () => {
    const { f, running } = F(process.times, process.temperatures);
    expect(running[0]).toBe(0);
    expect(running[39]).toBe(f);
    for (let i = 1; i < 40; i++) expect(running[i]!).toBeGreaterThanOrEqual(running[i - 1]!);
  });

  it("counts a reading at the threshold", () => {
    expect(F(column(0, 10), column(121.1, 121.1), { threshold: 121.1 }).f).toBe(10);
    expect(F(column(0, 10), column(121.0, 121.0), { threshold: 121.1 }).f).toBe(0);
    const method = "trapezoid";
    expect(F(column(0, 10), column(121.1, 121.1), { threshold: 121.1, method }).f).toBe(10);
    // Half a step of the ninth decimal is 5E-10 °C, and 2.8E-10 °C in a sheet in °F.
    const unit = temperatureUnits.find(({ symbol }) => symbol === "F")!;
    const below = column(121.1 - 4e-10, 121.1 - 4e-10);
    expect(F(column(0, 10), below, { threshold: 121.1 }).f).toBeCloseTo(10, 6);
    expect(F(column(0, 10), below, { threshold: 121.1, unit }).f).toBe(0);
  });

  it("counts the minutes of gaps and of missing readings instead of filling them", () => {
    const found = F(
      column(0, 1, 2, 3, 4, 14, 15),
      column(121.1, 121.1, undefined, 121.1, 121.1, 121.1, 121.1),
    );
    expect(found.f).toBeCloseTo(3, 12);
    expect(found.missingMinutes).toBe(12);
    expect([...found.running]).toEqual([0, 1, 1, 1, 2, 2, 3]);
  });

  it("keeps its digits when a reading hardly changes", () => {
    const found = F(column(0, 10), column(121.1, 121.1 + 1e-9));
    expect(found.f).toBeCloseTo(10 * (1 + (Math.LN10 * 1e-10) / 2), 12);
  });

  it("takes falls and rises of hundreds of degrees", () => {
    const up = F(column(0, 1), column(-200, 250), { z: 0.5 });
    const down = F(column(0, 1), column(250, -200), { z: 0.5 });
    expect(up.f).toBe(down.f);
    expect(Number.isFinite(up.f)).toBe(true);
  });

  it("refuses a reading whose rate is beyond all numbers, and names it", () => {
    const settings = given(lethality({ reference: 121.1, z: 10 }));
    expect(refusal(settings(grid(every(1, 3)), column(20, 99999, 20)))).toBe(
      "#N/A reading 99999 °C in row 2 is too far above the reference temperature",
    );
  });

  it("names the earlier of two equal readings whose rate is beyond all numbers", () => {
    const settings = given(lethality({ reference: 121.1, z: 10 }));
    expect(refusal(settings(grid(every(1, 3)), column(20, 20, 99999)))).toMatch(/row 3/);
    expect(refusal(settings(grid(every(1, 3)), column(99999, 20, 20)))).toMatch(/row 1/);
    expect(refusal(settings(grid(every(1, 2)), column(99999, 99999)))).toMatch(/row 1/);
  });

  it("adds nothing for readings below the threshold, however hot, and none for a rate of 0", () => {
    expect(F(column(0, 10), column(99999, 99999), { threshold: 1e6 }).f).toBe(0);
    expect(F(column(0, 10), column(100, 100), { z: 1e-307 }).f).toBe(0);
  });

  it("counts a record that falls to the threshold and stays there", () => {
    // Down from 131.1 to 121.1 in 10 minutes: 10 · (10 − 1)/ln 10; below, nothing.
    const found = F(column(0, 10, 20), column(131.1, 121.1, 111.1), { threshold: 121.1 });
    expect(found.f).toBeCloseTo((10 * 9) / Math.LN10, 9);
  });

  it("refuses a column of another length", () => {
    const settings = given(lethality({ reference: 121.1, z: 10 }));
    expect(refusal(settings(grid(every(1, 3)), column(121)))).toBe(
      "#VALUE! the record has 1 readings for 3 times",
    );
  });

  it("refuses a z that is none, and a record without two successive readings", () => {
    expect(refusal(lethality({ reference: 121.1, z: 0 }))).toBe("#VALUE! z: 0 or an empty cell");
    expect(refusal(lethality({ reference: 121.1, z: -10 }))).toBe("#VALUE! z -10 °C is not above 0");
    expect(refusal(given(lethality({ reference: 121.1, z: 10 }))(grid(every(1, 1)), column(1)))).toBe(
      "#N/A no two successive readings",
    );
  });

  it("rounds a threshold in the unit of the call", () => {
    const fahrenheit = temperatureUnits.find(({ symbol }) => symbol === "F")!;
    const celsius = (f: number) => (f - 32) * (5 / 9);
    for (let f = 230; f < 270; f += 0.1) {
      const at = celsius(Math.round(f * 10) / 10);
      const again = (Math.round(f * 10) / 10 - 32) / 1.8; // another way to the same temperature, other bits
      const found = F(column(0, 1), column(again, again), { threshold: at, unit: fahrenheit });
      expect(found.f).toBeGreaterThan(0);
    }
  });
});

describe("mean kinetic temperature", () => {
  const mkt = (temperatures: Float64Array, energy?: number, times?: Float64Array) =>
    given(given(meanKinetic(energy))(temperatures, times && grid(times)));

  /** The formula as printed, in kelvin, without any care for size. */
  const plain = (temperatures: number[], weights: number[], energy = 83.144) => {
    const ratio = energy / 0.0083144;
    const sum = temperatures.reduce((s, t, i) => s + weights[i]! * Math.exp(-ratio / (t + 273.15)), 0);
    const total = weights.reduce((s, w) => s + w, 0);
    return ratio / -Math.log(sum / total) - 273.15;
  };

  it.each([10, 83.144, 240])("agrees with the printed formula, %d kJ/mol", (energy) => {
    const temperatures = Array.from({ length: 30 }, (_, i) => 22 + 8 * jitter(i));
    const ones = temperatures.map(() => 1);
    expect(mkt(Float64Array.from(temperatures), energy)).toBeCloseTo(plain(temperatures, ones, energy), 9);
  });

  it("weighs by time where times are given: half of each interval to either end", () => {
    const found = mkt(column(20, 30, 25), undefined, column(0, 60, 180));
    expect(found).toBeCloseTo(plain([20, 30, 25], [30, 90, 60]), 10);
  });

  it("is the temperature itself in a steady store, and between mean and maximum otherwise", () => {
    expect(mkt(column(21.5, 21.5, 21.5))).toBeCloseTo(21.5, 12);
    const found = mkt(column(20, 30));
    expect(found).toBeGreaterThan(25);
    expect(found).toBeLessThan(30);
  });

  it("weighs nothing across a gap", () => {
    const found = mkt(column(20, 20, 20, 30, 30), undefined, column(0, 1, 2, 10, 11));
    expect(found).toBeCloseTo(plain([20, 20, 20, 30, 30], [0.5, 1, 0.5, 0.5, 0.5]), 10);
  });

  it("is not led astray by a reading without weight, whatever it is", () => {
    expect(mkt(column(-196, -196, undefined, 5000), 500, every(1, 4))).toBeCloseTo(-196, 9);
  });

  it("leaves out missing readings, gaps, and a hot reading between two missing ones", () => {
    expect(mkt(column(20, undefined, 30))).toBe(mkt(column(20, 30)));
    expect(mkt(column(20, 20, undefined, 5000, undefined, 20, 20), 500, every(1, 7))).toBeCloseTo(20, 10);
  });

  it("takes cold stores and high energies without running out of numbers", () => {
    expect(mkt(column(-196, -190), 500)).toBeGreaterThan(-196);
    expect(mkt(column(-196, -190), 500)).toBeLessThan(-190);
  });

  it("refuses energies outside 10 to 500 kJ/mol, absolute zero, and nothing to go by", () => {
    expect(refusal(meanKinetic(9.9))).toBe(
      "#VALUE! activation energy 9.9 kJ/mol is outside 10 to 500 kJ/mol",
    );
    expect(refusal(meanKinetic(501))).toMatch(/outside 10 to 500/);
    expect(mkt(column(20), 10)).toBeCloseTo(20, 9);
    expect(mkt(column(20), 500)).toBeCloseTo(20, 9);
    expect(refusal(given(meanKinetic())(column(1, 2), grid(every(1, 3))))).toBe(
      "#VALUE! the record has 2 readings for 3 times",
    );
    expect(refusal(given(meanKinetic())(column(20, -273.15)))).toBe(
      "#N/A reading -273.15 °C in row 2 is not above absolute zero",
    );
    expect(refusal(given(meanKinetic())(column(undefined)))).toBe("#N/A no reading");
    expect(refusal(given(meanKinetic())(column(20, undefined, 20), grid(every(1, 3))))).toBe(
      "#N/A no two successive readings",
    );
  });
});
