import { loadWithDocument } from "../ways-in";
import { addressOn, type Block, cellName, parseAddress, parseBlock } from "./address";
import { writeSheet } from "./office-sheet";
import { excelTrouble } from "./office-trouble";
import { Trouble } from "./trouble";
import type {
  CellInput,
  CellValue,
  Contents,
  FilledSheet,
  FormulaCell,
  Place,
  Traits,
  Workbook,
  Writing,
} from "./workbook";

const FIRST_FEW = 5;

/** Formula cells whose results are looked for when cells are remembered. */
const MOST_ANCHORS = 100;

/** Excel behind the interface. Each call is one `Excel.run`; what fails there comes out as a sentence. */
export class OfficeWorkbook implements Workbook {
  getSelection(): Promise<string> {
    return run(async (context) => {
      const range = context.workbook.getSelectedRange();
      range.load("address");
      await context.sync();
      return normal(range.address);
    });
  }

  onChange(listener: () => void): () => void {
    const handlers: OfficeExtension.EventHandlerResult<unknown>[] = [];
    let stopped = false;
    // Where a version has no such events the pane still works, it only follows the selection when asked.
    run(async (context) => {
      const { worksheets } = context.workbook;
      const heard = async () => listener();
      if (supports("1.9")) handlers.push(worksheets.onSelectionChanged.add(heard));
      if (supports("1.8")) handlers.push(worksheets.onCalculated.add(heard));
      await context.sync();
      if (stopped) remove(handlers);
    }).catch(() => {});
    return () => {
      stopped = true;
      remove(handlers);
    };
  }

  getValues(address: string): Promise<CellValue[][]> {
    return run(async (context) => {
      const range = rangeAt(context, address);
      range.load("values");
      await context.sync();
      return range.values as CellValue[][];
    });
  }

  getFormula(cell: string): Promise<FormulaCell | undefined> {
    return run(async (context) => {
      const range = rangeAt(context, cell);
      range.load("address, formulas");
      const parent = supports("1.12") ? range.getSpillParentOrNullObject() : undefined;
      parent?.load("address, formulas");
      await context.sync();
      const anchor = parent && !parent.isNullObject ? parent : range;
      const formula: unknown = anchor.formulas[0]?.[0];
      if (typeof formula !== "string" || !formula.startsWith("=")) return undefined;
      const spilled = supports("1.12") ? anchor.getSpillingToRangeOrNullObject() : undefined;
      spilled?.load("address");
      await context.sync();
      const filled = spilled && !spilled.isNullObject ? spilled : anchor;
      return { anchor: normal(anchor.address), range: normal(filled.address), formula };
    });
  }

  getContents(address: string): Promise<Contents> {
    return run(async (context) => {
      const range = rangeAt(context, address);
      range.load("formulas, numberFormat");
      await context.sync();
      const inputs = (range.formulas as CellInput[][]).map((row) => [...row]);
      for (const block of await spills(context, address, inputs)) blankBehindFirst(inputs, block);
      return { inputs, formats: range.numberFormat as string[][] };
    });
  }

  inspect(address: string): Promise<Place> {
    return run(async (context) => {
      const range = rangeAt(context, address);
      range.load("values");
      const sheet = range.worksheet;
      sheet.protection.load("protected");
      range.format.protection.load("locked");
      const tables = supports("1.9") ? range.getTables(false) : undefined;
      tables?.load("items/name");
      const merged = supports("1.13") ? range.getMergedAreasOrNullObject() : undefined;
      merged?.load("address");
      await context.sync();
      const { row, column } = parseBlock(parseAddress(address).range);
      const occupied = (range.values as CellValue[][]).flatMap((values, r) =>
        values.flatMap((value, c) => (value === "" ? [] : [cellName(row + r, column + c)])),
      );
      return {
        occupied: occupied.slice(0, FIRST_FEW),
        occupiedCount: occupied.length,
        inTable: (tables?.items.length ?? 0) > 0,
        merged: merged !== undefined && !merged.isNullObject,
        // Cells that were unlocked before the sheet was protected may be written. null: some are, some are not.
        protected: sheet.protection.protected && range.format.protection.locked !== false,
      };
    });
  }

  getUsedRange(address: string): Promise<string | undefined> {
    return run(async (context) => {
      const used = rangeAt(context, address).worksheet.getUsedRangeOrNullObject(true);
      used.load("address");
      await context.sync();
      return used.isNullObject ? undefined : parseAddress(used.address).range;
    });
  }

