import { describe, expect, it } from "vitest";
import { normalAbove, normalBelow, normalBetween, normalTwoSided } from "../../../src/core/numeric/normal";

/** 1 − Φ(z), computed with 40 digits of working precision by an independent library (mpmath). */
// biome-ignore format: one row a line
const TAILS: readonly (readonly [z: number, above: number])[] = [
  [-8, 0.9999999999999993],
  [-1, 0.8413447460685429],
  [0, 0.5],
  [0.5, 0.3085375387259869],
  [1, 0.15865525393145705],
  [1.96, 0.024997895148220435],
  [2, 0.02275013194817921],
  [2.5, 0.006209665325776135],
  [2.6, 0.00466118802371875],
  [3, 0.0013498980316300946],
  [5, 2.866515718791939e-7],
  [8, 6.220960574271784e-16],
  [12, 1.776482112077679e-33],
  [20, 2.7536241186062337e-89],
  [37, 5.725571222524577e-300],
];

describe("the normal distribution", () => {
  it.each(TAILS)("has its tail above %d to 13 digits", (z, above) => {
    expect(Math.abs(normalAbove(z) / above - 1)).toBeLessThan(1e-13);
    expect(normalBelow(-z)).toBe(normalAbove(z));
  });

  it("keeps its digits between two points of one tail", () => {
    // Φ(9) − Φ(8), by the same tails.
    const between = 6.220960574271784e-16 - 1.1285884059538405e-19;
    expect(normalBetween(8, 9) / between).toBeCloseTo(1, 12);
    expect(normalBetween(-9, -8)).toBe(normalBetween(8, 9));
    expect(normalBetween(-1, 1)).toBeCloseTo(0.6826894921370859, 15);
  });

  it.each([
    [0.5, 0.6744897501960817],
    [0.9, 1.6448536269514726],
    [0.95, 1.9599639845400543],
    [0.99, 2.575829303548901],
    [0.9973, 2.999976992703393],
  ])("holds %d within ± its two-sided quantile", (inside, z) => {
    expect(Math.abs(normalTwoSided(inside) / z - 1)).toBeLessThan(1e-13);
  });

  it("finds quantiles however near the probability is to 0 or 1", () => {
    for (const inside of [1e-300, 1e-12, 0.001, 0.5, 0.5000001, 0.999999, 1 - 2 ** -53]) {
      const z = normalTwoSided(inside);
      const reached = inside > 0.5 ? 2 * normalAbove(z) : 1 - inside;
      expect(z).toBeGreaterThan(0);
      expect(Math.abs(reached / (1 - inside) - 1)).toBeLessThan(1e-12);
    }
    // Near zero the density is 1/√(2π).
    expect(normalTwoSided(1e-12) / (1e-12 * Math.sqrt(Math.PI / 2))).toBeCloseTo(1, 12);
  });
});
