import { describe, expect, it } from "vitest";
import { normalDeviates } from "../../../src/core/numeric/normal-deviates";
import { stateFromSeed, xoshiro128 } from "../../../src/core/numeric/xoshiro128";

describe("normal deviates", () => {
  const count = 1_000_000;
  const deviate = normalDeviates(xoshiro128(stateFromSeed(12)));
  const drawn = Float64Array.from({ length: count }, deviate);
  const moment = (power: number): number => drawn.reduce((sum, x) => sum + x ** power, 0) / count;

  it("have the moments 0, 1, 0, 3 and 15 of the normal distribution within five standard errors", () => {
    // Variances of the powers: E x²ᵏ − (E xᵏ)².
    expect(Math.abs(moment(1))).toBeLessThan(5 * Math.sqrt(1 / count));
    expect(Math.abs(moment(2) - 1)).toBeLessThan(5 * Math.sqrt(2 / count));
    expect(Math.abs(moment(3))).toBeLessThan(5 * Math.sqrt(15 / count));
    expect(Math.abs(moment(4) - 3)).toBeLessThan(5 * Math.sqrt(96 / count));
    expect(Math.abs(moment(6) - 15)).toBeLessThan(5 * Math.sqrt(10170 / count));
  });

  it.each([
    [1, 0.158655],
    [2, 0.0227501],
    [3, 0.0013499],
    [4, 0.0000316712],
  ])("lie above %d with probability %d", (z, probability) => {
    const above = drawn.reduce((sum, x) => sum + (x > z ? 1 : 0), 0) / count;
    expect(Math.abs(above - probability)).toBeLessThan(5 * Math.sqrt(probability / count));
  });

  it("do not depend on the one before", () => {
    let sum = 0;
    for (let i = 1; i < count; i++) sum += (drawn[i] as number) * (drawn[i - 1] as number);
    expect(Math.abs(sum / count)).toBeLessThan(5 * Math.sqrt(1 / count));
  });
});
