/** The times of a log: rising, with the gaps in which nothing is known. */
import { measured, noAnswer, type Quantity, type Refusal, wrongKind } from "../errors";
import { refusedSetting } from "../numeric/above-zero";
import { medianInPlace } from "../numeric/median";

/**
 * Durations are told apart to 1E-6 minute (60 µs): finer than any logger, coarser than the 1E-8 minute to which a
 * double holds a date-time serial of this century.
 */
export const TIME_RESOLUTION = 1e-6;

export const roundedMinutes = (minutes: number): number => Math.round(minutes * 1e6) / 1e6;

/** A duration in a message. */
export const inMinutes = (minutes: number): Quantity => measured(minutes, "min");

/** Whether a duration is longer than another by more than the rounding of its times. */
export const longer = (minutes: number, than: number): boolean => minutes - than > TIME_RESOLUTION / 2;

/** A gap is longer than this many median intervals, unless the caller says otherwise. */
const GAP_INTERVALS = 3;

export interface TimeGrid {
  /** Minutes from any origin, never falling. */
  readonly times: Float64Array;
  /** Minutes from the scan before; 0 for the first. */
  readonly elapsed: Float64Array;
  /** 1 where the time from the scan before is a gap: it adds nothing to a duration or an integral. */
  readonly gap: Uint8Array;
  /** The longest time between two scans that is no gap, in minutes. */
  readonly maxGap: number;
}

/**
 * Median time between scans, in minutes; NaN where the times never rise. Repeated times do not count: they say only
 * that the logger rounds its clock.
 */
export function medianInterval(times: Float64Array): number {
  const intervals = new Float64Array(times.length);
  let count = 0;
  for (let i = 1; i < times.length; i++) {
    const interval = (times[i] as number) - (times[i - 1] as number);
    if (interval > 0) intervals[count++] = interval;
  }
  return medianInPlace(intervals.subarray(0, count));
}

/**
 * The time grid of a log. Refused: no scan, a missing or a falling time (equal times are allowed), a `maxGap` that is
 * not above 0. `maxGap` in minutes; three median intervals when left out.
 */
export function timeGrid(times: Float64Array, maxGap?: number): TimeGrid | Refusal {
  if (times.length === 0) return noAnswer`the log has no scan`;
  const refused = maxGap === undefined ? undefined : refusedSetting(maxGap, "max gap", inMinutes);
  if (refused !== undefined) return refused;
  const elapsed = new Float64Array(times.length);
  for (let i = 0; i < times.length; i++) {
    const time = times[i] as number;
    if (!Number.isFinite(time)) return wrongKind`time missing in row ${i + 1}`;
    if (i === 0) continue;
    const minutes = time - (times[i - 1] as number);
    if (minutes < 0) {
      return wrongKind`time in row ${i + 1} falls below the row before: midnight or a clock change? TIMELINE repairs it`;
    }
    elapsed[i] = minutes;
  }
  const longest = maxGap ?? GAP_INTERVALS * medianInterval(times);
  const gap = new Uint8Array(times.length);
  for (let i = 1; i < times.length; i++) if (longer(elapsed[i] as number, longest)) gap[i] = 1;
  return { times, elapsed, gap, maxGap: longest };
}

/** Refuses a column that has not one reading per time. `what` names it: "sensor 3". */
export function lengthRefusal(times: Float64Array, column: Float64Array, what: string): Refusal | undefined {
  if (column.length === times.length) return undefined;
  return wrongKind`${what} has ${column.length} readings for ${times.length} times`;
}
