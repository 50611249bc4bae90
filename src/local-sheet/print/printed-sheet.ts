import type { CellLook } from "../../workbooks";

/** What a sheet shows, cell by cell, as it goes onto paper. */
export interface PrintedSheet {
  name: string;
  /** Of the columns, in the pixels of the grid. */
  widths: readonly number[];
  /** Rows at the top that stay in view in the grid. */
  frozenRows: number;
  /** The rows that are printed, each as wide as `widths` is long. */
  rows: readonly (readonly PrintedCell[])[];
  /** All that hold something, printed or not. */
  usedRows: number;
  usedColumns: number;
}

export interface PrintedCell {
  /** In the number format that the grid shows; empty where it shows nothing. */
  text: string;
  isNumber: boolean;
  look: CellLook;
}

/** A page lays out this many cells without a halt that anybody minds; Chromium takes a second or two for them. */
export const mostCells = 30_000;

/** More would be too small to read on one page's width. */
export const mostColumns = 40;

/** How much of a sheet is printed. */
export function printedSize(usedRows: number, usedColumns: number): { rows: number; columns: number } {
  const columns = Math.min(usedColumns, mostColumns);
  return { rows: Math.min(usedRows, Math.floor(mostCells / Math.max(1, columns))), columns };
}

/** What is not on paper and how to print it; undefined where everything is. */
export function leftOutWords({ rows, widths, usedRows, usedColumns }: PrintedSheet): string | undefined {
  const parts = [
    ...(rows.length < usedRows ? [`the first ${rows.length} of ${usedRows} rows`] : []),
    ...(widths.length < usedColumns ? [`the first ${widths.length} of ${usedColumns} columns`] : []),
  ];
  if (parts.length === 0) return undefined;
  return `Printed here: ${parts.join(", ")}. To print the rest, save the workbook (.xlsx) and print it from a spreadsheet program.`;
}
