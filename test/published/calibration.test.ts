/** Calibrations from print. */
import { describe, expect, it } from "vitest";
import { type Thermocouple, thermocouple } from "../../src/core";
import { type DeviationFunction, emfAtNominal, fitDeviation } from "../../src/core/calibration";

describe("EA-4/02 M:2013, supplement 1, example S5: type N at 1000 °C", () => {
  it("moves 36 248 µV, measured at 1000.5 °C, to 36 229 µV at the nominal 1000 °C", () => {
    // Printed with 0.026 °C/µV, rounded: 19.2 µV of which the reference function makes 19.4.
    const moved = emfAtNominal(thermocouple("N") as Thermocouple, 36.248, 1000.5, 1000) as number;
    expect(Math.abs(moved * 1000 - 36_229)).toBeLessThan(1);
  });
});

describe("JCGM 100:2008 (GUM) H.3: a thermometer's correction as a straight line in t − 20 °C", () => {
  const t = [21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.01, 26.511];
  const b = [-0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.16];
  const fit = fitDeviation(
    t.map((reading) => reading - 20),
    b,
    1,
  ) as DeviationFunction;
  const covariance = fit.covariance as readonly (readonly [number, number])[];
  const [u1, u2] = fit.uncertainties as [number, number];

  it("has the printed intercept, slope and standard uncertainties", () => {
    expect(fit.coefficients[0]).toBeCloseTo(-0.1712, 4);
    expect(fit.coefficients[1]).toBeCloseTo(0.00218, 5);
    expect(u1).toBeCloseTo(0.0029, 4);
    expect(u2).toBeCloseTo(0.00067, 5);
  });

  it("has the printed correlation −0.930 and scatter 0.0035 °C with 9 degrees of freedom", () => {
    expect((covariance[0]?.[1] ?? 0) / (u1 * u2)).toBeCloseTo(-0.93, 3);
    expect(fit.residualSd as number).toBeCloseTo(0.0035, 4);
    expect(fit.dof).toBe(9);
  });

  it("predicts −0.1494 °C at 30 °C with a standard uncertainty of 0.0041 °C, by its covariance", () => {
    const [c1, c2] = fit.coefficients as [number, number];
    expect(c1 + 10 * c2).toBeCloseTo(-0.1494, 4);
    const variance = u1 ** 2 + 2 * 10 * (covariance[0]?.[1] ?? 0) + 100 * u2 ** 2;
    expect(Math.sqrt(variance)).toBeCloseTo(0.0041, 4);
  });
});
