import { type DeviationFunction, fitDeviation, Refusal, wrongKind } from "../../core";
import { gappedColumn, ifGiven, once, orElse, unit as unitOption } from "../arguments";
import { choice } from "../kinds/kind";
import { microvolts, number } from "../kinds/numbers";
import { temperature } from "../kinds/temperature";
import { truth } from "../kinds/truth";
import { numberResult, wordResult } from "../results";
import { type Entry, whole } from "../whole";

/**
 * Least-squares deviation function of one couple, in µV and powers of °C, from the points of its calibration,
 * with the standard uncertainties of its coefficients.
 * @customfunction CALFIT
 * @category Correct
 * @param temperatures Temperatures of the points, in a row or column. Rows that are blank here or in the deviations are dropped and counted.
 * @param deviationsUv Deviation from the reference function at each point, in µV.
 * @param order Highest power of the function, 0 to 10.
 * @param [uncertainties] Standard uncertainty of each deviation in µV: weights the points and sets the scale.
 * @param [throughZero] TRUE drops c0, since both junctions at 0 °C give no EMF; FALSE when left out.
 * @param [metric] One part: coefficients, uncertainties, covariance, residual_sd, dof, reduced_chi2 or largest_residual.
 * @param [unit] Unit of the temperatures: C (default), F, K or R. The coefficients are always for °C.
 * @returns Rows of quantity, value and standard uncertainty, or the part asked for.
 * @equation ΔE(t) = c0 + c1·t + c2·t² + … in µV, t in °C
 * @definition Given uncertainties set the scale of the coefficients' uncertainties; without them the residuals do.
 * @definition reduced_chi2: Σ(residual/uncertainty)² / degrees of freedom, near 1 when uncertainties and order suit the points. largest_residual: the one greatest in size, with its sign.
 * @standard Least squares by Householder reflections; NIST Statistical Reference Datasets as the check
 * @keywords calibration fit, polynomial, regression, deviation function, coefficients
 * @related CALTEMPERATURE, CALEMF, DEVIATION
 * @example =BEAD.CALFIT({0;100;200;300},{1;3;5;7},1,,,"coefficients") → {1.000;0.020}
 */
export function CALFIT(
  temperatures: unknown[][],
  deviationsUv: unknown[][],
  order: unknown[][],
  uncertainties?: unknown[][],
  throughZero?: unknown[][],
  metric?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return calfit({ temperatures, deviationsUv, order, uncertainties, throughZero, metric, unit });
}

type Gapped = readonly (number | undefined)[];

/** The points that have both a temperature and a deviation. */
function points(temperatures: Gapped, deviationsUv: Gapped, uncertainties: Gapped | undefined) {
  if (temperatures.length !== deviationsUv.length) {
    return wrongKind`temperatures and deviations differ in number, ${temperatures.length} and ${deviationsUv.length}`;
  }
  if (uncertainties !== undefined && uncertainties.length !== temperatures.length) {
    return wrongKind`temperatures and uncertainties differ in number, ${temperatures.length} and ${uncertainties.length}`;
  }
  const rows = temperatures.flatMap((t, i) => {
    const deviation = deviationsUv[i];
    return t === undefined || deviation === undefined
      ? []
      : [{ i, t, deviation, uncertainty: uncertainties?.[i] }];
  });
  const missing = uncertainties && rows.find(({ uncertainty }) => uncertainty === undefined);
  if (missing !== undefined)
    return wrongKind`uncertainties, row ${missing.i + 1}: the cell is blank beside a point`;
  return {
    temperatures: rows.map(({ t }) => t),
    deviationsUv: rows.map(({ deviation }) => deviation),
    uncertainties: uncertainties && rows.map(({ uncertainty }) => uncertainty as number),
    dropped: temperatures.length - rows.length,
  };
}

function everything(fit: DeviationFunction, dropped: number): Entry[][] {
  const { uncertainties } = fit;
  return [
    ["quantity", "value", "standard uncertainty"],
    ...fit.coefficients.map((coefficient, power): Entry[] => [
      `c${power}`,
      coefficient,
      uncertainties instanceof Refusal ? uncertainties : (uncertainties[power] as number),
    ]),
    ["residual_sd", fit.residualSd, ""],
    ["dof", fit.dof, ""],
    ["reduced_chi2", fit.reducedChi2, ""],
    ["largest_residual", fit.largestResidual, ""],
    ["dropped rows", dropped, ""],
  ];
}

const parts = {
  coefficients: (fit: DeviationFunction): Entry[][] => fit.coefficients.map((coefficient) => [coefficient]),
  uncertainties: ({ uncertainties }: DeviationFunction): Entry[][] =>
    uncertainties instanceof Refusal ? [[uncertainties]] : uncertainties.map((uncertainty) => [uncertainty]),
  covariance: ({ covariance }: DeviationFunction): Entry[][] =>
    covariance instanceof Refusal ? [[covariance]] : covariance.map((row) => [...row]),
  residual_sd: (fit: DeviationFunction): Entry[][] => [[fit.residualSd]],
  dof: (fit: DeviationFunction): Entry[][] => [[fit.dof]],
  reduced_chi2: (fit: DeviationFunction): Entry[][] => [[fit.reducedChi2]],
  largest_residual: (fit: DeviationFunction): Entry[][] => [[fit.largestResidual]],
};

const calfit = whole(CALFIT, {
  arguments: {
    temperatures: gappedColumn(temperature),
    deviationsUv: gappedColumn(microvolts),
    order: once(number),
    uncertainties: ifGiven(gappedColumn(microvolts)),
    throughZero: orElse(once(truth), false, "FALSE"),
    metric: ifGiven(once(choice(Object.keys(parts) as (keyof typeof parts)[]))),
    unit: unitOption,
  },
  result: { quantity: wordResult, value: numberResult, "standard uncertainty": numberResult },
  cells({ temperatures, deviationsUv, order, uncertainties, throughZero, metric }) {
    const given = points(temperatures, deviationsUv, uncertainties);
    if (given instanceof Refusal) return given;
    const fit = fitDeviation(given.temperatures, given.deviationsUv, order, {
      uncertainties: given.uncertainties,
      throughZero,
    });
    if (fit instanceof Refusal) return fit;
    return metric === undefined ? everything(fit, given.dropped) : parts[metric](fit);
  },
});
