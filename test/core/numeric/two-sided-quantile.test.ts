/** Quantiles of distributions whose own formulas are known. */
import { describe, expect, it } from "vitest";
import { type SymmetricDistribution, twoSidedQuantile } from "../../../src/core/numeric/two-sided-quantile";

/** Laplace's: P(|X| ≤ x) = 1 − e⁻ˣ, density e⁻ˣ/2. Counts how often a probability is asked for. */
function laplace(): SymmetricDistribution & { asked: number } {
  const distribution = {
    asked: 0,
    central: (x: number): number => {
      distribution.asked++;
      return -Math.expm1(-x);
    },
    outside: (x: number): number => {
      distribution.asked++;
      return Math.exp(-x);
    },
    density: (x: number): number => Math.exp(-x) / 2,
  };
  return distribution;
}

describe("the two-sided quantile", () => {
  it.each([1e-20, 0.01, 0.3, 0.5, 0.6, 0.99, 1 - 2 ** -40])(
    "of Laplace's distribution that holds %d is −ln(1 − p), in a handful of steps from near and far",
    (inside) => {
      const quantile = -Math.log1p(-inside);
      for (const share of [0.5, 1, 1.5, 3]) {
        const distribution = laplace();
        const found = twoSidedQuantile(distribution, inside, share * quantile);
        expect(found / quantile).toBeCloseTo(1, 12);
        expect(distribution.asked).toBeLessThan(15);
      }
    },
  );

  it("so near to zero that the density is that at zero needs no step", () => {
    const distribution = laplace();
    expect(twoSidedQuantile(distribution, 3e-31, 1)).toBe(3e-31);
    expect(distribution.asked).toBe(0);
  });

  it("of what is no distribution is given up after 100 steps", () => {
    let asked = 0;
    const jumping: SymmetricDistribution = {
      central: (x) => {
        asked++;
        return x < 1 ? 0.1 : 0.4;
      },
      outside: () => Number.NaN,
      density: (x) => (x < 1 ? 0.1 : 0.4) / (2 * x),
    };
    twoSidedQuantile(jumping, 0.2, 1);
    expect(asked).toBe(100);
  });
});
