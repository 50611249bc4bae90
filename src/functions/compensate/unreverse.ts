import { crossings, unreversed } from "../../core";
import { each, ifGiven, once, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { choice } from "../kinds/kind";
import { temperature } from "../kinds/temperature";
import { temperatureResult } from "../results";

/**
 * A reading that was taken with plus and minus crossed, put right.
 * @customfunction UNREVERSE
 * @category Compensate
 * @param indicated Temperature as indicated, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param crossedAt Where: terminals, head (only there), or both (the extension pair at both of its ends).
 * @param referenceTemperature Temperature of the reference junction (the terminals).
 * @param [headTemperature] Temperature of the connection head; needed for head and both.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns True temperature of the measuring junction.
 * @equation Crossed at the terminals: E(t) = 2·E(reference) − E(indicated)
 * @equation Crossed at the head: E(t) = 2·E(head) − E(indicated)
 * @equation Extension crossed at both ends: E(t) = E(indicated) + 2·[E(head) − E(reference)]
 * @assumes Homogeneous wires, an extension pair of the couple's own type, and both connections of the head, and of the terminals, at one temperature.
 * @standard IEC 60584-1:2013
 * @keywords polarity, reversed, crossed wires, swapped extension, plus and minus
 * @related DIAGNOSE, RELEAD, REREFERENCE
 * @example =BEAD.UNREVERSE(-55.8,"K","terminals",25) → 100
 */
export function UNREVERSE(
  indicated: unknown[][],
  type: unknown[][],
  crossedAt: unknown[][],
  referenceTemperature: unknown[][],
  headTemperature?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return unreverse({ indicated, type, crossedAt, referenceTemperature, headTemperature, unit });
}

const unreverse = cellwise(UNREVERSE, {
  arguments: {
    indicated: each(temperature),
    type: each(couple),
    crossedAt: once(choice(crossings)),
    referenceTemperature: each(temperature),
    headTemperature: ifGiven(each(temperature)),
    unit: unitOption,
  },
  result: temperatureResult,
  cell: ({ indicated, type, crossedAt, referenceTemperature, headTemperature }) =>
    unreversed(indicated, type, crossedAt, referenceTemperature, headTemperature),
});
