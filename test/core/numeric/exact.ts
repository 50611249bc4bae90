/** Doubles as whole numbers of 2⁻¹⁰⁰⁰, so that a test can say what a result ought to be to the last bit. */
const PLACES = 1000n;

/** x · 2¹⁰⁰⁰, without rounding; |x| is 0 or above 2⁻⁹⁰⁰. */
export function exact(x: number): bigint {
  let shift = PLACES;
  let whole = x;
  while (!Number.isInteger(whole)) {
    whole *= 2;
    shift--;
  }
  return BigInt(whole) << shift;
}

export const sizeOf = (x: bigint): bigint => (x < 0n ? -x : x);

/** a · b of two such numbers, the last place cut off. */
export const exactProduct = (a: bigint, b: bigint): bigint => (a * b) >> PLACES;
