import { describe, expect, it } from "vitest";
import { Refusal, type Thermocouple, thermocouple } from "../../../src/core";
import {
  type DeviationFunction,
  deviationDegrees,
  deviationUv,
  emfAtNominal,
  fitDeviation,
} from "../../../src/core/calibration";

const s = thermocouple("S") as Thermocouple;
const message = (value: unknown): string => (value instanceof Refusal ? value.message() : "no refusal");
const fitted = (...given: Parameters<typeof fitDeviation>): DeviationFunction => {
  const fit = fitDeviation(...given);
  if (fit instanceof Refusal) throw new Error(fit.message());
  return fit;
};

describe("the deviation of a measured EMF", () => {
  const emf = s.emf(1000) - s.emf(20) + 0.005;

  it("is 5 µV where 5 µV were added", () => {
    expect(deviationUv(s, emf, 1000, 20)).toBeCloseTo(5, 9);
  });

  it("in degrees is found by inversion, not by the slope", () => {
    expect(deviationDegrees(s, emf, 1000, 20)).toBeCloseTo(s.temperature(s.emf(1000) + 0.005) - 1000, 9);
    expect(deviationDegrees(s, s.emf(700), 1000, 0)).toBeCloseTo(-300, 9);
  });

  it("is moved to the nominal temperature by the reference function", () => {
    expect(emfAtNominal(s, s.emf(1000.7) + 0.004, 1000.7, 1000)).toBeCloseTo(s.emf(1000) + 0.004, 12);
  });

  it("is refused outside the reference function, by name", () => {
    expect(message(deviationUv(s, 1, 1800, 0))).toContain("temperature 1800 °C");
    expect(message(deviationUv(s, 1e306, 100, 0))).toBe("EMF 1e+306 mV is beyond any couple");
    expect(message(emfAtNominal(s, 1, 1800, 1000))).toBe(
      "true temperature 1800 °C is outside the range of type S, -50 °C to 1768.1 °C",
    );
    expect(message(deviationDegrees(s, 1, 1800, 0))).toContain("true temperature 1800 °C");
    expect(message(deviationDegrees(s, 100, 1000, 0))).toContain("above the limit of type S");
    expect(message(emfAtNominal(s, 1, 1000, 1800))).toContain("nominal temperature 1800 °C");
  });
});

