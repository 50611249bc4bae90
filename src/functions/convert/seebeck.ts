import { seebeckAt } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { temperature as temperatureKind } from "../kinds/temperature";
import { seebeckResult } from "../results";

/**
 * Seebeck coefficient (sensitivity) of a thermocouple at a temperature: the derivative of the published
 * reference function.
 * @customfunction SEEBECK
 * @category Convert
 * @param temperature Temperature, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Seebeck coefficient in µV per degree of the call's unit. At a join of two segments the lower one counts.
 * @equation S(t) = dE/dt
 * @standard IEC 60584-1:2013; NIST Monograph 175; ASTM E1751; GOST R 8.585-2001
 * @keywords sensitivity, slope, microvolts per degree, derivative
 * @related EMF, TEMPERATURE
 * @example =BEAD.SEEBECK(0,"S") → 5.403
 */
export function SEEBECK(temperature: unknown[][], type: unknown[][], unit?: unknown[][]): unknown[][] {
  return seebeck({ temperature, type, unit });
}

const seebeck = cellwise(SEEBECK, {
  arguments: { temperature: each(temperatureKind), type: each(couple), unit: unitOption },
  result: seebeckResult,
  cell: ({ temperature, type }) => seebeckAt(type, temperature),
});
