import { each, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { temperature } from "../kinds/temperature";
import { differenceResult } from "../results";
import { Certificates } from "./certificates";
import * as options from "./options";

/**
 * The correction to add at a reading, from the points of a calibration certificate.
 * @customfunction CORRECTION
 * @category Correct
 * @param reading Reading, one cell or a range.
 * @param points The certificate's temperatures, in a row or column, rising or falling strictly.
 * @param values Corrections or errors at the points; one column per reading column where sensors differ.
 * @param [givenAs] What the values are: correction (true − reading, default) or error (reading − true).
 * @param [method] linear (default), nearest, smooth (cubic without overshoot), fit1, fit2 or fit3 (least squares).
 * @param [pointsAre] What the points are: readings (default) or true temperatures.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Correction in degrees of the call's unit, to be added to the reading. Outside the points there is none.
 * @equation true temperature = reading + correction
 * @definition smooth: piecewise cubic that keeps the shape of the points (Fritsch and Carlson 1980; Fritsch and Butland 1984).
 * @definition fit1 to fit3: least-squares polynomial of that order, through at least order + 2 points.
 * @definition points_are true: each point's own error moves it to the reading axis first.
 * @standard Common practice of calibration certificates; Fritsch and Butland (1984) for smooth
 * @keywords certificate, calibration correction, interpolate, error, deviation
 * @related CORRECTED, CORRECTIONU, CALDRIFT
 * @example =BEAD.CORRECTION(150,{100;200},{-0.4;-1.0}) → -0.7
 * @example =BEAD.CORRECTION({100,150},{100;200},{0.5,-0.2;0.7,-0.4},"error") → {-0.5,0.3}
 */
export function CORRECTION(
  reading: unknown[][],
  points: unknown[][],
  values: unknown[][],
  givenAs?: unknown[][],
  method?: unknown[][],
  pointsAre?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return correction({ reading, points, values, givenAs, method, pointsAre, unit });
}

const correction = cellwise(CORRECTION, {
  arguments: {
    reading: each(temperature),
    points: options.points,
    values: options.values,
    givenAs: options.givenAs,
    method: options.method,
    pointsAre: options.pointsAre,
    unit: unitOption,
  },
  result: differenceResult,
  prepare: ({ points, values, ...terms }) => Certificates.from(points, values, terms),
  cell: ({ reading }, certificates, place) => certificates.correction(reading, place),
});
