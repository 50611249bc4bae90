import { describe, expect, it } from "vitest";
import { directionOf, intervalOf, orderRefused, rising } from "../../../src/core/calibration/points";

describe("the interval of a reading", () => {
  const points = Float64Array.of(0, 1, 2, 4, 8);

  it.each([
    [0, 0],
    [0.5, 0],
    [1, 1],
    [1.9, 1],
    [2, 2],
    [3.9, 2],
    [4, 3],
    [8, 3],
  ])("of %d starts at point %d: the last holds its right end too", (x, i) => {
    expect(intervalOf(points, x)).toBe(i);
  });

  it("among one or two points is the first", () => {
    expect(intervalOf(Float64Array.of(5), 5)).toBe(0);
    expect(intervalOf(Float64Array.of(5, 6), 6)).toBe(0);
  });
});

describe("the direction of points", () => {
  it.each([
    [[1, 2, 3], 1],
    [[3, 2, 1], -1],
    [[1, 2, 0, 3], 1],
    [[5, 6, 4, 3], -1],
    [[1, 3, 2], 1],
    [[3, 1, 2], -1],
    [[4, 4], 0],
    [[7], 0],
    [[], 0],
  ])("of %j is %d", (points, direction) => {
    expect(directionOf(points)).toBe(direction);
  });

  it("is what the refused point breaks", () => {
    expect(orderRefused([7])).toBeUndefined();
    expect(orderRefused([3, 2, 1])).toBeUndefined();
    expect(orderRefused([3, 2, 2.5, 1])?.message()).toBe(
      "points must rise or fall throughout: point 3 is 2.5 °C after 2 °C",
    );
    expect(orderRefused([0, 0])?.message()).toBe(
      "points must rise or fall throughout: point 2 is 0 °C (0 or an empty cell) after 0 °C (0 or an empty cell)",
    );
    expect(orderRefused([1e-8, 0, -1, 3])?.message()).toContain("point 4 is 3 °C after -1 °C");
    expect(orderRefused([1, 2, 1e-9])?.message()).toContain("point 3 is 1e-9 °C after 2 °C");
  });

  it("is turned to rising, with the values", () => {
    expect(rising([3, 2, 1], [30, 20, 10])).toEqual([Float64Array.of(1, 2, 3), Float64Array.of(10, 20, 30)]);
    expect(rising([1, 2], [10, 20])).toEqual([Float64Array.of(1, 2), Float64Array.of(10, 20)]);
  });
});
