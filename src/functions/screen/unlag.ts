import { noAnswer, Refusal, unlag as surroundings, timeGrid } from "../../core";
import { ifGiven, once, readings, times as timesOf, timeUnit as timeUnitOption } from "../arguments";
import { columnwise } from "../columnwise";
import { minutes, seconds, sheetTemperature } from "../kinds/numbers";
import { sheetTemperatureResult } from "../results";
import { scans } from "../scans";

/**
 * First-order lag of a sensor taken out of its record: the temperature to which it was exposed.
 * @customfunction UNLAG
 * @category Screen
 * @param times One column of times, rising. Write IF(ISBLANK(range),"",range) where rows below the log are empty.
 * @param temperatures Temperatures, a column per sensor, in whatever degrees the sheet holds. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0.
 * @param timeConstant Time constant of the sensor in seconds, above 0, as TIMECONSTANT gives it.
 * @param [windowMinutes] Width of the window in which the slope is taken; 5 median intervals when left out.
 * @param [timeUnit] Unit of the times: h, min or s; date-time serials when left out.
 * @returns Temperatures in the shape of the given ones.
 * @equation surroundings = T + τ · dT/dt, dT/dt as by RAMPRATE
 * @definition A reading without a second time in its window is #N/A.
 * @assumes A first-order sensor whose time constant does not change. Noise grows by the time constant over the window.
 * @standard First-order response of a sensor
 * @caution A reconstructed temperature is for analysis, never for an interlock or a release decision by itself.
 * @keywords lag, response time, dynamic correction, delay, first order
 * @related TIMECONSTANT, RAMPRATE
 * @example =BEAD.UNLAG({0;1;2},{20;22;24},30,,"min") → {21.0;23.0;25.0}
 */
export function UNLAG(
  times: unknown[][],
  temperatures: unknown[][],
  timeConstant: unknown[][],
  windowMinutes?: unknown[][],
  timeUnit?: unknown[][],
): unknown[][] {
  return unlag({ times, temperatures, timeConstant, windowMinutes, timeUnit });
}

const unlag = columnwise(UNLAG, {
  arguments: {
    times: timesOf,
    temperatures: readings(sheetTemperature),
    timeConstant: once(seconds),
    windowMinutes: ifGiven(once(minutes)),
    timeUnit: timeUnitOption,
  },
  result: sheetTemperatureResult,
  unanswered: noAnswer`no second reading within the window`,
  block: ({ temperatures }) => temperatures,
  answers({ times, temperatures, timeConstant, windowMinutes, timeUnit }) {
    const log = scans(times, timeUnit, temperatures);
    if (log instanceof Refusal) return log;
    const grid = timeGrid(log.minutes);
    if (grid instanceof Refusal) return grid;
    return log.columns.map((column) => surroundings(grid, column, timeConstant, windowMinutes));
  },
});
