import { Refusal, statement as statementOn } from "../../core";
import { once, orElse, unit as unitOption } from "../arguments";
import { number } from "../kinds/numbers";
import { temperatureDifference } from "../kinds/temperature";
import { wordResult } from "../results";
import { whole } from "../whole";
import { guardedUnlessSaid } from "./options";

/**
 * The sentences for a certificate that state a verdict: what was found, by which decision rule and guard band, and
 * the largest specific risk of a wrong Pass.
 * @customfunction STATEMENT
 * @category Judge
 * @param error Error (reading less true temperature), one cell.
 * @param limit The limit ±, above 0.
 * @param expandedUncertainty Expanded uncertainty U of the error, above 0.
 * @param [rule] guarded (default), simple, conditional; guarded 0.83 and the like for another multiple of U.
 * @param [k] Coverage factor of U; 2 when left out.
 * @param [unit] Unit of error, limit and uncertainty: C (default), F, K or R.
 * @returns One text of three sentences.
 * @definition Specific risk: probability that a value which passes at the very acceptance limit lies outside its limits.
 * @assumes A normal distribution, and no knowledge of the value other than this measurement.
 * @standard ISO/IEC 17025:2017, 7.8.6; ILAC-G8:09/2019; JCGM 106:2012
 * @keywords certificate, statement of conformity, decision rule, risk, guard band
 * @related VERDICT, ACCEPTANCE, CONFORMITY, REPORTVALUE
 * @caution Agree on the decision rule with the customer before the work. A stated Pass does not release a sensor for an alarm, a trip or another safety duty.
 * @example =BEAD.STATEMENT(1.2,2.5,0.5) → "Pass: the error of 1.2 °C lies within the acceptance limit of ±2 °C, the limit of ±2.5 °C less the guard band. Decision rule: acceptance with a guard band (ILAC-G8:09/2019, 4.2.2), guard band 0.5 °C = U, k = 2. Largest specific risk of a wrong Pass by this rule: at most 2.3 %."
 */
export function STATEMENT(
  error: unknown[][],
  limit: unknown[][],
  expandedUncertainty: unknown[][],
  rule?: unknown[][],
  k?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return statement({ error, limit, expandedUncertainty, rule, k, unit });
}

const statement = whole(STATEMENT, {
  arguments: {
    error: once(temperatureDifference),
    limit: once(temperatureDifference),
    expandedUncertainty: once(temperatureDifference),
    rule: guardedUnlessSaid,
    k: orElse(once(number), 2, "2"),
    unit: unitOption,
  },
  result: wordResult,
  cells({ error, limit, expandedUncertainty, rule, k, unit }) {
    const stated = statementOn(error, limit, expandedUncertainty, rule, k);
    return stated instanceof Refusal ? stated : [[stated.sentence(unit)]];
  },
});
