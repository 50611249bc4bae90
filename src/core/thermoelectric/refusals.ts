/** Why a couple has no answer, in the words that every routine uses. */
import { degrees, millivolts, noAnswer, type Refusal } from "../errors";
import { spoken } from "./designation";
import type { Thermocouple } from "./thermocouple";

/** A temperature that entered a calculation, and what it is called. */
export type Named = readonly [name: string, t: number];

/** The first of these that the couple's reference function does not cover, refused by name. */
export function firstOutside(couple: Thermocouple, ...temperatures: readonly Named[]): Refusal {
  const [name, t] = temperatures.find(([, at]) => Number.isNaN(couple.emf(at))) ?? (temperatures[0] as Named);
  return noAnswer`${name} ${degrees(t)} is outside the range of ${spoken(couple)}, ${degrees(couple.low)} to ${degrees(couple.high)}`;
}

/**
 * No temperature of this couple gives `emf` mV: says which limit it passed, and the
 * temperature there. `lead` names the EMF and how it came about.
 */
export function unreachable(
  couple: Thermocouple,
  emf: number,
  lead: Refusal = noAnswer`the EMF comes to ${millivolts(emf)},`,
): Refusal {
  if (emf > couple.emfHigh) {
    return lead.and` above the limit of ${spoken(couple)}, ${millivolts(couple.emfHigh)} (${degrees(couple.high)})`;
  }
  if (couple.uniqueFrom > couple.low) {
    return lead.and` below ${millivolts(couple.emfUniqueFrom)}: under ${degrees(couple.uniqueFrom)} an EMF of ${spoken(couple)} belongs to two temperatures`;
  }
  return lead.and` below the limit of ${spoken(couple)}, ${millivolts(couple.emfLow)} (${degrees(couple.low)})`;
}
