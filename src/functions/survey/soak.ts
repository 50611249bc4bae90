import { Refusal, soak as soakOf } from "../../core";
import {
  column,
  ifGiven,
  once,
  readings as readingsOf,
  times as timesOf,
  timeUnit as timeUnitOption,
  tolerance as toleranceOf,
} from "../arguments";
import { choice } from "../kinds/kind";
import { sheetDifference, sheetTemperature } from "../kinds/numbers";
import { durationResult, numberResult, sheetDifferenceResult, timeResult } from "../results";
import { metrics } from "../whole";
import * as options from "./options";
import { question } from "./question";

/**
 * The soak of a furnace log: the longest stretch with every sensor present and in band, with the way into it.
 * @customfunction SOAK
 * @category Survey
 * @param times One column of times, rising; equal ones are allowed. Write IF(ISBLANK(range),"",range) where rows below the log are empty.
 * @param readings Readings, a column per sensor, in whatever degrees the sheet holds. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0.
 * @param setpoint Set point of the soak.
 * @param tolerance Tolerance about the set point: one number, or two cells (below, above), both above 0.
 * @param [corrections] Correction to add to each sensor's readings: one row, a cell per sensor; none when left out.
 * @param [maxGap] Longest time between two scans that is no gap, in minutes; 3 median intervals when left out.
 * @param [timeUnit] Unit of the times: h, min or s; date-time serials when left out.
 * @param [metric] One value: start, end, minutes, minutes_to_reach, overshoot or interruptions.
 * @returns Rows of metric and value, or the one value asked for; start and end are the log's own times.
 * @definition A reading out of band, a missing reading or a gap ends a stretch; the first of several that are equally long is the soak. At a limit is in band. A single scan is no soak.
 * @definition minutes_to_reach: from the first scan of the log to the start of the soak.
 * @definition overshoot: highest reading less the set point between the last scan with every sensor below the band and the soak; never negative, and 0 when reached from above. A missing reading leaves its sensor where it was last seen.
 * @definition Reached from above: no scan had every sensor below the band, or an earlier, higher set point was held: at least 20 min, every sensor more than one band width above the band, steady within a quarter of it.
 * @definition interruptions: stretches out of band between the first and the last scan in band, each leaving and coming back counted once.
 * @standard Common practice of furnace surveys; SAE AMS2750
 * @caution For records and analysis only: never an interlock or a release decision by itself. Local codes and licensed practice come first.
 * @keywords soak time, hold, heat treatment, time at temperature, dwell, stabilisation
 * @related SURVEY, SURVEYSENSORS, TIMEABOVE
 * @example =BEAD.SOAK({0;2;4;6;8},{880;899;901;900;899},900,5,,,"min","minutes") → 6
 */
export function SOAK(
  times: unknown[][],
  readings: unknown[][],
  setpoint: unknown[][],
  tolerance: unknown[][],
  corrections?: unknown[][],
  maxGap?: unknown[][],
  timeUnit?: unknown[][],
  metric?: unknown[][],
): unknown[][] {
  return soak({ times, readings, setpoint, tolerance, corrections, maxGap, timeUnit, metric });
}

const soak = metrics(SOAK, {
  arguments: {
    times: timesOf,
    readings: readingsOf(sheetTemperature),
    setpoint: once(sheetTemperature),
    tolerance: toleranceOf(sheetDifference),
    corrections: ifGiven(column(sheetDifference)),
    maxGap: options.maxGap,
    timeUnit: timeUnitOption,
    metric: ifGiven(
      once(choice(["start", "end", "minutes", "minutes_to_reach", "overshoot", "interruptions"])),
    ),
  },
  result: {
    start: timeResult,
    end: timeResult,
    minutes: durationResult,
    minutes_to_reach: durationResult,
    overshoot: sheetDifferenceResult,
    interruptions: numberResult,
  },
  metrics(given) {
    const asked = question(given);
    if (asked instanceof Refusal) return asked;
    const found = soakOf(asked.log);
    if (found instanceof Refusal) return found;
    return {
      start: asked.scans.inSheet(found.first),
      end: asked.scans.inSheet(found.last),
      minutes: found.minutes,
      minutes_to_reach: found.minutesToReach,
      overshoot: found.overshoot,
      interruptions: found.interruptions,
    };
  },
});
