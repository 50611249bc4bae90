import { Refusal } from "../../core";
import { column, each, once, orElse, unit as unitOption } from "../arguments";
import { cellwise } from "../cellwise";
import { couple } from "../kinds/couple";
import { number } from "../kinds/numbers";
import { temperature as temperatureKind } from "../kinds/temperature";
import { emfResult } from "../results";
import { calibratedCouples } from "./calibrated";
import * as options from "./options";

/**
 * EMF of an individually calibrated couple, within the range of its calibration only.
 * @customfunction CALEMF
 * @category Correct
 * @param temperature Temperature of the measuring junction, one cell or a range.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param coefficients Coefficients c0, c1, … of the deviation function, µV and powers of °C, as CALFIT gives them.
 * @param low Lowest temperature of the calibration.
 * @param high Highest temperature of the calibration.
 * @param [referenceTemperature] Temperature of the reference junction; 0 °C when left out.
 * @param [referenceBy] What reaches the reference junction: standard (extension cable or instrument, default) or individual (the couple's own wires).
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R. The coefficients are always for °C.
 * @returns EMF in mV.
 * @equation emf = E(t) + ΔE(t) − E(reference); with individual, ΔE(reference) is taken off too
 * @assumes Homogeneous wires, and a couple that has not drifted since its calibration.
 * @standard IEC 60584-1:2013; NIST Monograph 175
 * @keywords calibrated thermocouple, individual calibration, deviation function
 * @related CALTEMPERATURE, CALFIT, EMF
 * @example =BEAD.CALEMF(100,"K",{10},0,200) → 4.106
 */
export function CALEMF(
  temperature: unknown[][],
  type: unknown[][],
  coefficients: unknown[][],
  low: unknown[][],
  high: unknown[][],
  referenceTemperature?: unknown[][],
  referenceBy?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return calemf({ temperature, type, coefficients, low, high, referenceTemperature, referenceBy, unit });
}

const calemf = cellwise(CALEMF, {
  arguments: {
    temperature: each(temperatureKind),
    type: each(couple),
    coefficients: column(number),
    low: once(temperatureKind),
    high: once(temperatureKind),
    referenceTemperature: orElse(each(temperatureKind), 0, "0 °C"),
    referenceBy: options.referenceBy,
    unit: unitOption,
  },
  result: emfResult,
  prepare: ({ coefficients, low, high }) => calibratedCouples(coefficients, low, high),
  cell({ temperature, type, referenceTemperature, referenceBy }, coupleOf) {
    const calibrated = coupleOf(type);
    if (calibrated instanceof Refusal) return calibrated;
    return calibrated.emf(temperature, referenceTemperature, referenceBy);
  },
});
