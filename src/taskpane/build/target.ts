import { blockOf, rangeOf, type Shape } from "../formula/shape";
import {
  addressOn,
  type Block,
  blockName,
  cellName,
  LAST_COLUMN,
  LAST_ROW,
  overlap,
  parseAddress,
  parseBlock,
} from "../workbook/address";
import type { Place, Workbook } from "../workbook/workbook";

export interface Target {
  readonly sheet: string;
  /** The first cell of the result. */
  readonly cell: string;
  readonly why:
    | "the selected cell"
    | "the first free column beside the readings"
    | "as chosen"
    | "its own cell";
}

/** The ranges of a formula that lie on a sheet. */
export function rangesOn(sheet: string, given: readonly string[]): Block[] {
  return given.flatMap((argument) => {
    const range = rangeOf(argument);
    if (range === undefined) return [];
    const { sheet: own } = parseAddress(range);
    return own === undefined || own === sheet ? [blockOf(range)] : [];
  });
}

/**
 * Where a new formula goes: the selected cell when it is free and no part of the formula's own readings, else the
 * first free column beside them.
 */
export async function suggestTarget(
  workbook: Workbook,
  given: readonly string[],
  home: string | undefined,
): Promise<Target> {
  const selection = await workbook.getSelection();
  const { sheet: open = "", range } = parseAddress(selection);
  const away = home !== undefined && home !== open && rangesOn(home, given).length > 0;
  const sheet = away ? home : open;
  const { row, column } = parseBlock(range);
  const selected = { row, column, lastRow: row, lastColumn: column };
  const ranges = rangesOn(sheet, given);
  const isReading = ranges.some((each) => overlap(each, selected));
  const cell = cellName(row, column);
  if (!isReading && !away) {
    const { occupiedCount } = await workbook.inspect(addressOn(sheet, cell));
    if (occupiedCount === 0 || ranges.length === 0) return { sheet, cell, why: "the selected cell" };
  }
  const first = ranges[0] ?? selected;
  const used = await workbook.getUsedRange(addressOn(sheet, cell));
  const lastUsed = used ? parseBlock(used).lastColumn : first.lastColumn;
  return {
    sheet,
    cell: cellName(first.row, Math.min(lastUsed + 2, LAST_COLUMN)),
    why: "the first free column beside the readings",
  };
}

/** The cells a result fills from its first one; undefined when it would run past the end of the sheet. */
export function filledBy({ cell }: Pick<Target, "cell">, { rows, columns }: Shape): string | undefined {
  const { row, column } = parseBlock(cell);
  const block = { row, column, lastRow: row + rows - 1, lastColumn: column + columns - 1 };
  return block.lastRow > LAST_ROW || block.lastColumn > LAST_COLUMN ? undefined : blockName(block);
}

/** The arguments with the sheet in front of each range that has none. */
export const seenFromElsewhere = (given: readonly string[], home: string | undefined): string[] =>
  given.map((argument) => {
    const range = rangeOf(argument);
    if (range === undefined || home === undefined || range.includes("!")) return argument;
    return argument.replaceAll(range, addressOn(home, range).replaceAll("$", "$$$$"));
  });

/** What stands in the way of one formula that spills; undefined when nothing does. */
export function hindranceTo(place: Place, spills: boolean): string | undefined {
  if (place.protected) return "The sheet is protected there. Unprotect it, or choose another place.";
  if (!spills) return undefined;
  if (place.merged) return "Cells are merged there, and a result cannot spill over them.";
  if (place.inTable) return "That is inside a table, where nothing can spill.";
  return undefined;
}
