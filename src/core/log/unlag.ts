/** The lag of a sensor taken out of its record. */
import { measured, type Refusal } from "../errors";
import { refusedSetting } from "../numeric/above-zero";
import { rampRate } from "./ramp-rate";
import type { TimeGrid } from "./time-grid";

const SECONDS_PER_MINUTE = 60;

/**
 * What a sensor of time constant τ (seconds) was exposed to: T + τ·dT/dt, the first-order equation solved for the
 * surroundings, with the slope of `rampRate` over the same window. It amplifies noise by τ over the window. NaN where
 * `rampRate` has none. Refused: a time constant that is not above 0, and what `rampRate` refuses.
 */
export function unlag(
  grid: TimeGrid,
  temperatures: Float64Array,
  timeConstant: number,
  windowMinutes?: number,
): Float64Array | Refusal {
  const refused = refusedSetting(timeConstant, "time constant", (seconds) => measured(seconds, "s"));
  if (refused !== undefined) return refused;
  const rates = rampRate(grid, temperatures, windowMinutes);
  if (!(rates instanceof Float64Array)) return rates;
  const minutes = timeConstant / SECONDS_PER_MINUTE;
  return rates.map((rate, i) => (temperatures[i] as number) + minutes * rate);
}
