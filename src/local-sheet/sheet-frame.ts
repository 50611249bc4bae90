import type { IWorksheetData } from "@univerjs/core";
import { LAST_COLUMN, LAST_ROW } from "./address";

// Room to type and to spill in: the engine's grid ends where it is told to, and a spill beyond it is refused.
const leastRows = 5000;
const spareRows = 500;
const leastColumns = 52;
const spareColumns = 26;

export interface Filled {
  readonly rows: number;
  readonly columns: number;
  readonly frozenRows: number;
  readonly widths: readonly (number | undefined)[];
  readonly heights: readonly { row: number; height: number }[] | undefined;
}

/** Everything of a sheet but its cells: its size, with room around what is filled, its widths and its frozen header. */
export const sheetFrame = ({
  rows,
  columns,
  frozenRows,
  widths,
  heights,
}: Filled): Partial<IWorksheetData> => ({
  rowCount: Math.min(Math.max(rows + spareRows, leastRows), LAST_ROW + 1),
  columnCount: Math.min(Math.max(columns + spareColumns, leastColumns), LAST_COLUMN + 1),
  defaultColumnWidth: 96,
  defaultRowHeight: 24,
  columnData: Object.fromEntries(widths.flatMap((w, column) => (w === undefined ? [] : [[column, { w }]]))),
  rowData: Object.fromEntries((heights ?? []).map(({ row, height }) => [row, { h: height }])),
  freeze: { xSplit: 0, ySplit: frozenRows, startRow: frozenRows, startColumn: -1 },
});
