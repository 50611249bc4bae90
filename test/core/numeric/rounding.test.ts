import { describe, expect, it } from "vitest";
import { decimal, plainDecimal, roundedTo } from "../../../src/core/numeric/decimal";
import { toNinthDecimal } from "../../../src/core/numeric/ninth-decimal";

describe("toNinthDecimal", () => {
  it("takes off what binary subtraction adds", () => {
    expect(902.2 - 900).not.toBe(2.2);
    expect(toNinthDecimal(902.2 - 900)).toBe(2.2);
    expect(toNinthDecimal(900 - 902.2)).toBe(-2.2);
  });

  it.each([
    [1.0000000005, 1.000000001],
    [-1.0000000005, -1.000000001],
    [1.00000000049, 1],
    [123456789012.5, 123456789012.5],
    [1e300, 1e300],
    [Number.NEGATIVE_INFINITY, Number.NEGATIVE_INFINITY],
  ])("rounds %d to %d", (value, rounded) => {
    expect(toNinthDecimal(value)).toBe(rounded);
  });
});

describe("decimal rounding", () => {
  it("takes a number apart into 15 digits, their place and a sign that zero has not", () => {
    expect(decimal(-12.5)).toEqual({
      negative: true,
      digits: 125_000_000_000_000n,
      lastPlace: -13,
      leadingPlace: 1,
    });
    expect(decimal(0).negative).toBe(false);
    expect(decimal(-0).negative).toBe(false);
  });

  const rounded = (value: number, place: number): string => {
    const exact = decimal(value);
    return plainDecimal(roundedTo(exact, place), place, exact.negative);
  };

  it.each([
    [2.5, 0, "3"],
    [-2.5, 0, "-3"],
    [0.105, -2, "0.11"],
    [1.005, -2, "1.01"],
    [0.1 + 0.2, -15, "0.300000000000000"],
    [-0.04, -1, "0.0"],
    [0, 2, "0"],
    [1234, 2, "1200"],
    [49, 2, "0"],
    [5e-7, -8, "0.00000050"],
    [1e21, 0, "1000000000000000000000"],
  ])("writes %d to the place %d as %s", (value, place, text) => {
    expect(rounded(value, place)).toBe(text);
  });
});
