import { furnaceClass } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { temperatureDifference } from "../kinds/temperature";
import { numberResult } from "../results";

/**
 * Furnace class of SAE AMS2750 whose uniformity limit a deviation from the set point meets: the tightest of classes 1
 * to 6.
 * @customfunction SURVEYCLASS
 * @category Survey
 * @param deviation Deviation from the set point, of either sign, one cell or a range.
 * @param [unit] Unit of the deviation: C (default), F, K or R.
 * @returns Class 1 to 6; #N/A beyond class 6.
 * @definition Limits of classes 1 to 6: ± 3, 6, 8, 10, 14, 28 °C, or ± 5, 10, 15, 20, 25, 50 °F. Both rows are the standard's own, no conversions of each other; F and R take the °F row. At the limit passes.
 * @standard SAE AMS2750H, furnace classes (found in print in part, the rest from memory)
 * @caution A class is more than its uniformity limit: instrumentation, intervals and system accuracy tests belong to it. Read the edition that your customer names.
 * @keywords AMS2750, furnace class, uniformity, TUS, tolerance
 * @related SURVEY, SYSTEMCHECK
 * @example =BEAD.SURVEYCLASS(13,"F") → 3
 * @example =BEAD.SURVEYCLASS({-2.4;8.3}) → {1;4}
 */
export function SURVEYCLASS(deviation: unknown[][], unit?: unknown[][]): unknown[][] {
  return surveyclass({ deviation, unit });
}

const surveyclass = cellwise(SURVEYCLASS, {
  arguments: { deviation: each(temperatureDifference), unit: unitOption },
  result: numberResult,
  cell: ({ deviation, unit }) => furnaceClass(deviation, unit),
});
