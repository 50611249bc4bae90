import type { CatalogueFunction } from "../../catalogue/catalogue";
import { callText } from "../formula/arguments";
import { isCellwise, resultShape, type Shape } from "../formula/shape";
import { evaluate, type LiveCell, OnlyTheSheet } from "../live/evaluate";
import { blockName, columnsOf, parseAddress, parseBlock, rowsOf } from "../workbook/address";
import type { CellValue, Workbook } from "../workbook/workbook";

export interface Preview {
  readonly cells: LiveCell[][];
  /** Of the whole result; the cells may be its first rows only. */
  readonly shape: Shape;
}

/** Rows that are calculated of a column in which each row stands for itself. */
const FIRST_ROWS = 8;

/** Cells that are fetched of a block that must be seen whole. */
const MOST_CELLS = 200_000;

/** What the call gives, or the reason why only the sheet can tell. */
export async function preview(
  found: CatalogueFunction,
  given: readonly string[],
  namespace: string,
  workbook: Workbook | undefined,
): Promise<Preview | { onlyTheSheet: true }> {
  const cellwise = isCellwise(found);
  const shape = cellwise ? resultShape(given) : undefined;
  try {
    const cells = await evaluate(callText(namespace, found.id, given), namespace, reader(workbook, shape));
    return { cells, shape: shape ?? { rows: cells.length, columns: cells[0]?.length ?? 0 } };
  } catch (failure) {
    if (failure instanceof OnlyTheSheet) return { onlyTheSheet: true };
    throw failure;
  }
}

function reader(workbook: Workbook | undefined, shape: Shape | undefined) {
  return async (address: string): Promise<CellValue[][]> => {
    if (!workbook) throw new OnlyTheSheet("a range");
    const { sheet, range } = parseAddress(address);
    const block = parseBlock(range);
    const rows = shape && rowsOf(block) > FIRST_ROWS ? FIRST_ROWS : rowsOf(block);
    if (rows * columnsOf(block) > MOST_CELLS) throw new OnlyTheSheet("a large block");
    const wanted = blockName({ ...block, lastRow: block.row + rows - 1 });
    return workbook.getValues(
      sheet === undefined ? wanted : `${address.slice(0, address.lastIndexOf("!"))}!${wanted}`,
    );
  };
}
