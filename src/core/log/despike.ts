/** Spikes taken out of a record by a moving median. */
import { type Refusal, wrongKind } from "../errors";
import { refusedSetting } from "../numeric/above-zero";
import { MedianWindow } from "../numeric/median";
import { exceeds, roundedLimit } from "../numeric/rounded-limit";

/** The median distance from the median of a normal distribution is its standard deviation over this (1/Φ⁻¹(3/4)). */
const MAD_TO_SD = 1.4826;

/** With fewer readings than this in a window, nobody can say which is the spike. */
const FEWEST = 3;

const LONGEST_HALF_WINDOW = 1000;

/** Prepared settings, for any number of columns. */
export type Despiker = (readings: Float64Array) => Float64Array;

/**
 * Hampel filter: a reading further than `threshold` scaled deviations from the median of the scans around it
 * (`halfWindow` on each side, as far as the record goes) is replaced by that median. The scaled deviation is 1.4826 ×
 * the median distance from the median, never under the smallest step in the column: a logger that writes tenths
 * leaves many windows without any spread. Missing readings (NaN) stay missing and take no part; all others that are
 * no spikes stay bit-identical. Refused: a half window that is no whole number from 1 to 1000, a threshold not above 0.
 * Source: F. R. Hampel, The influence curve and its role in robust estimation, JASA 69 (1974) 383–393.
 */
export function despiker(halfWindow = 3, threshold = 3): Despiker | Refusal {
  if (!(Number.isInteger(halfWindow) && halfWindow >= 1 && halfWindow <= LONGEST_HALF_WINDOW)) {
    return wrongKind`half window ${halfWindow} is no whole number from 1 to ${LONGEST_HALF_WINDOW}`;
  }
  const refused = refusedSetting(threshold, "threshold");
  if (refused !== undefined) return refused;
  const window = new MedianWindow(2 * halfWindow + 1);
  return (readings) => {
    const result = Float64Array.from(readings);
    const step = smallestStep(readings);
    window.clear();
    const enter = (i: number): void => {
      const reading = readings[i];
      if (reading !== undefined && !Number.isNaN(reading)) window.add(reading);
    };
    const leave = (i: number): void => {
      const reading = readings[i];
      if (reading !== undefined && !Number.isNaN(reading)) window.remove(reading);
    };
    for (let i = 0; i < halfWindow; i++) enter(i);
    for (let i = 0; i < readings.length; i++) {
      leave(i - halfWindow - 1);
      enter(i + halfWindow);
      const reading = readings[i] as number;
      if (Number.isNaN(reading) || window.size < FEWEST) continue;
      const median = window.median();
      const distance = Math.abs(reading - median);
      // Most readings lie close: the spread of the window matters only to the others.
      if (distance <= threshold * step) continue;
      const deviation = Math.max(MAD_TO_SD * window.medianDistance(median), step);
      if (exceeds(distance, roundedLimit(threshold * deviation))) result[i] = median;
    }
    return result;
  };
}

/** The smallest change from one reading to the next that is more than rounding (1E-9); 0 in a record without any. */
export function smallestStep(readings: Float64Array): number {
  let smallest = Number.POSITIVE_INFINITY;
  let before = Number.NaN;
  for (const reading of readings) {
    if (Number.isNaN(reading)) continue;
    const step = Math.abs(reading - before);
    if (step > 1e-9 && step < smallest) smallest = step;
    before = reading;
  }
  return smallest === Number.POSITIVE_INFINITY ? 0 : smallest;
}
