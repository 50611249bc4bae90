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
