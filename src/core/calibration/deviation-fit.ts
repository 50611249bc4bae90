/** The deviation function of one couple, fitted to its calibration points. */
import { degrees, measured, noAnswer, Refusal, wrongKind } from "../errors";
import { distinct, extremes, fitPolynomial, type PolynomialFit } from "../numeric/least-squares";
import { compensatedPolynomial } from "../numeric/polynomial";
import { countRefused } from "./points";

export const HIGHEST_ORDER = 10;

/** Coefficients rounded to doubles must give back the fit this well, µV, and relative to the largest deviation. */
const LOST_UV = 1e-6;
const LOST_SHARE = 1e-9;

export interface DeviationFunction {
  /** c0, c1, … in µV per °Cⁱ; c0 = 0 through zero. */
  readonly coefficients: readonly number[];
  /** Standard uncertainties of the coefficients. */
  readonly uncertainties: readonly number[] | Refusal;
  /** Covariance matrix of the coefficients. */
  readonly covariance: readonly (readonly number[])[] | Refusal;
  /** Measured less fitted deviation at each point, µV. */
  readonly residuals: readonly number[];
  /** √(Σ residual² / dof), µV. */
  readonly residualSd: number | Refusal;
  /** Points less fitted coefficients. */
  readonly dof: number;
  /** Σ (residual/uncertainty)² / dof: near 1 when uncertainties and order suit the points. */
  readonly reducedChi2: number | Refusal;
  /** The residual that is greatest in size, with its sign, µV. */
  readonly largestResidual: number;
}

export interface DeviationFitTerms {
  /** Standard uncertainty of each deviation, µV. */
  readonly uncertainties?: readonly number[] | undefined;
  /** Drop c0: the EMF of a couple whose junctions are both at 0 °C is zero. */
  readonly throughZero?: boolean;
}

/**
 * Least-squares deviation function ΔE(t) = c0 + c1 t + …, of order 0 to 10, through
 * deviations in µV at temperatures in °C, in any order and repeated or not.
 *
 * Given standard uncertainties weight the points and set the scale of the coefficients'
 * uncertainties; without them every point weighs the same and the scatter of the residuals
 * sets it, which needs at least one point more than coefficients. Householder reflections
 * on centred and scaled temperatures (numeric/least-squares).
 *
 * Refuses columns of different length, an order that is not whole or beyond 10, fewer
 * different temperatures than coefficients, an uncertainty not above 0, and an order so
 * high for so narrow a range that powers of °C cannot carry it.
 */
export function fitDeviation(
  temperatures: readonly number[],
  deviationsUv: readonly number[],
  order: number,
  { uncertainties, throughZero = false }: DeviationFitTerms = {},
): DeviationFunction | Refusal {
  const refusal =
    countRefused(temperatures, deviationsUv, "deviations") ??
    uncertaintiesRefused(temperatures, uncertainties) ??
    orderRefused(temperatures, order, throughZero);
  if (refusal !== undefined) return refusal;
  const fit = fitPolynomial(temperatures, deviationsUv, order, { uncertainties, throughZero });
  if (fit === undefined) return noAnswer`the deviations do not determine a function of order ${order}`;
  if (digitsLost(fit, temperatures, deviationsUv)) {
    const [from, to] = extremes(temperatures);
    return noAnswer`order ${order} from ${degrees(from)} to ${degrees(to)} cannot be written in powers of °C: take a lower order`;
  }
  const found = described(fit, uncertainties);
  return holdsOnlyNumbers(found) ? found : noAnswer`the deviations are too large`;
}

function holdsOnlyNumbers({ covariance, residualSd, reducedChi2 }: DeviationFunction): boolean {
  const numbers = [covariance instanceof Refusal ? [] : covariance.flat(), residualSd, reducedChi2].flat();
  return numbers.every((value) => value instanceof Refusal || Number.isFinite(value));
}

function described(fit: PolynomialFit, uncertainties: readonly number[] | undefined): DeviationFunction {
  const { coefficients, unitCovariance, residuals, dof } = fit;
  const perDof = (sum: number): number | Refusal =>
    dof > 0 ? sum / dof : noAnswer`as many coefficients as points: no degrees of freedom are left`;
  const variance = perDof(residuals.reduce((sum, residual) => sum + residual * residual, 0));
  const scale = uncertainties === undefined ? variance : 1;
  const covariance =
    scale instanceof Refusal ? scale : unitCovariance.map((row) => row.map((entry) => entry * scale));
  return {
    coefficients,
    uncertainties:
      covariance instanceof Refusal ? covariance : covariance.map((row, i) => Math.sqrt(row[i] as number)),
    covariance,
    residuals,
    residualSd: variance instanceof Refusal ? variance : Math.sqrt(variance),
    dof,
    reducedChi2:
      uncertainties === undefined
        ? noAnswer`reduced chi-squared needs the uncertainties of the points`
        : perDof(
            residuals.reduce((sum, residual, i) => sum + (residual / (uncertainties[i] as number)) ** 2, 0),
          ),
    largestResidual: residuals.reduce((largest, residual) =>
      Math.abs(residual) > Math.abs(largest) ? residual : largest,
    ),
  };
}

function orderRefused(
  temperatures: readonly number[],
  order: number,
  throughZero: boolean,
): Refusal | undefined {
  if (!(Number.isInteger(order) && order >= 0 && order <= HIGHEST_ORDER)) {
    return wrongKind`order ${order} is not a whole number from 0 to ${HIGHEST_ORDER}`;
  }
  const terms = throughZero ? order : order + 1;
  if (terms === 0) return wrongKind`order 0 through zero leaves nothing to fit`;
  const different = distinct(temperatures, throughZero);
  if (different >= terms) return undefined;
  return throughZero
    ? noAnswer`order ${order} through zero needs at least ${terms} different temperatures other than ${degrees(0)}; there are ${different}`
    : noAnswer`order ${order} needs at least ${terms} different temperatures; there are ${different}`;
}

function uncertaintiesRefused(
  temperatures: readonly number[],
  uncertainties: readonly number[] | undefined,
): Refusal | undefined {
  if (uncertainties === undefined) return undefined;
  const bad = uncertainties.findIndex((uncertainty) => !(uncertainty > 0));
  if (bad < 0) return countRefused(temperatures, uncertainties, "uncertainties");
  const uncertainty = uncertainties[bad] as number;
  return uncertainty === 0
    ? wrongKind`uncertainty of point ${bad + 1} is 0 or an empty cell`
    : wrongKind`uncertainty of point ${bad + 1} is ${measured(uncertainty, "µV")}, not above 0`;
}

/** Whether the coefficients, rounded to doubles, no longer give the fit that they stand for. */
function digitsLost(fit: PolynomialFit, xs: readonly number[], ys: readonly number[]): boolean {
  const largest = ys.reduce((most, y) => Math.max(most, Math.abs(y)), 0);
  return xs.some((x, i) => {
    const fitted = (ys[i] as number) - (fit.residuals[i] as number);
    const written = compensatedPolynomial(fit.coefficients, x);
    return !(Math.abs(written - fitted) <= LOST_UV + LOST_SHARE * largest);
  });
}
