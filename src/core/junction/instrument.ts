/** Readings logged with a wrong setting of the instrument, put right. */
import type { Refusal } from "../errors";
import { firstOutside, unreachable } from "../thermoelectric/refusals";
import type { Thermocouple } from "../thermoelectric/thermocouple";

/**
 * The true temperature, °C, of a reading in °C that was worked out with the reference
 * junction taken to be at `assumed` °C while it was at `actual` °C:
 * E(t) = E(indicated) − E(assumed) + E(actual).
 *
 * The measured EMF E(indicated) − E(assumed) is E(t) − E(actual). Assumes homogeneous
 * wires, and terminals that are all at one temperature. Refuses a temperature outside
 * the reference function, given or found.
 */
export function rereferenced(
  indicated: number,
  couple: Thermocouple,
  assumed: number,
  actual: number,
): number | Refusal {
  const emf = couple.emf(indicated) - couple.emf(assumed) + couple.emf(actual);
  const t = couple.temperature(emf);
  if (!Number.isNaN(t)) return t;
  return Number.isNaN(emf)
    ? firstOutside(
        couple,
        ["indicated temperature", indicated],
        ["assumed reference temperature", assumed],
        ["actual reference temperature", actual],
      )
    : unreachable(couple, emf);
}

/**
 * The true temperature, °C, of a reading in °C of an instrument set to another type than
 * the couple that was fitted, with the terminals at `reference` °C:
 * Efitted(t) = Eset(indicated) − Eset(reference) + Efitted(reference).
 *
 * The measured EMF Eset(indicated) − Eset(reference) is Efitted(t) − Efitted(reference).
 * Assumes homogeneous wires, and terminals that are all at the reference temperature.
 * Refuses a temperature outside the reference function of its couple, given or found.
 */
export function retyped(
  indicated: number,
  set: Thermocouple,
  fitted: Thermocouple,
  reference: number,
): number | Refusal {
  const measured = set.emf(indicated) - set.emf(reference);
  if (Number.isNaN(measured)) {
    return firstOutside(set, ["indicated temperature", indicated], ["reference temperature", reference]);
  }
  const emf = measured + fitted.emf(reference);
  const t = fitted.temperature(emf);
  if (!Number.isNaN(t)) return t;
  return Number.isNaN(emf)
    ? firstOutside(fitted, ["reference temperature", reference])
    : unreachable(fitted, emf);
}
