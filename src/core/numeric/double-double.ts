/**
 * Numbers carried as an unevaluated sum of two doubles, about 32 digits.
 *
 * T. J. Dekker, "A floating-point technique for extending the available precision",
 * Numer. Math. 18 (1971) 224–242; D. E. Knuth's sum of two doubles without error. For
 * work that is done once per call, not per reading: every operation allocates.
 */
export interface DoubleDouble {
  readonly high: number;
  readonly low: number;
}

/** Veltkamp's constant 2²⁷ + 1 splits a double into two halves of at most 26 bits. */
const SPLITTER = 134217729;

export const zero: DoubleDouble = { high: 0, low: 0 };
export const one: DoubleDouble = { high: 1, low: 0 };

export const exactly = (value: number): DoubleDouble => ({ high: value, low: 0 });

/** The high half is the sum rounded: everything below leaves it so. */
export const rounded = ({ high }: DoubleDouble): number => high;

/** a + b without error. */
export function sumOf(a: number, b: number): DoubleDouble {
  const high = a + b;
  const shadow = high - a;
  return { high, low: a - (high - shadow) + (b - shadow) };
}

/** The same where |a| ≥ |b|. */
function normalized(a: number, b: number): DoubleDouble {
  const high = a + b;
  return { high, low: b - (high - a) };
}

/** a · b without error. */
function productOf(a: number, b: number): DoubleDouble {
  const high = a * b;
  const scaledA = SPLITTER * a;
  const aHigh = scaledA - (scaledA - a);
  const aLow = a - aHigh;
  const scaledB = SPLITTER * b;
  const bHigh = scaledB - (scaledB - b);
  const bLow = b - bHigh;
  return { high, low: aLow * bLow - (high - aHigh * bHigh - aLow * bHigh - aHigh * bLow) };
}

export const negative = ({ high, low }: DoubleDouble): DoubleDouble => ({ high: -high, low: -low });

export function plus(a: DoubleDouble, b: DoubleDouble): DoubleDouble {
  const highs = sumOf(a.high, b.high);
  const lows = sumOf(a.low, b.low);
  const once = normalized(highs.high, highs.low + lows.high);
  return normalized(once.high, once.low + lows.low);
}

export const minus = (a: DoubleDouble, b: DoubleDouble): DoubleDouble => plus(a, negative(b));

export function times(a: DoubleDouble, b: DoubleDouble): DoubleDouble {
  const product = productOf(a.high, b.high);
  return normalized(product.high, product.low + (a.high * b.low + a.low * b.high));
}

/** Long division: each partial quotient takes up what the one before left over. */
export function over(a: DoubleDouble, b: DoubleDouble): DoubleDouble {
  const first = a.high / b.high;
  const rest = minus(a, times(b, exactly(first)));
  const second = rest.high / b.high;
  const third = minus(rest, times(b, exactly(second))).high / b.high;
  return plus(normalized(first, second), exactly(third));
}

/** One step of Newton's method from the root of the leading double; a ≥ 0. */
export function rootOf(a: DoubleDouble): DoubleDouble {
  if (!(a.high > 0)) return zero;
  const root = Math.sqrt(a.high);
  return plus(exactly(root), exactly(minus(a, productOf(root, root)).high / (2 * root)));
}

/** Σ aᵢ bᵢ from index `from` on. */
export function inner(a: readonly DoubleDouble[], b: readonly DoubleDouble[], from = 0): DoubleDouble {
  let sum = zero;
  for (let i = from; i < a.length; i++) sum = plus(sum, times(a[i] as DoubleDouble, b[i] as DoubleDouble));
  return sum;
}
