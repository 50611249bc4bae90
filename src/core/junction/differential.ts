/** Differential couples and thermopiles. */
import { millivolts, noAnswer, type Refusal, wrongKind } from "../errors";
import { firstOutside, unreachable } from "../thermoelectric/refusals";
import type { Thermocouple } from "../thermoelectric/thermocouple";

/**
 * Temperature difference in °C above the base junctions at `base` °C, from the EMF in mV
 * of `pairs` couples in series: E(base + Δ) = E(base) + emf/pairs. Negative when the
 * other junctions are colder.
 *
 * Assumes homogeneous wires, all base junctions at one temperature and all others at
 * one, and copper from the base on. Refuses a count of pairs that is not whole and above
 * 0, and a temperature outside the reference function, given or found.
 */
export function differential(
  emf: number,
  couple: Thermocouple,
  base: number,
  pairs: number,
): number | Refusal {
  if (!(pairs > 0 && Number.isInteger(pairs))) {
    return pairs === 0
      ? wrongKind`pairs is 0 or an empty cell`
      : wrongKind`pairs is ${pairs}, not a whole number above 0`;
  }
  const sum = couple.emf(base) + emf / pairs;
  const t = couple.temperature(sum);
  if (!Number.isNaN(t)) return t - base;
  if (Number.isNaN(sum)) return firstOutside(couple, ["base temperature", base]);
  return Number.isFinite(sum)
    ? unreachable(couple, sum)
    : noAnswer`EMF ${millivolts(emf)} is beyond any couple`;
}
