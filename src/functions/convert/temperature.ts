import { temperatureOf, temperaturesOf } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { emf as emfInMillivolts } from "../kinds/numbers";
import { temperature as temperatureKind } from "../kinds/temperature";
import { temperatureResult } from "../results";

/**
 * Temperature of the measuring junction from a measured EMF and the temperature of the reference junction,
 * by exact inversion of the published reference function.
 * @customfunction TEMPERATURE
 * @category Convert
 * @param emf Measured EMF in mV, one cell or a range of readings. For a column write IF(ISBLANK(range),"",range), so that an empty cell is not read as 0 mV.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param referenceTemperature Temperature of the reference junction (the terminals). Type 0 for an ice point.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Temperature of the measuring junction in the call's unit.
 * @equation E(t) = emf + E(reference), solved for t
 * @assumes Homogeneous wires, and terminals that are all at the reference temperature.
 * @standard IEC 60584-1:2013; NIST Monograph 175; ASTM E1751; GOST R 8.585-2001
 * @caution For records and analysis. Never use a worksheet as a safety interlock of a furnace, steriliser or pressure vessel.
 * @keywords cold junction, CJC, reference junction, thermocouple mV to degrees, millivolts, convert, inverse
 * @related EMF, SEEBECK, TYPEINFO
 * @example =BEAD.TEMPERATURE(4.096,"K",0) → 100.0
 * @example =BEAD.TEMPERATURE(2.55,"K",84,"F") → 195
 */
export function TEMPERATURE(
  emf: unknown[][],
  type: unknown[][],
  referenceTemperature: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return temperature({ emf, type, referenceTemperature, unit });
}

const temperature = cellwise(TEMPERATURE, {
  arguments: {
    emf: each(emfInMillivolts),
    type: each(couple),
    referenceTemperature: each(temperatureKind),
    unit: unitOption,
  },
  result: temperatureResult,
  cell: ({ emf, type, referenceTemperature }) => temperatureOf(type, emf, referenceTemperature),
  column({ type }, { emf, referenceTemperature }, answers, count) {
    temperaturesOf(type, emf, referenceTemperature, answers, count);
  },
});
