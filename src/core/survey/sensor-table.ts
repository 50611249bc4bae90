/** The survey, sensor by sensor. All on corrected readings of the survey period. */
import { noAnswer, type Refusal } from "../errors";
import type { Survey } from "./survey";
import { type SurveyVerdict, surveyVerdict } from "./verdict";

export interface SensorRow {
  /** °C added to the sensor's readings. */
  readonly correction: number;
  /** °C; refused, as the next six, where the sensor has no reading in the period. */
  readonly minimum: number | Refusal;
  readonly mean: number | Refusal;
  readonly maximum: number | Refusal;
  /** Highest and lowest reading less the set point, signed, °C. */
  readonly plusDeviation: number | Refusal;
  readonly minusDeviation: number | Refusal;
  /** Highest less lowest, °C. */
  readonly stability: number | Refusal;
  /** Share of its readings inside the tolerance, 0…1. */
  readonly inBand: number | Refusal;
  readonly missing: number;
  /** As of the survey, from this sensor's readings and overshoot alone. */
  readonly verdict: SurveyVerdict;
}

/** One row per sensor, in the order of the columns. */
export function surveyTable(survey: Survey): SensorRow[] {
  const { block, sensors } = survey;
  const { setpoint } = block.band;
  return sensors.map(({ count, missing, outOfBand, lowest, highest, mean }, sensor) => {
    const figure = (value: number): number | Refusal =>
      count > 0 ? value : noAnswer`no reading in the survey period`;
    return {
      correction: block.corrections[sensor] as number,
      minimum: figure(lowest),
      mean: figure(mean),
      maximum: figure(highest),
      plusDeviation: figure(highest - setpoint),
      minusDeviation: figure(lowest - setpoint),
      stability: figure(highest - lowest),
      inBand: figure((count - outOfBand) / count),
      missing,
      verdict: surveyVerdict({
        outOfBand: outOfBand > 0 || block.band.sideOf(survey.overshoots[sensor] as number) > 0,
        incomplete: missing > 0 || survey.gap,
        short: survey.short,
      }),
    };
  });
}
