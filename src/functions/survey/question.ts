/** What a sheet asks of a survey, as the core takes it. */
import { Refusal, type SurveyLog, type Tolerance, wrongKind } from "../../core";
import type { Readings, Times } from "../arguments";
import { allScans, type Scans } from "../scans";

interface Asked {
  readonly times: Times;
  readonly readings: Readings;
  readonly setpoint: number;
  readonly tolerance: Tolerance;
  readonly corrections?: readonly number[] | undefined;
  readonly maxGap?: number | undefined;
  readonly timeUnit: number;
}

export interface Question {
  readonly log: SurveyLog;
  readonly scans: Scans;
}

export function question({ times, readings, timeUnit, ...asked }: Asked): Question | Refusal {
  const scans = allScans(times, timeUnit, readings);
  if (scans instanceof Refusal) return scans;
  return { log: { ...asked, times: scans.minutes, readings: scans.columns }, scans };
}

/** A start or end of the survey period on the log's scale. */
export const bound = (scans: Scans, time: number | undefined): number | undefined =>
  time === undefined ? undefined : scans.minutesOf(time);

export type SensorName = string | number;

/** One name per sensor; without one it is called by its place, from 1. */
export function sensorNames(
  given: readonly (SensorName | undefined)[] | undefined,
  sensors: number,
): readonly SensorName[] | Refusal {
  if (given !== undefined && given.length !== sensors)
    return wrongKind`${given.length} names for ${sensors} sensors`;
  return Array.from({ length: sensors }, (_, at) => given?.[at] ?? at + 1);
}
