import {
  certificate,
  emfBetween,
  fromCelsius,
  publications,
  Refusal,
  spoken,
  type TemperatureUnit,
  type Thermocouple,
  temperatureOf,
  wrongKind,
} from "../../core";
import { column as columnOf, ifGiven, once, unit as unitOption } from "../arguments";
import * as options from "../correct/options";
import { couple } from "../kinds/couple";
import { choice } from "../kinds/kind";
import { emf as emfInMillivolts } from "../kinds/numbers";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { wordResult } from "../results";
import { version } from "../version";
import { type Entry, whole } from "../whole";

/**
 * The full calculation of one reading, step by step, for an auditor: each line with its value, its equation and
 * where it comes from.
 * @customfunction WORKING
 * @category Record
 * @param emf Measured EMF in mV.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param referenceTemperature Temperature of the reference junction. Type 0 for an ice point.
 * @param [points] The certificate's temperatures, where a correction is to be shown too.
 * @param [values] Corrections or errors at the points.
 * @param [givenAs] What the values are: correction (true − reading, default) or error (reading − true).
 * @param [method] linear (default), nearest, smooth (cubic without overshoot), fit1, fit2 or fit3 (least squares).
 * @param [pointsAre] What the points are: readings (default) or true temperatures.
 * @param [column] One column without its header: step, value, equation or source.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Rows of step, value, equation and source; the last is the result.
 * @assumes Homogeneous wires, and terminals that are all at the reference temperature.
 * @standard IEC 60584-1:2013; NIST Monograph 175; ASTM E1751; GOST R 8.585-2001
 * @keywords audit, show the calculation, trace, worked example, explain
 * @related TEMPERATURE, CORRECTED, PROVENANCE
 * @example =BEAD.WORKING(4.096,"K",0,,,,,,"step") → {"measured EMF, mV";"EMF of the reference junction at 0 °C, mV";"sum, mV";…}
 */
export function WORKING(
  emf: unknown[][],
  type: unknown[][],
  referenceTemperature: unknown[][],
  points?: unknown[][],
  values?: unknown[][],
  givenAs?: unknown[][],
  method?: unknown[][],
  pointsAre?: unknown[][],
  column?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return working({
    emf,
    type,
    referenceTemperature,
    points,
    values,
    givenAs,
    method,
    pointsAre,
    column,
    unit,
  });
}

const COLUMNS = ["step", "value", "equation", "source"] as const;

type Line = readonly [step: string, value: Entry, equation: string, source: string];

const printed = (t: number, unit: TemperatureUnit): string =>
  `${Number(fromCelsius(t, unit).toPrecision(9))} ${unit.label}`;

/** "segment 2 of 2, 0 °C to 1372 °C" */
function segmentAt(type: Thermocouple, t: number, unit: TemperatureUnit): string {
  const { segments } = type.reference;
  const index = type.segmentIndex(t);
  const { from = t, to = t } = segments[index] ?? {};
  return `segment ${index + 1} of ${segments.length}, ${printed(from, unit)} to ${printed(to, unit)}`;
}

/** From the measured EMF to the temperature, and back again by the reference function. */
function conversion(
  emf: number,
  type: Thermocouple,
  reference: number,
  t: number,
  unit: TemperatureUnit,
): Line[] {
  const { publication, note } = type.reference;
  const source = publications[publication].citation;
  const atReference = type.emf(reference);
  const back = emfBetween(type, t, reference);
  return [
    ["measured EMF, mV", emf, "emf", "reading"],
    [
      `EMF of the reference junction at ${printed(reference, unit)}, mV`,
      atReference,
      "E(r)",
      `${source}, ${spoken(type)}, ${segmentAt(type, reference, unit)}`,
    ],
    ["sum, mV", emf + atReference, "E(t) = emf + E(r)", "law of intermediate temperatures"],
    [
      `temperature, ${unit.label}`,
      fromCelsius(t, unit),
      "E(t) solved for t, exactly",
      `${source}, ${spoken(type)}, ${segmentAt(type, t, unit)}`,
    ],
    [
      "check: EMF at that temperature, mV",
      back,
      "E(t) − E(r)",
      note === undefined ? source : `${source}. ${note}`,
    ],
  ];
}

const working = whole(WORKING, {
  arguments: {
    emf: once(emfInMillivolts),
    type: once(couple),
    referenceTemperature: once(temperature),
    points: ifGiven(columnOf(temperature)),
    values: ifGiven(columnOf(temperatureDifference)),
    givenAs: options.givenAs,
    method: options.method,
    pointsAre: options.pointsAre,
    column: ifGiven(once(choice(COLUMNS))),
    unit: unitOption,
  },
  result: { step: wordResult, value: wordResult, equation: wordResult, source: wordResult },
  cells({ emf, type, referenceTemperature, points, values, givenAs, method, pointsAre, column }, unit) {
    const t = temperatureOf(type, emf, referenceTemperature);
    if (t instanceof Refusal) return t;
    if ((points === undefined) !== (values === undefined)) {
      return wrongKind`points and values belong together: ${points === undefined ? "points" : "values"} missing`;
    }
    const lines = conversion(emf, type, referenceTemperature, t, unit);
    let result = t;
    if (points !== undefined && values !== undefined) {
      const made = certificate(points, values, { givenAs, method, pointsAre });
      const correction = made instanceof Refusal ? made : made.correction(t);
      if (correction instanceof Refusal) return correction;
      result = t + correction;
      const equation = givenAs === "correction" ? "c(t)" : "c(t) = −error(t)";
      const terms = `certificate: ${points.length} points, ${pointsAre === "true" ? "true temperatures" : "readings"}`;
      lines.push([`correction, ${unit.label}`, correction / unit.degree, `${equation}, ${method}`, terms]);
    }
    const equation = points === undefined ? "t" : "t + c(t)";
    lines.push([`result, ${unit.label}`, fromCelsius(result, unit), equation, `Beadline ${version}`]);
    if (column === undefined) return [[...COLUMNS], ...lines];
    return lines.map((line) => [line[COLUMNS.indexOf(column)] as Entry]);
  },
});
