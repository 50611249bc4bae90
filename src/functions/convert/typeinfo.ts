import { publications, seebeckAt } from "../../core";
import { ifGiven, once, unit as unitOption } from "../arguments";
import { couple } from "../kinds/couple";
import { choice } from "../kinds/kind";
import { emfResult, seebeckResult, temperatureResult, wordResult } from "../results";
import { metrics } from "../whole";

/**
 * What is published of a thermocouple type: conductors, range of its reference function, EMF at both ends,
 * sensitivity, standard, publication and temperature scale.
 * @customfunction TYPEINFO
 * @category Convert
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param [metric] One value: conductors, low, high, emf_low, emf_high, seebeck_mid_uv, unique_from, standard, publication or scale.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Rows of metric and value, or the one value asked for.
 * @definition low, high: range of the reference function. emf_low, emf_high: EMF in mV at its ends. seebeck_mid_uv: Seebeck coefficient half-way between them.
 * @definition unique_from: from here up an EMF belongs to one temperature only; above low for type B, whose EMF falls before it rises.
 * @standard IEC 60584-1:2013; NIST Monograph 175; ASTM E1751; GOST R 8.585-2001
 * @keywords range, limits, conductors, materials, standard
 * @related EMFTABLE, TEMPERATURE
 * @example =BEAD.TYPEINFO("R","high") → 1768.1
 * @example =BEAD.TYPEINFO("K","conductors") → "Ni-Cr / Ni-Al"
 */
export function TYPEINFO(type: unknown[][], metric?: unknown[][], unit?: unknown[][]): unknown[][] {
  return typeinfo({ type, metric, unit });
}

const typeinfo = metrics(TYPEINFO, {
  arguments: {
    type: once(couple),
    metric: ifGiven(
      once(
        choice([
          "conductors",
          "low",
          "high",
          "emf_low",
          "emf_high",
          "seebeck_mid_uv",
          "unique_from",
          "standard",
          "publication",
          "scale",
        ]),
      ),
    ),
    unit: unitOption,
  },
  result: {
    conductors: wordResult,
    low: temperatureResult,
    high: temperatureResult,
    emf_low: emfResult,
    emf_high: emfResult,
    seebeck_mid_uv: seebeckResult,
    unique_from: temperatureResult,
    standard: wordResult,
    publication: wordResult,
    scale: wordResult,
  },
  metrics: ({ type }) => ({
    conductors: type.reference.conductors,
    low: type.low,
    high: type.high,
    emf_low: type.emfLow,
    emf_high: type.emfHigh,
    seebeck_mid_uv: seebeckAt(type, (type.low + type.high) / 2),
    unique_from: type.uniqueFrom,
    standard: publications[type.reference.standard].citation,
    publication: publications[type.reference.publication].citation,
    scale: type.reference.scale,
  }),
});
