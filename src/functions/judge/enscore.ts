import { enScore } from "../../core";
import { each } from "../arguments";
import { cellwise } from "../cellwise";
import { number } from "../kinds/numbers";
import { numberResult } from "../results";

/**
 * The En number of a comparison between two laboratories, or of a laboratory with a reference value.
 * @customfunction ENSCORE
 * @category Judge
 * @param value The laboratory's value, one cell or a range.
 * @param expandedUncertainty Its expanded uncertainty U (k = 2), above 0.
 * @param referenceValue The reference value.
 * @param referenceUncertainty Expanded uncertainty U (k = 2) of the reference value, above 0.
 * @returns The En number: satisfactory from −1 to 1.
 * @equation En = (value − reference) / √(U² + Uref²)
 * @assumes Two values that are independent of each other.
 * @standard ISO/IEC 17043:2010, B.3.1.3
 * @keywords proficiency test, interlaboratory comparison, En ratio, normalized error
 * @related VERDICT, REPORTVALUE
 * @example =BEAD.ENSCORE(100.5,0.3,100.1,0.4) → 0.8
 */
export function ENSCORE(
  value: unknown[][],
  expandedUncertainty: unknown[][],
  referenceValue: unknown[][],
  referenceUncertainty: unknown[][],
): unknown[][] {
  return enscore({ value, expandedUncertainty, referenceValue, referenceUncertainty });
}

const enscore = cellwise(ENSCORE, {
  arguments: {
    value: each(number),
    expandedUncertainty: each(number),
    referenceValue: each(number),
    referenceUncertainty: each(number),
  },
  result: numberResult,
  cell: ({ value, expandedUncertainty, referenceValue, referenceUncertainty }) =>
    enScore(value, expandedUncertainty, referenceValue, referenceUncertainty),
});
