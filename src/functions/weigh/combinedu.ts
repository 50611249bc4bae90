import { combinedUncertainty, Refusal } from "../../core";
import { block, gappedColumn, ifGiven } from "../arguments";
import { number } from "../kinds/numbers";
import { numberResult } from "../results";
import { whole } from "../whole";
import { withBlankRowsAsNothing } from "./gapped";

/**
 * Combined standard uncertainty of several contributions, with their correlations where there are any.
 * @customfunction COMBINEDU
 * @category Weigh
 * @param uncertainties Standard uncertainties, in a row or column. Rows that are wholly blank are passed over.
 * @param [sensitivities] Sensitivity coefficient of each; blank or left out: 1. A 0 is refused, it may be an empty cell.
 * @param [correlations] Correlation matrix, as many rows and columns as uncertainties; left out: independent.
 * @returns Combined standard uncertainty.
 * @equation u = √(Σi Σj ci·ui·rij·cj·uj)
 * @definition The correlation matrix is symmetric, has 1 on its diagonal and no coefficients that contradict each other (positive semi-definite).
 * @standard JCGM 100:2008, 5.1 and 5.2
 * @keywords root sum of squares, RSS, propagation, correlation, combine
 * @related BUDGET, EFFECTIVEDOF, STANDARDU, COVERAGE
 * @example =BEAD.COMBINEDU({5.8;3.9;6.7}) → 9.7
 * @example =BEAD.COMBINEDU({3,4},,{1,1;1,1}) → 7
 */
export function COMBINEDU(
  uncertainties: unknown[][],
  sensitivities?: unknown[][],
  correlations?: unknown[][],
): unknown[][] {
  return combinedu({ uncertainties, sensitivities, correlations });
}

const combinedu = whole(COMBINEDU, {
  arguments: {
    uncertainties: gappedColumn(number),
    sensitivities: ifGiven(gappedColumn(number)),
    correlations: ifGiven(block(number)),
  },
  result: numberResult,
  cells({ uncertainties, sensitivities, correlations }) {
    const given = withBlankRowsAsNothing(uncertainties, { sensitivities });
    if (given instanceof Refusal) return given;
    const combined = combinedUncertainty(given, sensitivities, correlations);
    return combined instanceof Refusal ? combined : [[combined]];
  },
});
