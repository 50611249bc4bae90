import { describe, expect, it } from "vitest";
import { fitPolynomial, type PolynomialFit } from "../../../src/core/numeric/least-squares";

const fitted = (...given: Parameters<typeof fitPolynomial>): PolynomialFit => {
  const fit = fitPolynomial(...given);
  if (fit === undefined) throw new Error("not determined");
  return fit;
};

describe("fitPolynomial", () => {
  it("finds an exact polynomial again, far from the origin", () => {
    const xs = [900, 950, 1000, 1050, 1100, 1150];
    const ys = xs.map((x) => 3 - 2 * x + 0.5 * x * x);
    expect(fitted(xs, ys, 2).coefficients).toEqual([3, -2, 0.5]);
  });

  it("weights points by the reciprocal of their squared uncertainty", () => {
    // Order 0 is the weighted mean: (1/1 · 10 + 1/4 · 20)/(1 + 1/4) = 12, of variance 1/(1 + 1/4).
    const fit = fitted([0, 1], [10, 20], 0, { uncertainties: [1, 2] });
    expect(fit.coefficients[0]).toBeCloseTo(12, 14);
    expect(fit.unitCovariance[0]?.[0]).toBeCloseTo(0.8, 14);
  });

  it("has the textbook covariance of a straight line", () => {
    // s²/Sxx for the slope, s² (1/n + x̄²/Sxx) for the intercept, −s² x̄/Sxx between them; here s = 1.
    const xs = [1, 2, 3, 4, 10];
    const [n, mean, sxx] = [5, 4, 50];
    const [first, second] = fitted(xs, [1, 5, 2, 8, 3], 1).unitCovariance as [number[], number[]];
    expect(second[1]).toBeCloseTo(1 / sxx, 15);
    expect(first[0]).toBeCloseTo(1 / n + mean ** 2 / sxx, 15);
    expect(first[1]).toBeCloseTo(-mean / sxx, 15);
    expect(second[0]).toBe(first[1]);
  });

  it("leaves out c0 through zero, and counts one coefficient less", () => {
    const fit = fitted([1, 2, 4], [2, 5, 7], 1, { throughZero: true });
    // Σxy/Σx² = (2 + 10 + 28)/21
    expect(fit.coefficients[0]).toBe(0);
    expect(fit.coefficients[1]).toBeCloseTo(40 / 21, 14);
    expect(fit.dof).toBe(2);
    expect(fit.unitCovariance[0]).toEqual([0, 0]);
  });

  it("has residuals that are orthogonal to every power", () => {
    const xs = Array.from({ length: 15 }, (_, i) => 100 + 60 * i);
    const ys = xs.map((x) => 30 * Math.sin(x / 150));
    const { residuals } = fitted(xs, ys, 5);
    for (let power = 0; power <= 5; power++) {
      const along = residuals.reduce((sum, r, i) => sum + r * ((xs[i] as number) / 1000) ** power, 0);
      expect(Math.abs(along)).toBeLessThan(1e-11);
    }
  });

  it("is undetermined by fewer different places than coefficients", () => {
    expect(fitPolynomial([1, 1, 2], [1, 2, 3], 2)).toBeUndefined();
    expect(fitPolynomial([0, 0, 5], [1, 2, 3], 2, { throughZero: true })).toBeUndefined();
    expect(fitPolynomial([1], [1], 0, { throughZero: true })).toBeUndefined();
    // Thirds and sevenths, so that rounding leaves something where exact numbers leave zero.
    const two = [1 / 3, 1 / 3, 5 / 7, 5 / 7, 1 / 3];
    expect(fitPolynomial(two, [1, 2, 4, 5, 3], 1)).toBeDefined();
    for (const order of [2, 3, 4]) expect(fitPolynomial(two, [1, 2, 4, 5, 3], order)).toBeUndefined();
  });

  it("at a single place is the mean", () => {
    const fit = fitted([5, 5], [2, 4], 0);
    expect(fit.coefficients).toEqual([3]);
    expect(fit.residuals).toEqual([-1, 1]);
    expect(fit.value(5)).toBe(3);
  });

  it("has coefficients in proportion to the unit of x, however large or small that makes it", () => {
    const xs = [1, 2, 3, 5, 7, 8, 9, 12];
    const ys = [3, -1, 4, 1, -5, 9, 2, -6];
    const { coefficients } = fitted(xs, ys, 6);
    for (const power of [-60, 60, 100]) {
      const unit = 2 ** power;
      const scaled = fitted(
        xs.map((x) => x * unit),
        ys,
        6,
      );
      scaled.coefficients.forEach((c, j) => {
        expect((c * unit ** j) / (coefficients[j] as number)).toBeCloseTo(1, 12);
      });
    }
  });

  it("gives nothing rather than infinities", () => {
    expect(fitPolynomial([-1.7e308, 0, 1.7e308], [1, 2, 3], 1)).toBeUndefined();
    expect(fitPolynomial([1, 2, 3], [1e308, -1e308, 1e308], 1)).toBeUndefined();
  });
});
