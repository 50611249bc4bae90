/** NIST StRD, univariate sets whose readings follow a rule. */
import type { CertifiedSet } from "./strd-univariate";

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

/** As NIST publishes them: the 957th is 3, where π has 8. */
const publishedDigits = (): number[] => digitsOfPi(5000).with(956, 3);

/** x̄, then x̄ ± 0.1 in turn 500 times. */
const numAcc = (mean: number, low: number, high: number): number[] => [
  mean,
  ...Array.from({ length: 1000 }, (_, i) => (i % 2 === 0 ? low : high)),
];

export const setsByRule: readonly CertifiedSet[] = [
  { name: "PiDigits", mean: 4.5348, sd: 2.86733906028871, readings: publishedDigits() },
];

/** From memory, rule and values. */
export const setsFromMemory: readonly CertifiedSet[] = [
  { name: "NumAcc2", mean: 1.2, sd: 0.1, readings: numAcc(1.2, 1.1, 1.3) },
  // Doubles hold these readings to 1E-10 and 1E-9 only, which leaves 9 and 8 digits of 0.1.
  {
    name: "NumAcc3",
    mean: 1000000.2,
    sd: 0.1,
    digitsOfSd: 9,
    readings: numAcc(1000000.2, 1000000.1, 1000000.3),
  },
  {
    name: "NumAcc4",
    mean: 10000000.2,
    sd: 0.1,
    digitsOfSd: 8,
    readings: numAcc(10000000.2, 10000000.1, 10000000.3),
  },
];
