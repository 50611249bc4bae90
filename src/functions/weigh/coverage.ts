import { coverageFactor, INFINITE_DOF } from "../../core";
import { each } from "../arguments";
import { cellwise } from "../cellwise";
import { degreesOfFreedom as degreesOfFreedomKind } from "../kinds/degrees-of-freedom";
import { numberResult } from "../results";
import { probability as probabilityOption } from "./options";

/**
 * Coverage factor k, from Student's t distribution.
 * @customfunction COVERAGE
 * @category Weigh
 * @param degreesOfFreedom Effective degrees of freedom, one cell or a range; 1E+99: infinite.
 * @param [probability] Coverage probability between 0 and 1; 0.9545 when left out, which makes k = 2 for infinite degrees of freedom.
 * @returns Coverage factor k.
 * @equation k = t with P(−t ≤ T ≤ t) = probability
 * @definition A fractional count is truncated, after 1E-6 was added to it; below 1 there is no k. The default probability is erf(√2) exactly.
 * @standard JCGM 100:2008, G.3 and G.4.1
 * @keywords coverage factor, Student, t distribution, k factor, confidence
 * @related EFFECTIVEDOF, BUDGET, TYPEA
 * @example =BEAD.COVERAGE({1;10;50}) → {13.97;2.28;2.05}
 * @example =BEAD.COVERAGE(10,0.95) → 2.23
 * @example =BEAD.COVERAGE(1E99) → 2
 */
export function COVERAGE(degreesOfFreedom: unknown[][], probability?: unknown[][]): unknown[][] {
  return coverage({ degreesOfFreedom, probability });
}

const coverage = cellwise(COVERAGE, {
  arguments: { degreesOfFreedom: each(degreesOfFreedomKind), probability: probabilityOption },
  result: numberResult,
  // A probability that is none is a fault of the whole call.
  prepare: ({ probability }) => coverageFactor(INFINITE_DOF, probability),
  cell: ({ degreesOfFreedom, probability }) => coverageFactor(degreesOfFreedom, probability),
});
