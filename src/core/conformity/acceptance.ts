/** The limit that is left for a Pass once the guard band is taken off. */
import { noAnswer, type Refusal } from "../errors";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import { refusedUnlessPositive } from "../numeric/positive";
import { type DecisionRule, guardedAcceptance } from "./decision-rule";

/**
 * Acceptance limit AL = TL − w, w = multiple × U, for a limit ±TL and its expanded
 * uncertainty, all in one unit (ILAC-G8:09/2019, clause 4.2). Refused: a limit or an
 * uncertainty that is not above 0, and a guard band wider than the limit.
 */
export function acceptanceLimit(
  limit: number,
  uncertainty: number,
  rule: DecisionRule = guardedAcceptance,
): number | Refusal {
  const refused =
    refusedUnlessPositive(limit, "limit") ?? refusedUnlessPositive(uncertainty, "expanded uncertainty");
  if (refused !== undefined) return refused;
  const band = rule.multiple * uncertainty;
  // Asked as a verdict asks it, so that whatever passes lies within a limit that is there.
  if (toNinthDecimal(limit - band) >= 0) return Math.max(0, limit - band);
  return rule.multiple === 1
    ? noAnswer`U exceeds the limit: ${uncertainty} is more than ${limit}`
    : noAnswer`guard band ${rule.multiple} × ${uncertainty} exceeds the limit ${limit}`;
}
