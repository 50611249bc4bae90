import { cellName, columnName, parseCell } from "../../sheets";

export { cellName, columnName, parseCell };

/** A block of cells, rows and columns counted from 0, both ends included. */
export interface Block {
  readonly row: number;
  readonly column: number;
  readonly lastRow: number;
  readonly lastColumn: number;
}

/** The last row and column that a sheet can have. */
export const LAST_ROW = 1_048_575;
export const LAST_COLUMN = 16_383;

const columnNumber = (letters: string): number => parseCell(`${letters}1`).column;

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

/** The cells of "H6:K9", of "H6", of whole columns "B:C" and of whole rows "2:5". */
export function parseBlock(range: string): Block {
  const [first = "", last = first] = range.replaceAll("$", "").split(":");
  if (/^[A-Z]{1,3}$/i.test(first) && /^[A-Z]{1,3}$/i.test(last)) {
    return { row: 0, column: columnNumber(first), lastRow: LAST_ROW, lastColumn: columnNumber(last) };
  }
  if (/^[1-9]\d*$/.test(first) && /^[1-9]\d*$/.test(last)) {
    return { row: Number(first) - 1, column: 0, lastRow: Number(last) - 1, lastColumn: LAST_COLUMN };
  }
  const [from, to] = [parseCell(first), parseCell(last)];
  return {
    row: Math.min(from.row, to.row),
    column: Math.min(from.column, to.column),
    lastRow: Math.max(from.row, to.row),
    lastColumn: Math.max(from.column, to.column),
  };
}

export function blockName({ row, column, lastRow, lastColumn }: Block): string {
  const first = cellName(row, column);
  const last = cellName(lastRow, lastColumn);
  return first === last ? first : `${first}:${last}`;
}

export const rowsOf = ({ row, lastRow }: Block): number => lastRow - row + 1;
export const columnsOf = ({ column, lastColumn }: Block): number => lastColumn - column + 1;

export const overlap = (a: Block, b: Block): boolean =>
  a.row <= b.lastRow && b.row <= a.lastRow && a.column <= b.lastColumn && b.column <= a.lastColumn;

/** The part of a block that lies in another; undefined where they do not meet. */
export function within(a: Block, b: Block): Block | undefined {
  if (!overlap(a, b)) return undefined;
  return {
    row: Math.max(a.row, b.row),
    column: Math.max(a.column, b.column),
    lastRow: Math.min(a.lastRow, b.lastRow),
    lastColumn: Math.min(a.lastColumn, b.lastColumn),
  };
}

/** An address for use in a formula on a sheet: without the sheet's name where it is the same one. */
export function seenFrom(sheet: string | undefined, address: string): string {
  const { sheet: own, range } = parseAddress(address);
  if (own === undefined || own === sheet) return range;
  return /^[A-Za-z_][A-Za-z0-9_]*$/.test(own) && !/^[A-Z]{1,3}\d+$/i.test(own)
    ? `${own}!${range}`
    : addressOn(own, range);
}
