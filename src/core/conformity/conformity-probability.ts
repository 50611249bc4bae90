/** Probability of conformity and specific risk, JCGM 106:2012, normal distribution. */
import { noAnswer, type Refusal } from "../errors";
import { finite } from "../numeric/finite";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import { normalAbove, normalBetween } from "../numeric/normal";
import { refusedUnlessPositive } from "../numeric/positive";
import type { DecisionRule } from "./decision-rule";
import { type LowerLimit, lowerLimit } from "./limits";

/**
 * Φ((upper − v)/u) − Φ((lower − v)/u): the probability that the true value lies within its
 * limits, from 0 to 1 (JCGM 106:2012, clause 7). Value, limits and standard uncertainty in
 * one unit. Refused: as for a verdict.
 */
export function conformityProbability(
  value: number,
  upper: number,
  standardUncertainty: number,
  lower?: LowerLimit,
): number | Refusal {
  const bottom = lowerLimit(upper, lower);
  if (typeof bottom !== "number") return bottom;
  const refused = refusedUnlessPositive(standardUncertainty, "standard uncertainty");
  if (refused !== undefined) return refused;
  return normalBetween((bottom - value) / standardUncertainty, (upper - value) / standardUncertainty);
}

/**
 * Largest specific risk of a wrong Pass: the probability that a value which passes at the
 * very acceptance limit lies outside its tolerance (either side of it). Refused: a guard
 * band that leaves nothing to pass; k or U not above 0.
 */
export function largestPassRisk(
  upper: number,
  expandedUncertainty: number,
  rule: DecisionRule,
  k: number,
  lower?: LowerLimit,
): number | Refusal {
  const bottom = lowerLimit(upper, lower);
  if (typeof bottom !== "number") return bottom;
  const refused =
    refusedUnlessPositive(expandedUncertainty, "expanded uncertainty") ??
    refusedUnlessPositive(k, "coverage factor");
  if (refused !== undefined) return refused;
  const band = finite(rule.multiple * expandedUncertainty, "guard band");
  if (typeof band !== "number") return band;
  if (toNinthDecimal(bottom + band) > toNinthDecimal(upper - band)) {
    return noAnswer`the guard band leaves nothing to pass`;
  }
  // In units of u = U/k: the band is r·k wide, and the rest of the tolerance lies beyond the other limit.
  const toOtherLimit = ((upper - bottom - band) / expandedUncertainty) * k;
  return normalAbove(rule.multiple * k) + normalAbove(toOtherLimit);
}
