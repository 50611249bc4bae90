import { lethality as lethalityOf, Refusal, timeGrid } from "../../core";
import {
  ifGiven,
  once,
  orElse,
  readings,
  times as timesOf,
  timeUnit as timeUnitOption,
  unit as unitOption,
} from "../arguments";
import { choice } from "../kinds/kind";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { durationResult } from "../results";
import { allScans } from "../scans";
import { type Entry, whole } from "../whole";
import * as options from "./options";

/**
 * F value in minutes of each logged sensor: the time at a reference temperature that would kill as much as the record
 * did.
 * @customfunction LETHALITY
 * @category Survey
 * @param times One column of times, rising. Write IF(ISBLANK(range),"",range) where rows below the log are empty.
 * @param temperatures Temperatures, a column per sensor. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0.
 * @param referenceTemperature Reference temperature. For F0 121, 121.1 and 121.11 °C are all in print: take that of your protocol.
 * @param z Temperature difference that changes the lethal rate tenfold, above 0; 10 °C for F0.
 * @param [threshold] Readings below add nothing; all count when left out.
 * @param [method] straight (temperature straight between scans, integrated exactly; default) or trapezoid (of the lethal rates).
 * @param [maxGap] Longest time between two scans that is no gap, in minutes; 3 median intervals when left out.
 * @param [timeUnit] Unit of the times: h, min or s; date-time serials when left out.
 * @param [metric] f (default), running (F up to each scan, a column per sensor) or missing_minutes.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns One row, one cell per sensor; for running one row per scan.
 * @equation F = ∫ 10^((T − reference)/z) dt
 * @definition A reading at the threshold counts. Where a straight temperature crosses it, the part of the interval above counts.
 * @definition missing_minutes: in gaps and in intervals with a missing reading at an end; they add nothing to F.
 * @assumes First-order death of one organism with one z value.
 * @standard Common practice of moist-heat sterilisation and pasteurisation
 * @caution For records and analysis only: never an interlock or a release decision by itself. Local codes and licensed practice come first.
 * @keywords F0, sterilisation, autoclave, pasteurisation, PU, lethal rate, steriliser validation
 * @related TIMEABOVE, MEANKINETIC
 * @example =BEAD.LETHALITY({0;15},{124;111},121,10,,"trapezoid",,"min") → 15.71
 * @example =BEAD.LETHALITY({0;5;10;15},{124;124;124;124},121,10,,,,"min") → 29.93
 */
export function LETHALITY(
  times: unknown[][],
  temperatures: unknown[][],
  referenceTemperature: unknown[][],
  z: unknown[][],
  threshold?: unknown[][],
  method?: unknown[][],
  maxGap?: unknown[][],
  timeUnit?: unknown[][],
  metric?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return lethality({
    times,
    temperatures,
    referenceTemperature,
    z,
    threshold,
    method,
    maxGap,
    timeUnit,
    metric,
    unit,
  });
}

const lethality = whole(LETHALITY, {
  arguments: {
    times: timesOf,
    temperatures: readings(temperature),
    referenceTemperature: once(temperature),
    z: once(temperatureDifference),
    threshold: ifGiven(once(temperature)),
    method: orElse(once(choice(["straight", "trapezoid"])), "straight", "straight"),
    maxGap: options.maxGap,
    timeUnit: timeUnitOption,
    metric: orElse(once(choice(["f", "running", "missing_minutes"])), "f", "f"),
    unit: unitOption,
  },
  result: durationResult,
  cells({ times, temperatures, referenceTemperature, maxGap, timeUnit, metric, ...settings }) {
    const of = lethalityOf({ ...settings, reference: referenceTemperature });
    if (of instanceof Refusal) return of;
    const log = allScans(times, timeUnit, temperatures);
    if (log instanceof Refusal) return log;
    const grid = timeGrid(log.minutes, maxGap);
    if (grid instanceof Refusal) return grid;
    const records = log.columns.map((column) => of(grid, column));
    const row = (figure: (record: Exclude<(typeof records)[number], Refusal>) => Entry): Entry[] =>
      records.map((record) => (record instanceof Refusal ? record : figure(record)));
    if (metric === "f") return [row(({ f }) => f)];
    if (metric === "missing_minutes") return [row(({ missingMinutes }) => missingMinutes)];
    // Rows below the last time are no part of the log, and stay blank.
    return Array.from({ length: times.rows }, (_, scan) => row(({ running }) => running[scan] ?? ""));
  },
});
