import { describe, expect, it } from "vitest";
import { toNinthDecimal } from "../../../src/core/numeric/ninth-decimal";
import { exceeds, roundedLimit } from "../../../src/core/numeric/rounded-limit";

describe("a rounded limit", () => {
  it("lets pass what lies at it, whatever binary subtraction adds", () => {
    const limit = roundedLimit(2.2);
    expect(exceeds(902.2 - 900, limit)).toBe(false);
    expect(exceeds(2.2, limit)).toBe(false);
    expect(exceeds(2.2 + 0.4e-9, limit)).toBe(false);
    expect(exceeds(2.2 + 0.6e-9, limit)).toBe(true);
    expect(exceeds(2.1, limit)).toBe(false);
  });

  it.each([0, 0.1, 2.2, -3.7, 1e5])("of %d agrees with rounding both numbers first", (limit) => {
    const prepared = roundedLimit(limit);
    for (const steps of [-3, -1.4, -0.6, -0.4, 0, 0.4, 0.6, 1.4, 3, 1e6]) {
      const value = limit + steps * 1e-9;
      expect(exceeds(value, prepared)).toBe(toNinthDecimal(value) > toNinthDecimal(limit));
    }
  });

  it("rounds in the unit in which the numbers were given: 1E-9 °F is 5/9 of 1E-9 °C", () => {
    const limit = roundedLimit(1.8 * (5 / 9), 5 / 9);
    expect(exceeds((1.8 + 0.4e-9) * (5 / 9), limit)).toBe(false);
    expect(exceeds((1.8 + 0.6e-9) * (5 / 9), limit)).toBe(true);
  });

  it("where a double has no ninth decimal is the limit and its own rounding", () => {
    const limit = roundedLimit(1e9);
    expect(exceeds(1e9, limit)).toBe(false);
    expect(exceeds(1e9 + 2 ** -22, limit)).toBe(true);
    expect(exceeds(-1e9, roundedLimit(-1e9))).toBe(false);
    expect(exceeds(-1e9 + 2 ** -22, roundedLimit(-1e9))).toBe(true);
    expect(exceeds(1e300, roundedLimit(Number.POSITIVE_INFINITY))).toBe(false);
  });
});