describe("a deviation function", () => {
  const t = [0, 200, 400, 600, 800, 1000];
  const line = t.map((at, i) => 1 + 0.01 * at + (i % 2 === 0 ? 0.3 : -0.3));

  it("has uncertainties set by those of the points where they are given", () => {
    const unit = fitted(t, line, 1, { uncertainties: t.map(() => 1) });
    const double = fitted(t, line, 1, { uncertainties: t.map(() => 2) });
    expect(double.coefficients).toEqual(unit.coefficients);
    (double.uncertainties as number[]).forEach((u, i) => {
      expect(u).toBeCloseTo(2 * ((unit.uncertainties as number[])[i] as number), 14);
    });
    expect(double.reducedChi2).toBeCloseTo((unit.reducedChi2 as number) / 4, 14);
    expect(unit.residualSd as number).toBeCloseTo(Math.sqrt(unit.reducedChi2 as number), 14);
  });

  it("has uncertainties set by the scatter otherwise", () => {
    const free = fitted(t, line, 1);
    const unit = fitted(t, line, 1, { uncertainties: t.map(() => 1) });
    expect((free.uncertainties as number[])[1]).toBeCloseTo(
      ((unit.uncertainties as number[])[1] as number) * (free.residualSd as number),
      14,
    );
    expect(message(free.reducedChi2)).toBe("reduced chi-squared needs the uncertainties of the points");
  });

  it("names the residual that is greatest in size, with its sign", () => {
    const fit = fitted([0, 1, 2, 3, 4], [0, 0, -5, 0, 0], 0);
    expect(fit.largestResidual).toBeCloseTo(-4, 14);
    expect(fit.dof).toBe(4);
    // Residuals 1, 1, −4, 1, 1: √(20/4).
    expect(fit.residualSd).toBeCloseTo(Math.sqrt(5), 14);
    const weighted = fitted([0, 1, 2, 3, 4], [0, 0, -5, 0, 0], 0, { uncertainties: [2, 2, 2, 2, 2] });
    expect(weighted.reducedChi2).toBeCloseTo(5 / 4, 14);
  });

  it("names the first of two residuals of one size", () => {
    expect(fitted([0, 100], [3, 1], 0).largestResidual).toBe(1);
    expect(fitted([0, 100], [1, 3], 0).largestResidual).toBe(-1);
  });

  it("of order 10 finds ten zeros and their sign again", () => {
    const at = Array.from({ length: 12 }, (_, i) => i / 2 - 2.75);
    // Chebyshev's T10(t/3) = cos(10 arccos(t/3)), of leading coefficient 2⁹/3¹⁰.
    const fit = fitted(
      at,
      at.map((x) => Math.cos(10 * Math.acos(x / 3))),
      10,
    );
    expect((fit.coefficients[10] as number) / (2 ** 9 / 3 ** 10)).toBeCloseTo(1, 9);
  });

  it("keeps to its digits in proportion to the deviations: a million times larger ones are fitted as well", () => {
    const at = Array.from({ length: 12 }, (_, i) => 900 + 20 * i);
    const jagged = at.map((_, i) => (i % 3) - 1);
    const small = fitted(at, jagged, 6);
    const large = fitted(
      at,
      jagged.map((y) => y * 2 ** 20),
      6,
    );
    expect(large.coefficients).toEqual(small.coefficients.map((c) => c * 2 ** 20));
  });

  it("through as many points as coefficients has no scatter to judge by", () => {
    const fit = fitted([0, 100], [1, 2], 1);
    expect(fit.coefficients).toEqual([1, 0.01]);
    expect(fit.dof).toBe(0);
    for (const none of [fit.uncertainties, fit.covariance, fit.residualSd])
      expect(message(none)).toBe("as many coefficients as points: no degrees of freedom are left");
    const known = fitted([0, 100], [1, 2], 1, { uncertainties: [0.5, 0.5] });
    expect((known.uncertainties as number[])[0]).toBeCloseTo(0.5, 14);
    expect(known.reducedChi2).toBeInstanceOf(Refusal);
  });

  it("through zero starts with a c0 of exactly 0", () => {
    const fit = fitted(t, line, 2, { throughZero: true });
    expect(fit.coefficients).toHaveLength(3);
    expect(fit.coefficients[0]).toBe(0);
    expect((fit.uncertainties as number[])[0]).toBe(0);
    expect(fit.dof).toBe(4);
  });

  it.each([
    [1.5, "order 1.5 is not a whole number from 0 to 10"],
    [-1, "order -1 is not a whole number from 0 to 10"],
    [11, "order 11 is not a whole number from 0 to 10"],
    [6, "order 6 needs at least 7 different temperatures; there are 6"],
  ])("of order %d through six points is refused", (order, words) => {
    expect(message(fitDeviation(t, line, order))).toBe(words);
  });

  it("refuses order 0 through zero, and a point at 0 °C that determines nothing", () => {
    expect(message(fitDeviation(t, line, 0, { throughZero: true }))).toBe(
      "order 0 through zero leaves nothing to fit",
    );
    expect(message(fitDeviation([0, 100], [0, 1], 2, { throughZero: true }))).toBe(
      "order 2 through zero needs at least 2 different temperatures other than 0 °C; there are 1",
    );
  });

  it("refuses uncertainties that are not above 0 or not as many", () => {
    expect(message(fitDeviation([1, 2], [1, 2], 0, { uncertainties: [1, 0] }))).toBe(
      "uncertainty of point 2 is 0 or an empty cell",
    );
    expect(message(fitDeviation([1, 2], [1, 2], 0, { uncertainties: [-1, 1] }))).toBe(
      "uncertainty of point 1 is -1 µV, not above 0",
    );
    expect(message(fitDeviation([1, 2], [1, 2], 0, { uncertainties: [1] }))).toBe(
      "points and uncertainties differ in number, 2 and 1",
    );
    expect(message(fitDeviation([1, 2], [1], 0))).toContain("points and deviations differ in number");
    expect(fitDeviation([], [], 0)).toBeInstanceOf(Refusal);
  });

  it("refuses a high order over a range so narrow that powers of °C lose its digits", () => {
    const narrow = Array.from({ length: 15 }, (_, i) => 1000 + i / 100);
    const jagged = narrow.map((_, i) => (i % 2 === 0 ? 1 : -1));
    expect(message(fitDeviation(narrow, jagged, 9))).toBe(
      "order 9 from 1000 °C to 1000.14 °C cannot be written in powers of °C: take a lower order",
    );
    // Where 0 °C is among the points, that one keeps its digits, but it is not enough.
    expect(message(fitDeviation([0, ...narrow], [0, ...jagged], 9))).toContain("cannot be written");
  });

  it("refuses numbers that are too large instead of giving infinities", () => {
    expect(message(fitDeviation([1, 2, 3], [1e308, -1e308, 1e308], 1))).toBe(
      "the deviations do not determine a function of order 1",
    );
    expect(message(fitDeviation([1, 2, 3], [1e200, -1e200, 1e200], 1))).toBe("the deviations are too large");
  });
});
