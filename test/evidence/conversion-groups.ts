/** EMF tables, inverse approximations and worked conversions from print. */
import { type Thermocouple, thermocouple } from "../../src/core";
import { EMF, TEMPERATURE } from "../../src/functions";
import * as conversions from "../published/conversions";
import { emfTables } from "../published/emf-tables";
import { type PublishedInverse, publishedInverses } from "../published/inverse-approximations";
import { type Group, type Row, row } from "./group";

const one = (value: unknown): unknown[][] => [[value]];

const tables = emfTables.map(
  ({ source, rows }): Group => ({
    source,
    compared: "EMF in mV over temperature, to half a unit of the last printed digit",
    rows: rows.map(([type, t, emf, decimals]) =>
      row(`${type} at ${t} °C`, emf, thermocouple(type)?.emf(t), decimals),
    ),
  }),
);

const STEPS = 500;

/** The band of approximation less exact inverse over its range. */
function band({ type, emfRange: [from, to], errorBand, rounding, coefficients }: PublishedInverse): Row {
  const couple = thermocouple(type) as Thermocouple;
  let [low, high] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  for (let i = 0; i <= STEPS; i++) {
    const emf = Math.min(Math.max(from + ((to - from) * i) / STEPS, couple.emfLow), couple.emfHigh);
    // Written out: the check must not share the evaluation with the code under test.
    const approximate = coefficients.reduce((sum, coefficient, power) => sum + coefficient * emf ** power, 0);
    const error = approximate - couple.temperature(emf);
    low = Math.min(low, error);
    high = Math.max(high, error);
  }
  return {
    what: `${type}, ${from} to ${to} mV`,
    published: `${errorBand[0]} to ${errorBand[1]}`,
    ours: `${low.toFixed(4)} to ${high.toFixed(4)}`,
    difference: "within",
    holds: low >= errorBand[0] - rounding && high <= errorBand[1] + rounding,
  };
}

const inverses: Group = {
  source: "NIST SRD 60, inverse approximations",
  compared: "approximation less the exact inverse in °C, within the printed band and its last digit",
  rows: publishedInverses.map(band),
};

const worked: Group = {
  source: conversions.textbook,
  compared: "EMF in mV and, to 1 °F, temperature; the book works with rounded table values",
  rows: [
    ...conversions.textbookTemperatures.map(([emf, reference, answer]) =>
      row(
        `K: ${emf} mV, terminals at ${reference} °F`,
        answer,
        TEMPERATURE(one(emf), one("K"), one(reference), one("F"))[0]?.[0],
        0,
      ),
    ),
    ...conversions.textbookEmfs.map(([type, t, reference, unit, emf, tolerance]) =>
      row(
        `${type}: ${t} °${unit}, terminals at ${reference} °${unit}`,
        emf,
        EMF(one(t), one(type), one(reference), one(unit))[0]?.[0],
        3,
        tolerance,
      ),
    ),
  ],
};

const page: Group = {
  source: "a sensor maker's technical page",
  compared: "EMF in mV at 350 °C",
  rows: conversions.makersPage.map(([type, emf]) => row(type, emf, EMF(one(350), one(type))[0]?.[0], 3)),
};

const fixed: Group = {
  source: "type S at fixed points of ITS-90 (from memory)",
  compared: "EMF in mV",
  rows: conversions.fixedPoints.map(([name, t, emf]) =>
    row(`${name}, ${t} °C`, emf, EMF(one(t), one("S"))[0]?.[0], 4),
  ),
};

export const conversionGroups: readonly Group[] = [...tables, inverses, worked, page, fixed];
