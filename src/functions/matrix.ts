/** Ranges as a spreadsheet hands them over: rows of cells. */

export type Matrix = readonly (readonly unknown[])[];

/** A single value becomes one cell; anything that is not a range at all does too. */
export function asMatrix(given: unknown): Matrix {
  if (!Array.isArray(given)) return [[given]];
  if (given.every(Array.isArray)) return given as Matrix;
  return [given];
}

export const rowsOf = (matrix: Matrix): number => matrix.length;
export const columnsOf = (matrix: Matrix): number => matrix[0]?.length ?? 0;

/** Stands for a cell that no stretching reaches. */
export const OUTSIDE = Symbol("outside the range");

/**
 * The cell that broadcasting puts at (row, column): a dimension of 1 is stretched,
 * as native array formulas do; beyond that there is nothing.
 */
export function cellAt(matrix: Matrix, row: number, column: number): unknown {
  const cells = matrix[matrix.length === 1 ? 0 : row];
  if (cells === undefined) return OUTSIDE;
  const width = columnsOf(matrix);
  if (width === 1) return cells[0];
  return column < width ? cells[column] : OUTSIDE;
}
