import { Refusal, timeConstant, timeGrid } from "../../core";
import { ifGiven, once, readings, times as timesOf, timeUnit as timeUnitOption } from "../arguments";
import { choice } from "../kinds/kind";
import { sheetTemperature } from "../kinds/numbers";
import { secondsResult, sheetTemperatureResult } from "../results";
import { allScans } from "../scans";
import { type Entry, whole } from "../whole";

/**
 * Time constant in seconds of a sensor from a recorded step, fitted by least squares, with its standard uncertainty
 * and the temperatures before and after.
 * @customfunction TIMECONSTANT
 * @category Screen
 * @param times One column of times, rising. Write IF(ISBLANK(range),"",range) where rows below the log are empty.
 * @param temperatures The recorded step, a column per sensor, in whatever degrees the sheet holds. Blank cells are left out.
 * @param [timeUnit] Unit of the times: h, min or s; date-time serials when left out.
 * @param [metric] One value per sensor: time_constant, uncertainty, initial or final.
 * @returns Rows of metric and value, a value column per sensor, or the one row asked for.
 * @equation T(t) = final + (initial − final) · exp(−t/τ), τ the time constant
 * @definition time_constant, uncertainty: seconds; the uncertainty is the standard one, from the scatter about the fitted curve.
 * @definition initial: mean of the level readings before the step, or the curve at the first reading. final: where the curve settles.
 * @definition #N/A where the record has fewer than 6 readings or more than 20 000, where no step stands out of scatter and resolution, where it is over within one interval, or where the record ends before it begins to settle.
 * @assumes A first-order sensor and surroundings that change at once, as when it is plunged into a bath.
 * @standard Least squares by variable projection; Golub and Pereyra (1973)
 * @keywords response time, step response, plunge test, lag, tau, 63 %
 * @related UNLAG, RAMPRATE
 * @example =BEAD.TIMECONSTANT({0;5;10;15;20;30;40},{20;51.478;70.570;82.150;89.173;96.017;98.535},"s","time_constant") → 10.0
 */
export function TIMECONSTANT(
  times: unknown[][],
  temperatures: unknown[][],
  timeUnit?: unknown[][],
  metric?: unknown[][],
): unknown[][] {
  return timeconstant({ times, temperatures, timeUnit, metric });
}

const names = {
  time_constant: "timeConstant",
  uncertainty: "uncertainty",
  initial: "initial",
  final: "final",
} as const;
type Metric = keyof typeof names;
const all = Object.keys(names) as Metric[];

const timeconstant = whole(TIMECONSTANT, {
  arguments: {
    times: timesOf,
    temperatures: readings(sheetTemperature),
    timeUnit: timeUnitOption,
    metric: ifGiven(once(choice(all))),
  },
  result: {
    time_constant: secondsResult,
    uncertainty: secondsResult,
    initial: sheetTemperatureResult,
    final: sheetTemperatureResult,
  },
  cells({ times, temperatures, timeUnit, metric }) {
    const log = allScans(times, timeUnit, temperatures);
    if (log instanceof Refusal) return log;
    const grid = timeGrid(log.minutes);
    if (grid instanceof Refusal) return grid;
    const steps = log.columns.map((column) => timeConstant(grid, column));
    const row = (asked: Metric): Entry[] =>
      steps.map((step) => (step instanceof Refusal ? step : step[names[asked]]));
    const [only] = steps;
    if (steps.length === 1 && only instanceof Refusal) return only;
    if (metric !== undefined) return [row(metric)];
    const values = steps.length === 1 ? ["value"] : steps.map((_, at) => `sensor ${at + 1}`);
    return [["metric", ...values], ...all.map((each) => [each, ...row(each)])];
  },
});
