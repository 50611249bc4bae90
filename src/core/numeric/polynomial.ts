/** Polynomials in ascending powers, evaluated by Horner's scheme. */

/** Σ cᵢ xⁱ. */
export function polynomial(coefficients: ArrayLike<number>, x: number): number {
  let sum = 0;
  for (let i = coefficients.length - 1; i >= 0; i--) sum = sum * x + (coefficients[i] as number);
  return sum;
}

/** Coefficients of the derivative. */
export function derivative(coefficients: readonly number[]): number[] {
  return coefficients.slice(1).map((coefficient, index) => coefficient * (index + 1));
}

/** Veltkamp's constant 2²⁷ + 1 splits a double into two halves of at most 26 bits. */
const SPLITTER = 134217729;

/**
 * Σ cᵢ xⁱ as if computed in twice the working precision and rounded once.
 *
 * Compensated Horner scheme: S. Graillat, P. Langlois, N. Louvet, "Algorithms for
 * accurate, validated and fast polynomial evaluation", Japan J. Indust. Appl. Math.
 * 26 (2009), algorithm CompHorner. Products are split by Dekker's and sums by
 * Knuth's error-free transformation, since JavaScript has no fused multiply-add.
 */
export function compensatedPolynomial(coefficients: ArrayLike<number>, x: number): number {
  const scaledX = SPLITTER * x;
  const xHigh = scaledX - (scaledX - x);
  const xLow = x - xHigh;
  let sum = 0;
  let correction = 0;
  for (let i = coefficients.length - 1; i >= 0; i--) {
    const product = sum * x;
    const scaledSum = SPLITTER * sum;
    const sumHigh = scaledSum - (scaledSum - sum);
    const sumLow = sum - sumHigh;
    const productError = sumLow * xLow - (product - sumHigh * xHigh - sumLow * xHigh - sumHigh * xLow);
    const coefficient = coefficients[i] as number;
    const next = product + coefficient;
    const shadow = next - product;
    const sumError = product - (next - shadow) + (coefficient - shadow);
    correction = correction * x + (productError + sumError);
    sum = next;
  }
  return sum + correction;
}

/** Unit roundoff of a double, 2⁻⁵³. */
const ROUNDOFF = 2 ** -53;

/**
 * An upper bound of the rounding error of `polynomial(coefficients, x)`:
 * 2n·u·Σ|cᵢ||x|ⁱ (N. J. Higham, Accuracy and Stability of Numerical Algorithms,
 * 2nd ed., section 5.1).
 */
export function roundingBound(coefficients: readonly number[], x: number): number {
  return 2 * coefficients.length * ROUNDOFF * polynomial(coefficients.map(Math.abs), Math.abs(x));
}
