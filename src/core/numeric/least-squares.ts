/**
 * A polynomial through points in the least-squares sense.
 *
 * Fitted in z = (x − centre)/scale, which lies in −1…1 and, with the scale a power of
 * two, is held without rounding; the coefficients are then moved to powers of x by
 * synthetic division. All of it is done in double-double arithmetic and rounded once
 * at the end, so that the coefficients are as good as the data.
 */
import {
  type DoubleDouble,
  exactly,
  inner,
  minus,
  over,
  plus,
  rounded,
  sumOf,
  times,
  zero,
} from "./double-double";
import { leastSquares } from "./householder";
import { polynomial } from "./polynomial";

export interface PolynomialFit {
  /** In ascending powers of x; c0 = 0 when the fit goes through zero. */
  readonly coefficients: readonly number[];
  /** Covariance of `coefficients` for rows of unit variance after weighting. */
  readonly unitCovariance: readonly (readonly number[])[];
  /** y − fit at each point. */
  readonly residuals: readonly number[];
  /** Points less coefficients that were fitted. */
  readonly dof: number;
  /** The fit at x, from the centred coefficients: as good as they are, wherever x lies. */
  value(x: number): number;
}

export interface FitOptions {
  /** Standard uncertainty of each y, above 0: rows are weighted by its reciprocal. */
  readonly uncertainties?: readonly number[] | undefined;
  /** Leaves out c0: x times a polynomial of an order less. */
  readonly throughZero?: boolean;
}

/** Least and greatest; a column may be too long to be spread into arguments. */
export const extremes = (xs: readonly number[]): readonly [number, number] =>
  xs.reduce<[number, number]>(
    ([least, greatest], x) => [Math.min(least, x), Math.max(greatest, x)],
    [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY],
  );

/** How many x differ, and can so tell coefficients apart; through zero, x = 0 cannot. */
export const distinct = (xs: readonly number[], throughZero: boolean): number =>
  new Set(xs.filter((x) => !(throughZero && x === 0))).size;

/**
 * Fits a polynomial of `order` to the points; undefined where they do not determine it
 * (fewer `distinct` x than coefficients) or where the numbers are too large for a double.
 */
export function fitPolynomial(
  xs: readonly number[],
  ys: readonly number[],
  order: number,
  { uncertainties, throughZero = false }: FitOptions = {},
): PolynomialFit | undefined {
  const terms = throughZero ? order : order + 1;
  if (terms < 1 || distinct(xs, throughZero) < terms) return undefined;
  const [lowest, highest] = extremes(xs);
  const centre = lowest + (highest - lowest) / 2;
  const scale = powerOfTwoAbove(Math.max(highest - centre, centre - lowest));
  const places = xs.map((x) => times(sumOf(x, -centre), exactly(1 / scale)));
  const lead = xs.map((x) => exactly(throughZero ? x : 1));
  const weights = xs.map((_, i) => over(exactly(1), exactly(uncertainties?.[i] ?? 1)));
  const columns = powers(places, lead, weights, terms);
  const solution = leastSquares(
    columns,
    ys.map((y, i) => times(exactly(y), weights[i] as DoubleDouble)),
  );
  if (solution === undefined) return undefined;

  const inPowersOfX = (centred: readonly DoubleDouble[]): DoubleDouble[] => {
    const moved = shifted(centred, centre, scale);
    return throughZero ? [zero, ...moved] : moved;
  };
  const coefficients = inPowersOfX(solution.unknowns).map(rounded);
  const unitCovariance = crossProducts(solution.inverse.map(inPowersOfX));
  const residuals = ys.map((y, i) => {
    const fitted = horner(solution.unknowns, places[i] as DoubleDouble);
    return rounded(minus(exactly(y), times(fitted, lead[i] as DoubleDouble)));
  });
  const results = [...coefficients, ...unitCovariance.flat(), ...residuals];
  if (!results.every(Number.isFinite)) return undefined;

  const centred = solution.unknowns.map(rounded);
  return {
    coefficients,
    unitCovariance,
    residuals,
    dof: xs.length - terms,
    value: (x) => polynomial(centred, (x - centre) / scale) * (throughZero ? x : 1),
  };
}

/** 1 for a single place. */
const powerOfTwoAbove = (value: number): number => (value > 0 ? 2 ** Math.ceil(Math.log2(value)) : 1);

/** Columns lead·zʲ, rows weighted. */
function powers(
  places: readonly DoubleDouble[],
  lead: readonly DoubleDouble[],
  weights: readonly DoubleDouble[],
  terms: number,
): DoubleDouble[][] {
  let column = lead.map((first, i) => times(first, weights[i] as DoubleDouble));
  const columns = [column];
  for (let j = 1; j < terms; j++) {
    column = column.map((entry, i) => times(entry, places[i] as DoubleDouble));
    columns.push(column);
  }
  return columns.map((made) => [...made]);
}

function horner(coefficients: readonly DoubleDouble[], z: DoubleDouble): DoubleDouble {
  return coefficients.reduceRight((sum, coefficient) => plus(times(sum, z), coefficient), zero);
}

/** Coefficients in powers of (x − centre)/scale, in powers of x. */
function shifted(coefficients: readonly DoubleDouble[], centre: number, scale: number): DoubleDouble[] {
  const back = exactly(-centre);
  const moved = coefficients.map((coefficient, j) => times(coefficient, exactly(scale ** -j)));
  for (let i = 0; i < moved.length; i++) {
    for (let j = moved.length - 2; j >= i; j--) {
      moved[j] = plus(moved[j] as DoubleDouble, times(back, moved[j + 1] as DoubleDouble));
    }
  }
  return moved;
}

/** G Gᵀ of a matrix given by its columns. */
function crossProducts(columns: readonly (readonly DoubleDouble[])[]): number[][] {
  const rows = (columns[0] as readonly DoubleDouble[]).map((_, i) =>
    columns.map((column) => column[i] as DoubleDouble),
  );
  return rows.map((row) => rows.map((other) => rounded(inner(row, other))));
}
