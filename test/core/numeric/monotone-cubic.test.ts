import { describe, expect, it } from "vitest";
import { cubicAt, monotoneSlopes } from "../../../src/core/numeric/monotone-cubic";

const curve = (xs: number[], ys: number[]): ((i: number, x: number) => number) => {
  const at = Float64Array.from(xs);
  const values = Float64Array.from(ys);
  const slopes = monotoneSlopes(at, values);
  return (i, x) => cubicAt(at, values, slopes, i, x);
};

describe("the shape-preserving cubic", () => {
  it("is a straight line through two points", () => {
    expect(curve([0, 10], [1, 3])(0, 2.5)).toBeCloseTo(1.5, 15);
  });

  it("is flat at a peak and between equal neighbours", () => {
    expect([...monotoneSlopes(Float64Array.of(0, 1, 2, 3), Float64Array.of(0, 5, 1, 1))].slice(1)).toEqual([
      0, 0, 0,
    ]);
  });

  it("gives a straight line its slope everywhere, whatever the spacing", () => {
    for (const slope of monotoneSlopes(Float64Array.of(0, 1, 5, 6), Float64Array.of(1, 3, 11, 13))) {
      expect(slope).toBeCloseTo(2, 15);
    }
  });

  it("has the slopes of Fritsch and Butland's formula, worked by hand", () => {
    // Widths 1 and 3, chords 2 and 1: α = (1 + 2·3)/(3·4) = 7/12 on the first, 1/m = α/2 + (1 − α)/1 = 17/24.
    const slopes = monotoneSlopes(Float64Array.of(0, 1, 4), Float64Array.of(0, 2, 5));
    expect(slopes[1]).toBeCloseTo(24 / 17, 14);
    // First end: ((2·1 + 3)·2 − 1·1)/4 = 9/4; last: ((2·3 + 1)·1 − 3·2)/4 = 1/4.
    expect(slopes[0]).toBeCloseTo(9 / 4, 14);
    expect(slopes[2]).toBeCloseTo(1 / 4, 14);
  });

  it("weighs the chord over the shorter interval more, on whichever side it lies", () => {
    // Widths 2 and 1, chords 2 and 1: weights 2 + 2·1 and 2·2 + 1, 9/(4/2 + 5/1) = 9/7.
    expect(monotoneSlopes(Float64Array.of(0, 2, 3), Float64Array.of(0, 4, 5))[1]).toBeCloseTo(9 / 7, 14);
  });

  it("is held back at an end: to 0 where the parabola would start the wrong way, to three chords where it is too steep", () => {
    // (3·1 − 5)/2 = −1 against a chord of 1; (3·1 + 9)/2 = 6 against 3.
    const starts = (...ys: number[]): number =>
      monotoneSlopes(Float64Array.of(0, 1, 2), Float64Array.from(ys))[0] as number;
    expect(starts(0, 1, 6)).toBe(0);
    expect(starts(0, 1, -8)).toBe(3);
    expect(starts(0, -1, 8)).toBe(-3);
    // (3·1 + 3)/2 = 3 is just allowed, and (3·1 + 1)/2 = 2 anyhow.
    expect(starts(0, 1, -2)).toBe(3);
    expect(starts(0, 1, 0)).toBe(2);
    expect(starts(0, 0, 5)).toBe(0);
    const ends = monotoneSlopes(Float64Array.of(0, 1, 2), Float64Array.of(0, 10, 8));
    // (3·(−2) − 10)/2 = −8 against a chord of −2.
    expect(ends[2]).toBe(-6);
  });

  it("joins its pieces with one slope", () => {
    const f = curve([0, 1, 4, 5, 9], [0, 2, 5, 5.1, 4]);
    const h = 1e-6;
    for (const [i, x] of [
      [0, 1],
      [1, 4],
      [2, 5],
    ] as const) {
      const left = (f(i, x) - f(i, x - h)) / h;
      const right = (f(i + 1, x + h) - f(i + 1, x)) / h;
      expect(Math.abs(left - right)).toBeLessThan(1e-4);
    }
  });
});
