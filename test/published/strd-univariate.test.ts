import { describe, expect, it } from "vitest";
import { type TypeA, typeA } from "../../src/core/uncertainty";
import { univariateSets } from "./strd-univariate";

/** Correct significant digits, as NIST counts them. */
const digits = (value: number, certified: number): number =>
  value === certified ? 15 : -Math.log10(Math.abs(value - certified) / Math.abs(certified));

/** Digits of π by Machin's formula, π = 16·atan(1/5) − 4·atan(1/239), in whole numbers. */
function digitsOfPi(count: number): number[] {
  const scale = 10n ** BigInt(count + 10);
  const arctangent = (x: bigint): bigint => {
    let term = scale / x;
    let sum = term;
    for (let n = 3n; term !== 0n; n += 2n) {
      term = -term / (x * x);
      sum += term / n;
    }
    return sum;
  };
  const pi = 16n * arctangent(5n) - 4n * arctangent(239n);
  return [...String(pi)].slice(0, count).map(Number);
}

/** NumAcc2 to NumAcc4, whose readings follow a rule (from memory): x̄, then x̄ ± 0.1 in turn 500 times. */
const numAcc = (mean: number, low: number, high: number): number[] => [
  mean,
  ...Array.from({ length: 1000 }, (_, i) => (i % 2 === 0 ? low : high)),
];

describe("NIST StRD, univariate summary statistics", () => {
  it.each(univariateSets)("$name: mean and standard deviation to 13 digits", ({ mean, sd, readings }) => {
    const found = typeA(readings) as TypeA;
    expect(digits(found.mean as number, mean)).toBeGreaterThan(13);
    expect(digits(found.sd as number, sd)).toBeGreaterThan(13);
    expect(found.u).toBeCloseTo(sd / Math.sqrt(readings.length), 12);
    expect(found.dof).toBe(readings.length - 1);
  });

  it("PiDigits: the first 5000 digits of π, the 957th as published, 3 instead of 8", () => {
    const readings = digitsOfPi(5000);
    readings[956] = 3;
    const found = typeA(readings) as TypeA;
    expect(digits(found.mean as number, 4.5348)).toBeGreaterThan(14);
    expect(digits(found.sd as number, 2.86733906028871)).toBeGreaterThan(13);
  });

  it.each([
    ["NumAcc2", 1.2, 1.1, 1.3, 13],
    ["NumAcc3", 1000000.2, 1000000.1, 1000000.3, 9],
    // Doubles hold these readings to 1E-9 only, which leaves 8 digits of 0.1.
    ["NumAcc4", 10000000.2, 10000000.1, 10000000.3, 8],
  ])("%s (from memory): mean %d, standard deviation 0.1", (_, mean, low, high, least) => {
    const found = typeA(numAcc(mean, low, high)) as TypeA;
    expect(digits(found.mean as number, mean)).toBeGreaterThan(13);
    expect(digits(found.sd as number, 0.1)).toBeGreaterThan(least);
  });
});
