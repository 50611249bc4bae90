import { describe, expect, it } from "vitest";
import { Refusal } from "../../../src/core";
import {
  combinedUncertainty,
  coverageFactor,
  distribution,
  effectiveDof,
  INFINITE_DOF,
  standardUncertainty,
  type TypeA,
  typeA,
} from "../../../src/core/uncertainty";

const message = (found: unknown): string => (found as Refusal).message();

describe("typeA", () => {
  it("keeps the mean of a single reading and refuses its deviation", () => {
    const { mean, sd, u, dof } = typeA([20.5]) as TypeA;
    expect(mean).toBe(20.5);
    expect(message(sd)).toBe("one reading has no standard deviation");
    expect(message(u)).toBe("one reading has no standard deviation");
    expect(dof).toBe(0);
  });

  it("finds no deviation among equal readings", () => {
    expect(typeA([0.1, 0.1, 0.1])).toEqual({ mean: 0.1, sd: 0, u: 0, dof: 2 });
  });

  it("refuses no readings, and sums past the largest number", () => {
    expect(message(typeA([]))).toBe("no readings");
    expect((typeA([1e308, 1e308, 1e308]) as TypeA).mean).toBeInstanceOf(Refusal);
  });

  it("keeps tiny deviations", () => {
    expect((typeA([1e-200, 3e-200]) as TypeA).sd).toBeCloseTo(Math.SQRT2 * 1e-200, 210);
  });
});

describe("standardUncertainty", () => {
  it.each([
    ["normal", 1, undefined, 0.5],
    ["normal", 1, 3, 1 / 3],
    ["rectangular", 1, undefined, 1 / Math.sqrt(3)],
    ["triangular", 1, undefined, 1 / Math.sqrt(6)],
    ["u-shaped", 1, undefined, 1 / Math.sqrt(2)],
    ["resolution", 1, undefined, 1 / Math.sqrt(12)],
    ["standard", 1, undefined, 1],
    ["rectangular", 1, 2, 0.5],
    // GUM 4.3.9: a²(1 + β²)/6.
    ["trapezoidal", 1, 0.5, Math.sqrt(1.25 / 6)],
    ["rectangular", 0, undefined, 0],
  ] as const)("%s of %d, divisor %s: %d", (kind, value, divisor, u) => {
    expect(standardUncertainty(value, kind, divisor)).toBeCloseTo(u, 15);
  });

  it("of a trapezium lies between the triangle and the rectangle", () => {
    expect(standardUncertainty(1, "trapezoidal", 1)).toBeCloseTo(1 / Math.sqrt(3), 15);
    expect(standardUncertainty(1, "trapezoidal", 1e-9)).toBeCloseTo(1 / Math.sqrt(6), 12);
  });

  it.each([
    ["Rectangular", "rectangular"],
    [" NORMAL ", "normal"],
    ["U shaped", "u-shaped"],
    ["ushaped", "u-shaped"],
    ["uniform", "rectangular"],
    ["arcsine", "u-shaped"],
  ])('reads "%s" as %s', (text, name) => {
    expect(distribution(text)).toBe(name);
  });

  it("refuses what is no distribution, and numbers that cannot be", () => {
    expect((distribution("gauss?") as Refusal).kind).toBe("wrong kind");
    expect((distribution("") as Refusal).kind).toBe("wrong kind");
    expect(message(standardUncertainty(1, "rectangular", 0))).toBe("divisor is 0 or an empty cell");
    expect(message(standardUncertainty(1, "normal", -2))).toBe("divisor -2 is below 0");
    expect(message(standardUncertainty(0, "normal"))).toBe("expanded uncertainty is 0 or an empty cell");
    expect(message(standardUncertainty(-1, "rectangular"))).toContain("below 0");
    expect(message(standardUncertainty(1, "trapezoidal"))).toContain("ratio of its top to its bottom");
    expect(message(standardUncertainty(1, "trapezoidal", 2))).toBe("ratio of top to bottom 2 is above 1");
    expect(message(standardUncertainty(1, "trapezoidal", 0))).toBe(
      "ratio of top to bottom is 0 or an empty cell",
    );
  });
});

