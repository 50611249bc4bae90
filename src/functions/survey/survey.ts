import { REQUIRED_MINUTES, Refusal, survey as surveyOf, surveySummary } from "../../core";
import {
  ifGiven,
  once,
  orElse,
  readings as readingsOf,
  times as timesOf,
  timeUnit as timeUnitOption,
  tolerance as toleranceOf,
  unit as unitOption,
} from "../arguments";
import { choice } from "../kinds/kind";
import { minutes } from "../kinds/numbers";
import { temperature, temperatureDifference } from "../kinds/temperature";
import {
  differencePerHourResult,
  differenceResult,
  durationResult,
  numberResult,
  temperatureResult,
  timeResult,
  wordResult,
} from "../results";
import { metrics } from "../whole";
import * as options from "./options";
import { bound, question, sensorNames } from "./question";

/**
 * Summary of a temperature uniformity survey over its survey period: extremes with sensor and time, deviations, spread,
 * drift, overshoot, class met and verdict. A missing reading or a gap is never hidden.
 * @customfunction SURVEY
 * @category Survey
 * @param times One column of times, rising; equal ones are allowed. Write IF(ISBLANK(range),"",range) where rows below the log are empty.
 * @param readings Readings, a column per sensor. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0. Blank, text and error cells are missing readings.
 * @param setpoint Set point of the survey.
 * @param tolerance Tolerance about the set point: one number, or two cells (below, above), both above 0.
 * @param [corrections] Correction to add to each sensor's readings: one row, a cell per sensor; none when left out.
 * @param [names] Names of the sensors: one row, a cell per sensor; 1, 2, 3 … when left out.
 * @param [start] First time of the survey period; from the first scan in band when left out. A log with several set points needs it.
 * @param [end] Last time of the survey period; to the last scan in band when left out.
 * @param [requiredMinutes] Shortest survey that can pass, in minutes; 30 when left out.
 * @param [maxGap] Longest time between two scans that is no gap, in minutes; 3 median intervals when left out.
 * @param [timeUnit] Unit of the times: h, min or s; date-time serials when left out.
 * @param [metric] One value, such as verdict, plus_deviation, minus_deviation, spread, overshoot, class_met, missing or minutes; see the rows of the table.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Rows of metric and value, or the one value asked for; times are the log's own.
 * @definition Survey period: from start to end; without them from the first to the last scan with every sensor present and in band. Anything out of band between them fails it. All figures are on corrected readings of the period.
 * @definition plus_deviation, minus_deviation: highest and lowest reading less the set point, signed. spread: greatest difference between sensors in one scan.
 * @definition drift: pooled least-squares slope within the sensors, degrees per hour. hottest_sensor, coldest_sensor: by mean, among sensors with at least 90 % of the scans.
 * @definition centring_shift: band centre less the middle of highest and lowest. margin: least distance of any reading from its limit, negative when one is out of band.
 * @definition overshoot: highest reading less the set point between the last scan with every sensor below the band and the period; never negative, and 0 when reached from above. A missing reading leaves its sensor where it was last seen.
 * @definition Reached from above: no scan had every sensor below the band, or an earlier, higher set point was held: at least 20 min, every sensor more than one band width above the band, steady within a quarter of it.
 * @definition minutes: of the period; a gap, and an interval with any missing reading at an end, adds nothing. missing: missing readings in the period, all sensors together.
 * @definition class_met: tightest class of AMS2750, by its uniformity limits, for the larger of both deviations and the overshoot; none beyond the last class. F and R have the standard's own °F row.
 * @definition verdict, the first that applies: Fail (a reading out of band, or an overshoot above it), Incomplete (readings missing, a gap, or a start or end beyond the log or in a gap), Short (under the required minutes, or a single scan), Pass.
 * @standard SAE AMS2750H uniformity limits; common practice of furnace surveys
 * @caution For records and analysis only: never an interlock or a release decision by itself. Local codes and licensed practice come first.
 * @keywords TUS, temperature uniformity survey, furnace, oven, AMS2750, CQI-9, qualification, mapping
 * @related SURVEYSENSORS, SURVEYCLASS, SOAK, ENVELOPE
 * @example =BEAD.SURVEY({0;10;20;30;40},{850,840;898,896;901,899;902,897;900,898},900,5,,,,,,,"min","verdict") → "Pass"
 * @example =BEAD.SURVEY({0;10;20;30;40},{850,840;898,896;901,899;902,897;900,898},900,5,,,,,,,"min","minus_deviation") → -4
 */
