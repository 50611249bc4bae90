import { describe, expect, it } from "vitest";
import { compensatedSum } from "../../../src/core/numeric/compensated-sum";
import { rootSumSquare } from "../../../src/core/numeric/root-sum-square";

describe("the compensated sum", () => {
  it("keeps what a plain sum loses, whichever term is the larger", () => {
    expect(compensatedSum([1, 1e100, 1, -1e100])).toBe(2);
    expect(compensatedSum([1e100, 1, -1e100, 1])).toBe(2);
    expect(compensatedSum([-1e100, 1, 1e100, 3])).toBe(4);
  });

  it("of a hundred thousand tenths is ten thousand", () => {
    const tenths = new Float64Array(100_000).fill(0.1);
    expect(tenths.reduce((sum, tenth) => sum + tenth, 0)).not.toBe(10_000);
    expect(compensatedSum(tenths)).toBe(10_000);
  });

  it("takes a shift off every term, and of nothing is 0", () => {
    expect(compensatedSum([11, 12, 14], 10)).toBe(7);
    expect(compensatedSum([])).toBe(0);
  });
});

describe("the root of a sum of squares", () => {
  it.each([
    [[3, 4], 5],
    [[-3, 4], 5],
    [[4, -3], 5],
    [[2, 3, 6], 7],
    [[-7], 7],
    [[0, 0], 0],
    [[], 0],
  ])("of %j is %d", (values, root) => {
    expect(rootSumSquare(values)).toBe(root);
  });

  it("neither overflows nor vanishes where the squares would", () => {
    expect(rootSumSquare([3e200, 4e200]) / 5e200).toBeCloseTo(1, 14);
    expect(rootSumSquare([3e-200, 4e-200]) / 5e-200).toBeCloseTo(1, 14);
    expect(rootSumSquare([3, Number.POSITIVE_INFINITY])).toBe(Number.POSITIVE_INFINITY);
    expect(rootSumSquare([Number.NEGATIVE_INFINITY, 1])).toBe(Number.POSITIVE_INFINITY);
  });
});
