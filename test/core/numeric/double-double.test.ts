import { describe, expect, it } from "vitest";
import {
  exactly,
  minus,
  over,
  plus,
  rootOf,
  rounded,
  sumOf,
  times,
} from "../../../src/core/numeric/double-double";

describe("double-double numbers", () => {
  it("keep what a sum of doubles loses", () => {
    const sum = sumOf(1e16, Math.PI);
    expect(rounded(minus(sum, exactly(1e16)))).toBe(Math.PI);
  });

  it("multiply as integers of 106 bits do", () => {
    const a = 2 ** 53 - 111;
    const b = 2 ** 53 - 7891;
    const product = times(exactly(a), exactly(b));
    expect(BigInt(product.high) + BigInt(product.low)).toBe(BigInt(a) * BigInt(b));
  });

  it("divide to 31 digits", () => {
    const third = over(exactly(1), exactly(3));
    const missing = minus(exactly(1), times(third, exactly(3)));
    expect(Math.abs(rounded(missing))).toBeLessThan(1e-31);
  });

  it("take roots to 31 digits", () => {
    const root = rootOf(exactly(2));
    expect(Math.abs(rounded(minus(times(root, root), exactly(2))))).toBeLessThan(1e-31);
    expect(rounded(rootOf(exactly(0)))).toBe(0);
  });

  it("add numbers of very different size without losing the small one", () => {
    const sum = plus(plus(exactly(1e20), exactly(1)), exactly(-1e20));
    expect(rounded(sum)).toBe(1);
  });
});
