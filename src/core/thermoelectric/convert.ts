/**
 * EMF and temperature of a pair of junctions. By the law of intermediate
 * temperatures the EMF between the measuring junction at t and the reference
 * junction at r is E(t) − E(r), so it is EMFs that are added, never degrees.
 */
import { degrees, millivolts, noAnswer, type Refusal } from "../errors";
import { spoken } from "./designation";
import type { Thermocouple } from "./thermocouple";

const outsideRange = (couple: Thermocouple, t: number, what: string): Refusal =>
  noAnswer`${what} ${degrees(t)} is outside the range of ${spoken(couple)}, ${degrees(couple.low)} to ${degrees(couple.high)}`;

/** EMF in mV with the measuring junction at `t` and the reference junction at `reference`, both °C. */
export function emfBetween(couple: Thermocouple, t: number, reference: number): number | Refusal {
  const emf = couple.emf(t) - couple.emf(reference);
  if (!Number.isNaN(emf)) return emf;
  return Number.isNaN(couple.emf(t))
    ? outsideRange(couple, t, "temperature")
    : outsideRange(couple, reference, "reference temperature");
}

/** Temperature in °C of the measuring junction, from the EMF in mV and the reference junction's temperature in °C. */
export function temperatureOf(couple: Thermocouple, emf: number, reference: number): number | Refusal {
  const sum = emf + couple.emf(reference);
  const t = couple.temperature(sum);
  if (!Number.isNaN(t)) return t;
  if (Number.isNaN(sum)) return outsideRange(couple, reference, "reference temperature");
  return emfRefused(couple, emf, reference, sum);
}

/** Seebeck coefficient in µV/°C at `t` °C. */
export function seebeckAt(couple: Thermocouple, t: number): number | Refusal {
  const millivoltsPerDegree = couple.seebeck(t);
  return Number.isNaN(millivoltsPerDegree)
    ? outsideRange(couple, t, "temperature")
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

/** Says which limit the sum of the EMFs passed, and the temperature at that limit. */
function emfRefused(couple: Thermocouple, emf: number, reference: number, sum: number): Refusal {
  const total =
    reference === 0
      ? noAnswer`EMF ${millivolts(sum)}`
      : noAnswer`EMF ${millivolts(emf)} with the reference junction at ${degrees(reference)} makes ${millivolts(sum)},`;
  if (sum > couple.emfHigh) {
    return total.and` above the limit of ${spoken(couple)}, ${millivolts(couple.emfHigh)} (${degrees(couple.high)})`;
  }
  if (couple.uniqueFrom > couple.low) {
    return total.and` below ${millivolts(couple.emfUniqueFrom)}: under ${degrees(couple.uniqueFrom)} an EMF of ${spoken(couple)} belongs to two temperatures`;
  }
  return total.and` below the limit of ${spoken(couple)}, ${millivolts(couple.emfLow)} (${degrees(couple.low)})`;
}
