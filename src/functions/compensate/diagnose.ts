import { diagnose as explanations } from "../../core";
import { ifGiven, once, unit as unitOption } from "../arguments";
import { couple } from "../kinds/couple";
import { choice } from "../kinds/kind";
import { temperature } from "../kinds/temperature";
import { differenceResult, temperatureResult, wordResult } from "../results";
import { table } from "../whole";

/**
 * Which wiring or setting fault would explain a suspicious reading: each fault with the true temperature that it
 * would mean and how far that is from the expected one, best first.
 * @customfunction DIAGNOSE
 * @category Compensate
 * @param indicated The suspicious reading.
 * @param expected What it should have been.
 * @param type Thermocouple type that is fitted and set.
 * @param referenceTemperature Temperature of the reference junction (the terminals).
 * @param [headTemperature] Temperature of the connection head; without it the faults of the run are left out.
 * @param [column] One column without its header: fault, temperature or residual.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Rows of fault, true temperature under that fault, and its difference from the expected temperature.
 * @definition residual: true temperature that the fault would explain, less the expected one.
 * @assumes One fault at a time, homogeneous wires, and terminals (and head) at one temperature.
 * @standard IEC 60584-1:2013
 * @keywords troubleshoot, fault finding, wrong reading, polarity, wrong type, wrong cable
 * @related UNREVERSE, RETYPE, REREFERENCE, RELEAD
 * @caution A likely fault is a place to look, not a finding. Isolate and lock off before work on furnace wiring; local codes and licensed practice come first.
 * @example =BEAD.DIAGNOSE(-55.8,100,"K",25,,"fault") → {"crossed at the terminals";…}
 */
export function DIAGNOSE(
  indicated: unknown[][],
  expected: unknown[][],
  type: unknown[][],
  referenceTemperature: unknown[][],
  headTemperature?: unknown[][],
  column?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return diagnose({ indicated, expected, type, referenceTemperature, headTemperature, column, unit });
}

const diagnose = table(DIAGNOSE, {
  arguments: {
    indicated: once(temperature),
    expected: once(temperature),
    type: once(couple),
    referenceTemperature: once(temperature),
    headTemperature: ifGiven(once(temperature)),
    column: ifGiven(once(choice(["fault", "temperature", "residual"]))),
    unit: unitOption,
  },
  result: { fault: wordResult, temperature: temperatureResult, residual: differenceResult },
  rows: ({ indicated, expected, type, referenceTemperature, headTemperature }) =>
    explanations(indicated, expected, type, referenceTemperature, headTemperature),
});
