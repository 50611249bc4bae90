import type { CatalogueParameter } from "../../catalogue/catalogue";
import {
  addressOn,
  type Block,
  blockName,
  LAST_ROW,
  parseAddress,
  parseBlock,
  rowsOf,
  seenFrom,
  within,
} from "../workbook/address";
import type { Workbook } from "../workbook/workbook";

export interface Picked {
  /** As it stands in a formula on the sheet of the target. */
  readonly address: string;
  /** The same down to the last row that holds something, where one row was selected of a longer column. */
  readonly downToEnd: string | undefined;
}

/** The selected range as an argument: a whole column is cut to its readings, so that no title is among them. */
export async function pickSelection(
  workbook: Workbook,
  parameter: CatalogueParameter,
  home: string | undefined,
): Promise<Picked> {
  const selection = await workbook.getSelection();
  const { sheet = "", range } = parseAddress(selection);
  const selected = parseBlock(range);
  const used = await workbook.getUsedRange(selection);
  const on = (block: Block) => seenFrom(home ?? sheet, addressOn(sheet, blockName(block)));
  if (!used) return { address: on(selected), downToEnd: undefined };
  const usedBlock = parseBlock(used);
  if (selected.lastRow === LAST_ROW && selected.row === 0) {
    const cut = within(selected, usedBlock) ?? selected;
    return { address: on(await withoutTitles(workbook, sheet, cut)), downToEnd: undefined };
  }
  const isOneRow = rowsOf(selected) === 1;
  const wanted = parameter.shape !== "cell" && isOneRow && usedBlock.lastRow > selected.row;
  const down = wanted
    ? await lastFilledRow(workbook, sheet, { ...selected, lastRow: usedBlock.lastRow })
    : selected.row;
  return {
    address: on(selected),
    downToEnd: down > selected.lastRow ? on({ ...selected, lastRow: down }) : undefined,
  };
}

/** Rows above the first number are titles and notes. */
async function withoutTitles(workbook: Workbook, sheet: string, block: Block): Promise<Block> {
  const looked = { ...block, lastRow: Math.min(block.lastRow, block.row + 50) };
  const values = await workbook.getValues(addressOn(sheet, blockName(looked)));
  const first = values.findIndex((row) => row.some((value) => typeof value === "number"));
  return first > 0 ? { ...block, row: block.row + first } : block;
}

async function lastFilledRow(workbook: Workbook, sheet: string, block: Block): Promise<number> {
  const values = await workbook.getValues(addressOn(sheet, blockName(block)));
  let last = values.length - 1;
  while (last > 0 && values[last]!.every((value) => value === "")) last--;
  return block.row + last;
}
