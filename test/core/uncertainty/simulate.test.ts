import { describe, expect, it } from "vitest";
import { Refusal, type Thermocouple, temperatureOf, thermocouple } from "../../../src/core";
import { type Simulation, simulateTemperature, temperatureUncertainty } from "../../../src/core/uncertainty";
import { ranks, shortestInterval, symmetricInterval } from "../../../src/core/uncertainty/coverage-interval";
import { validation } from "../../../src/core/uncertainty/validation";

const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
const message = (found: unknown): string => (found as Refusal).message();
const input = { couple: couple("K"), emf: 20, reference: 25, uEmfUv: 5, uReference: 0.2 };

describe("simulateTemperature", () => {
  it("agrees with the first order where the function is nearly straight", () => {
    const t = temperatureOf(input.couple, input.emf, input.reference) as number;
    const u = temperatureUncertainty(input.couple, t, 5, 0.2, 25) as number;
    const found = simulateTemperature(input) as Simulation;
    const scatter = u / Math.sqrt(1e6);
    expect(Math.abs(found.mean - t)).toBeLessThan(5 * scatter);
    expect(Math.abs(found.standard / u - 1)).toBeLessThan(5 / Math.sqrt(2e6));
    expect(Math.abs(found.low - (t - 1.96 * u))).toBeLessThan(15 * scatter);
    expect(Math.abs(found.high - (t + 1.96 * u))).toBeLessThan(15 * scatter);
    expect(found.shortestHigh - found.shortestLow).toBeLessThanOrEqual(found.high - found.low);
    expect(found.validated).toBe("yes");
  });

  it("does not run again for the next question about the same simulation", () => {
    const found = simulateTemperature({ ...input, seed: 99 });
    expect(simulateTemperature({ ...input, seed: 99 })).toBe(found);
  });

  it("repeats itself for a seed and differs between seeds", () => {
    const first = simulateTemperature({ ...input, trials: 1000, seed: 5 });
    const other = simulateTemperature({ ...input, trials: 1000, seed: 6 });
    expect(other).not.toEqual(first);
    expect(simulateTemperature({ ...input, trials: 1000, seed: 5 })).toEqual(first);
  });

  it("adds other uncertainties in degrees", () => {
    const found = simulateTemperature({ ...input, uEmfUv: 0, uReference: 0, uOther: 0.5, trials: 100_000 });
    expect((found as Simulation).standard / 0.5).toBeCloseTo(1, 2);
  });

  it("sees the bend that the first order misses", () => {
    // Type B just above its minimum: E is nearly quadratic, so the temperatures are skewed.
    const bent = simulateTemperature({
      couple: couple("B"),
      emf: 0.02,
      reference: 0,
      uEmfUv: 4,
      uReference: 0,
    });
    const { mean, low, high, validated } = bent as Simulation;
    expect(mean - low).toBeGreaterThan(high - mean);
    expect(validated).toBe("no");
  });

  it("does not tell where the scatter of the trials could decide", () => {
    const { validated } = simulateTemperature({ ...input, trials: 1000 }) as Simulation;
    expect(message(validated)).toBe("1000 trials are too few to tell whether the first-order result holds");
  });

  it("counts the trials outside the range", () => {
    const refused = simulateTemperature({ ...input, emf: input.couple.emfHigh - 1.001, trials: 10_000 });
    expect(message(refused)).toMatch(/^\d+ of 10000 trials are outside the range of type K$/);
  });

  it("refuses what it cannot simulate", () => {
    expect(message(simulateTemperature({ ...input, emf: 60 }))).toContain("above the limit of type K");
    expect(message(simulateTemperature({ ...input, uEmfUv: -1 }))).toContain("below 0");
    expect(message(simulateTemperature({ ...input, uEmfUv: 0, uReference: 0 }))).toBe(
      "every uncertainty is 0",
    );
    for (const trials of [0, 999, 1000.5, 1e9]) {
      expect(message(simulateTemperature({ ...input, trials }))).toContain(
        "a whole number from 1000 to 10000000",
      );
    }
    for (const seed of [-1, 0.5, 1e20])
      expect(simulateTemperature({ ...input, seed })).toBeInstanceOf(Refusal);
  });
});

describe("coverage intervals (JCGM 101:2008, 7.7)", () => {
  it("count ranks as the supplement does", () => {
    // q = pM where whole, r = (M − q)/2: from the 25 001st to the 975 001st … of a million.
    expect(ranks(1_000_000)).toEqual({ span: 950_000, first: 24_999 });
    // M = 1001: q = ⌊950.95 + ½⌋ = 951, r = 25.
    expect(ranks(1001)).toEqual({ span: 951, first: 24 });
  });

  it("take the narrowest end of a skewed sample", () => {
    const sorted = Float64Array.from({ length: 1000 }, (_, i) => (i / 1000) ** 2);
    expect(shortestInterval(sorted).low).toBe(0);
    expect(symmetricInterval(sorted).low).toBe(sorted[24]);
    expect(symmetricInterval(sorted).high).toBe(sorted[974]);
  });
});

describe("validation (JCGM 101:2008, 8)", () => {
  /** Ends of a uniform sample are known: 95 % of it from 0.025 to 0.975. */
  const uniform = Float64Array.from({ length: 1_000_000 }, (_, i) => i / 1e6);

  it("accepts ends within half a unit of the first digit of u", () => {
    // u = 0.24 rounds to 0.2: δ = 0.05.
    expect(validation(uniform, 0.5, 0.24)).toBe("yes");
    // u = 0.3: 1.96 u = 0.588, 0.113 past either end.
    expect(validation(uniform, 0.5, 0.3)).toBe("no");
  });

  it("refuses at δ itself", () => {
    // 1.96 u = 0.525, 0.05 past either end.
    expect(validation(uniform, 0.5, 0.525 / 1.96)).toBeInstanceOf(Refusal);
  });
});
