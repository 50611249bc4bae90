import { describe, expect, it } from "vitest";
import { Refusal, type Thermocouple, temperatureUnits, thermocouple } from "../../../src/core";
import {
  type Budget,
  type BudgetLine,
  budget,
  INFINITE_DOF,
  reportValue,
  temperatureUncertainty,
} from "../../../src/core/uncertainty";

const message = (found: unknown): string => (found as Refusal).message();

describe("budget", () => {
  const lines: readonly BudgetLine[] = [
    { name: "readings", value: 0.12, distribution: "standard", dof: 9 },
    { name: "calibrator", value: 0.3, distribution: "Normal" },
    { name: "resolution", value: 0.1, distribution: "RESOLUTION", sensitivity: -2 },
  ];

  it("evaluates each row", () => {
    const { rows } = budget(lines) as Budget;
    expect(rows[0]).toMatchObject({ divisor: 1, standardUncertainty: 0.12, sensitivity: 1, dof: 9 });
    expect(rows[1]).toMatchObject({
      distribution: "normal",
      divisor: 2,
      standardUncertainty: 0.15,
      dof: INFINITE_DOF,
    });
    expect(rows[2]?.standardUncertainty).toBeCloseTo(0.1 / Math.sqrt(12), 15);
    expect(rows[2]?.contribution).toBeCloseTo(0.2 / Math.sqrt(12), 15);
  });

  it("sums them up", () => {
    const { combined, dof, k, expanded, probability } = budget(lines) as Budget;
    const variance = 0.12 ** 2 + 0.15 ** 2 + 0.04 / 12;
    expect(combined).toBeCloseTo(Math.sqrt(variance), 14);
    expect(dof).toBeCloseTo(variance ** 2 / (0.12 ** 4 / 9), 9);
    expect(probability).toBeCloseTo(0.9545, 4);
    expect(expanded).toBe(k * combined);
  });

  it("has k = 2 where all degrees of freedom are infinite", () => {
    expect((budget(lines.slice(1)) as Budget).k).toBe(2);
  });

  it.each([
    [{ distribution: "oblong" }, "wrong kind", 'row 2 (drift): distribution "oblong" is unknown'],
    [{ value: -1 }, "no answer", "row 2 (drift): value -1 is below 0"],
    [{ divisor: 0 }, "no answer", "row 2 (drift): divisor is 0 or an empty cell"],
    [{ sensitivity: 0 }, "no answer", "row 2 (drift): sensitivity is 0 or an empty cell"],
    [{ dof: 0 }, "no answer", "row 2 (drift): degrees of freedom is 0 or an empty cell"],
    [{ distribution: "trapezoidal" }, "no answer", "row 2 (drift): trapezoidal needs the ratio"],
  ])("refuses %j with its row", (fault, kind, words) => {
    const line = { name: "drift", value: 1, distribution: "rectangular", ...fault };
    const refused = budget([lines[0] as BudgetLine, line]) as Refusal;
    expect(refused).toBeInstanceOf(Refusal);
    expect(refused.kind).toBe(kind);
    expect(refused.message().startsWith(words)).toBe(true);
  });

  it("names the row that a line says it was typed in", () => {
    const line = { name: "drift", value: -1, distribution: "rectangular", row: 7 };
    expect(message(budget([line]))).toMatch(/^row 7 \(drift\): value -1 is below 0/);
  });

  it("refuses a budget of nothing", () => {
    expect(message(budget([]))).toBe("the budget has no lines");
    expect(message(budget([{ name: "a", value: 0, distribution: "rectangular" }]))).toBe(
      "every contribution is 0",
    );
  });

  it("refuses too few degrees of freedom and a wrong probability", () => {
    expect(budget([{ name: "a", value: 1, distribution: "standard", dof: 0.5 }])).toBeInstanceOf(Refusal);
    expect(budget(lines, 95)).toBeInstanceOf(Refusal);
  });
});

