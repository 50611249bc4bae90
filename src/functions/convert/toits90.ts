import { toIts90 } from "../../core";
import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { temperature } from "../kinds/temperature";
import { temperatureResult } from "../results";

/**
 * A temperature from an old certificate (IPTS-68) on today's scale, ITS-90.
 * @customfunction TOITS90
 * @category Convert
 * @param t68 Temperature on IPTS-68, one cell or a range, from −200 °C to 4000 °C.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns The same temperature on ITS-90, in the call's unit.
 * @equation t90 = t68 + d(t90), d the published difference as a function of t90, solved by iteration
 * @standard ITS-90; Rusby et al. (1991) to 630.6 °C; Rusby, Hudson, Durieux (1994) to 1064.18 °C
 * @definition Above 1064.18 °C: d = −0.25·((t90 + 273.15)/1337.33)², a form from memory that meets the printed values.
 * @keywords IPTS-68, old scale, temperature scale, conversion of scales
 * @related TYPEINFO
 * @example =BEAD.TOITS90(100) → 99.974
 */
export function TOITS90(t68: unknown[][], unit?: unknown[][]): unknown[][] {
  return toits90({ t68, unit });
}

const toits90 = cellwise(TOITS90, {
  arguments: { t68: each(temperature), unit: unitOption },
  result: temperatureResult,
  cell: ({ t68 }) => toIts90(t68),
});
