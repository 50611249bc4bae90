import { describe, expect, it } from "vitest";
import { normalAbove, normalBelow, normalBetween, normalTwoSided } from "../../../src/core/numeric/normal";
import { normalTails } from "../../published/distributions";

describe("the normal distribution", () => {
  it.each(normalTails)("has below −z what it has above z = %d", (z) => {
    expect(normalBelow(-z)).toBe(normalAbove(z));
  });

  it("keeps its digits between two points of one tail", () => {
    // Φ(9) − Φ(8), by the same tails.
    const between = 6.220960574271784e-16 - 1.1285884059538405e-19;
    expect(normalBetween(8, 9) / between).toBeCloseTo(1, 12);
    expect(normalBetween(-9, -8)).toBe(normalBetween(8, 9));
    expect(normalBetween(-1, 1)).toBeCloseTo(0.6826894921370859, 15);
    for (const [a, b] of [
      [0.3, 1.1],
      [0.7, 2.9],
      [1.3, 0.2],
      [0.1, 3.7],
    ] as const) {
      expect(normalBetween(-a, b)).toBe(normalBetween(-b, a));
    }
  });

  it("finds quantiles however near the probability is to 0 or 1", () => {
    for (const inside of [0.5, 0.5000001, 0.999999, 1 - 2 ** -53]) {
      const outside = 2 * normalAbove(normalTwoSided(inside));
      expect(Math.abs(outside / (1 - inside) - 1)).toBeLessThan(1e-12);
    }
    for (const inside of [0.001, 0.01, 0.1, 0.5]) {
      const z = normalTwoSided(inside);
      expect(Math.abs(normalBetween(-z, z) / inside - 1)).toBeLessThan(1e-12);
    }
    // Near zero the density is 1/√(2π).
    for (const inside of [1e-300, 1e-31, 1e-30, 1e-29, 1e-17, 1e-12]) {
      expect(normalTwoSided(inside) / (inside * Math.sqrt(Math.PI / 2))).toBeCloseTo(1, 12);
    }
    expect(normalTwoSided(Number.MIN_VALUE)).toBe(Number.MIN_VALUE);
  });
});
