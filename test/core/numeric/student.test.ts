import { describe, expect, it } from "vitest";
import { studentTwoSided } from "../../../src/core/numeric/student";

/** Two-sided quantiles, computed with 40 digits of working precision by an independent library (mpmath). */
// biome-ignore format: one row a line
const QUANTILES: readonly (readonly [dof: number, inside: number, t: number])[] = [
  [3, 0.5, 0.7648923284043453],
  [3, 0.9973, 9.218701822037348],
  [5, 0.95, 2.5705818356363155],
  [7, 0.9973, 4.529910402646552],
  [16, 0.95, 2.1199052992212546],
  [19, 1 - 2 ** -20, 7.093074914451616],
  [30, 0.5, 0.6827556933212926],
  [50, 0.95, 2.008559112100761],
  [101, 0.9973, 3.0759534494488396],
  [400, 0.5, 0.6751035842407485],
  [400, 1 - 2 ** -20, 4.978655987055913],
  [999, 0.95, 1.96234146113345],
  [999, 1 - 2 ** -20, 4.9318178053383255],
  [1000, 0.5, 0.6747351646070094],
  [1000, 0.9973, 3.007494111288684],
  [1000, 1 - 2 ** -20, 4.9317867831743785],
  [20000, 0.95, 1.9600826051581353],
];

const INSIDES = [1e-9, 0.1, 0.5, 0.5000001, 0.9, 0.9544997361036416, 0.9973, 0.999999];

describe("Student's t distribution", () => {
  it.each(QUANTILES)("with %d degrees of freedom holds %d within ±%d", (dof, inside, t) => {
    expect(Math.abs(studentTwoSided(inside, dof) / t - 1)).toBeLessThan(1e-12);
  });

  it("with 1 degree of freedom is Cauchy's: t = tan(πp/2)", () => {
    for (const p of INSIDES) {
      expect(studentTwoSided(p, 1) / Math.tan((Math.PI * p) / 2)).toBeCloseTo(1, 9);
    }
  });

  it("with 2 degrees of freedom has t = p·√(2/(1 − p²))", () => {
    for (const p of INSIDES) {
      expect(studentTwoSided(p, 2) / (p * Math.sqrt(2 / ((1 - p) * (1 + p))))).toBeCloseTo(1, 12);
    }
  });

  it("with 4 degrees of freedom holds p = s·(1 + ½(1 − s²)), s = t/√(4 + t²) (Abramowitz & Stegun 26.7.4)", () => {
    for (const p of INSIDES) {
      const t = studentTwoSided(p, 4);
      const s = t / Math.sqrt(4 + t * t);
      expect((s * (1 + 0.5 * (1 - s * s))) / p).toBeCloseTo(1, 12);
    }
  });

  it("falls with the degrees of freedom, across the change of method too", () => {
    for (const p of INSIDES) {
      let before = Number.POSITIVE_INFINITY;
      for (const dof of [1, 2, 3, 5, 8, 20, 100, 500, 998, 999, 1000, 1001, 5000, 1e6, 1e15]) {
        const t = studentTwoSided(p, dof);
        expect(t).toBeLessThanOrEqual(before);
        before = t;
      }
    }
  });
});
