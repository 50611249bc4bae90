import { describe, expect, it } from "vitest";
import { thermocouple } from "../../src/core";
import { publishedInverses } from "./inverse-approximations";

/** Written here on purpose: the check must not share the evaluation with the code under test. */
const approximation = (coefficients: readonly number[], emf: number): number =>
  coefficients.reduce((sum, coefficient, power) => sum + coefficient * emf ** power, 0);

describe("the published inverse approximations (NIST SRD 60)", () => {
  it.each(publishedInverses)(
    "type $type, $emfRange mV: the exact inverse lies within the printed band $errorBand °C",
    ({ type, emfRange: [from, to], errorBand, rounding, coefficients }) => {
      const couple = thermocouple(type);
      if (couple === undefined) throw new Error(type);
      const steps = 500;
      for (let i = 0; i <= steps; i++) {
        const emf = Math.min(Math.max(from + ((to - from) * i) / steps, couple.emfLow), couple.emfHigh);
        const error = approximation(coefficients, emf) - couple.temperature(emf);
        expect(error).toBeGreaterThanOrEqual(errorBand[0] - rounding);
        expect(error).toBeLessThanOrEqual(errorBand[1] + rounding);
      }
    },
  );
});
