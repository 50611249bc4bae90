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

/** A function, and every place at which it was asked for its value. */
const watched = (value: (x: number) => number, slope: (x: number) => number) => {
  const asked: number[] = [];
  const slopes: number[] = [];
  return {
    asked,
    slopes,
    value: (x: number): number => {
      asked.push(x);
      return value(x);
    },
    slope: (x: number): number => {
      slopes.push(x);
      return slope(x);
    },
  };
};

describe("the way to the place", () => {
  const line = () =>
    watched(
      (x) => 2 * x,
      () => 2,
    );

  it.each([
    [1, 1],
    [0, 0],
    [10, 10],
    [-0.1, 5],
    [10.1, 5],
    [Number.NaN, 5],
  ])("started at %d begins at %d: in the bracket there, otherwise half-way", (start, first) => {
    const f = line();
    expect(whereReached(f, 6, 0, 10, start, 1e-12)).toBe(3);
    // Newton's step on a straight line ends at once, and where nothing is missing no slope is needed.
    expect(f.asked).toEqual([first, 3]);
    expect(f.slopes).toEqual([first]);
  });

  it("begins half-way in a bracket that does not start at zero", () => {
    const f = line();
    expect(whereReached(f, 16, 7, 10, 99, 1e-12)).toBe(8);
    expect(f.asked[0]).toBe(8.5);
  });

  it("ends with a step that is no longer than asked for, inside the bracket", () => {
    const f = line();
    expect(whereReached(f, 6, 0, 10, 2.5, 0.5)).toBe(3);
    expect(f.asked).toEqual([2.5]);
    const g = line();
    expect(whereReached(g, 6, 0, 10, 3.5, 0.5)).toBe(3);
    expect(g.asked).toEqual([3.5]);
    expect(whereReached(line(), 20.4, 0, 10, 9.9, 0.5)).toBe(10);
    expect(whereReached(line(), -0.4, 0, 10, 0.1, 0.5)).toBe(0);
  });

  it("halves the bracket where there is no slope, down to the width asked for", () => {
    const step = watched(
      (x) => (x < 1.1 ? 0 : 1),
      () => 0,
    );
    expect(whereReached(step, 0.5, 0, 2, 1, 0.25)).toBe(1.125);
    expect(step.asked).toEqual([1, 1.5, 1.25]);
  });

  it.each([1, 2])(
    "never asks twice at one place, where from %d Newton's steps would go round in a circle",
    (start) => {
      const jump = watched(
        (x) => (x <= 1 ? x : x + 1),
        (x) => (x <= 1 ? 0.5 : 1.5),
      );
      expect(whereReached(jump, 1.5, 0, 3, start, 1e-12)).toBeCloseTo(1, 11);
      expect(new Set(jump.asked).size).toBe(jump.asked.length);
    },
  );

  it("gives up after 200 steps", () => {
    const never = watched(
      (x) => (x < 1 ? 0 : 1),
      () => 0,
    );
    whereReached(never, 0.5, 0, 3, 1, -1);
    expect(never.asked).toHaveLength(200);
  });
});

describe("signChange", () => {
  it.each([1 / 3, 0.1, 0.7, 1, 1.1, 2, Math.E, 3.3])("gives the first double above a rise at %d", (at) => {
    const found = signChange((x) => x - at, 0, 4);
    expect(found).toBeGreaterThan(at);
    expect(found - at).toBeLessThanOrEqual(at * 2 ** -52);
  });

  it("takes zero for not above zero, at the end too", () => {
    expect(signChange((x) => 2 - x, 0, 2)).toBe(2);
    expect(signChange((x) => 1 - x, 0, 2)).toBe(1);
  });

  it("closes in to neighbouring doubles", () => {
    expect(signChange((x) => x * x - 2, 0, 2)).toBeCloseTo(Math.SQRT2, 15);
    expect(signChange((x) => 2 - x * x, 0, 2)).toBeCloseTo(Math.SQRT2, 15);
  });
});
