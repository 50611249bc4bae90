/**
 * Values from print beside ours, under their source. The tests and the evidence page read the same rows and judge them
 * by the same function, so that neither can be kinder than the other.
 */
import { Refusal } from "../../src/core";

/**
 * "memory" also marks a source whose rows were written down partly from print and partly from memory, not told apart;
 * "computed" a value from another program or another algorithm, for what no print gives to enough digits.
 */
export type Origin = "print" | "memory" | "computed";

export interface PublishedValue {
  /** The quantity, and what it holds for. */
  readonly what: string;
  /** Empty for a pure number and for words. */
  readonly unit: string;
  readonly published: number | string;
  /** Digits printed after the decimal mark; left out where a number is given to many significant digits. */
  readonly decimals?: number;
  /** How far ours may lie from it, where that is not half a unit of the last printed digit. */
  readonly tolerance?: number;
  /** The print states a bound, up to which ours may be anything. */
  readonly atMost?: true;
  readonly ours: () => unknown;
}

export interface PublishedSet {
  readonly source: string;
  readonly origin: Origin;
  /** What is compared and, where the rows do not say it themselves, what counts as agreement. */
  readonly compared: string;
  readonly values: readonly PublishedValue[];
}

/** A value and what became of it, in the words of the page. */
export interface Judged {
  readonly what: string;
  readonly unit: string;
  readonly published: string;
  readonly ours: string;
  readonly difference: string;
  /** The largest difference that still counts as agreement. */
  readonly allowed: string;
  readonly holds: boolean;
}

/** Digits that change with the last bit of an exponential are noise: two of a difference are enough. */
export const short = (value: number): string =>
  value === 0 ? "0" : value.toExponential(1).replace("e", "E").replace("E+", "E");

/** The same two digits without an exponent where that is easily read: 0.5, 0.00042, 1.0E-9. */
const twoDigits = (value: number): string =>
  value === 0 || Math.abs(value) >= 1e-5 ? String(Number(value.toPrecision(2))) : short(value);

const tidy = (value: number): string => String(value).replace("e", "E").replace("E+", "E");

/** Ours in enough digits to see whether it agrees, and no more: the last bits may differ from machine to machine. */
interface Shown {
  readonly published: string;
  readonly ours: string;
  readonly difference: number;
}

/** To three digits beyond those printed. */
function shownInDecimals(published: number, value: number, decimals: number): Shown {
  const places = Math.min(decimals + 3, 20);
  return {
    published: published.toFixed(decimals),
    ours: decimals === 0 && Number.isInteger(value) ? String(value) : value.toFixed(places),
    difference: Number((value - published).toFixed(places)),
  };
}

/** To a hundredth of what is allowed. */
function shownInDigits(published: number, value: number, allowed: number): Shown {
  const power = (of: number): number => Math.floor(Math.log10(Math.abs(of)));
  const digits = Math.min(Math.max(power(published) - power(allowed) + 3, 1), 15);
  const difference = value - published;
  return {
    published: tidy(published),
    ours: tidy(Number(value.toPrecision(digits))),
    difference: Math.abs(difference) < allowed / 100 ? 0 : difference,
  };
}

export function judged({ what, unit, published, decimals, tolerance, atMost, ours }: PublishedValue): Judged {
  const found = ours();
  const refusal = found instanceof Refusal ? found.message() : undefined;
  if (typeof published === "string") {
    const holds = found === published;
    const difference = holds ? "none" : "another";
    return { what, unit, published, ours: refusal ?? String(found), difference, allowed: "none", holds };
  }
  const value = typeof found === "number" ? found : Number.NaN;
  // Half a unit of the last printed digit, and the rounding of a sum that ends in 5.
  const allowed = tolerance ?? 0.5 * 10 ** -(decimals ?? Number.NaN) + 1e-9;
  const difference = value - published;
  const shown =
    decimals === undefined
      ? shownInDigits(published, value, allowed)
      : shownInDecimals(published, value, decimals);
  return {
    what,
    unit,
    published: `${atMost ? "at most " : ""}${shown.published}`,
    ours: refusal ?? shown.ours,
    difference: twoDigits(shown.difference),
    allowed: twoDigits(allowed),
    // What is no number is within no tolerance.
    holds: atMost ? difference <= allowed : Math.abs(difference) <= allowed,
  };
}
