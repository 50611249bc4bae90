import { emfAtNominal } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { emf as emfInMillivolts } from "../kinds/numbers";
import { temperature } from "../kinds/temperature";
import { emfResult } from "../results";

/**
 * A measured EMF moved from the true temperature of the bath or furnace to the nominal one of the certificate.
 * @customfunction ATNOMINAL
 * @category Correct
 * @param emf Measured EMF in mV, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param trueTemperature True temperature at which it was measured.
 * @param nominal Nominal temperature.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns EMF in mV at the nominal temperature.
 * @equation emf at nominal = emf + E(nominal) − E(true)
 * @assumes The couple's deviation is the same at both temperatures: they lie a degree or two apart.
 * @standard IEC 60584-1:2013; common practice
 * @keywords nominal temperature, calibration point, bath temperature
 * @related DEVIATION, CALFIT
 * @example =BEAD.ATNOMINAL(4.096,"K",100,100) → 4.096
 */
export function ATNOMINAL(
  emf: unknown[][],
  type: unknown[][],
  trueTemperature: unknown[][],
  nominal: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return atnominal({ emf, type, trueTemperature, nominal, unit });
}

const atnominal = cellwise(ATNOMINAL, {
  arguments: {
    emf: each(emfInMillivolts),
    type: each(couple),
    trueTemperature: each(temperature),
    nominal: each(temperature),
    unit: unitOption,
  },
  result: emfResult,
  cell: ({ emf, type, trueTemperature, nominal }) => emfAtNominal(type, emf, trueTemperature, nominal),
});
