import { differential as temperatureDifference } from "../../core";
import { each, once, orElse, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { emf as emfInMillivolts, number } from "../kinds/numbers";
import { temperature } from "../kinds/temperature";
import { differenceResult } from "../results";

/**
 * Temperature difference that a differential couple or a thermopile measures above its base junctions.
 * @customfunction DIFFERENTIAL
 * @category Compensate
 * @param emf Measured EMF in mV, one cell or a range of readings.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param baseTemperature Temperature of the base junctions.
 * @param [pairs] Number of couples in series; 1 when left out.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Temperature of the other junctions less that of the base, in degrees of the call's unit.
 * @equation E(base + difference) = E(base) + emf / pairs
 * @assumes Homogeneous wires, all base junctions at one temperature and all others at one.
 * @standard IEC 60584-1:2013
 * @keywords thermopile, differential thermocouple, temperature difference, heat flux
 * @related TEMPERATURE, SEEBECK
 * @example =BEAD.DIFFERENTIAL(8.192,"K",0,2) → 100.0
 */
export function DIFFERENTIAL(
  emf: unknown[][],
  type: unknown[][],
  baseTemperature: unknown[][],
  pairs?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return differential({ emf, type, baseTemperature, pairs, unit });
}

const differential = cellwise(DIFFERENTIAL, {
  arguments: {
    emf: each(emfInMillivolts),
    type: each(couple),
    baseTemperature: each(temperature),
    pairs: orElse(once(number), 1, "1"),
    unit: unitOption,
  },
  result: differenceResult,
  cell: ({ emf, type, baseTemperature, pairs }) => temperatureDifference(emf, type, baseTemperature, pairs),
});
