/** "B12" as row and column counted from 0. */
export function parseCell(cell: string): { row: number; column: number } {
  const match = /^\$?([A-Z]{1,3})\$?([1-9]\d*)$/i.exec(cell);
  if (!match) throw new Error(`${cell} is not the address of a cell`);
  let column = 0;
  for (const letter of match[1]!.toUpperCase()) column = column * 26 + letter.charCodeAt(0) - 64;
  return { row: Number(match[2]) - 1, column: column - 1 };
}

/** A column counted from 0 by its letters. */
export function columnName(column: number): string {
  const rest = Math.floor(column / 26);
  return (rest > 0 ? columnName(rest - 1) : "") + String.fromCharCode(65 + (column % 26));
}

/** A cell by row and column counted from 0. */
export const cellName = (row: number, column: number): string => `${columnName(column)}${row + 1}`;
