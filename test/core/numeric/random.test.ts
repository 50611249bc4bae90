import { describe, expect, it } from "vitest";
import { normalDeviates } from "../../../src/core/numeric/normal-deviates";
import { stateFromSeed, xoshiro128 } from "../../../src/core/numeric/xoshiro128";

describe("a seeded state", () => {
  it("is that of the two first numbers of SplitMix64 (for seed 1234567, from memory)", () => {
    const state = stateFromSeed(1_234_567).map((word) => BigInt.asUintN(32, BigInt(word)));
    const [low = 0n, high = 0n, secondLow = 0n, secondHigh = 0n] = state;
    expect((high << 32n) | low).toBe(6_457_827_717_110_365_317n);
    expect((secondHigh << 32n) | secondLow).toBe(3_203_168_211_198_807_973n);
  });

  it("is never all zeros, and differs in every word between neighbouring seeds", () => {
    const words = Array.from({ length: 50 }, (_, seed) => stateFromSeed(seed));
    for (let place = 0; place < 4; place++) {
      expect(new Set(words.map((state) => state[place])).size).toBe(50);
    }
  });
});

describe("the polar method", () => {
  /** Gives these uniform numbers of −1 … 1, each as two words of 32 bits. */
  const bitsOf = (...uniforms: number[]): (() => number) => {
    const words = uniforms.flatMap((u) => {
      const whole = (u + 1) * 2 ** 52;
      return [Math.floor(whole / 2 ** 21), (whole % 2 ** 21) * 2 ** 11];
    });
    return () => words.shift() as number;
  };

  it("makes two deviates of two uniform numbers: x·√(−2 ln s/s) and y·√(−2 ln s/s), s = x² + y²", () => {
    const scale = Math.sqrt((-2 * Math.log(0.3125)) / 0.3125);
    const deviate = normalDeviates(bitsOf(0.5, -0.25, 0.25, 0.5));
    expect([deviate(), deviate(), deviate(), deviate()]).toEqual(
      [0.5, -0.25, 0.25, 0.5].map((u) => u * scale),
    );
  });

  it("throws away points outside the circle, on it, and at its centre", () => {
    const scale = Math.sqrt((-2 * Math.log(0.3125)) / 0.3125);
    const deviate = normalDeviates(bitsOf(0.75, 0.75, -1, 0, 0, 0, 0.5, 0.25));
    expect([deviate(), deviate()]).toEqual([0.5 * scale, 0.25 * scale]);
  });

  it("uses all 53 bits of a uniform number", () => {
    const least = 2 ** -52;
    const square = least * least + 0.25;
    expect(normalDeviates(bitsOf(least, 0.5))()).toBe(least * Math.sqrt((-2 * Math.log(square)) / square));
  });
});

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
