/** Whether a simulation bears out the first-order result, JCGM 101:2008, clause 8. */
import { noAnswer, type Refusal } from "../errors";
import { COVERAGE_PROBABILITY, ranks } from "./coverage-interval";

/** Coverage factor of the first-order 95 % interval. */
const K = 1.96;

/** How many standard deviations of an end's rank its scatter is allowed. */
const SCATTER = 4;

/** δ = ½·10ˡ for u = c·10ˡ with c of one digit (clause 7.9.2). */
const numericalTolerance = (u: number): number => {
  const [, exponent] = u.toExponential(0).split("e");
  return 0.5 * 10 ** Number(exponent);
};

/**
 * "yes" where both ends of y ± 1.96·u lie within δ of the ends of the simulated interval, "no"
 * where one does not. The rank of either end in the sorted trials scatters with standard
 * deviation √(M·α·(1 − α)), α = 2.5 %, whatever the distribution; refused where moving an end by
 * four of these would change the answer.
 */
export function validation(sorted: Float64Array, y: number, u: number): "yes" | "no" | Refusal {
  const trials = sorted.length;
  const { span, first } = ranks(trials);
  const alpha = (1 - COVERAGE_PROBABILITY) / 2;
  const scatter = Math.ceil(SCATTER * Math.sqrt(trials * alpha * (1 - alpha)));
  const tolerance = numericalTolerance(u);
  const low = distances(sorted, first, scatter, y - K * u);
  const high = distances(sorted, first + span, scatter, y + K * u);
  if (low.largest <= tolerance && high.largest <= tolerance) return "yes";
  if (low.least > tolerance || high.least > tolerance) return "no";
  return noAnswer`${String(trials)} trials are too few to tell whether the first-order result holds`;
}

/** Least and largest distance of `end` from the trials within `scatter` ranks of `rank`. */
function distances(
  sorted: Float64Array,
  rank: number,
  scatter: number,
  end: number,
): { readonly least: number; readonly largest: number } {
  const from = sorted[rank - scatter] ?? Number.NEGATIVE_INFINITY;
  const to = sorted[rank + scatter] ?? Number.POSITIVE_INFINITY;
  return { least: Math.max(0, from - end, end - to), largest: Math.max(end - from, to - end) };
}
