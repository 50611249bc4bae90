/** The lower of two limits, which is often left out. */
import { noAnswer, type Refusal } from "../errors";
import { refusedUnlessPositive } from "../numeric/positive";

/** The lower limit as it is typed: a number, "none" where there is only an upper one, or left out for −upper. */
export type LowerLimit = number | "none" | undefined;

/** The lower limit as a number, −∞ for "none". */
export function lowerLimit(upper: number, lower: LowerLimit): number | Refusal {
  if (lower === "none") return Number.NEGATIVE_INFINITY;
  if (lower === undefined) {
    const refused = refusedUnlessPositive(upper, "limit");
    return refused === undefined ? -upper : refused.and`: give the lower limit as well, or "none"`;
  }
  return lower <= upper ? lower : noAnswer`lower limit ${lower} is above the upper limit ${upper}`;
}
