import { describe, expect, it } from "vitest";
import { signChange, whereReached } from "../../../src/core/numeric/root";

const cube = { value: (x: number) => x ** 3, slope: (x: number) => 3 * x * x };

describe("whereReached", () => {
  it("finds the place from any start, in the bracket or not", () => {
    for (const start of [-5, 0.001, 4, 1000, Number.NaN]) {
      expect(whereReached(cube, 27, 0, 10, start, 1e-12)).toBeCloseTo(3, 12);
    }
  });

  it("halves the bracket where the slope is zero or misleads", () => {
    expect(whereReached(cube, 1e-3, -10, 10, 0, 1e-13)).toBeCloseTo(0.1, 12);
    const kinked = { value: (x: number) => Math.sign(x) * Math.sqrt(Math.abs(x)), slope: () => 1e-9 };
    expect(whereReached(kinked, 2, -100, 100, -99, 1e-12)).toBeCloseTo(4, 9);
  });

  it("ends at a jump that skips the value", () => {
    const jumping = { value: (x: number) => (x > 1 ? x + 1e-6 : x), slope: () => 1 };
    expect(whereReached(jumping, 1 + 5e-7, 0, 2, 0.5, 1e-12)).toBeCloseTo(1, 9);
  });
});

describe("signChange", () => {
  it("closes in to neighbouring doubles", () => {
    expect(signChange((x) => x * x - 2, 0, 2)).toBeCloseTo(Math.SQRT2, 15);
    expect(signChange((x) => 2 - x * x, 0, 2)).toBeCloseTo(Math.SQRT2, 15);
  });
});
