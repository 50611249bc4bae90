/** The times and the readings of a log, row by row one scan. */
import { Refusal, wrongKind } from "../core";
import type { Readings, Times } from "./arguments";

export interface Scans {
  /** Minutes from the first scan; NaN where a time is missing. */
  readonly minutes: Float64Array;
  /** One column per sensor, as long as the times. */
  readonly columns: readonly Float64Array[];
  /** Another time of the call on the same scale. */
  minutesOf(time: number): number;
  /** The time of a scan as its cell holds it. */
  inSheet(scan: number): number;
}

/** Cuts the rows below the last time. `minutesPerUnit`: of the times. */
export function scans(times: Times, minutesPerUnit: number, readings: Readings): Scans | Refusal {
  const { inSheet, rows } = times;
  if (rows !== readings.rows) {
    return wrongKind`times and ${readings.label} differ in rows, ${rows} and ${readings.rows}`;
  }
  const emptied = inSheet.findIndex((time, row) => time === 0 && (inSheet[row - 1] as number) > 0);
  if (emptied !== -1) {
    // What a truly empty cell looks like on the desktop; or midnight, where a log has times of day.
    return wrongKind`time in row ${emptied + 1}: 0 or an empty cell; IF(ISBLANK(range),"",range) tells them apart, TIMELINE repairs midnight`;
  }
  const origin = inSheet.find((time) => !Number.isNaN(time)) ?? 0;
  const minutesOf = (time: number): number => (time - origin) * minutesPerUnit;
  return {
    minutes: inSheet.map(minutesOf),
    columns: readings.columns.map((column) => column.subarray(0, inSheet.length)),
    minutesOf,
    inSheet: (scan) => inSheet[scan] as number,
  };
}

/** The same for a function that sums up: a reading below the last time is not left out in silence. */
export function allScans(times: Times, minutesPerUnit: number, readings: Readings): Scans | Refusal {
  const found = scans(times, minutesPerUnit, readings);
  if (found instanceof Refusal) return found;
  for (let row = found.minutes.length; row < readings.rows; row++) {
    if (readings.isRead(row)) return wrongKind`time missing in row ${row + 1}, which has a reading`;
  }
  return found;
}
