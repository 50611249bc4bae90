import { Refusal } from "../../core";
import { each, ifGiven, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { temperature } from "../kinds/temperature";
import { temperatureResult } from "../results";
import { Certificates } from "./certificates";
import * as options from "./options";

/**
 * A reading with the correction of its calibration certificate added.
 * @customfunction CORRECTED
 * @category Correct
 * @param reading Reading, one cell or a range. For a column write IF(ISBLANK(range),"",range), so that an empty cell stays empty.
 * @param points The certificate's temperatures, in a row or column, rising or falling strictly.
 * @param values Corrections or errors at the points; one column per reading column where sensors differ.
 * @param [givenAs] What the values are: correction (true − reading, default) or error (reading − true).
 * @param [method] linear (default), nearest, smooth (cubic without overshoot), fit1, fit2 or fit3 (least squares).
 * @param [pointsAre] What the points are: readings (default) or true temperatures.
 * @param [at] Temperature at which the correction is taken instead of at the reading, such as a survey's set point.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Corrected temperature in the call's unit.
 * @equation true temperature = reading + correction
 * @standard Common practice of calibration certificates; Fritsch and Butland (1984) for smooth
 * @keywords certificate, apply correction, calibrated sensor, true temperature
 * @related CORRECTION, CORRECTIONU
 * @example =BEAD.CORRECTED(150,{100;200},{-0.4;-1.0}) → 149.3
 */
export function CORRECTED(
  reading: unknown[][],
  points: unknown[][],
  values: unknown[][],
  givenAs?: unknown[][],
  method?: unknown[][],
  pointsAre?: unknown[][],
  at?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return corrected({ reading, points, values, givenAs, method, pointsAre, at, unit });
}

const corrected = cellwise(CORRECTED, {
  arguments: {
    reading: each(temperature),
    points: options.points,
    values: options.values,
    givenAs: options.givenAs,
    method: options.method,
    pointsAre: options.pointsAre,
    at: ifGiven(each(temperature)),
    unit: unitOption,
  },
  result: temperatureResult,
  prepare: ({ points, values, ...terms }) => Certificates.from(points, values, terms),
  cell({ reading, at }, certificates, place) {
    const correction =
      at === undefined
        ? certificates.correction(reading, place)
        : certificates.correction(at, place, "temperature of the correction");
    return correction instanceof Refusal ? correction : reading + correction;
  },
});
