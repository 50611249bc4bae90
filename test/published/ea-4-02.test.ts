/** EA-4/02 M:2013, supplement 1, example S5: calibration of a type N thermocouple at 1000 °C. */
import { describe, expect, it } from "vitest";
import { type Budget, type BudgetLine, budget, reportValue } from "../../src/core/uncertainty";

/** C_S, C_S/C_S0 confirmed in copies; C_X and C_X0 from memory, reproduced to 14 digits by the published totals. */
const C_S = 0.077;
const C_X = 0.026;
const C_X0 = 0.039;

/** [line, printed standard uncertainty, printed contribution] */
const furnace: readonly (readonly [BudgetLine, number, number])[] = [
  [{ name: "temperature of reference thermometers", value: 0.1, distribution: "standard", dof: 9 }, 0.1, 0.1],
  [{ name: "voltmeter calibration", value: 2, distribution: "normal", sensitivity: C_S }, 1, 0.077],
  [{ name: "voltmeter resolution", value: 0.5, distribution: "rectangular", sensitivity: C_S }, 0.29, 0.022],
  [{ name: "reversing switch", value: 2, distribution: "Rectangular", sensitivity: C_S }, 1.15, 0.089],
  [{ name: "reference point", value: 0.1, distribution: "rectangular", sensitivity: -0.407 }, 0.058, 0.024],
  [{ name: "reference thermocouples", value: 0.3, distribution: "NORMAL", divisor: 2 }, 0.15, 0.15],
  [{ name: "drift of references", value: 0.3, distribution: "rectangular" }, 0.173, 0.173],
  [{ name: "furnace non-uniformity", value: 1, distribution: "rectangular" }, 0.577, 0.577],
];

const emf: readonly (readonly [BudgetLine, number, number])[] = [
  [{ name: "voltmeter indication", value: 1.6, distribution: "standard", dof: 9 }, 1.6, 1.6],
  [{ name: "voltmeter calibration", value: 2, distribution: "normal" }, 1, 1],
  [{ name: "voltmeter resolution", value: 0.5, distribution: "rectangular" }, 0.29, 0.29],
  [{ name: "reversing switch", value: 2, distribution: "rectangular" }, 1.15, 1.15],
  [{ name: "compensating cables", value: 5, distribution: "rectangular" }, 2.9, 2.9],
  // Printed as 24.5, where 0.641 × 38.5 is 24.7.
  [{ name: "furnace", value: 0.641, distribution: "standard", sensitivity: 1 / C_X, dof: 50 }, 0.641, 24.65],
  [{ name: "reference point", value: 0.1, distribution: "rectangular", sensitivity: -1 / C_X0 }, 0.058, 1.48],
];

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
