import { describe, expect, it } from "vitest";
import { exactly, rounded } from "../../../src/core/numeric/double-double";
import { leastSquares } from "../../../src/core/numeric/householder";

/** The unknowns for columns and right-hand side of doubles. */
const solved = (columns: number[][], b: number[]): number[] | undefined =>
  leastSquares(
    columns.map((column) => column.map(exactly)),
    b.map(exactly),
  )?.unknowns.map(rounded);

describe("least squares by reflections", () => {
  it("solves as many equations as unknowns", () => {
    // 2x + y = 5, x − 3y = −8.
    expect(solved([[2, 1], [1, -3]], [5, -8])).toEqual([1, 3]); // biome-ignore format: a matrix
  });

  it("loses nothing where a column is almost along its axis, in either direction", () => {
    for (const sign of [1, -1]) {
      // (3·sign + 5E-20)/(1 + 1E-40).
      expect(solved([[sign, 1e-20]], [3, 5])).toEqual([sign * 3]);
    }
    expect(solved([[0, 2]], [9, 5])).toEqual([2.5]);
  });

  it("gives the inverse of the triangle, whose products are the covariance", () => {
    // Columns (3, 4) and (0, 1): AᵀA = (25, 4; 4, 1), of inverse (1, −4; −4, 25)/9.
    const { inverse } = leastSquares(
      [[3, 4].map(exactly), [0, 1].map(exactly)],
      [0, 0].map(exactly),
    ) as never as {
      inverse: Parameters<typeof rounded>[0][][];
    };
    const entry = (i: number, j: number): number =>
      inverse.reduce((sum, column) => sum + rounded(column[i] as never) * rounded(column[j] as never), 0);
    expect(entry(0, 0)).toBeCloseTo(1 / 9, 15);
    expect(entry(0, 1)).toBeCloseTo(-4 / 9, 15);
    expect(entry(1, 1)).toBeCloseTo(25 / 9, 14);
  });

  it("has no answer where a column is nothing, or no number", () => {
    expect(solved([[0, 0]], [1, 2])).toBeUndefined();
    expect(solved([[1, 1], [0, 0]], [1, 2])).toBeUndefined(); // biome-ignore format: a matrix
    expect(solved([[Number.NaN, 1]], [1, 2])).toBeUndefined();
  });
});
