/**
 * Least squares by orthogonal triangulation, in double-double arithmetic.
 *
 * Householder reflections never square the condition number, as normal equations do
 * (G. H. Golub, Numer. Math. 7 (1965) 206–216). Written here because no small library
 * carries more digits than a double, and a tenth-order polynomial loses twelve of the
 * sixteen on its way back to powers of the temperature.
 */
import {
  type DoubleDouble,
  inner,
  minus,
  negative,
  one,
  over,
  plus,
  rootOf,
  rounded,
  times,
  zero,
} from "./double-double";

type Column = DoubleDouble[];

export interface Solution {
  /** The unknowns, one for each column. */
  readonly unknowns: readonly DoubleDouble[];
  /** R⁻¹ of A = QR, by columns; the covariance of the unknowns is R⁻¹R⁻ᵀ times the variance of a row. */
  readonly inverse: readonly (readonly DoubleDouble[])[];
}

/**
 * The x that makes |A x − b| least. `columns` are those of A, at least as long as they
 * are many; both are overwritten. Undefined when the columns do not tell the unknowns apart.
 */
export function leastSquares(columns: Column[], b: Column): Solution | undefined {
  const diagonal: DoubleDouble[] = [];
  for (const [k, column] of columns.entries()) {
    const norm = rootOf(inner(column, column, k));
    const head = column[k] as DoubleDouble;
    // Reflect onto the far side of zero, so that nothing cancels.
    const corner = head.high > 0 ? negative(norm) : norm;
    if (!(rounded(norm) > 0)) return undefined;
    column[k] = minus(head, corner);
    // |v|²/2 of the mirror v, which now stands in the column.
    const half = minus(times(norm, norm), times(head, corner));
    for (const other of [...columns.slice(k + 1), b]) reflect(other, column, k, half);
    diagonal.push(corner);
  }
  const inverse = columns.map((_, k) =>
    backward(
      columns,
      diagonal,
      columns.map((_, i) => (i === k ? one : zero)),
    ),
  );
  return { unknowns: backward(columns, diagonal, b), inverse };
}

function reflect(column: Column, mirror: readonly DoubleDouble[], from: number, half: DoubleDouble): void {
  const share = over(inner(mirror, column, from), half);
  for (let i = from; i < column.length; i++) {
    column[i] = minus(column[i] as DoubleDouble, times(share, mirror[i] as DoubleDouble));
  }
}

/** Solves R x = b: R has `diagonal` on its diagonal, and above it what is left in `columns`. */
function backward(
  columns: readonly Column[],
  diagonal: readonly DoubleDouble[],
  b: readonly DoubleDouble[],
): DoubleDouble[] {
  const x: DoubleDouble[] = [];
  for (let i = diagonal.length - 1; i >= 0; i--) {
    let known = zero;
    for (let j = i + 1; j < diagonal.length; j++) {
      known = plus(known, times((columns[j] as Column)[i] as DoubleDouble, x[j] as DoubleDouble));
    }
    x[i] = over(minus(b[i] as DoubleDouble, known), diagonal[i] as DoubleDouble);
  }
  return x;
}
