/** The block of a survey: one time per scan, one column of readings per sensor. */
import { noAnswer, Refusal, wrongKind } from "../errors";
import { lengthRefusal, type TimeGrid, timeGrid } from "../log/time-grid";
import type { TemperatureUnit } from "../units";
import { type Tolerance, type ToleranceBand, toleranceBand } from "./tolerance-band";

export interface SurveyLog {
  /** Minutes from any origin; equal times allowed, falling ones refused. */
  readonly times: Float64Array;
  /** One column per sensor, °C as read; NaN where a reading is missing. */
  readonly readings: readonly Float64Array[];
  readonly setpoint: number;
  readonly tolerance: Tolerance;
  /** °C to add to each sensor's readings; none when left out. */
  readonly corrections?: readonly number[] | undefined;
  /** Longest time between two scans that is no gap, minutes; three median intervals when left out. */
  readonly maxGap?: number | undefined;
  /** The unit of the call, in which limits are rounded and the furnace class is read; °C when left out. */
  readonly unit?: TemperatureUnit | undefined;
}

/** A block that has been checked: corrected readings, a time grid, a band. */
export interface SurveyBlock {
  readonly grid: TimeGrid;
  /** Corrected readings, °C. */
  readonly sensors: readonly Float64Array[];
  readonly corrections: readonly number[];
  readonly band: ToleranceBand;
}

/** Refused: what `timeGrid` and `toleranceBand` refuse, no sensor, columns or corrections that do not match. */
export function surveyBlock(log: SurveyLog): SurveyBlock | Refusal {
  const grid = timeGrid(log.times, log.maxGap);
  if (grid instanceof Refusal) return grid;
  const band = toleranceBand(log.setpoint, log.tolerance, log.unit);
  if (band instanceof Refusal) return band;
  const { readings } = log;
  if (readings.length === 0) return noAnswer`the survey has no sensor`;
  for (const [index, column] of readings.entries()) {
    const wrongLength = lengthRefusal(grid.times, column, `sensor ${index + 1}`);
    if (wrongLength !== undefined) return wrongLength;
  }
  const corrections = log.corrections ?? readings.map(() => 0);
  if (corrections.length !== readings.length) {
    return wrongKind`${corrections.length} corrections for ${readings.length} sensors`;
  }
  const missing = corrections.findIndex((correction) => !Number.isFinite(correction));
  if (missing >= 0) return wrongKind`correction of sensor ${missing + 1} is missing`;
  return {
    grid,
    sensors: readings.map((column, i) => corrected(column, corrections[i] as number)),
    corrections,
    band,
  };
}

/** A column plus its correction; the column itself when there is nothing to add. */
export function corrected(column: Float64Array, correction: number): Float64Array {
  if (correction === 0) return column;
  const result = new Float64Array(column.length);
  for (let i = 0; i < column.length; i++) result[i] = (column[i] as number) + correction;
  return result;
}
