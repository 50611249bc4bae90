/** How long a record stays above a temperature. */
import { noAnswer, type Refusal } from "../errors";
import { lengthRefusal, roundedMinutes, type TimeGrid } from "../log/time-grid";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import { celsius, type TemperatureUnit } from "../units";

/**
 * Minutes at or above `threshold` (°C) of a record that runs straight between scans, its crossings interpolated.
 * `temperatures` in °C, NaN where missing; gaps and intervals with a missing reading at an end add nothing. A reading
 * within 1E-9 of the unit's degree of the threshold is at it. Refused: a column of another length, no two successive
 * readings.
 */
export function timeAbove(
  { times, elapsed, gap }: TimeGrid,
  temperatures: Float64Array,
  threshold: number,
  unit: TemperatureUnit = celsius,
): number | Refusal {
  const wrongLength = lengthRefusal(times, temperatures, "the record");
  if (wrongLength !== undefined) return wrongLength;
  const height = (scan: number): number =>
    toNinthDecimal(((temperatures[scan] as number) - threshold) / unit.degree);
  let minutes = 0;
  let intervals = 0;
  let before = height(0);
  for (let scan = 1; scan < times.length; scan++) {
    const now = height(scan);
    if (gap[scan] === 0 && !Number.isNaN(before + now)) {
      intervals++;
      minutes += (elapsed[scan] as number) * shareAbove(before, now);
    }
    before = now;
  }
  return intervals > 0 ? roundedMinutes(minutes) : noAnswer`no two successive readings`;
}

/** Share of a straight line from one height to another that lies at or above 0. */
export function shareAbove(from: number, to: number): number {
  const low = Math.min(from, to);
  const high = Math.max(from, to, 0);
  return low >= 0 ? 1 : high / (high - low);
}
