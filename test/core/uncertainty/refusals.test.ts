/** What each function of uncertainty refuses, in whole sentences, and the numbers just inside. */
import { describe, expect, it } from "vitest";
import { Refusal, type Thermocouple, thermocouple } from "../../../src/core";
import {
  type Budget,
  type BudgetLine,
  budget,
  combinedUncertainty,
  coverageFactor,
  distribution,
  effectiveDof,
  INFINITE_DOF,
  reportValue,
  standardUncertainty,
  type TypeA,
  temperatureUncertainty,
  typeA,
} from "../../../src/core/uncertainty";

const message = (found: unknown): string => {
  if (!(found instanceof Refusal)) throw new Error(`not refused: ${found}`);
  return `${found.kind === "wrong kind" ? "#VALUE!" : "#N/A"} ${found.message()}`;
};

describe("a budget", () => {
  const line: BudgetLine = { name: "drift", value: 1, distribution: "rectangular" };
  const refused = (fault: Partial<BudgetLine>) => message(budget([line, { ...line, ...fault }]));

  it("names row and quantity of what it refuses", () => {
    expect(refused({ distribution: "oblong" })).toBe(
      '#VALUE! row 2 (drift): distribution "oblong" is unknown: normal, rectangular, triangular, u-shaped, trapezoidal, resolution, standard',
    );
    expect(refused({ value: -1 })).toBe(
      "#N/A row 2 (drift): value -1 is below 0: give the half-width without sign",
    );
    expect(refused({ distribution: "trapezoidal" })).toBe(
      "#N/A row 2 (drift): trapezoidal needs the ratio of its top to its bottom as divisor",
    );
    expect(refused({ divisor: -2 })).toBe("#N/A row 2 (drift): divisor -2 is below 0");
    expect(refused({ dof: -1 })).toBe("#N/A row 2 (drift): degrees of freedom -1 is below 0");
  });

  it("leaves out a name that is blank, and the blanks about one", () => {
    expect(refused({ name: " ", value: -1 })).toMatch(/^#N\/A row 2: value -1/);
    expect(refused({ name: " cold end ", value: -1 })).toMatch(/^#N\/A row 2 \(cold end\): value -1/);
  });

  it("says which number became too large", () => {
    expect(refused({ value: 1e308, sensitivity: 10 })).toBe(
      "#N/A row 2 (drift): contribution is too large for a number",
    );
    expect(refused({ value: 1e300, divisor: 1e-300 })).toBe(
      "#N/A row 2 (drift): standard uncertainty is too large for a number",
    );
    const huge = { name: "a", value: 1.5e308, distribution: "standard" };
    expect(message(budget([huge, huge]))).toBe("#N/A combined uncertainty is too large for a number");
    expect(message(budget([huge]))).toBe("#N/A expanded uncertainty is too large for a number");
  });

  it("passes on what the coverage factor refuses", () => {
    expect(message(budget([{ name: "a", value: 1, distribution: "standard", dof: 0.5 }]))).toBe(
      "#N/A degrees of freedom 0.5 is below 1",
    );
    expect(message(budget([line], 95))).toBe("#N/A probability 95 is not between 0 and 1 (95 % is 0.95)");
  });

  it("takes a line of 0 beside others, which has no share", () => {
    const { rows } = budget([line, { ...line, value: 0 }]) as Budget;
    expect(rows.map(({ share }) => share)).toEqual([1, 0]);
  });
});

describe("a combination", () => {
  it("names the row of a contribution that became too large, or the whole", () => {
    expect(message(combinedUncertainty([1, 1e200], [1, 1e200]))).toBe(
      "#N/A row 2: contribution is too large for a number",
    );
    const whole = "#N/A combined uncertainty is too large for a number";
    expect(message(combinedUncertainty([1.5e308, 1.5e308]))).toBe(whole);
    const alike = [
      [1, 1],
      [1, 1],
    ];
    expect(message(combinedUncertainty([1e308, 1e308], undefined, alike))).toBe(whole);
  });

  it("of nothing uncertain is 0, whatever the correlations", () => {
    const none = [
      [1, 0.5],
      [0.5, 1],
    ];
    expect(combinedUncertainty([0, 0], undefined, none)).toBe(0);
    expect(combinedUncertainty([0, 2], undefined, none)).toBe(2);
  });

  it("says of which kind a refusal is", () => {
    expect(message(combinedUncertainty([]))).toBe("#N/A no uncertainties");
    expect(message(combinedUncertainty([1, 2], [1]))).toBe("#VALUE! 1 sensitivities for 2 uncertainties");
    expect(message(combinedUncertainty([1, -2]))).toBe("#N/A row 2: uncertainty -2 is below 0");
  });

  it("adds cross terms twice, by their signs (JCGM 100:2008, equation 16)", () => {
    const r = [
      [1, 0.3, -0.2],
      [0.3, 1, 0.5],
      [-0.2, 0.5, 1],
    ];
    // 1·3, 2·−2 and 4·0.5: variance 9 + 16 + 4 + 2(0.3·3·−4 − 0.2·3·2 + 0.5·−4·2).
    const variance = 9 + 16 + 4 + 2 * (0.3 * 3 * -4 - 0.2 * 3 * 2 + 0.5 * -4 * 2);
    expect(combinedUncertainty([1, 2, 4], [3, -2, 0.5], r)).toBeCloseTo(Math.sqrt(variance), 12);
  });
});

describe("correlations", () => {
  const of = (...matrix: number[][]) => combinedUncertainty([1, 1], undefined, matrix);

  it("may be off by 1E-9 and no more", () => {
    expect(of([1 + 5e-10, 0], [0, 1 - 5e-10])).toBeCloseTo(Math.SQRT2, 8);
    expect(of([1, 1e-9], [0, 1])).toBeCloseTo(Math.SQRT2, 8);
    expect(message(of([1, 2.5e-9], [0, 1]))).toBe(
      "#N/A correlation in row 1, column 2 is 2.5e-9, but 0 in row 2, column 1",
    );
    expect(message(of([1 - 2e-9, 0], [0, 1]))).toMatch(
      /^#N\/A correlation in row 1, column 1 is .*: 1 on the diagonal$/,
    );
    expect(message(of([1, 1 + 2e-9], [1 + 2e-9, 1]))).toMatch(
      /^#N\/A correlation in row 1, column 2 is .*: outside -1 to 1$/,
    );
    // At 1 + 1E-9 it is not this rule that refuses.
    expect(message(of([1, 1 + 1e-9], [1 + 1e-9, 1]))).toMatch(/^#N\/A correlations in row 2 contradict/);
  });

  it("may be −1", () => {
    expect(of([1, -1], [-1, 1])).toBeCloseTo(0, 12);
    expect(message(of([1, -1.2], [-1.2, 1]))).toBe(
      "#N/A correlation in row 1, column 2 is -1.2: outside -1 to 1",
    );
  });

  it("are a square of as many rows as uncertainties", () => {
    const wide = "#VALUE! correlations: 2 × 3 for 2 uncertainties";
    expect(message(of([1, 0], [0, 1, 0]))).toBe(wide);
    expect(message(of([1, 0, 0], [0, 1, 0]))).toBe(wide);
    expect(message(of([1, 0], [0, 1], [0, 0]))).toBe("#VALUE! correlations: 3 × 2 for 2 uncertainties");
  });
});

describe("degrees of freedom", () => {
  it("are infinite from 1E+99 up, alone or among others", () => {
    for (const dof of [undefined, 1e99, 1e300, Number.POSITIVE_INFINITY]) {
      expect(effectiveDof([3], [dof])).toBe(INFINITE_DOF);
      expect(effectiveDof([3, 1, 0], [dof, dof, dof])).toBe(INFINITE_DOF);
    }
    expect(effectiveDof([1], [1e98])).toBe(1e98);
  });

  it("are refused by row", () => {
    expect(message(effectiveDof([1, 1], [5, -1]))).toBe("#N/A row 2: degrees of freedom -1 is below 0");
    expect(message(effectiveDof([1, -1], [5, 5]))).toBe("#N/A row 2: uncertainty -1 is below 0");
    expect(message(effectiveDof([1, 1], [5, 5], [1]))).toBe("#VALUE! 1 sensitivities for 2 uncertainties");
    expect(message(effectiveDof([1], [5, 5]))).toBe("#VALUE! 2 degrees of freedom for 1 uncertainties");
  });

  it("count where one contribution of several is 0", () => {
    expect(effectiveDof([0, 2], [5, 7])).toBeCloseTo(7, 12);
  });
});

describe("a coverage factor", () => {
  it("has a probability between 0 and 1, both excluded", () => {
    for (const p of [0, 1, -0.5, 1.5, Number.NaN]) {
      expect(message(coverageFactor(5, p))).toMatch(
        /^#N\/A probability .* is not between 0 and 1 \(95 % is 0\.95\)$/,
      );
    }
  });

  it("has one degree of freedom at least, after adding 1E-6: t = tan(πp/2)", () => {
    for (const dof of [1, 1.9, 1 - 5e-7]) {
      expect(coverageFactor(dof, 0.95)).toBeCloseTo(Math.tan((Math.PI * 0.95) / 2), 10);
    }
    expect(message(coverageFactor(1 - 2e-6, 0.95))).toMatch(/is below 1$/);
  });

  it("is the normal one for infinite degrees of freedom and another probability", () => {
    // Φ⁻¹(0.995) and Φ⁻¹(0.84134474606854…) = 1, of any table.
    expect(coverageFactor(INFINITE_DOF, 0.99)).toBeCloseTo(2.5758293035489, 12);
    expect(coverageFactor(INFINITE_DOF, 0.682689492137086)).toBeCloseTo(1, 12);
  });
});

describe("a distribution", () => {
  it("is read in any case, with or without blanks and hyphens", () => {
    for (const text of ["u-shaped", "U  Shaped", "u - shaped", "\tU-SHAPED ", "arc-sine", "Arcsine"]) {
      expect(distribution(text)).toBe("u-shaped");
    }
    expect(distribution("Gaussian")).toBe("normal");
  });

  it("is quoted without its blanks, and no longer than 30 characters", () => {
    const known = "normal, rectangular, triangular, u-shaped, trapezoidal, resolution, standard";
    expect(message(distribution("  odd "))).toBe(`#VALUE! distribution "odd" is unknown: ${known}`);
    const long = "x".repeat(40);
    expect(message(distribution(long))).toBe(`#VALUE! distribution "${"x".repeat(30)}" is unknown: ${known}`);
  });

  it("takes a ratio of top to bottom for a trapezium alone", () => {
    expect(message(standardUncertainty(1, "trapezoidal", -1))).toBe(
      "#N/A ratio of top to bottom -1 is below 0",
    );
    expect(message(standardUncertainty(1, "trapezoidal", 1.01))).toBe(
      "#N/A ratio of top to bottom 1.01 is above 1",
    );
    expect(standardUncertainty(1, "rectangular", 2)).toBe(0.5);
  });

  it("refuses what is stated as nothing where it must be something", () => {
    expect(standardUncertainty(0, "standard")).toBe(0);
    expect(message(standardUncertainty(0, "normal"))).toBe("#N/A expanded uncertainty is 0 or an empty cell");
    expect(message(standardUncertainty(-1, "rectangular"))).toBe(
      "#N/A value -1 is below 0: give the half-width without sign",
    );
  });
});

describe("repeated readings", () => {
  it("name what became too large", () => {
    const wide = typeA([1.7e308, -1.7e308, 1.7e308, -1.7e308]) as TypeA;
    expect(message(wide.sd)).toBe("#N/A standard deviation is too large for a number");
    expect(message(wide.u)).toBe("#N/A standard uncertainty is too large for a number");
    expect(message((typeA([1e308, 1e308, 1e308]) as TypeA).mean)).toBe("#N/A mean is too large for a number");
  });

  it("have n − 1 degrees of freedom, and the mean an uncertainty of sd/√n", () => {
    expect(typeA([1, 2, 3, 4, 5])).toEqual({
      mean: 3,
      sd: Math.sqrt(2.5),
      u: expect.closeTo(Math.sqrt(0.5), 14),
      dof: 4,
    });
  });
});

describe("the uncertainty of a converted temperature", () => {
  const couple = (name: string): Thermocouple => thermocouple(name) as Thermocouple;
  const k = couple("K");

  it("names the uncertainty that is below 0", () => {
    const refused = (...of: number[]) =>
      message(temperatureUncertainty(k, 100, of[0]!, of[1]!, 0, of[2], of[3]));
    expect(refused(-1, 0, 0, 0)).toBe("#N/A uncertainty of the EMF -1 µV is below 0");
    expect(refused(1, -1, 0, 0)).toBe("#N/A uncertainty of the reference temperature -1 °C is below 0");
    expect(refused(1, 0, -1, 0)).toBe("#N/A other uncertainty -1 °C is below 0");
    expect(refused(1, 0, 0, -1)).toBe("#N/A inhomogeneity -1 is below 0");
    expect(temperatureUncertainty(k, 100, 0, 0, 0)).toBe(0);
  });

  it("names the temperature that is out of range, and the range of one EMF for two temperatures", () => {
    expect(message(temperatureUncertainty(k, 1400, 1, 0, 0))).toMatch(
      /^#N\/A temperature 1400 °C is outside the range of type K/,
    );
    expect(message(temperatureUncertainty(k, 100, 1, 0, -300))).toMatch(
      /^#N\/A reference temperature -300 °C is outside the range of type K/,
    );
    const b = couple("B");
    const limit = Number(b.uniqueFrom.toPrecision(6));
    expect(message(temperatureUncertainty(b, 30, 1, 0, 0))).toBe(
      `#N/A temperature 30 °C: under ${limit} °C an EMF of type B belongs to two temperatures`,
    );
    expect(temperatureUncertainty(k, -270, 1, 0, 0)).toBeCloseTo(1 / (1000 * k.seebeck(-270)), 9);
  });

  it("says when it became too large", () => {
    expect(message(temperatureUncertainty(k, -270, 1.7e308, 0, 0))).toBe(
      "#N/A uncertainty is too large for a number",
    );
  });
});

describe("a reported value", () => {
  it("names what it refuses", () => {
    expect(message(reportValue(1, 0))).toBe("#N/A expanded uncertainty is 0 or an empty cell");
    expect(message(reportValue(1, -1))).toBe("#N/A expanded uncertainty -1 is below 0");
    expect(message(reportValue(1, 1, 5))).toBe("#VALUE! digits 5: a whole number from 1 to 4");
    expect(message(reportValue(1, 1, 1.5))).toBe("#VALUE! digits 1.5: a whole number from 1 to 4");
  });
});
