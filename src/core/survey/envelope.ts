/** All sensors of a scan at a glance, for charts. */
import { noAnswer, type Refusal, wrongKind } from "../errors";

/** One value per scan, °C; NaN in a scan in which no sensor has a reading. */
export interface Envelope {
  readonly lowest: Float64Array;
  readonly highest: Float64Array;
  readonly mean: Float64Array;
  readonly spread: Float64Array;
}

/**
 * Lowest, highest and mean reading of each scan and the difference of the first two, on corrected readings (NaN where
 * missing). Refused: no sensor, columns of different lengths, corrections that do not match them.
 */
export function envelope(
  readings: readonly Float64Array[],
  corrections?: readonly number[],
): Envelope | Refusal {
  const scans = readings[0]?.length;
  if (scans === undefined) return noAnswer`there is no sensor`;
  const odd = readings.findIndex((column) => column.length !== scans);
  if (odd !== -1)
    return wrongKind`sensor ${odd + 1} has ${readings[odd]!.length} readings, sensor 1 has ${scans}`;
  if (corrections !== undefined && corrections.length !== readings.length) {
    return wrongKind`${corrections.length} corrections for ${readings.length} sensors`;
  }
  const lowest = new Float64Array(scans).fill(Number.POSITIVE_INFINITY);
  const highest = new Float64Array(scans).fill(Number.NEGATIVE_INFINITY);
  const sum = new Float64Array(scans);
  const count = new Uint32Array(scans);
  readings.forEach((column, sensor) => {
    const correction = corrections?.[sensor] ?? 0;
    for (let scan = 0; scan < scans; scan++) {
      const temperature = (column[scan] as number) + correction;
      if (Number.isNaN(temperature)) continue;
      lowest[scan] = Math.min(lowest[scan] as number, temperature);
      highest[scan] = Math.max(highest[scan] as number, temperature);
      sum[scan]! += temperature;
      count[scan]!++;
    }
  });
  const mean = sum.map((total, scan) => total / (count[scan] as number));
  const spread = highest.map((high, scan) => high - (lowest[scan] as number));
  for (let scan = 0; scan < scans; scan++) {
    if (count[scan] === 0) lowest[scan] = highest[scan] = spread[scan] = Number.NaN;
  }
  return { lowest, highest, mean, spread };
}
