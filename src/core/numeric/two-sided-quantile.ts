/**
 * The x > 0 with P(|X| ≤ x) = p, for a distribution symmetric about zero whose
 * central and outside probabilities are known.
 *
 * Newton's method on the logarithm of the smaller of the two against the logarithm
 * of x. Both curves are concave, so from any start the steps come down on the root
 * from one side and cannot leave it; and the smaller probability keeps its relative
 * accuracy however close p is to 0 or 1.
 */
export interface SymmetricDistribution {
  /** P(|X| ≤ x), asked only on the way to a probability of ½ or less. */
  central(x: number): number;
  /** P(|X| > x) */
  outside(x: number): number;
  density(x: number): number;
}

/** So near to zero the density is that at zero. */
const FLAT = 1e-30;

const MOST_STEPS = 100;

/** A step below this changes nothing that counts: the next one would be its square. */
const CONVERGED = 1e-9;

/** `inside` = P(|X| ≤ x), above 0 and below 1; `start` any positive guess, above ½ not far below the root. */
export function twoSidedQuantile(distribution: SymmetricDistribution, inside: number, start: number): number {
  if (inside < FLAT) return inside / (2 * distribution.density(0));
  const fromOutside = inside > 0.5;
  const wanted = fromOutside ? 1 - inside : inside;
  let x = start;
  for (let i = 0; i < MOST_STEPS; i++) {
    const reached = fromOutside ? distribution.outside(x) : distribution.central(x);
    const slope = (2 * distribution.density(x) * x) / reached;
    const distance = (Math.log(reached) - Math.log(wanted)) / slope;
    const step = fromOutside ? distance : -distance;
    x *= Math.exp(step);
    if (Math.abs(step) < CONVERGED) break;
  }
  return x;
}
