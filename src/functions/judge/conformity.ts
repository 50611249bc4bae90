import { conformityProbability } from "../../core";
import { each } from "../arguments";
import { cellwise } from "../cellwise";
import { number } from "../kinds/numbers";
import { shareResult } from "../results";
import { lower as lowerOption } from "./options";

/**
 * The probability that the true value lies within its limits, given a measured value and its standard uncertainty.
 * @customfunction CONFORMITY
 * @category Judge
 * @param value Measured value or error, one cell or a range.
 * @param upper Upper limit, in the value's unit.
 * @param standardUncertainty Standard uncertainty u (U/k) of the value, above 0.
 * @param [lower] Lower limit; − upper when left out, none when there is only an upper one.
 * @returns Probability from 0 to 1.
 * @equation p = Φ((upper − value)/u) − Φ((lower − value)/u)
 * @assumes A normal distribution, and no knowledge of the value other than this measurement.
 * @definition A lower limit alone: give value and limit with the opposite sign, and none.
 * @standard JCGM 106:2012, clause 7
 * @keywords probability of conformance, risk, false accept, tolerance
 * @related VERDICT, STATEMENT, ACCEPTANCE
 * @example =BEAD.CONFORMITY(13.6,16.3,1.8,12.5) → 0.66
 * @example =BEAD.CONFORMITY(-5.47,-5.40,0.05,"none") → 0.92
 */
export function CONFORMITY(
  value: unknown[][],
  upper: unknown[][],
  standardUncertainty: unknown[][],
  lower?: unknown[][],
): unknown[][] {
  return conformity({ value, upper, standardUncertainty, lower });
}

const conformity = cellwise(CONFORMITY, {
  arguments: {
    value: each(number),
    upper: each(number),
    standardUncertainty: each(number),
    lower: lowerOption,
  },
  result: shareResult,
  cell: ({ value, upper, standardUncertainty, lower }) =>
    conformityProbability(value, upper, standardUncertainty, lower),
});
