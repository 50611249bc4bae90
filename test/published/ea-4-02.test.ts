/** EA-4/02 M:2013, supplement 1, example S5: calibration of a type N thermocouple at 1000 °C. */
import { describe, expect, it } from "vitest";
import { type Budget, type BudgetLine, budget, reportValue } from "../../src/core/uncertainty";
import { emf, furnace } from "./ea-4-02";

const made = (lines: readonly (readonly [BudgetLine, number, number])[]): Budget =>
  budget(lines.map(([line]) => line)) as Budget;

describe.each([
  ["furnace temperature", furnace],
  ["EMF", emf],
] as const)("EA-4/02 S5, budget of the %s", (_, lines) => {
  it("prints each standard uncertainty and contribution", () => {
    made(lines).rows.forEach((row, i) => {
      const [, u, contribution] = lines[i] as readonly [BudgetLine, number, number];
      expect(Math.abs(row.standardUncertainty / u - 1)).toBeLessThan(0.01);
      expect(Math.abs(row.contribution / contribution - 1)).toBeLessThan(0.025);
    });
  });
});

describe("EA-4/02 S5, results", () => {
  it("u = 0.641 °C with 7688 effective degrees of freedom, U = 1.3 °C: 1000.5 °C ± 1.3 °C", () => {
    const { combined, k, expanded } = made(furnace);
    expect(combined).toBeCloseTo(0.641, 3);
    // Unrounded in a public copy, which takes 0.077/0.189 for 0.407 and 50 degrees of freedom for each k = 2.
    const unrounded = budget(
      furnace.map(([line], i) => ({
        ...line,
        ...(i === 4 ? { sensitivity: -0.077 / 0.189 } : {}),
        ...(line.distribution.toLowerCase() === "normal" ? { dof: 50 } : {}),
      })),
    ) as Budget;
    expect(unrounded.combined).toBeCloseTo(0.640870516811861, 13);
    expect(Math.floor(unrounded.dof)).toBe(7688);
    expect(k).toBeCloseTo(2, 2);
    expect(reportValue(1000.5, expanded)).toBe("1000.5 ± 1.3");
  });

  it("u = 25.0 µV, U = 50 µV: 36 229 µV ± 50 µV", () => {
    const { combined, dof } = made(emf);
    expect(combined).toBeCloseTo(25, 1);
    // Unrounded in the copy, which carries 0.641 °C over from the first budget.
    expect(combined).toBeCloseTo(24.96625063622077, 11);
    // 52 in the copy, which takes 50 degrees of freedom for the furnace.
    expect(Math.floor(dof)).toBe(52);
    expect(reportValue(36228.77, 2 * combined)).toBe("36229 ± 50");
  });
});
