import { releaded } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { lead as leadKind } from "../kinds/lead";
import { temperature } from "../kinds/temperature";
import { temperatureResult } from "../results";

/**
 * A reading taken through a run of another pair, or of copper, from head to terminals, put right.
 * @customfunction RELEAD
 * @category Compensate
 * @param indicated Temperature as indicated, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param lead Pair of the run: a type (its extension cable), or copper.
 * @param headTemperature Temperature of the connection head.
 * @param referenceTemperature Temperature of the reference junction (the terminals).
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns True temperature of the measuring junction.
 * @equation E(t) = E(indicated) + [E(head) − E(reference)] − [Elead(head) − Elead(reference)]
 * @assumes The run's plus wire on the couple's plus wire, homogeneous wires, and both connections of the head, and of the terminals, at one temperature.
 * @standard IEC 60584-1:2013
 * @keywords extension cable, copper wire, wrong cable, lead wire, repair
 * @related LEADERROR, UNREVERSE, DIAGNOSE
 * @example =BEAD.RELEAD(765.1,"K","copper",60,25) → 800
 */
export function RELEAD(
  indicated: unknown[][],
  type: unknown[][],
  lead: unknown[][],
  headTemperature: unknown[][],
  referenceTemperature: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return relead({ indicated, type, lead, headTemperature, referenceTemperature, unit });
}

const relead = cellwise(RELEAD, {
  arguments: {
    indicated: each(temperature),
    type: each(couple),
    lead: each(leadKind),
    headTemperature: each(temperature),
    referenceTemperature: each(temperature),
    unit: unitOption,
  },
  result: temperatureResult,
  cell: ({ indicated, type, lead, headTemperature, referenceTemperature }) =>
    releaded(indicated, type, lead, headTemperature, referenceTemperature),
});
