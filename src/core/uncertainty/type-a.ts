/** Type A evaluation: repeated readings of one quantity. */
import { noAnswer, type Refusal } from "../errors";
import { compensatedSum } from "../numeric/compensated-sum";
import { finite } from "../numeric/finite";
import { rootSumSquare } from "../numeric/root-sum-square";

export interface TypeA {
  readonly mean: number | Refusal;
  /** Of a single reading. */
  readonly sd: number | Refusal;
  /** Standard uncertainty of the mean, sd/√n. */
  readonly u: number | Refusal;
  /** n − 1 */
  readonly dof: number;
}

/**
 * Mean, experimental standard deviation and standard uncertainty of the mean (JCGM 100:2008,
 * 4.2), in the readings' own unit. In two passes, the second about the mean of the first and
 * corrected by what that mean missed (T. F. Chan, G. H. Golub, R. J. LeVeque, Algorithms for
 * Computing the Sample Variance, Am. Stat. 37 (1983) 242–247), so that readings that differ in
 * their last digits only keep them. Refused: no readings; of one reading the deviation alone.
 */
export function typeA(readings: ArrayLike<number>): TypeA | Refusal {
  const count = readings.length;
  if (count === 0) return noAnswer`no readings`;
  const first = compensatedSum(readings) / count;
  const missed = compensatedSum(readings, first) / count;
  const mean = finite(first + missed, "mean");
  if (count === 1) {
    const single = noAnswer`one reading has no standard deviation`;
    return { mean, sd: single, u: single, dof: 0 };
  }
  const deviations = new Float64Array(count);
  for (let i = 0; i < count; i++) deviations[i] = (readings[i] as number) - first - missed;
  const sd = rootSumSquare(deviations) / Math.sqrt(count - 1);
  return {
    mean,
    sd: finite(sd, "standard deviation"),
    u: finite(sd / Math.sqrt(count), "standard uncertainty"),
    dof: count - 1,
  };
}
