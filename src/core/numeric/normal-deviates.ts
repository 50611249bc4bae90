/** Random numbers from the standard normal distribution. */

const TO_UNIT = 2 ** -52;

/**
 * Marsaglia's polar method (G. Marsaglia and T. A. Bray, A Convenient Method for
 * Generating Normal Variables, SIAM Review 6 (1964) 260–264), exact but for rounding.
 * `bits` gives 32 random bits a call; two calls make one uniform number of 53 bits.
 * Which points of the square are rejected is decided in exact arithmetic, so streams
 * cannot come apart between engines whose logarithms differ in the last bit.
 */
export function normalDeviates(bits: () => number): () => number {
  let spare = 0;
  let hasSpare = false;
  /** Uniform in −1 … 1. */
  const uniform = (): number => (bits() * 2097152 + (bits() >>> 11)) * TO_UNIT - 1;
  return () => {
    if (hasSpare) {
      hasSpare = false;
      return spare;
    }
    let x: number;
    let y: number;
    let square: number;
    do {
      x = uniform();
      y = uniform();
      square = x * x + y * y;
    } while (square >= 1 || square === 0);
    const scale = Math.sqrt((-2 * Math.log(square)) / square);
    spare = y * scale;
    hasSpare = true;
    return x * scale;
  };
}
