import { acceptanceLimit } from "../../core";
import { each } from "../arguments";
import { cellwise } from "../cellwise";
import { number } from "../kinds/numbers";
import { numberResult } from "../results";
import { guardedUnlessSaid } from "./options";

/**
 * The limit that is left for a Pass once the guard band is taken off.
 * @customfunction ACCEPTANCE
 * @category Judge
 * @param limit The limit ±, one cell or a range, above 0.
 * @param expandedUncertainty Expanded uncertainty U in the limit's unit, above 0.
 * @param [rule] guarded (default): less U; guarded 0.83 and the like: less another multiple of U; conditional: as guarded; simple: nothing off.
 * @returns The acceptance limit ±, in the limit's unit. Where the guard band is wider than the limit there is none.
 * @equation acceptance limit = limit − r·U, r = 1 for guarded
 * @standard ILAC-G8:09/2019, 4.2; ISO 14253-1:2017 for 0.83
 * @keywords guard band, decision rule, test limit, acceptance limit
 * @related VERDICT, STATEMENT, CONFORMITY
 * @example =BEAD.ACCEPTANCE(1,0.2) → 0.8
 * @example =BEAD.ACCEPTANCE({1;0.5},{0.2;0.1},"guarded 0.83") → {0.834;0.417}
 */
export function ACCEPTANCE(
  limit: unknown[][],
  expandedUncertainty: unknown[][],
  rule?: unknown[][],
): unknown[][] {
  return acceptance({ limit, expandedUncertainty, rule });
}

const acceptance = cellwise(ACCEPTANCE, {
  arguments: { limit: each(number), expandedUncertainty: each(number), rule: guardedUnlessSaid },
  result: numberResult,
  cell: ({ limit, expandedUncertainty, rule }) => acceptanceLimit(limit, expandedUncertainty, rule),
});
