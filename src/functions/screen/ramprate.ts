import { noAnswer, Refusal, rampRate, timeGrid } from "../../core";
import { ifGiven, once, readings, times as timesOf, timeUnit as timeUnitOption } from "../arguments";
import { columnwise } from "../columnwise";
import { minutes, sheetTemperature } from "../kinds/numbers";
import { rampRateResult } from "../results";
import { scans } from "../scans";

/**
 * How fast logged temperatures rise, in degrees per minute: the slope of a least-squares line through the readings
 * about each scan.
 * @customfunction RAMPRATE
 * @category Screen
 * @param times One column of times, rising. Write IF(ISBLANK(range),"",range) where rows below the log are empty.
 * @param temperatures Temperatures, a column per sensor, in whatever degrees the sheet holds. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0.
 * @param [windowMinutes] Width of the window, half of it on each side of a scan; 5 median intervals when left out.
 * @param [timeUnit] Unit of the times: h, min or s; date-time serials when left out.
 * @returns Degrees per minute, in the shape of the temperatures.
 * @equation slope = Σ(t − t̄)(T − T̄) / Σ(t − t̄)² over the window
 * @definition At the ends of the record the window reaches as far as it goes. A reading without a second time in its window is #N/A.
 * @standard Local linear least squares
 * @keywords heating rate, cooling rate, slope, derivative, ramp, degrees per minute
 * @related UNLAG, TIMECONSTANT, DESPIKE
 * @example =BEAD.RAMPRATE({0;1;2;3},{20;25;30;35},,"min") → {5.0;5.0;5.0;5.0}
 */
export function RAMPRATE(
  times: unknown[][],
  temperatures: unknown[][],
  windowMinutes?: unknown[][],
  timeUnit?: unknown[][],
): unknown[][] {
  return ramprate({ times, temperatures, windowMinutes, timeUnit });
}

const ramprate = columnwise(RAMPRATE, {
  arguments: {
    times: timesOf,
    temperatures: readings(sheetTemperature),
    windowMinutes: ifGiven(once(minutes)),
    timeUnit: timeUnitOption,
  },
  result: rampRateResult,
  unanswered: noAnswer`no second reading within the window`,
  block: ({ temperatures }) => temperatures,
  answers({ times, temperatures, windowMinutes, timeUnit }) {
    const log = scans(times, timeUnit, temperatures);
    if (log instanceof Refusal) return log;
    const grid = timeGrid(log.minutes);
    if (grid instanceof Refusal) return grid;
    return log.columns.map((column) => rampRate(grid, column, windowMinutes));
  },
});