describe("temperatureUncertainty", () => {
  const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
  const k = couple("K");

  it("divides by the Seebeck coefficient at the measuring junction", () => {
    expect(temperatureUncertainty(k, 1000, 5, 0, 0)).toBeCloseTo(5 / (1000 * k.seebeck(1000)), 14);
  });

  it("carries the reference junction over by the ratio of the coefficients", () => {
    const expected = (0.3 * k.seebeck(25)) / k.seebeck(1000);
    expect(temperatureUncertainty(k, 1000, 0, 0.3, 25)).toBeCloseTo(expected, 14);
  });

  it("takes inhomogeneity as a fraction of the EMF between the junctions", () => {
    const expected = (0.001 * (k.emf(1000) - k.emf(25))) / k.seebeck(1000);
    expect(temperatureUncertainty(k, 1000, 0, 0, 25, 0, 0.001)).toBeCloseTo(expected, 14);
    expect(temperatureUncertainty(k, 25, 0, 0, 1000, 0, 0.001)).toBeGreaterThan(0);
  });

  it("combines them all", () => {
    const alone = [
      temperatureUncertainty(k, 600, 5, 0, 25),
      temperatureUncertainty(k, 600, 0, 0.3, 25),
      temperatureUncertainty(k, 600, 0, 0, 25, 0.2),
      temperatureUncertainty(k, 600, 0, 0, 25, 0, 0.001),
    ] as number[];
    expect(temperatureUncertainty(k, 600, 5, 0.3, 25, 0.2, 0.001)).toBeCloseTo(Math.hypot(...alone), 13);
  });

  it("refuses temperatures outside the range and uncertainties below 0", () => {
    const fahrenheit = temperatureUnits.find(({ symbol }) => symbol === "F");
    expect(message(temperatureUncertainty(k, 1400, 1, 0, 0))).toContain("outside the range of type K");
    expect(message(temperatureUncertainty(k, 100, 1, 0, -300))).toContain("reference temperature");
    expect(message(temperatureUncertainty(k, 100, -1, 0, 0))).toBe("uncertainty of the EMF -1 µV is below 0");
    expect((temperatureUncertainty(k, 100, 1, -1, 0) as Refusal).message(fahrenheit)).toBe(
      "uncertainty of the reference temperature -1.8 °F is below 0",
    );
    expect(temperatureUncertainty(k, 100, 1, 0, 0, -1)).toBeInstanceOf(Refusal);
    expect(temperatureUncertainty(k, 100, 1, 0, 0, 0, -1)).toBeInstanceOf(Refusal);
    expect(message(temperatureUncertainty(couple("B"), 30, 1, 0, 0))).toContain(
      "belongs to two temperatures",
    );
  });
});

describe("reportValue", () => {
  it.each([
    [1000.5, 1.2818, 2, "1000.5 ± 1.3"],
    [36228.77, 49.93, 2, "36229 ± 50"],
    [36228.77, 49.93, 1, "36230 ± 50"],
    [-12.345, 0.0678, 2, "-12.345 ± 0.068"],
    [-0.04, 1.3, 2, "0.0 ± 1.3"],
    [0, 120, 2, "0 ± 120"],
    [-4, 120, 2, "0 ± 120"],
    [-5, 120, 2, "-10 ± 120"],
    [5, 0.0996, 2, "5.00 ± 0.10"],
    [12345, 996, 2, "12300 ± 1000"],
    [0.105, 0.105, 2, "0.11 ± 0.11"],
    [902.2 - 900, 0.35, 2, "2.20 ± 0.35"],
    // Rounded down 1.4 loses 29 %, 1.06 loses 5.7 %, 1.05 loses 4.8 %.
    [1, 1.4, 1, "1 ± 2"],
    [1, 1.06, 1, "1 ± 2"],
    [1, 1.05, 1, "1 ± 1"],
    [1, 2.1, 1, "1 ± 2"],
    [1, 9.6, 1, "0 ± 10"],
    [1e21, 3.2e19, 2, "1000000000000000000000 ± 32000000000000000000"],
    [1e-12, 2.55e-13, 2, "0.00000000000100 ± 0.00000000000026"],
    [12.34567, 0.0123456, 4, "12.34567 ± 0.01235"],
  ])("%d with U = %d to %d digits is %s", (value, u, digits, text) => {
    expect(reportValue(value, u, digits)).toBe(text);
  });

  it("takes two digits when none are given", () => {
    expect(reportValue(20, 0.123)).toBe("20.00 ± 0.12");
  });

  it("refuses an uncertainty of 0 and digits that are none", () => {
    expect(message(reportValue(1, 0))).toBe("expanded uncertainty is 0 or an empty cell");
    expect(message(reportValue(1, -1))).toBe("expanded uncertainty -1 is below 0");
    for (const digits of [0, 1.5, 5, -1])
      expect((reportValue(1, 1, digits) as Refusal).kind).toBe("wrong kind");
  });
});
