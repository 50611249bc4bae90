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

/** "'Furnace log'!H6:K9" as the sheet's name, undefined where none is given, and the range on it. */
export function parseAddress(address: string): { sheet: string | undefined; range: string } {
  const mark = address.lastIndexOf("!");
  if (mark < 0) return { sheet: undefined, range: address };
  const name = address.slice(0, mark);
  const sheet = name.startsWith("'") ? name.slice(1, -1).replaceAll("''", "'") : name;
  return { sheet, range: address.slice(mark + 1) };
}

export const addressOn = (sheet: string, range: string): string =>
  `'${sheet.replaceAll("'", "''")}'!${range}`;
