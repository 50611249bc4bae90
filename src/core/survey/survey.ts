/** A prepared survey: everything that a summary or a table of sensors says, from two passes over the block. */
import { Refusal, wrongKind } from "../errors";
import { inMinutes, longer, roundedMinutes } from "../log/time-grid";
import { celsius, type TemperatureUnit } from "../units";
import { overshoots } from "./approach";
import { type SurveyBlock, type SurveyLog, surveyBlock } from "./block";
import { type SurveyPeriod, surveyPeriod } from "./period";
import { MISSING, scanStates } from "./scan-state";
import { noExtremes, type ScanExtremes, type SensorFigures, sensorFigures } from "./sensor-figures";
import { REQUIRED_MINUTES } from "./verdict";

export interface SurveyQuestion extends SurveyLog {
  /** First and last minute of the survey period, as the times; found from the band when left out. */
  readonly start?: number | undefined;
  readonly end?: number | undefined;
  /** Shortest survey that can pass, minutes; 30 when left out. */
  readonly requiredMinutes?: number | undefined;
}

/** What was found in the block; `surveySummary` and `surveyTable` put it into words and figures. */
export interface Survey {
  readonly block: SurveyBlock;
  readonly period: SurveyPeriod;
  readonly sensors: readonly SensorFigures[];
  readonly extremes: ScanExtremes;
  /** °C per sensor, never below 0. */
  readonly overshoots: Float64Array;
  /** Minutes of the period; gaps, and intervals with a missing reading at an end, add nothing. */
  readonly minutes: number;
  /** A gap lies in the period, or reaches into it. */
  readonly gap: boolean;
  /** The period is shorter than required, or no more than one moment. */
  readonly short: boolean;
  /** The question's unit decides the row of furnace classes and what counts as equal. */
  readonly unit: TemperatureUnit;
}

/** Refused: what `surveyBlock` and `surveyPeriod` refuse, and required minutes that are not above 0. */
export function survey(question: SurveyQuestion): Survey | Refusal {
  const { start, end, requiredMinutes = REQUIRED_MINUTES, unit = celsius } = question;
  if (!(requiredMinutes > 0)) {
    return requiredMinutes === 0
      ? wrongKind`required minutes: 0 or an empty cell`
      : wrongKind`required minutes: ${inMinutes(requiredMinutes)} is not above 0`;
  }
  const block = surveyBlock(question);
  if (block instanceof Refusal) return block;
  const states = scanStates(block);
  const period = surveyPeriod(block, states, start, end);
  if (period instanceof Refusal) return period;
  const extremes = noExtremes(period);
  const sensors = block.sensors.map((_, sensor) => sensorFigures(block, sensor, period, extremes));
  const { minutes, gap } = duration(block, states, period);
  return {
    block,
    period,
    sensors,
    extremes,
    overshoots: overshoots(block, period.first, period.last),
    minutes,
    gap: gap || period.ragged,
    short: minutes === 0 || longer(requiredMinutes, minutes),
    unit,
  };
}

function duration(
  { grid }: SurveyBlock,
  states: Uint8Array,
  { first, last }: SurveyPeriod,
): { minutes: number; gap: boolean } {
  let minutes = 0;
  let gap = false;
  for (let scan = first + 1; scan <= last; scan++) {
    if (grid.gap[scan] === 1) gap = true;
    else if ((((states[scan - 1] as number) | (states[scan] as number)) & MISSING) === 0) {
      minutes += grid.elapsed[scan] as number;
    }
  }
  return { minutes: roundedMinutes(minutes), gap };
}
