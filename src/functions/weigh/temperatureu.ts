import { temperatureUncertainty } from "../../core";
import { each, orElse, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { microvolts, number } from "../kinds/numbers";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { differenceResult } from "../results";

/**
 * Standard uncertainty of a temperature that was converted from an EMF: of the EMF, of the reference junction, of the
 * wires' inhomogeneity and of whatever else is given in degrees.
 * @customfunction TEMPERATUREU
 * @category Weigh
 * @param temperature Temperature of the measuring junction, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param uEmfUv Standard uncertainty of the EMF, in µV.
 * @param uReference Standard uncertainty of the reference junction's temperature, in degrees of the call's unit.
 * @param referenceTemperature Temperature of the reference junction.
 * @param [uOther] Standard uncertainty of anything else, in degrees of the call's unit; 0 when left out.
 * @param [inhomogeneity] Standard uncertainty from inhomogeneous wires, as a fraction of the EMF (0.001 for 0.1 %); 0 when left out.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Standard uncertainty in degrees of the call's unit.
 * @equation u² = (u_emf/S(t))² + (u_ref·S(tref)/S(t))² + (inhomogeneity·(E(t) − E(tref))/S(t))² + u_other²
 * @assumes Contributions that are independent, and a reference function that is nearly straight over them (SIMULATEU checks it).
 * @standard JCGM 100:2008, 5.1; IEC 60584-1:2013
 * @keywords propagate, sensitivity, cold junction uncertainty, inhomogeneity, thermocouple uncertainty
 * @related SIMULATEU, BUDGET, SEEBECK, STANDARDU
 * @example =BEAD.TEMPERATUREU(0,"K",39.45,0,0) → 1.00
 * @example =BEAD.TEMPERATUREU(20,"K",0,0.3,20,0.4) → 0.5
 */
export function TEMPERATUREU(
  temperature: unknown[][],
  type: unknown[][],
  uEmfUv: unknown[][],
  uReference: unknown[][],
  referenceTemperature: unknown[][],
  uOther?: unknown[][],
  inhomogeneity?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return temperatureu({
    temperature,
    type,
    uEmfUv,
    uReference,
    referenceTemperature,
    uOther,
    inhomogeneity,
    unit,
  });
}

const temperatureu = cellwise(TEMPERATUREU, {
  arguments: {
    temperature: each(temperature),
    type: each(couple),
    uEmfUv: each(microvolts),
    uReference: each(temperatureDifference),
    referenceTemperature: each(temperature),
    uOther: orElse(each(temperatureDifference), 0, "0"),
    inhomogeneity: orElse(each(number), 0, "0"),
    unit: unitOption,
  },
  result: differenceResult,
  cell: ({ temperature, type, uEmfUv, uReference, referenceTemperature, uOther, inhomogeneity }) =>
    temperatureUncertainty(
      type,
      temperature,
      uEmfUv,
      uReference,
      referenceTemperature,
      uOther,
      inhomogeneity,
    ),
});
