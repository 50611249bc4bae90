import { rereferenced } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { temperature } from "../kinds/temperature";
import { temperatureResult } from "../results";

/**
 * A reading that was logged with the wrong reference-junction temperature, put right.
 * @customfunction REREFERENCE
 * @category Compensate
 * @param indicated Temperature as indicated, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param assumedReference Reference-junction temperature that the instrument reckoned with.
 * @param actualReference Temperature that the reference junction really had.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns True temperature of the measuring junction.
 * @equation E(t) = E(indicated) − E(assumed) + E(actual), solved for t
 * @assumes Homogeneous wires, and terminals that are all at one temperature.
 * @standard IEC 60584-1:2013
 * @keywords wrong cold junction, CJC error, compensation off, reference junction
 * @related TEMPERATURE, RETYPE, DIAGNOSE
 * @example =BEAD.REREFERENCE(100,"K",0,25) → 124.3
 */
export function REREFERENCE(
  indicated: unknown[][],
  type: unknown[][],
  assumedReference: unknown[][],
  actualReference: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return rereference({ indicated, type, assumedReference, actualReference, unit });
}

const rereference = cellwise(REREFERENCE, {
  arguments: {
    indicated: each(temperature),
    type: each(couple),
    assumedReference: each(temperature),
    actualReference: each(temperature),
    unit: unitOption,
  },
  result: temperatureResult,
  cell: ({ indicated, type, assumedReference, actualReference }) =>
    rereferenced(indicated, type, assumedReference, actualReference),
});