export function SURVEY(
  times: unknown[][],
  readings: unknown[][],
  setpoint: unknown[][],
  tolerance: unknown[][],
  corrections?: unknown[][],
  names?: unknown[][],
  start?: unknown[][],
  end?: unknown[][],
  requiredMinutes?: unknown[][],
  maxGap?: unknown[][],
  timeUnit?: unknown[][],
  metric?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return survey({
    times,
    readings,
    setpoint,
    tolerance,
    corrections,
    names,
    start,
    end,
    requiredMinutes,
    maxGap,
    timeUnit,
    metric,
    unit,
  });
}

const result = {
  highest: temperatureResult,
  highest_sensor: wordResult,
  highest_time: timeResult,
  lowest: temperatureResult,
  lowest_sensor: wordResult,
  lowest_time: timeResult,
  plus_deviation: differenceResult,
  minus_deviation: differenceResult,
  spread: differenceResult,
  drift: differencePerHourResult,
  hottest_sensor: wordResult,
  coldest_sensor: wordResult,
  centring_shift: differenceResult,
  overshoot: differenceResult,
  start: timeResult,
  end: timeResult,
  minutes: durationResult,
  missing: numberResult,
  margin: differenceResult,
  class_met: numberResult,
  verdict: wordResult,
};

const survey = metrics(SURVEY, {
  arguments: {
    times: timesOf,
    readings: readingsOf(temperature),
    setpoint: once(temperature),
    tolerance: toleranceOf(temperatureDifference),
    corrections: options.corrections,
    names: options.names,
    start: options.start,
    end: options.end,
    requiredMinutes: orElse(once(minutes), REQUIRED_MINUTES, `${REQUIRED_MINUTES} min`),
    maxGap: options.maxGap,
    timeUnit: timeUnitOption,
    metric: ifGiven(once(choice(Object.keys(result) as (keyof typeof result)[]))),
    unit: unitOption,
  },
  result,
  metrics({ names, start, end, requiredMinutes, unit, ...given }) {
    const asked = question(given);
    if (asked instanceof Refusal) return asked;
    const { log, scans } = asked;
    const called = sensorNames(names, log.readings.length);
    if (called instanceof Refusal) return called;
    const found = surveyOf({
      ...log,
      start: bound(scans, start),
      end: bound(scans, end),
      requiredMinutes,
      unit,
    });
    if (found instanceof Refusal) return found;
    const figures = surveySummary(found);
    const sensor = (at: number | Refusal) => (at instanceof Refusal ? at : (called[at] as string | number));
    return {
      highest: figures.highest,
      highest_sensor: sensor(figures.highestSensor),
      highest_time: scans.inSheet(figures.highestScan),
      lowest: figures.lowest,
      lowest_sensor: sensor(figures.lowestSensor),
      lowest_time: scans.inSheet(figures.lowestScan),
      plus_deviation: figures.plusDeviation,
      minus_deviation: figures.minusDeviation,
      spread: figures.spread,
      drift: figures.drift,
      hottest_sensor: sensor(figures.hottestSensor),
      coldest_sensor: sensor(figures.coldestSensor),
      centring_shift: figures.centringShift,
      overshoot: figures.overshoot,
      start: scans.inSheet(figures.first),
      end: scans.inSheet(figures.last),
      minutes: figures.minutes,
      missing: figures.missing,
      margin: figures.margin,
      class_met: figures.classMet,
      verdict: figures.verdict,
    };
  },
});
