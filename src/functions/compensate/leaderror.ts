import { leadError } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { lead as leadKind } from "../kinds/lead";
import { temperature as temperatureKind } from "../kinds/temperature";
import { differenceResult } from "../results";

/**
 * Error of the indication when the run from head to terminals is of another pair than the couple, or of copper.
 * @customfunction LEADERROR
 * @category Compensate
 * @param temperature True temperature of the measuring junction, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param lead Pair of the run: a type (its extension cable), or copper.
 * @param headTemperature Temperature of the connection head.
 * @param referenceTemperature Temperature of the reference junction (the terminals).
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Indicated less true temperature, in degrees of the call's unit.
 * @equation E(indicated) = E(t) − [E(head) − E(reference)] + [Elead(head) − Elead(reference)]
 * @assumes The run's plus wire on the couple's plus wire, homogeneous wires, and both connections of the head, and of the terminals, at one temperature.
 * @standard IEC 60584-1:2013
 * @keywords extension cable, copper wire, wrong cable, compensating cable, lead wire
 * @related RELEAD, CABLETOLERANCE, DIAGNOSE
 * @example =BEAD.LEADERROR(800,"K","copper",60,25) → -35
 */
export function LEADERROR(
  temperature: unknown[][],
  type: unknown[][],
  lead: unknown[][],
  headTemperature: unknown[][],
  referenceTemperature: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return leaderror({ temperature, type, lead, headTemperature, referenceTemperature, unit });
}

const leaderror = cellwise(LEADERROR, {
  arguments: {
    temperature: each(temperatureKind),
    type: each(couple),
    lead: each(leadKind),
    headTemperature: each(temperatureKind),
    referenceTemperature: each(temperatureKind),
    unit: unitOption,
  },
  result: differenceResult,
  cell: ({ temperature, type, lead, headTemperature, referenceTemperature }) =>
    leadError(temperature, type, lead, headTemperature, referenceTemperature),
});
