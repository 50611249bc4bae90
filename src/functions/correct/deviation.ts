import { deviationDegrees, deviationUv } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { emf as emfInMillivolts } from "../kinds/numbers";
import { temperature } from "../kinds/temperature";
import { differenceResult, microvoltResult } from "../results";
import * as options from "./options";

/**
 * What a couple measured at a known temperature, less what its reference function says.
 * @customfunction DEVIATION
 * @category Correct
 * @param emf Measured EMF in mV, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param trueTemperature True temperature of the measuring junction.
 * @param referenceTemperature Temperature of the reference junction. Type 0 for an ice point.
 * @param [expressedIn] uV (default), or degrees by exact inversion.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Deviation in µV, or in degrees of the call's unit: indicated less true temperature.
 * @equation In µV: emf − [E(true) − E(reference)]. In degrees: t(emf) − true
 * @standard IEC 60584-1:2013
 * @keywords calibration, error, deviation from table, EMF deviation
 * @related ATNOMINAL, CALFIT, TEMPERATURE
 * @example =BEAD.DEVIATION(4.106,"K",100,0) → 10
 */
export function DEVIATION(
  emf: unknown[][],
  type: unknown[][],
  trueTemperature: unknown[][],
  referenceTemperature: unknown[][],
  expressedIn?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return deviation({ emf, type, trueTemperature, referenceTemperature, expressedIn, unit });
}

const deviation = cellwise(DEVIATION, {
  arguments: {
    emf: each(emfInMillivolts),
    type: each(couple),
    trueTemperature: each(temperature),
    referenceTemperature: each(temperature),
    expressedIn: options.expressedIn,
    unit: unitOption,
  },
  result: microvoltResult,
  resultOf: ({ expressedIn }) => (expressedIn === "uV" ? microvoltResult : differenceResult),
  cell: ({ emf, type, trueTemperature, referenceTemperature, expressedIn }) =>
    (expressedIn === "uV" ? deviationUv : deviationDegrees)(type, emf, trueTemperature, referenceTemperature),
});
