/**
 * EMF and temperature of a pair of junctions. By the law of intermediate
 * temperatures the EMF between the measuring junction at t and the reference
 * junction at r is E(t) − E(r), so it is EMFs that are added, never degrees.
 */
import { degrees, millivolts, noAnswer, type Refusal } from "../errors";
import { firstOutside, unreachable } from "./refusals";
import type { Thermocouple } from "./thermocouple";

/** EMF in mV with the measuring junction at `t` and the reference junction at `reference`, both °C. */
export function emfBetween(couple: Thermocouple, t: number, reference: number): number | Refusal {
  const emf = couple.emf(t) - couple.emf(reference);
  if (!Number.isNaN(emf)) return emf;
  return firstOutside(couple, ["temperature", t], ["reference temperature", reference]);
}

/** Temperature in °C of the measuring junction, from the EMF in mV and the reference junction's temperature in °C. */
export function temperatureOf(couple: Thermocouple, emf: number, reference: number): number | Refusal {
  const sum = emf + couple.emf(reference);
  const t = couple.temperature(sum);
  if (!Number.isNaN(t)) return t;
  if (Number.isNaN(sum)) return firstOutside(couple, ["reference temperature", reference]);
  const lead =
    reference === 0
      ? noAnswer`EMF ${millivolts(sum)} is`
      : noAnswer`EMF ${millivolts(emf)} with the reference junction at ${degrees(reference)} makes ${millivolts(sum)},`;
  return unreachable(couple, sum, lead);
}

/** Seebeck coefficient in µV/°C at `t` °C. */
export function seebeckAt(couple: Thermocouple, t: number): number | Refusal {
  const millivoltsPerDegree = couple.seebeck(t);
  return Number.isNaN(millivoltsPerDegree)
    ? firstOutside(couple, ["temperature", t])
    : millivoltsPerDegree * 1000;
}

/**
 * `emfBetween` down a column, into `emfs`; NaN where `emfBetween` would refuse.
 */
export function emfsBetween(
  couple: Thermocouple,
  temperatures: Float64Array,
  references: Float64Array,
  emfs: Float64Array,
  count: number,
): void {
  const offsets = referenceEmfs(couple, references, count);
  couple.emfs(temperatures, emfs, count);
  for (let i = 0; i < count; i++) emfs[i] = (emfs[i] as number) - (offsets[i] as number);
}

/** `temperatureOf` down a column, into `temperatures`; NaN where `temperatureOf` would refuse. */
export function temperaturesOf(
  couple: Thermocouple,
  emfs: Float64Array,
  references: Float64Array,
  temperatures: Float64Array,
  count: number,
): void {
  const sums = referenceEmfs(couple, references, count);
  for (let i = 0; i < count; i++) sums[i] = (emfs[i] as number) + (sums[i] as number);
  couple.temperatures(sums, temperatures, count);
}

/** E(reference) in mV for each row; worked out once when the reference junction is the same all the way. */
function referenceEmfs(couple: Thermocouple, references: Float64Array, count: number): Float64Array {
  const emfs = new Float64Array(count);
  const first = references[0] as number;
  let same = true;
  for (let i = 1; same && i < count; i++) same = references[i] === first;
  if (same) emfs.fill(couple.emf(first));
  else couple.emfs(references, emfs, count);
  return emfs;
}
