import { blankSafe } from "../../sheets";
import { cellName, columnsOf, parseAddress, rowsOf } from "../workbook/address";
import { blockOf, rangeOf, type Shape } from "./shape";

/**
 * The arguments of the formula that stands alone in one cell of a result: of each range the cell that belongs to
 * it. For places where nothing can spill: inside a table, over merged cells, in old versions of Excel.
 */
export function argumentsOfCell(given: readonly string[], row: number, column: number): string[] {
  return given.map((argument) => {
    const range = rangeOf(argument);
    if (range === undefined) return argument;
    const block = blockOf(range);
    if (rowsOf(block) * columnsOf(block) === 1) return argument;
    const ownRow = block.row + (rowsOf(block) === 1 ? 0 : row);
    const ownColumn = block.column + (columnsOf(block) === 1 ? 0 : column);
    const { sheet } = parseAddress(range);
    const cell = cellName(ownRow, ownColumn);
    const address = sheet === undefined ? cell : `${range.slice(0, range.lastIndexOf("!"))}!${cell}`;
    return argument === range ? address : blankSafe(address);
  });
}

/** Formulas for every cell of a result, row by row. */
export function perRow(
  given: readonly string[],
  { rows, columns }: Shape,
  formula: (given: readonly string[]) => string,
): string[][] {
  return Array.from({ length: rows }, (_, row) =>
    Array.from({ length: columns }, (_, column) => formula(argumentsOfCell(given, row, column))),
  );
}
