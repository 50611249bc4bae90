/** What a couple measured at a known temperature, against its reference function. */
import { millivolts, noAnswer, Refusal } from "../errors";
import { emfBetween, temperatureOf } from "../thermoelectric/convert";
import { firstOutside } from "../thermoelectric/refusals";
import type { Thermocouple } from "../thermoelectric/thermocouple";

/**
 * Measured EMF less that of the reference function, in µV: emf − [E(t) − E(reference)],
 * for `emf` in mV with the measuring junction at the true temperature `t` and the
 * reference junction at `reference`, both °C. Refuses a temperature outside the function.
 */
export function deviationUv(
  couple: Thermocouple,
  emf: number,
  t: number,
  reference: number,
): number | Refusal {
  const expected = emfBetween(couple, t, reference);
  if (expected instanceof Refusal) return expected;
  const deviation = (emf - expected) * 1000;
  return Number.isFinite(deviation) ? deviation : noAnswer`EMF ${millivolts(emf)} is beyond any couple`;
}

/**
 * The same in °C, by exact inversion: the temperature that the reference function gives
 * for `emf`, less the true one.
 */
export function deviationDegrees(
  couple: Thermocouple,
  emf: number,
  t: number,
  reference: number,
): number | Refusal {
  if (Number.isNaN(couple.emf(t))) return firstOutside(couple, ["true temperature", t]);
  const indicated = temperatureOf(couple, emf, reference);
  return indicated instanceof Refusal ? indicated : indicated - t;
}

/**
 * A measured EMF in mV moved from the bath's true temperature `t` to the nominal one, °C:
 * emf + E(nominal) − E(t). The couple's deviation is taken to be the same at both, which
 * holds for the degree or two between them. The reference junction is not moved.
 */
export function emfAtNominal(
  couple: Thermocouple,
  emf: number,
  t: number,
  nominal: number,
): number | Refusal {
  const moved = emf + (couple.emf(nominal) - couple.emf(t));
  return Number.isNaN(moved)
    ? firstOutside(couple, ["true temperature", t], ["nominal temperature", nominal])
    : moved;
}
