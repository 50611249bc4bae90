/** The tightest tolerance class that a set of points meets. */
import { noAnswer, type Refusal, wrongKind } from "../errors";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import { inWords } from "../thermoelectric/designation";
import { toleranceClassesOf } from "./tolerance";
import type { ToleranceClass } from "./tolerance-class";
import type { ToleranceClassName } from "./tolerance-table";

export const classStandards = ["IEC", "ASTM"] as const;
export type ClassStandard = (typeof classStandards)[number];

/**
 * The name of the class, among those of the standard for this sensor, that covers every
 * temperature and whose limits no error exceeds; where several do, the one with the smallest
 * limits there, of equal ones the first in the standard. "none" when there is none.
 * `temperatures` and `errors` in °C, point by point; `designation` a couple's or "Pt".
 * Refused: columns of different lengths (wrong kind), no points, a sensor without classes.
 */
export function classMet(
  temperatures: ArrayLike<number>,
  errors: ArrayLike<number>,
  designation: string,
  standard: ClassStandard = "IEC",
): ToleranceClassName | "none" | Refusal {
  const count = temperatures.length;
  if (count !== errors.length) return wrongKind`${count} temperatures for ${errors.length} errors`;
  if (count === 0) return noAnswer`no points to judge`;
  const classes = toleranceClassesOf(designation).filter(
    (one) => (one.standard === "astmE230") === (standard === "ASTM"),
  );
  if (classes.length === 0) return noAnswer`${standard} has no tolerance class for ${inWords(designation)}`;
  let best: ToleranceClassName | "none" = "none";
  let smallest = Number.POSITIVE_INFINITY;
  for (const one of classes) {
    const sum = sumOfLimitsMet(one, temperatures, errors);
    if (sum < smallest) {
      smallest = sum;
      best = one.name;
    }
  }
  return best;
}

/** Σ of the limits at the points; ∞ where the class does not cover or pass them all. */
function sumOfLimitsMet(
  one: ToleranceClass,
  temperatures: ArrayLike<number>,
  errors: ArrayLike<number>,
): number {
  let sum = 0;
  for (let i = 0; i < temperatures.length; i++) {
    const limit = one.limit(temperatures[i] as number);
    if (typeof limit !== "number") return Number.POSITIVE_INFINITY;
    if (toNinthDecimal(Math.abs(errors[i] as number)) > toNinthDecimal(limit))
      return Number.POSITIVE_INFINITY;
    sum += limit;
  }
  return sum;
}
