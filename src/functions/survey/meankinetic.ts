import { ACTIVATION_ENERGY, meanKinetic, Refusal, timeGrid } from "../../core";
import {
  ifGiven,
  once,
  orElse,
  readings,
  times as timesOf,
  timeUnit as timeUnitOption,
  unit as unitOption,
} from "../arguments";
import { plainNumber } from "../kinds/kind";
import { temperature } from "../kinds/temperature";
import { temperatureResult } from "../results";
import { allScans } from "../scans";
import { whole, written } from "../whole";

/**
 * Mean kinetic temperature of each logged sensor: the steady temperature that would age a product as much as the
 * record did.
 * @customfunction MEANKINETIC
 * @category Survey
 * @param temperatures Temperatures, a column per sensor. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0.
 * @param [activationEnergy] Activation energy in kJ/mol, 10 to 500; 83.144 when left out.
 * @param [times] One column of times, rising; each reading then counts by its time. All readings count the same when left out.
 * @param [timeUnit] Unit of the times: h, min or s; date-time serials when left out.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns One row: mean kinetic temperature, one cell per sensor.
 * @equation T = (ΔH/R) / −ln(Σ w·exp(−ΔH/(R·T)) / Σ w), T in kelvin, R = 8.3144 J/(mol·K)
 * @definition w is 1, or with times half the time to each neighbour; a gap of more than 3 median intervals, and an interval with a missing reading at an end, adds nothing.
 * @assumes One reaction with one activation energy.
 * @standard USP ⟨1079⟩ mean kinetic temperature (from memory)
 * @caution For records and analysis only: never an interlock or a release decision by itself. Local codes and licensed practice come first.
 * @keywords MKT, storage, stability, cold chain, Arrhenius, pharmaceutical, warehouse mapping
 * @related LETHALITY, TIMEABOVE
 * @example =BEAD.MEANKINETIC({20;22;25;30}) → 25.03
 */
export function MEANKINETIC(
  temperatures: unknown[][],
  activationEnergy?: unknown[][],
  times?: unknown[][],
  timeUnit?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return meankinetic({ temperatures, activationEnergy, times, timeUnit, unit });
}

const meankinetic = whole(MEANKINETIC, {
  arguments: {
    temperatures: readings(temperature),
    activationEnergy: orElse(
      once(plainNumber("activation energy", "kJ/mol")),
      ACTIVATION_ENERGY,
      `${ACTIVATION_ENERGY} kJ/mol`,
    ),
    times: ifGiven(timesOf),
    timeUnit: timeUnitOption,
    unit: unitOption,
  },
  result: temperatureResult,
  cells({ temperatures, activationEnergy, times, timeUnit }, unit) {
    const of = meanKinetic(activationEnergy);
    if (of instanceof Refusal) return of;
    if (times === undefined) {
      return [temperatures.columns.map((column) => written(of(column), temperatureResult, unit))];
    }
    const log = allScans(times, timeUnit, temperatures);
    if (log instanceof Refusal) return log;
    const grid = timeGrid(log.minutes);
    if (grid instanceof Refusal) return grid;
    return [log.columns.map((column) => written(of(column, grid), temperatureResult, unit))];
  },
});
