/** How fast a record rises, scan by scan. */
import type { Refusal } from "../errors";
import { refusedSetting } from "../numeric/above-zero";
import { runningSlope } from "../numeric/running-slope";
import { inMinutes, lengthRefusal, medianInterval, TIME_RESOLUTION, type TimeGrid } from "./time-grid";

/** The window spans so many median intervals, unless the caller says otherwise. */
const WINDOW_INTERVALS = 5;

/**
 * Degrees per minute at each scan: slope of the least-squares line through the readings within half a window before
 * and after it (at the ends of the record, as far as it goes). `temperatures` in °C, NaN where missing. NaN in the
 * result: a missing reading, or no second time in its window. `windowMinutes`: five median intervals when left out.
 * Refused: a column of another length, a window that is not above 0.
 */
export function rampRate(
  grid: TimeGrid,
  temperatures: Float64Array,
  windowMinutes?: number,
): Float64Array | Refusal {
  const wrongLength = lengthRefusal(grid.times, temperatures, "the record");
  if (wrongLength !== undefined) return wrongLength;
  const refused =
    windowMinutes === undefined ? undefined : refusedSetting(windowMinutes, "window", inMinutes);
  if (refused !== undefined) return refused;
  // In a record whose times never rise there is no interval (NaN), and no rate.
  const window = windowMinutes ?? WINDOW_INTERVALS * medianInterval(grid.times);
  return runningSlope(grid.times, temperatures, window / 2 + TIME_RESOLUTION / 2);
}
