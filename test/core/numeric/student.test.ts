import { describe, expect, it } from "vitest";
import { studentTwoSided } from "../../../src/core/numeric/student";

const INSIDES = [1e-9, 0.1, 0.5, 0.5000001, 0.9, 0.9544997361036416, 0.9973, 0.999999];

describe("Student's t distribution", () => {
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

  /** Computed with 40 digits of working precision by an independent library (mpmath), for the doubles next to these. */
  it.each([
    [1000, 0.5, 0.6747351646070094],
    [1000, 0.95, 1.962339080826408],
    [1200, 0.99, 2.5799325688329544],
    [3000, 0.9545, 2.0008361202658853],
  ])("with %d degrees of freedom, where the expansion begins, is right to 14 digits at %d", (dof, p, t) => {
    expect(Math.abs(studentTwoSided(p, dof) / t - 1)).toBeLessThan(8e-15);
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
