import { describe, expect, it } from "vitest";
import { Refusal, toCelsius } from "../../src/core";
import { furnaceClass, survey, surveySummary } from "../../src/core/survey";
import { eachAgrees } from "./agrees";
import { inUnit, surveySets, uniformityByClass, workedClass } from "./survey";

eachAgrees(surveySets);

const C = inUnit("C");
const F = inUnit("F");
const K = inUnit("K");
const R = inUnit("R");

describe("SAE AMS2750 uniformity by furnace class (in print and from memory)", () => {
  it.each(uniformityByClass)(
    "class %d allows ± %d °F or ± %d °C, and no more",
    (which, fahrenheit, celsius) => {
      for (const [unit, limit] of [
        [C, celsius],
        [K, celsius],
        [F, fahrenheit],
        [R, fahrenheit],
      ] as const) {
        expect(furnaceClass(limit * unit.degree, unit)).toBe(which);
        expect(furnaceClass(-limit * unit.degree, unit)).toBe(which);
        const beyond = furnaceClass((limit + 1e-6) * unit.degree, unit);
        if (which < 6) expect(beyond).toBe(which + 1);
        else expect(beyond).toBeInstanceOf(Refusal);
      }
    },
  );

  it("has two rows of its own: 8.3 °C are beyond class 3 by the °C row (8 °C) and within it by the °F row (15 °F)", () => {
    expect(furnaceClass(8.3, C)).toBe(4);
    expect(furnaceClass(8.3, F)).toBe(3);
  });

  it("refuses a deviation beyond the last class in the unit of the call", () => {
    const beyond = furnaceClass(60 * F.degree, F);
    expect((beyond as Refusal).message(F)).toBe("deviation 60 °F exceeds class 6: ± 50 °F");
    expect((furnaceClass(30) as Refusal).message()).toBe("deviation 30 °C exceeds class 6: ± 28 °C");
  });

  it("gives the worked example its class by a whole survey", () => {
    const { setpoint, lowest, highest } = workedClass;
    const found = survey({
      times: Float64Array.of(0, 15, 30),
      readings: [
        Float64Array.of(1900, lowest, 1895).map((t) => toCelsius(t, F)),
        Float64Array.of(1905, highest, 1910).map((t) => toCelsius(t, F)),
      ],
      setpoint: toCelsius(setpoint, F),
      tolerance: { below: 15 * F.degree, above: 15 * F.degree },
      unit: F,
    });
    if (found instanceof Refusal) throw new Error(found.message());
    expect(surveySummary(found)).toMatchObject({ classMet: workedClass.furnaceClass, verdict: "Pass" });
  });
});
