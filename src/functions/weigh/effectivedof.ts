import { effectiveDof, Refusal } from "../../core";
import { gappedColumn, ifGiven } from "../arguments";
import { degreesOfFreedom } from "../kinds/degrees-of-freedom";
import { number } from "../kinds/numbers";
import { numberResult } from "../results";
import { whole } from "../whole";
import { withBlankRowsAsNothing } from "./gapped";

/**
 * Effective degrees of freedom of a combined uncertainty, by the formula of Welch and Satterthwaite.
 * @customfunction EFFECTIVEDOF
 * @category Weigh
 * @param uncertainties Standard uncertainties, in a row or column. Rows that are wholly blank are passed over.
 * @param degreesOfFreedom Degrees of freedom of each; blank or 1E+99: infinite. A 0 is refused, it may be an empty cell.
 * @param [sensitivities] Sensitivity coefficient of each; blank or left out: 1.
 * @returns Effective degrees of freedom; 1E+99 where they are infinite.
 * @equation ν = u⁴ / Σ((ci·ui)⁴/νi)
 * @assumes Contributions that are independent of each other.
 * @standard JCGM 100:2008, G.4.1
 * @keywords Welch-Satterthwaite, degrees of freedom, effective
 * @related COVERAGE, COMBINEDU, BUDGET
 * @example =BEAD.EFFECTIVEDOF({3;4},{9;1E99}) → 69.4
 */
export function EFFECTIVEDOF(
  uncertainties: unknown[][],
  degreesOfFreedom: unknown[][],
  sensitivities?: unknown[][],
): unknown[][] {
  return effectivedof({ uncertainties, degreesOfFreedom, sensitivities });
}

const effectivedof = whole(EFFECTIVEDOF, {
  arguments: {
    uncertainties: gappedColumn(number),
    degreesOfFreedom: gappedColumn(degreesOfFreedom),
    sensitivities: ifGiven(gappedColumn(number)),
  },
  result: numberResult,
  cells({ uncertainties, degreesOfFreedom, sensitivities }) {
    const given = withBlankRowsAsNothing(uncertainties, {
      "degrees of freedom": degreesOfFreedom,
      sensitivities,
    });
    if (given instanceof Refusal) return given;
    const dof = effectiveDof(given, degreesOfFreedom, sensitivities);
    return dof instanceof Refusal ? dof : [[dof]];
  },
});
