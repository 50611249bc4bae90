/** What a matrix must be to hold correlation coefficients. */
import { noAnswer, type Refusal, wrongKind } from "../errors";
import { contradictingRow } from "../numeric/semidefinite";

/** Coefficients that differ by no more than this are equal. */
const EQUAL = 1e-9;

/**
 * Refuses what is not a correlation matrix of `count` quantities: square (wrong kind), 1 on
 * the diagonal, −1 to 1 beside it, symmetric and positive semi-definite. The message names the
 * row, and the column where there is one. undefined where all is well.
 */
export function refusedCorrelations(
  matrix: readonly (readonly number[])[],
  count: number,
): Refusal | undefined {
  const width = matrix.find((row) => row.length !== count)?.length ?? count;
  if (matrix.length !== count || width !== count) {
    return wrongKind`correlations: ${matrix.length} × ${width} for ${count} uncertainties`;
  }
  for (const [i, row] of matrix.entries()) {
    for (const [j, r] of row.entries()) {
      if (i === j && Math.abs(r - 1) > EQUAL) {
        return noAnswer`correlation in row ${i + 1}, column ${j + 1} is ${r}: 1 on the diagonal`;
      }
      if (Math.abs(r) > 1 + EQUAL) {
        return noAnswer`correlation in row ${i + 1}, column ${j + 1} is ${r}: outside -1 to 1`;
      }
      const mirrored = matrix[j]?.[i] as number;
      if (Math.abs(r - mirrored) > EQUAL) {
        return noAnswer`correlation in row ${i + 1}, column ${j + 1} is ${r}, but ${mirrored} in row ${j + 1}, column ${i + 1}`;
      }
    }
  }
  const row = contradictingRow(matrix);
  return row === -1
    ? undefined
    : noAnswer`correlations in row ${row + 1} contradict those above it: the matrix is not positive semi-definite`;
}
