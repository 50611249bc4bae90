/** Readings of a couple whose polarity was crossed, put right. */
import { noAnswer, type Refusal } from "../errors";
import { firstOutside, unreachable } from "../thermoelectric/refusals";
import type { Thermocouple } from "../thermoelectric/thermocouple";

/**
 * Where plus and minus were exchanged: at the instrument's terminals, at the head where
 * couple and extension pair meet, or at both ends of the extension pair.
 */
export type Crossing = "terminals" | "head" | "both";

export const crossings: readonly Crossing[] = ["terminals", "head", "both"];

/**
 * The true temperature, °C, of a reading in °C taken through a crossed connection, with
 * the terminals at `reference` °C and the head at `head` °C (not needed for a crossing at
 * the terminals). The EMF at the terminals is E(indicated) − E(reference), and
 *
 * - terminals: everything reversed, −[E(t) − E(ref)], so E(t) = 2E(ref) − E(ind);
 * - head: the couple alone reversed, −[E(t) − E(head)] + [E(head) − E(ref)], so E(t) = 2E(head) − E(ind);
 * - both: the extension pair alone reversed, [E(t) − E(head)] − [E(head) − E(ref)], so
 *   E(t) = E(ind) + 2[E(head) − E(ref)].
 *
 * Assumes an extension pair of the couple's own type, homogeneous wires, and both
 * connections of the head, and of the terminals, at one temperature. Refuses a missing
 * head temperature, and a temperature outside the reference function, given or found.
 */
export function unreversed(
  indicated: number,
  couple: Thermocouple,
  crossing: Crossing,
  reference: number,
  head?: number,
): number | Refusal {
  if (crossing === "terminals") {
    return answered(couple, 2 * couple.emf(reference) - couple.emf(indicated), indicated, reference);
  }
  if (head === undefined) return noAnswer`head temperature missing`;
  const emfHead = couple.emf(head);
  const emf =
    crossing === "head"
      ? 2 * emfHead - couple.emf(indicated)
      : couple.emf(indicated) + 2 * (emfHead - couple.emf(reference));
  return answered(couple, emf, indicated, reference, head);
}

function answered(
  couple: Thermocouple,
  emf: number,
  indicated: number,
  reference: number,
  head = reference,
): number | Refusal {
  const t = couple.temperature(emf);
  if (!Number.isNaN(t)) return t;
  return Number.isNaN(emf)
    ? firstOutside(
        couple,
        ["indicated temperature", indicated],
        ["reference temperature", reference],
        ["head temperature", head],
      )
    : unreachable(couple, emf);
}
