import { describe, expect, it } from "vitest";
import { platinumResistance, platinumTemperature } from "../../src/core/junction";
import { platinumTable, supersededPlatinumTable } from "./platinum";

/** Half a unit of the last printed digit, and the rounding of a sum that ends in 5. */
const HALF_OHM_DIGIT = 0.005 + 1e-9;

describe("IEC 60751, R0 = 100 Ω", () => {
  it.each(platinumTable)("%d °C is printed as %d Ω", (t, printed) => {
    expect(Math.abs((platinumResistance(t, 100) as number) - printed)).toBeLessThanOrEqual(HALF_OHM_DIGIT);
  });

  // The two ends may round to outside the range by less than the half digit.
  it.each(platinumTable.slice(1, -1))("%d °C comes back from the printed %d Ω", (t, printed) => {
    const perDegree = (platinumResistance(t + 1, 100) as number) - (platinumResistance(t, 100) as number);
    expect(Math.abs((platinumTemperature(printed, 100) as number) - t)).toBeLessThanOrEqual(
      1.01 * (HALF_OHM_DIGIT / perDegree),
    );
  });

  it.each(platinumTable)("%d °C is ten times %d Ω with R0 = 1000 Ω", (t, printed) => {
    expect(Math.abs((platinumResistance(t, 1000) as number) / 10 - printed)).toBeLessThanOrEqual(
      HALF_OHM_DIGIT,
    );
  });

  it("has R(100 °C) = 138.5055 Ω, α = 3.85055E-3 /°C (IEC 60751, from memory)", () => {
    expect(Math.abs((platinumResistance(100, 100) as number) - 138.5055)).toBeLessThan(5e-5);
  });
});

describe("the superseded table of IPTS-68 (one copy, checked against its coefficients from memory)", () => {
  it.each(supersededPlatinumTable)("%d °C was printed as %d Ω, another value than today's", (t, printed) => {
    const today = platinumResistance(t, 100) as number;
    expect(today.toFixed(2)).not.toBe(printed.toFixed(2));
    expect(Math.abs(today - printed)).toBeLessThanOrEqual(0.06 + 1e-9);
  });
});
