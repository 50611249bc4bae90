import { describe, expect, it } from "vitest";
import {
  type DoubleDouble,
  exactly,
  inner,
  minus,
  over,
  plus,
  rootOf,
  rounded,
  sumOf,
  times,
} from "../../../src/core/numeric/double-double";
import { exact, exactProduct, sizeOf } from "./exact";

const exactValue = ({ high, low }: DoubleDouble): bigint => exact(high) + exact(low);

/** Numbers with both halves filled, of both signs and many sizes. */
const THIRDS: readonly DoubleDouble[] = [1, -7, 1e-9, 12345.678, -3e12].map((size) =>
  over(exactly(size), exactly(3)),
);
const PAIRS = THIRDS.flatMap((a) => THIRDS.map((b) => [a, times(b, exactly(Math.PI))] as const));

/** That the found number is the right one to 2⁻¹⁰⁰ of `size`, and that no bit of its low half belongs into the high one. */
function expectWithin(found: DoubleDouble, right: bigint, size = sizeOf(right)): void {
  expect(sizeOf(exactValue(found) - right)).toBeLessThanOrEqual(size >> 100n);
  expect(found.high + found.low).toBe(found.high);
}

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

  it("are added without error from two doubles, whichever is the larger", () => {
    for (const a of [1e16, -1e16, 0.1, 3, -1e-9]) {
      for (const b of [Math.PI, -1e-12, 1e20, 0]) expect(exactValue(sumOf(a, b))).toBe(exact(a) + exact(b));
    }
  });

  it("add, subtract, multiply and divide to 30 digits whatever the signs and sizes", () => {
    for (const [a, b] of PAIRS) {
      const [exactA, exactB] = [exactValue(a), exactValue(b)];
      expectWithin(plus(a, b), exactA + exactB, sizeOf(exactA) + sizeOf(exactB));
      expectWithin(minus(a, b), exactA - exactB, sizeOf(exactA) + sizeOf(exactB));
      expectWithin(times(a, b), exactProduct(exactA, exactB));
      expectWithin(over(a, b), (exactA << 1000n) / exactB);
    }
  });

  it("have roots of 30 digits, and those below zero the root zero", () => {
    for (const a of THIRDS.filter(({ high }) => high > 0)) {
      const root = exactValue(rootOf(a));
      expect(sizeOf(exactProduct(root, root) - exactValue(a))).toBeLessThanOrEqual(exactValue(a) >> 99n);
    }
    expect(rootOf(exactly(-1))).toEqual(exactly(0));
  });

  it("have an inner product from any index on", () => {
    const [a, b] = [[2, 3, 5].map(exactly), [7, 11, 13].map(exactly)];
    expect([0, 1, 2, 3].map((from) => rounded(inner(a, b, from)))).toEqual([112, 98, 65, 0]);
    expect(rounded(inner(a, b))).toBe(112);
  });
});
