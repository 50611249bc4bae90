import { describe, expect, it } from "vitest";
import {
  compensatedPolynomial,
  derivative,
  polynomial,
  roundingBound,
} from "../../../src/core/numeric/polynomial";
import { exact, exactProduct, sizeOf } from "./exact";

/** (x − 1)⁷ written out: near 1 its terms cancel to almost nothing. */
const COEFFICIENTS = [-1, 7, -21, 35, -35, 21, -7, 1];
const NEAR_ONE = [0.97, 0.99, 0.999, 1.002, 1.01, 1.03, -0.7, 3.3];

const exactValue = (x: number): bigint =>
  COEFFICIENTS.reduceRight((sum, c) => exactProduct(sum, exact(x)) + exact(c), 0n);

describe("a polynomial", () => {
  it("is its sum of powers, and its derivative that of the slopes", () => {
    expect(polynomial([5, -3, 2], 4)).toBe(5 - 12 + 32);
    expect(polynomial([], 4)).toBe(0);
    expect(derivative([5, -3, 2, 10])).toEqual([-3, 4, 30]);
    expect(derivative([5])).toEqual([]);
  });

  it.each(NEAR_ONE)(
    "errs at %d by no more than its bound, and the bound is within reach of the error",
    (x) => {
      const error = Number(sizeOf(exact(polynomial(COEFFICIENTS, x)) - exactValue(x))) / 2 ** 1000;
      const bound = roundingBound(COEFFICIENTS, x);
      expect(error).toBeLessThanOrEqual(bound);
      // 2n·u·Σ|cᵢ||x|ⁱ by Higham; here Σ|cᵢ||x|ⁱ = (1 + |x|)⁷.
      expect(bound / (2 * 8 * 2 ** -53 * (1 + Math.abs(x)) ** 7)).toBeCloseTo(1, 12);
    },
  );

  it.each(NEAR_ONE)("compensated is right at %d to the last bit but one, in spite of the cancelling", (x) => {
    const found = exact(compensatedPolynomial(COEFFICIENTS, x));
    const right = exactValue(x);
    // |error| ≤ u|p| + γ²·Σ|cᵢ||x|ⁱ with γ = 2n·u (Graillat, Langlois, Louvet, theorem for CompHorner).
    const allowed = sizeOf(right) / 2n ** 52n + exact((16 * 2 ** -53) ** 2 * (1 + Math.abs(x)) ** 7);
    expect(sizeOf(found - right)).toBeLessThanOrEqual(allowed);
  });

  it("compensated of nothing is 0, and of a constant that constant", () => {
    expect(compensatedPolynomial([], 3)).toBe(0);
    expect(compensatedPolynomial([7], 3)).toBe(7);
  });
});
