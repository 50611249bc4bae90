import { Refusal, survey, surveyTable } from "../../core";
import {
  ifGiven,
  once,
  readings as readingsOf,
  times as timesOf,
  timeUnit as timeUnitOption,
  tolerance as toleranceOf,
  unit as unitOption,
} from "../arguments";
import { choice } from "../kinds/kind";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { differenceResult, numberResult, shareResult, temperatureResult, wordResult } from "../results";
import { table } from "../whole";
import * as options from "./options";
import { bound, question, type SensorName, sensorNames } from "./question";

/**
 * The survey sensor by sensor: correction, minimum, mean, maximum, deviations, stability, share in band, missing
 * readings and verdict of each, spilled with a header row.
 * @customfunction SURVEYSENSORS
 * @category Survey
 * @param times One column of times, rising; equal ones are allowed. Write IF(ISBLANK(range),"",range) where rows below the log are empty.
 * @param readings Readings, a column per sensor. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0. Blank, text and error cells are missing readings.
 * @param setpoint Set point of the survey.
 * @param tolerance Tolerance about the set point: one number, or two cells (below, above), both above 0.
 * @param [corrections] Correction to add to each sensor's readings: one row, a cell per sensor; none when left out.
 * @param [names] Names of the sensors: one row, a cell per sensor; 1, 2, 3 … when left out.
 * @param [start] First time of the survey period; from the first scan in band when left out. A log with several set points needs it.
 * @param [end] Last time of the survey period; to the last scan in band when left out.
 * @param [timeUnit] Unit of the times: h, min or s; date-time serials when left out.
 * @param [column] One column without its header: sensor, correction, minimum, mean, maximum, plus_deviation, minus_deviation, stability, in_band, missing or verdict.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns One row per sensor, in the order of the columns.
 * @definition Survey period as of SURVEY, the same for all sensors; all figures are on its corrected readings.
 * @definition plus_deviation, minus_deviation: highest and lowest reading less the set point, signed. stability: highest less lowest. in_band: share of the sensor's readings inside the tolerance, 0 to 1.
 * @definition verdict: as of SURVEY, from this sensor's own readings and overshoot, with the default gap and 30 required minutes. A sensor without any reading in the period has #N/A figures and is Incomplete.
 * @standard SAE AMS2750H uniformity limits; common practice of furnace surveys
 * @caution For records and analysis only: never an interlock or a release decision by itself. Local codes and licensed practice come first.
 * @keywords TUS, temperature uniformity survey, sensor table, per sensor, hottest, coldest, report
 * @related SURVEY, ENVELOPE, CORRECTION
 * @example =BEAD.SURVEYSENSORS({0;10;20;30;40},{850,840;898,896;901,899;902,897;900,898},900,5,,,,,"min","stability") → {4;3}
 */
export function SURVEYSENSORS(
  times: unknown[][],
  readings: unknown[][],
  setpoint: unknown[][],
  tolerance: unknown[][],
  corrections?: unknown[][],
  names?: unknown[][],
  start?: unknown[][],
  end?: unknown[][],
  timeUnit?: unknown[][],
  column?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return surveysensors({
    times,
    readings,
    setpoint,
    tolerance,
    corrections,
    names,
    start,
    end,
    timeUnit,
    column,
    unit,
  });
}

const result = {
  sensor: wordResult,
  correction: differenceResult,
  minimum: temperatureResult,
  mean: temperatureResult,
  maximum: temperatureResult,
  plus_deviation: differenceResult,
  minus_deviation: differenceResult,
  stability: differenceResult,
  in_band: shareResult,
  missing: numberResult,
  verdict: wordResult,
};

const surveysensors = table(SURVEYSENSORS, {
  arguments: {
    times: timesOf,
    readings: readingsOf(temperature),
    setpoint: once(temperature),
    tolerance: toleranceOf(temperatureDifference),
    corrections: options.corrections,
    names: options.names,
    start: options.start,
    end: options.end,
    timeUnit: timeUnitOption,
    column: ifGiven(once(choice(Object.keys(result) as (keyof typeof result)[]))),
    unit: unitOption,
  },
  result,
  rows({ names, start, end, unit, ...given }) {
    const asked = question(given);
    if (asked instanceof Refusal) return asked;
    const { log, scans } = asked;
    const called = sensorNames(names, log.readings.length);
    if (called instanceof Refusal) return called;
    const found = survey({ ...log, start: bound(scans, start), end: bound(scans, end), unit });
    if (found instanceof Refusal) return found;
    return surveyTable(found).map((row, at) => ({
      sensor: called[at] as SensorName,
      correction: row.correction,
      minimum: row.minimum,
      mean: row.mean,
      maximum: row.maximum,
      plus_deviation: row.plusDeviation,
      minus_deviation: row.minusDeviation,
      stability: row.stability,
      in_band: row.inBand,
      missing: row.missing,
      verdict: row.verdict,
    }));
  },
});
