import { Refusal } from "../../core";
import { column, each, once, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { emf as emfInMillivolts, number } from "../kinds/numbers";
import { temperature } from "../kinds/temperature";
import { temperatureResult } from "../results";
import { calibratedCouples } from "./calibrated";
import * as options from "./options";

/**
 * Temperature measured with an individually calibrated couple, by exact inversion of its own function, within the
 * range of its calibration only.
 * @customfunction CALTEMPERATURE
 * @category Correct
 * @param emf Measured EMF in mV, one cell or a range. For a column write IF(ISBLANK(range),"",range), so that an empty cell is not read as 0 mV.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param coefficients Coefficients c0, c1, … of the deviation function, µV and powers of °C, as CALFIT gives them.
 * @param low Lowest temperature of the calibration.
 * @param high Highest temperature of the calibration.
 * @param referenceTemperature Temperature of the reference junction. Type 0 for an ice point.
 * @param [referenceBy] What reaches the reference junction: standard (extension cable or instrument, default) or individual (the couple's own wires).
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R. The coefficients are always for °C.
 * @returns Temperature of the measuring junction in the call's unit.
 * @equation emf + E(reference) = E(t) + ΔE(t), solved for t; with individual, ΔE(reference) is added on the left
 * @assumes Homogeneous wires, and a couple that has not drifted since its calibration.
 * @standard IEC 60584-1:2013; NIST Monograph 175
 * @keywords calibrated thermocouple, individual calibration, deviation function
 * @related CALEMF, CALFIT, TEMPERATURE
 * @example =BEAD.CALTEMPERATURE(4.106,"K",{10},0,200,0) → 100.0
 */
export function CALTEMPERATURE(
  emf: unknown[][],
  type: unknown[][],
  coefficients: unknown[][],
  low: unknown[][],
  high: unknown[][],
  referenceTemperature: unknown[][],
  referenceBy?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return caltemperature({ emf, type, coefficients, low, high, referenceTemperature, referenceBy, unit });
}

const caltemperature = cellwise(CALTEMPERATURE, {
  arguments: {
    emf: each(emfInMillivolts),
    type: each(couple),
    coefficients: column(number),
    low: once(temperature),
    high: once(temperature),
    referenceTemperature: each(temperature),
    referenceBy: options.referenceBy,
    unit: unitOption,
  },
  result: temperatureResult,
  prepare: ({ coefficients, low, high }) => calibratedCouples(coefficients, low, high),
  cell({ emf, type, referenceTemperature, referenceBy }, coupleOf) {
    const calibrated = coupleOf(type);
    if (calibrated instanceof Refusal) return calibrated;
    return calibrated.temperature(emf, referenceTemperature, referenceBy);
  },
});
