/** Statements of conformity by the decision rules of ILAC-G8:09/2019. */
import { noAnswer, type Refusal } from "../errors";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import { refusedUnlessPositive } from "../numeric/positive";
import { type DecisionRule, guardedAcceptance, simpleAcceptance } from "./decision-rule";
import { type LowerLimit, lowerLimit } from "./limits";

export type Verdict = "Pass" | "Conditional pass" | "Conditional fail" | "Fail";

/** Whether a value lies in limits moved inwards by `band`; all three rounded to 1E-9 first, so that a value at the limit is inside. */
const inside = (value: number, lower: number, upper: number, band: number): boolean =>
  value <= toNinthDecimal(upper - band) && value >= toNinthDecimal(lower + band);

/**
 * Verdict on an error against its upper and lower limit, all in one unit. Without an
 * uncertainty the rule is simple, with one guarded with w = U, unless `rule` says otherwise.
 * A Fail under the guarded rule also covers what is not proven; where the guard band leaves
 * nothing, nothing passes. Refused: limits in the wrong order, a limit of 0 or below without
 * a lower one, an uncertainty that is not above 0, a guarded rule without an uncertainty.
 */
export function verdict(
  error: number,
  upper: number,
  uncertainty?: number,
  rule: DecisionRule = uncertainty === undefined ? simpleAcceptance : guardedAcceptance,
  lower?: LowerLimit,
): Verdict | Refusal {
  const bottom = lowerLimit(upper, lower);
  if (typeof bottom !== "number") return bottom;
  const refused =
    uncertainty === undefined ? undefined : refusedUnlessPositive(uncertainty, "expanded uncertainty");
  if (refused !== undefined) return refused;
  if (rule.kind !== "simple" && uncertainty === undefined) {
    return noAnswer`rule ${rule.kind} needs the expanded uncertainty`;
  }
  const band = rule.multiple * (uncertainty ?? 0);
  const rounded = toNinthDecimal(error);
  if (inside(rounded, bottom, upper, band)) return "Pass";
  if (rule.kind !== "conditional") return "Fail";
  if (inside(rounded, bottom, upper, 0)) return "Conditional pass";
  return inside(rounded, bottom, upper, -band) ? "Conditional fail" : "Fail";
}
