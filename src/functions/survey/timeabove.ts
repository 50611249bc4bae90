import { Refusal, timeAbove, timeGrid } from "../../core";
import { once, readings, times as timesOf, timeUnit as timeUnitOption } from "../arguments";
import { sheetTemperature } from "../kinds/numbers";
import { durationResult } from "../results";
import { allScans } from "../scans";
import { whole } from "../whole";
import * as options from "./options";

/**
 * Minutes that each logged sensor spends at or above a temperature, with the crossings interpolated.
 * @customfunction TIMEABOVE
 * @category Survey
 * @param times One column of times, rising. Write IF(ISBLANK(range),"",range) where rows below the log are empty.
 * @param temperatures Temperatures, a column per sensor, in whatever degrees the sheet holds. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0.
 * @param threshold The temperature at or above which time counts.
 * @param [maxGap] Longest time between two scans that is no gap, in minutes; 3 median intervals when left out.
 * @param [timeUnit] Unit of the times: h, min or s; date-time serials when left out.
 * @returns One row: minutes, one cell per sensor.
 * @definition The temperature runs straight between scans. A reading at the threshold counts as above. A gap, and an interval with a missing reading at an end, adds nothing.
 * @standard Linear interpolation
 * @caution For records and analysis only: never an interlock or a release decision by itself. Local codes and licensed practice come first.
 * @keywords time at temperature, exposure, hold time, dwell, above threshold
 * @related LETHALITY, SOAK
 * @example =BEAD.TIMEABOVE({0;10;20},{110;130;110},120,,"min") → 10
 */
export function TIMEABOVE(
  times: unknown[][],
  temperatures: unknown[][],
  threshold: unknown[][],
  maxGap?: unknown[][],
  timeUnit?: unknown[][],
): unknown[][] {
  return timeabove({ times, temperatures, threshold, maxGap, timeUnit });
}

const timeabove = whole(TIMEABOVE, {
  arguments: {
    times: timesOf,
    temperatures: readings(sheetTemperature),
    threshold: once(sheetTemperature),
    maxGap: options.maxGap,
    timeUnit: timeUnitOption,
  },
  result: durationResult,
  cells({ times, temperatures, threshold, maxGap, timeUnit }) {
    const log = allScans(times, timeUnit, temperatures);
    if (log instanceof Refusal) return log;
    const grid = timeGrid(log.minutes, maxGap);
    if (grid instanceof Refusal) return grid;
    return [log.columns.map((column) => timeAbove(grid, column, threshold))];
  },
});
