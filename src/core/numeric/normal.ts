/**
 * The standard normal distribution, to about 1E-14 of whichever tail is asked for.
 *
 * Up to `SERIES_TO` the series Φ(z) − ½ = φ(z)·(z + z³/3 + z⁵/(3·5) + …)
 * (G. Marsaglia, Evaluating the Normal Distribution, J. Stat. Software 11 (2004) 4),
 * beyond it the continued fraction of Mills' ratio
 * (1 − Φ(z))/φ(z) = 1/(z + 1/(z + 2/(z + 3/(z + …)))), Abramowitz & Stegun 26.2.14.
 */
import { type SymmetricDistribution, twoSidedQuantile } from "./two-sided-quantile";

const SERIES_TO = 2.5;

/** At z = 2.5 the fraction has converged to a double after so many levels, further out sooner. */
const LEVELS = 70;

const ROOT_TWO_PI = Math.sqrt(2 * Math.PI);

const density = (z: number): number => Math.exp(-0.5 * z * z) / ROOT_TWO_PI;

/** Φ(z) − ½ for z ≥ 0 up to `SERIES_TO`. */
function halfCentral(z: number): number {
  const square = z * z;
  let term = z;
  let sum = z;
  for (let odd = 3; term > sum * 1e-17; odd += 2) {
    term *= square / odd;
    sum += term;
  }
  return sum * density(z);
}

/** 1 − Φ(z) for z above `SERIES_TO`. */
function farTail(z: number): number {
  let fraction = z;
  for (let level = LEVELS; level > 0; level--) fraction = z + level / fraction;
  return density(z) / fraction;
}

/** P(Z > z). */
export function normalAbove(z: number): number {
  if (z < 0) return 1 - normalAbove(-z);
  return z > SERIES_TO ? farTail(z) : 0.5 - halfCentral(z);
}

/** Φ(z) = P(Z ≤ z). */
export const normalBelow = (z: number): number => normalAbove(-z);

/** P(from < Z ≤ to) for from ≤ to; taken in the tail where both lie on one side, so that nothing cancels. */
export function normalBetween(from: number, to: number): number {
  if (from > 0) return normalAbove(from) - normalAbove(to);
  if (to < 0) return normalAbove(-to) - normalAbove(-from);
  return 1 - (normalAbove(-from) + normalAbove(to));
}

const normal: SymmetricDistribution = {
  // Asked where it is the smaller of the two, far below `SERIES_TO`.
  central: (z) => 2 * halfCentral(z),
  outside: (z) => 2 * normalAbove(z),
  density,
};

/** The z > 0 with P(|Z| ≤ z) = `inside`, which is above 0 and below 1. */
export function normalTwoSided(inside: number): number {
  // P(|Z| > z) ≤ exp(−z²/2) and P(|Z| ≤ z) ≤ 2z·φ(0): starts from which Newton's steps cannot overshoot.
  const start = inside > 0.5 ? Math.sqrt(-2 * Math.log(1 - inside)) : inside * (ROOT_TWO_PI / 2);
  return twoSidedQuantile(normal, inside, start);
}
