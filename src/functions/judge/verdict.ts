import { verdict as verdictOn } from "../../core";
import { each, ifGiven } from "../arguments";
import { cellwise } from "../cellwise";
import { number } from "../kinds/numbers";
import { wordResult } from "../results";
import { lower as lowerOption, ruleIfSaid } from "./options";

/**
 * Pass or Fail of an error against its limits, by a decision rule that says how the uncertainty counts.
 * @customfunction VERDICT
 * @category Judge
 * @param error Error (reading less true value), one cell or a range.
 * @param limit Upper limit, in the error's unit.
 * @param [expandedUncertainty] Expanded uncertainty U of the error, above 0.
 * @param [rule] simple (default without U), guarded (default with U), conditional; guarded 0.83 and the like for another multiple of U.
 * @param [lower] Lower limit; − limit when left out, none when there is only an upper one.
 * @returns Pass or Fail; by the rule conditional also Conditional pass or Conditional fail.
 * @definition simple: Pass within the limits. At the limit passes; both are rounded to 1E-9 before they are compared.
 * @definition guarded: Pass only within the limits less U. Fail then also covers what is not proven.
 * @definition conditional: Pass as guarded; Conditional pass within the limits; Conditional fail outside by no more than U; Fail beyond.
 * @standard ILAC-G8:09/2019; ISO 14253-1:2017 for 0.83
 * @keywords pass fail, conformity, decision rule, guard band, within tolerance
 * @related CHECKTABLE, STATEMENT, ACCEPTANCE, CONFORMITY, TOLERANCE
 * @caution A Pass says that this error lay within its limit when it was measured. It does not release a sensor for an alarm, a trip or another safety duty: that takes the plant's own procedure.
 * @example =BEAD.VERDICT({2.2;2.3},2.2) → {"Pass";"Fail"}
 * @example =BEAD.VERDICT(0.81,1,0.2) → "Fail"
 * @example =BEAD.VERDICT({0.8;1;1.2;1.21},1,0.2,"conditional") → {"Pass";"Conditional pass";"Conditional fail";"Fail"}
 */
export function VERDICT(
  error: unknown[][],
  limit: unknown[][],
  expandedUncertainty?: unknown[][],
  rule?: unknown[][],
  lower?: unknown[][],
): unknown[][] {
  return verdict({ error, limit, expandedUncertainty, rule, lower });
}

const verdict = cellwise(VERDICT, {
  arguments: {
    error: each(number),
    limit: each(number),
    expandedUncertainty: ifGiven(each(number)),
    rule: ruleIfSaid,
    lower: lowerOption,
  },
  result: wordResult,
  cell: ({ error, limit, expandedUncertainty, rule, lower }) =>
    verdictOn(error, limit, expandedUncertainty, rule, lower),
});
