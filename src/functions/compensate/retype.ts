import { retyped } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { temperature } from "../kinds/temperature";
import { temperatureResult } from "../results";

/**
 * A reading that was logged with the instrument set to another type than the couple that was fitted, put right.
 * @customfunction RETYPE
 * @category Compensate
 * @param indicated Temperature as indicated, one cell or a range.
 * @param setType Type to which the instrument was set.
 * @param fittedType Type of the couple that was really fitted.
 * @param referenceTemperature Temperature of the reference junction (the terminals).
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns True temperature of the measuring junction.
 * @equation Efitted(t) = Eset(indicated) − Eset(reference) + Efitted(reference), solved for t
 * @assumes Homogeneous wires, and terminals that are all at the reference temperature.
 * @standard IEC 60584-1:2013
 * @keywords wrong type, wrong setting, type J on K, misconfigured
 * @related REREFERENCE, DIAGNOSE
 * @example =BEAD.RETYPE(152.3,"J","K",0) → 200
 */
export function RETYPE(
  indicated: unknown[][],
  setType: unknown[][],
  fittedType: unknown[][],
  referenceTemperature: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return retype({ indicated, setType, fittedType, referenceTemperature, unit });
}

const retype = cellwise(RETYPE, {
  arguments: {
    indicated: each(temperature),
    setType: each(couple),
    fittedType: each(couple),
    referenceTemperature: each(temperature),
    unit: unitOption,
  },
  result: temperatureResult,
  cell: ({ indicated, setType, fittedType, referenceTemperature }) =>
    retyped(indicated, setType, fittedType, referenceTemperature),
});
