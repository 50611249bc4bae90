import { correctionUncertainty } from "../../core";
import { column, each, once, orElse, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { number } from "../kinds/numbers";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { differenceResult } from "../results";

/**
 * Standard uncertainty of a correction that was interpolated between two points of a certificate.
 * @customfunction CORRECTIONU
 * @category Correct
 * @param reading Reading, one cell or a range.
 * @param points The certificate's temperatures, in a row or column, rising or falling strictly.
 * @param expandedUncertainties Expanded uncertainty U at each point, above 0.
 * @param [k] Coverage factor of U; 2 when left out.
 * @param [drift] Allowance for drift since the calibration, as the half-width of a rectangular distribution; 0 when left out.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Standard uncertainty in degrees of the call's unit.
 * @equation u = √(max(U/k of the two points beside)² + drift²/3)
 * @definition At a point its own U/k counts. The uncertainty of the interpolation itself is not included.
 * @standard JCGM 100:2008, 4.3.7; common practice for the larger of two points
 * @keywords certificate uncertainty, calibration uncertainty, drift allowance
 * @related CORRECTION, BUDGET, CALDRIFT
 * @example =BEAD.CORRECTIONU(150,{100;200},{0.8;1.2}) → 0.6
 */
export function CORRECTIONU(
  reading: unknown[][],
  points: unknown[][],
  expandedUncertainties: unknown[][],
  k?: unknown[][],
  drift?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return correctionu({ reading, points, expandedUncertainties, k, drift, unit });
}

const correctionu = cellwise(CORRECTIONU, {
  arguments: {
    reading: each(temperature),
    points: column(temperature),
    expandedUncertainties: column(temperatureDifference),
    k: orElse(once(number), 2, "2"),
    drift: orElse(each(temperatureDifference), 0, "0"),
    unit: unitOption,
  },
  result: differenceResult,
  prepare: ({ points, expandedUncertainties, k }) => correctionUncertainty(points, expandedUncertainties, k),
  cell: ({ reading, drift }, uncertainty) => uncertainty.at(reading, drift),
});