describe("combinedUncertainty", () => {
  it("adds squares, with sensitivities", () => {
    expect(combinedUncertainty([3, 4])).toBe(5);
    expect(combinedUncertainty([3, 2], [undefined, -2])).toBe(5);
    expect(combinedUncertainty([0, 0])).toBe(0);
  });

  it("adds outright what is fully correlated, and lets opposites cancel", () => {
    const one = [
      [1, 1],
      [1, 1],
    ];
    expect(combinedUncertainty([3, 4], undefined, one)).toBeCloseTo(7, 12);
    expect(combinedUncertainty([3, 3], [1, -1], one)).toBe(0);
  });

  it("does not overflow on the way", () => {
    expect(combinedUncertainty([3e200, 4e200])).toBeCloseTo(5e200, -190);
    expect(combinedUncertainty([1e200], [1e200])).toBeInstanceOf(Refusal);
  });

  it("names the row of what it refuses", () => {
    expect(message(combinedUncertainty([1, -2]))).toBe("row 2: uncertainty -2 is below 0");
    expect(message(combinedUncertainty([1, 2], [1, 0]))).toBe("row 2: sensitivity is 0 or an empty cell");
    expect(message(combinedUncertainty([1, 2], [1]))).toBe("1 sensitivities for 2 uncertainties");
    expect(message(combinedUncertainty([]))).toBe("no uncertainties");
  });

  it.each([
    [[[1, 0.5]], "correlations: 1 × 2 for 2 uncertainties"],
    [[[1], [0.5]], "correlations: 2 × 1 for 2 uncertainties"],
    [
      [
        [1, 0.5],
        [0.4, 1],
      ],
      "correlation in row 1, column 2 is 0.5, but 0.4 in row 2, column 1",
    ],
    [
      [
        [1, 0.5],
        [0.5, 0],
      ],
      "correlation in row 2, column 2 is 0: 1 on the diagonal",
    ],
    [
      [
        [1, 1.2],
        [1.2, 1],
      ],
      "correlation in row 1, column 2 is 1.2: outside -1 to 1",
    ],
  ])("refuses the matrix %j", (matrix, words) => {
    expect(message(combinedUncertainty([1, 1], undefined, matrix))).toBe(words);
  });

  it("refuses correlations that contradict each other", () => {
    const matrix = [
      [1, 0.9, 0.9],
      [0.9, 1, -0.9],
      [0.9, -0.9, 1],
    ];
    expect(message(combinedUncertainty([1, 1, 1], undefined, matrix))).toBe(
      "correlations in row 3 contradict those above it: the matrix is not positive semi-definite",
    );
  });
});

describe("effectiveDof", () => {
  it("is that of the only uncertainty with a finite count, enlarged by the share of the others", () => {
    expect(effectiveDof([1], [7])).toBeCloseTo(7, 12);
    expect(effectiveDof([1, 1], [7, undefined])).toBeCloseTo(28, 12);
    expect(effectiveDof([1, 2], [7, 1e99], [2, 1])).toBeCloseTo(28, 12);
  });

  it("is infinite where all are", () => {
    expect(effectiveDof([1, 1], [undefined, 1e99])).toBe(INFINITE_DOF);
  });

  it("names the row of what it refuses", () => {
    expect(message(effectiveDof([1, 1], [5, 0]))).toBe("row 2: degrees of freedom is 0 or an empty cell");
    expect(message(effectiveDof([1, 1], [5]))).toBe("1 degrees of freedom for 2 uncertainties");
    expect(message(effectiveDof([0, 0], [5, 5]))).toBe("every contribution is 0");
  });
});

describe("coverageFactor", () => {
  it("is 2 exactly for infinite degrees of freedom", () => {
    expect(coverageFactor(INFINITE_DOF)).toBe(2);
    expect(coverageFactor(1e300)).toBe(2);
    expect(coverageFactor(INFINITE_DOF, 0.95)).toBeCloseTo(1.959963984540054, 12);
  });

  it("truncates a fractional count after adding 1E-6", () => {
    expect(coverageFactor(9.99)).toBe(coverageFactor(9));
    expect(coverageFactor(9.9999995)).toBe(coverageFactor(10));
    expect(coverageFactor(16.76, 0.99)).toBe(coverageFactor(16, 0.99));
  });

  it("refuses less than one degree of freedom, and what is no probability", () => {
    expect(message(coverageFactor(0))).toBe("degrees of freedom is 0 or an empty cell");
    expect(message(coverageFactor(0.9))).toBe("degrees of freedom 0.9 is below 1");
    expect(message(coverageFactor(-3))).toBe("degrees of freedom -3 is below 1");
    expect(message(coverageFactor(5, 95))).toBe("probability 95 is not between 0 and 1 (95 % is 0.95)");
    for (const p of [0, 1, -0.5]) expect(coverageFactor(5, p)).toBeInstanceOf(Refusal);
  });
});
