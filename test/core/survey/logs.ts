/** Invented logs for the survey's tests. */
import type { SurveyQuestion } from "../../../src/core/survey";
import { jitter } from "../log/record";

/** Scans every 2 minutes, one row per scan, one cell per sensor; undefined is a missing reading. */
export type Rows = readonly (readonly (number | undefined)[])[];

export const MINUTES_PER_SCAN = 2;

export function question(rows: Rows, more: Partial<SurveyQuestion> = {}): SurveyQuestion {
  const sensors = rows[0]?.length ?? 0;
  return {
    times: Float64Array.from(rows, (_, scan) => scan * MINUTES_PER_SCAN),
    readings: Array.from({ length: sensors }, (_, sensor) =>
      Float64Array.from(rows, (row) => row[sensor] ?? Number.NaN),
    ),
    setpoint: 900,
    tolerance: { below: 6, above: 6 },
    ...more,
  };
}

/** `count` scans with every sensor at about the given levels. */
export const hold = (count: number, ...levels: number[]): number[][] =>
  Array.from({ length: count }, () => levels);

/** From one level to another in equal steps, the last not included; all sensors alike but for their offsets. */
export const ramp = (from: number, to: number, steps: number, ...offsets: number[]): number[][] =>
  Array.from({ length: steps }, (_, i) => offsets.map((offset) => from + ((to - from) * i) / steps + offset));

/** A furnace with 5 sensors: ramp, soak of an hour with noise, cooling. */
export const furnace = (): number[][] => [
  ...ramp(20, 890, 30, 0, 3, -4, 1, -2),
  ...Array.from({ length: 31 }, (_, i) =>
    [0.5, 2, -3, 1, -1.5].map((offset, s) => 900 + offset + 1.5 * jitter(5 * i + s) + 0.02 * i),
  ),
  ...ramp(880, 400, 10, 0, 3, -4, 1, -2),
];

/** The rows with one reading changed. */
export const withReading = (rows: Rows, scan: number, sensor: number, value: number | undefined): Rows =>
  rows.map((row, i) => (i === scan ? row.map((cell, s) => (s === sensor ? value : cell)) : row));
