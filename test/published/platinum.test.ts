import { describe, expect, it } from "vitest";
import { platinumResistance, platinumTemperature } from "../../src/core/junction";
import { eachAgrees } from "./agrees";
import { platinumSets, platinumTable } from "./platinum";

/** Half a unit of the last printed digit, and the rounding of a sum that ends in 5. */
const HALF_OHM_DIGIT = 0.005 + 1e-9;

eachAgrees(platinumSets);

describe("the printed resistances of IEC 60751", () => {
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
});
