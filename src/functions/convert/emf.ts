import { emfBetween, emfsBetween } from "../../core";
import { each, orElse, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { temperature as temperatureKind } from "../kinds/temperature";
import { emfResult } from "../results";

/**
 * EMF of a thermocouple between its measuring junction and its reference junction, from the published
 * reference function.
 * @customfunction EMF
 * @category Convert
 * @param temperature Temperature of the measuring junction, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param [referenceTemperature] Temperature of the reference junction; 0 °C when left out, as in printed tables.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns EMF in mV.
 * @equation emf = E(t) − E(reference)
 * @assumes Homogeneous wires, and terminals that are all at the reference temperature.
 * @standard IEC 60584-1:2013; NIST Monograph 175; ASTM E1751; GOST R 8.585-2001
 * @keywords temperature to millivolts, table value, voltage, simulate, calibrator
 * @related TEMPERATURE, EMFTABLE, SEEBECK
 * @example =BEAD.EMF(350,"J") → 19.09
 * @example =BEAD.EMF({100;200;300},"K") → {4.096;8.138;12.209}
 * @example =BEAD.EMF(1922,"B",135,"F") → 5.294
 */
export function EMF(
  temperature: unknown[][],
  type: unknown[][],
  referenceTemperature?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return emf({ temperature, type, referenceTemperature, unit });
}

const emf = cellwise(EMF, {
  arguments: {
    temperature: each(temperatureKind),
    type: each(couple),
    referenceTemperature: orElse(each(temperatureKind), 0, "0 °C"),
    unit: unitOption,
  },
  result: emfResult,
  cell: ({ temperature, type, referenceTemperature }) => emfBetween(type, temperature, referenceTemperature),
  column({ type }, { temperature, referenceTemperature }, answers, count) {
    emfsBetween(type, temperature, referenceTemperature, answers, count);
  },
});