  write(writings: readonly Writing[]): Promise<void> {
    return run(async (context) => {
      for (const { range: address, inputs, formats } of writings) {
        const range = rangeAt(context, address);
        if (formats !== undefined) {
          range.numberFormat = (
            typeof formats === "string" ? formats : formats.map((row) => [...row])
          ) as string[][];
        }
        if (inputs) range.formulas = inputs.map((row) => [...row]);
      }
      await context.sync();
    }).then(loadWithDocument);
  }

  select(address: string): Promise<void> {
    return run(async (context) => {
      const range = rangeAt(context, address);
      range.worksheet.activate();
      range.select();
      await context.sync();
    });
  }

  addSheet(sheet: FilledSheet): Promise<string> {
    return run(async (context) => {
      const { worksheets } = context.workbook;
      worksheets.load("items/name");
      await context.sync();
      const taken = new Set(worksheets.items.map(({ name }) => name.toLowerCase()));
      let name = sheet.name;
      for (let number = 2; taken.has(name.toLowerCase()); number++) name = `${sheet.name} (${number})`;
      const added = worksheets.add(name);
      writeSheet(added, sheet);
      added.activate();
      await context.sync();
      await loadWithDocument();
      return name;
    });
  }

  removeSheet(name: string): Promise<void> {
    return run(async (context) => {
      context.workbook.worksheets.getItem(name).delete();
      await context.sync();
    });
  }

  /** Excel keeps the messages of custom functions to itself; the pane asks the function again. */
  async getErrorMessage(): Promise<undefined> {
    return undefined;
  }

  async getTraits(): Promise<Traits> {
    const spills = supports("1.12");
    if (!supports("1.11")) return { decimal: ".", list: ",", spills, name: "Excel" };
    const decimal = await run(async (context) => {
      const numbers = context.application.cultureInfo.numberFormat;
      numbers.load("numberDecimalSeparator");
      await context.sync();
      return numbers.numberDecimalSeparator;
    }).catch(() => ".");
    // Excel does not tell its list separator; beside a decimal comma it is a semicolon.
    return { decimal, list: decimal === "," ? ";" : ",", spills, name: "Excel" };
  }
}

async function run<Result>(work: (context: Excel.RequestContext) => Promise<Result>): Promise<Result> {
  try {
    return await Excel.run(work);
  } catch (failure) {
    throw failure instanceof Trouble ? failure : excelTrouble(failure);
  }
}

const supports = (version: string): boolean =>
  Office.context.requirements.isSetSupported("ExcelApi", version);

function rangeAt(context: Excel.RequestContext, address: string): Excel.Range {
  const { sheet, range } = parseAddress(address);
  const { worksheets } = context.workbook;
  return (sheet ? worksheets.getItem(sheet) : worksheets.getActiveWorksheet()).getRange(range);
}

/** Excel quotes a sheet's name only where it must. */
function normal(address: string): string {
  const { sheet, range } = parseAddress(address);
  return sheet === undefined ? range : addressOn(sheet, range);
}

/** The blocks, from the corner of the range, that formulas in it fill. */
async function spills(
  context: Excel.RequestContext,
  address: string,
  inputs: CellInput[][],
): Promise<Block[]> {
  if (!supports("1.12")) return [];
  const { row, column } = parseBlock(parseAddress(address).range);
  const range = rangeAt(context, address);
  const anchors = inputs
    .flatMap((cells, r) =>
      cells.flatMap((input, c) => (String(input).startsWith("=") ? [range.getCell(r, c)] : [])),
    )
    .slice(0, MOST_ANCHORS)
    .map((cell) => cell.getSpillingToRangeOrNullObject());
  for (const each of anchors) each.load("address");
  await context.sync();
  return anchors
    .filter(({ isNullObject }) => !isNullObject)
    .map((each) => {
      const block = parseBlock(parseAddress(each.address).range);
      return {
        row: block.row - row,
        column: block.column - column,
        lastRow: block.lastRow - row,
        lastColumn: block.lastColumn - column,
      };
    });
}

/** What spilled is no content of its own: written back it would stand in the way of its formula. */
function blankBehindFirst(inputs: CellInput[][], { row, column, lastRow, lastColumn }: Block): void {
  for (let r = row; r <= Math.min(lastRow, inputs.length - 1); r++) {
    const cells = inputs[r]!;
    for (let c = column; c <= Math.min(lastColumn, cells.length - 1); c++) {
      if (r !== row || c !== column) cells[c] = "";
    }
  }
}

function remove(handlers: readonly OfficeExtension.EventHandlerResult<unknown>[]): void {
  for (const handler of handlers) {
    Excel.run(handler.context, async (context) => {
      handler.remove();
      await context.sync();
    }).catch(() => {});
  }
}
