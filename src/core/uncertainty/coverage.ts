/** Coverage factors from Student's t distribution. */
import { noAnswer, type Refusal } from "../errors";
import { normalTwoSided } from "../numeric/normal";
import { studentTwoSided } from "../numeric/student";
import { INFINITE_DOF } from "./effective-dof";

/** erf(√2): the probability within ±2 standard deviations of a normal distribution. */
export const TWO_SIGMA = 0.9544997361036416;

/** Added before a fractional count is truncated: 9.9999999 is 10 (JCGM 100:2008, G.4.1, truncates). */
const NEARLY_WHOLE = 1e-6;

/**
 * Coverage factor k = t_p(ν): the interval ±k·u holds the coverage probability p (JCGM
 * 100:2008, G.3). Degrees of freedom from 1E+99 up are infinite; k is then 2 exactly for the
 * default probability. Refused: degrees of freedom that truncate to less than 1, a probability
 * that is not between 0 and 1.
 */
export function coverageFactor(dof: number, probability = TWO_SIGMA): number | Refusal {
  if (!(probability > 0 && probability < 1)) {
    return noAnswer`probability ${probability} is not between 0 and 1 (95 % is 0.95)`;
  }
  const whole = Math.floor(dof + NEARLY_WHOLE);
  if (!(whole >= 1)) {
    return dof === 0
      ? noAnswer`degrees of freedom is 0 or an empty cell`
      : noAnswer`degrees of freedom ${dof} is below 1`;
  }
  if (dof < INFINITE_DOF) return studentTwoSided(probability, whole);
  return probability === TWO_SIGMA ? 2 : normalTwoSided(probability);
}
