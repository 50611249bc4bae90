/**
 * Whether a symmetric matrix of order one (a correlation matrix) is positive
 * semi-definite, by Cholesky's factorisation row by row: the first row that fails is
 * the one that cannot stand with the rows before it.
 */

/** A pivot this close to zero is zero: correlations are typed with few digits, and rounding leaves 1E-16. */
const ZERO_PIVOT = 1e-9;

/** Index of the first row that contradicts the rows before it, counted from 0; −1 when there is none. */
export function contradictingRow(matrix: readonly (readonly number[])[]): number {
  const rows: number[][] = [];
  for (const [i, given] of matrix.entries()) {
    const row: number[] = [];
    for (let j = 0; j <= i; j++) {
      const other = rows[j] ?? row;
      let rest = given[j] as number;
      for (let k = 0; k < j; k++) rest -= (row[k] as number) * (other[k] as number);
      if (j === i) {
        if (rest < -ZERO_PIVOT) return i;
        row.push(rest > ZERO_PIVOT ? Math.sqrt(rest) : 0);
      } else {
        const pivot = other[j] as number;
        // Where an earlier quantity is fully determined by others, nothing can be left to correlate with it.
        if (pivot === 0 && rest * rest > ZERO_PIVOT) return i;
        row.push(pivot === 0 ? 0 : rest / pivot);
      }
    }
    rows.push(row);
  }
  return -1;
}
