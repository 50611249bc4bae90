/** Slopes whose sign changes where anyone can see it. */
import { describe, expect, it } from "vitest";
import { turningPoint } from "../../../src/core/calibration/turning-point";

describe("the turning point", () => {
  it("is where the slope changes sign, up or down", () => {
    expect(turningPoint((t) => 1 - t / 5, [0, 10])).toBeCloseTo(5, 12);
    expect(turningPoint((t) => t - 3, [0, 10])).toBeCloseTo(3, 12);
  });

  it("is the first of several, and lies in any piece", () => {
    expect(turningPoint(Math.sin, [0.1, 10])).toBeCloseTo(Math.PI, 12);
    expect(turningPoint(Math.sin, [0.1, 1, 2, 10])).toBeCloseTo(Math.PI, 12);
    expect(turningPoint((t) => Math.sin(t - 1), [1.5, 2, 4, 6])).toBeCloseTo(1 + Math.PI, 12);
  });

  it("is the start where the slope falls throughout, and none where it rises throughout", () => {
    expect(turningPoint(() => -1, [200, 300, 500])).toBe(200);
    expect(turningPoint(() => 0, [200, 300])).toBe(200);
    expect(turningPoint(() => 1, [200, 300, 500])).toBeUndefined();
  });

  it.each([0.003, 2.5, 5.003, 7.7777, 9.999])(
    "is found in a dip at %d that is far narrower than a look",
    (at) => {
      const dip = (t: number): number => (t - at) ** 2 - 1e-10;
      expect(turningPoint(dip, [0, 10])).toBeCloseTo(at - 1e-5, 9);
      expect(turningPoint((t) => (t - at) ** 2 + 1e-10, [0, 10])).toBeUndefined();
    },
  );

  it("is a join at which the slope jumps, and the join itself belongs to the piece below", () => {
    const jump = (t: number): number => (t <= 4 ? 1 : -1);
    expect(turningPoint(jump, [0, 4, 10])).toBeCloseTo(4, 9);
    // Just above the join the slope is that of the upper piece alone.
    const atJoinOnly = (t: number): number => (t === 4 ? -1 : 1);
    expect(turningPoint(atJoinOnly, [0, 4, 10])).toBeCloseTo(4, 9);
  });

  it("is found in a narrow dip beside a wide one that stays above zero, on either side of it", () => {
    const beside = (wide: number, narrow: number) => (t: number) =>
      Math.min((t - wide) ** 2 + 0.001, (t - narrow) ** 2 - 1e-10);
    expect(turningPoint(beside(2, 7), [0, 10])).toBeCloseTo(7 - 1e-5, 9);
    expect(turningPoint(beside(8, 3), [0, 10])).toBeCloseTo(3 - 1e-5, 9);
    // So steep that a single look falls into it.
    const steep = (t: number): number => Math.min(1, (t - 8) ** 2 + 0.001, 1e4 * ((t - 3.005) ** 2 - 1e-10));
    expect(turningPoint(steep, [0, 10])).toBeCloseTo(3.005 - 1e-5, 9);
  });

  it("asks for no slope outside the range, where there is none", () => {
    for (const [low, high] of [
      [-60.2, 178.19999999999996],
      [-137.5, 65.60000000000001],
      [148.6, 498.46666666666664],
      [-171.7, 22.333333333333332],
    ] as const) {
      // Of these spans 256 equal steps lead past the end, by rounding.
      expect(low + 256 * ((high - low) / 256)).toBeGreaterThan(high);
      const known = (t: number): number => (t >= low && t <= high ? 1 : Number.NaN);
      expect(turningPoint(known, [low, high])).toBeUndefined();
    }
  });

  it("is seen at the very ends of the range", () => {
    expect(turningPoint((t) => 10 - 1e-9 - t, [0, 10])).toBeCloseTo(10, 8);
    expect(turningPoint((t) => t - 1e-9, [0, 10])).toBeCloseTo(0, 8);
  });
});
