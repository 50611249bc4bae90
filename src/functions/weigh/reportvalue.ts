import { reportValue } from "../../core";
import { each, once, orElse } from "../arguments";
import { cellwise } from "../cellwise";
import { number } from "../kinds/numbers";
import { wordResult } from "../results";

/**
 * The text of a result for a certificate: value and expanded uncertainty rounded together.
 * @customfunction REPORTVALUE
 * @category Weigh
 * @param value The value, one cell or a range.
 * @param expandedUncertainty Its expanded uncertainty U, above 0.
 * @param [digits] Significant digits of U, 1 to 4; 2 when left out.
 * @returns A text such as 1000.5 ± 1.3.
 * @definition U is rounded up where rounding down would lose more than 5 % of it. The value is rounded to the same decimal place, halves away from zero.
 * @standard JCGM 100:2008, 7.2.6; EA-4/02 M:2013, 6.3
 * @keywords round, significant digits, certificate, plus minus, report
 * @related BUDGET, STATEMENT
 * @example =BEAD.REPORTVALUE(1000.5,1.2818) → "1000.5 ± 1.3"
 * @example =BEAD.REPORTVALUE(36228.77,49.93) → "36229 ± 50"
 */
export function REPORTVALUE(
  value: unknown[][],
  expandedUncertainty: unknown[][],
  digits?: unknown[][],
): unknown[][] {
  return reportvalue({ value, expandedUncertainty, digits });
}

const reportvalue = cellwise(REPORTVALUE, {
  arguments: {
    value: each(number),
    expandedUncertainty: each(number),
    digits: orElse(once(number), 2, "2"),
  },
  result: wordResult,
  // Digits that are none are a fault of the whole call.
  prepare: ({ digits }) => reportValue(1, 1, digits),
  cell: ({ value, expandedUncertainty, digits }) => reportValue(value, expandedUncertainty, digits),
});
