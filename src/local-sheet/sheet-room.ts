const spareRows = 100;
const mostRows = 1_048_576;
const spareColumns = 26;
const leastColumns = 52;
const mostColumns = 16_384;

/** How large a sheet is made round what it holds: results need room to spill into, and the engine adds none. */
export const sheetRoom = (rows: number, columns: number): { rowCount: number; columnCount: number } => ({
  rowCount: Math.min(rows + spareRows, mostRows),
  columnCount: Math.min(Math.max(columns + spareColumns, leastColumns), mostColumns),
});
