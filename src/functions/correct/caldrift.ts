import { calibrationDrift, Refusal } from "../../core";
import { column as columnOf, ifGiven, once, unit as unitOption } from "../arguments";
import { choice } from "../kinds/kind";
import { date } from "../kinds/numbers";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { dateResult, differencePerYearResult, differenceResult, temperatureResult } from "../results";
import { table } from "../whole";

/**
 * What two calibrations of one sensor say of its drift: per point, per year, and the date on which the value would
 * leave its limit at that rate.
 * @customfunction CALDRIFT
 * @category Correct
 * @param points Temperatures of both certificates, in a row or column, rising or falling strictly.
 * @param firstValues Corrections (or errors) of the first calibration.
 * @param secondValues The same of the second calibration.
 * @param firstDate Date of the first calibration.
 * @param secondDate Date of the second calibration, later than the first.
 * @param [limits] Limit of the value, ±: one for all points or one for each.
 * @param [column] One column without its header: point, drift, per_year or leaves_limit_on.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Rows of point, drift, drift per year and date; format the last column as a date.
 * @equation drift = second − first value; per year = drift / days · 365.25
 * @definition leaves_limit_on: the day on which the second value, going on at the same rate, reaches plus or minus its limit.
 * @standard Common practice of recalibration intervals
 * @keywords drift, recalibration, interval, due date, stability
 * @related CORRECTION, CORRECTIONU
 * @example =BEAD.CALDRIFT({500;900},{-1.0;-2.0},{-1.4;-2.6},44927,45292.25,,"per_year") → {-0.4;-0.6}
 */
export function CALDRIFT(
  points: unknown[][],
  firstValues: unknown[][],
  secondValues: unknown[][],
  firstDate: unknown[][],
  secondDate: unknown[][],
  limits?: unknown[][],
  column?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return caldrift({ points, firstValues, secondValues, firstDate, secondDate, limits, column, unit });
}

const caldrift = table(CALDRIFT, {
  arguments: {
    points: columnOf(temperature),
    firstValues: columnOf(temperatureDifference),
    secondValues: columnOf(temperatureDifference),
    firstDate: once(date),
    secondDate: once(date),
    limits: ifGiven(columnOf(temperatureDifference)),
    column: ifGiven(once(choice(["point", "drift", "per_year", "leaves_limit_on"]))),
    unit: unitOption,
  },
  result: {
    point: temperatureResult,
    drift: differenceResult,
    per_year: differencePerYearResult,
    leaves_limit_on: dateResult,
  },
  rows({ points, firstValues, secondValues, firstDate, secondDate, limits }) {
    const drifts = calibrationDrift(
      points,
      { date: firstDate, values: firstValues },
      { date: secondDate, values: secondValues },
      limits,
    );
    if (drifts instanceof Refusal) return drifts;
    return drifts.map(({ point, drift, perYear, leavesLimitOn }) => ({
      point,
      drift,
      per_year: perYear,
      leaves_limit_on: leavesLimitOn,
    }));
  },
});
