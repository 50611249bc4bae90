import { CellValueType, type ICellData, type Nullable } from "@univerjs/core";
import { FormulaDataModel, type FRange, type FWorksheet } from "@univerjs/preset-sheets-core";
import {
  addressOn,
  type Block,
  blockName,
  overlap,
  parseAddress,
  parseBlock,
  within,
} from "../taskpane/workbook/address";
import { Trouble } from "../taskpane/workbook/trouble";
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
} from "../taskpane/workbook/workbook";
import type { Grid } from "./grid";
import type { GridWorkbook } from "./grid-workbook";
import { reachOf } from "./reach";
import { SpilledResults } from "./spilled-results";

const FIRST_FEW = 5;

/** What the pane needs of the grid beyond what our other pages do. */
export class GridPaneWorkbook implements Workbook {
  readonly #grid: Grid;
  readonly #workbook: GridWorkbook;

  constructor(grid: Grid, workbook: GridWorkbook) {
    this.#grid = grid;
    this.#workbook = workbook;
  }

  /** Whole columns as Excel names them, "B:B"; the engine gives their first and last row. */
  async getSelection(): Promise<string> {
    const { sheet, range } = parseAddress(await this.#workbook.getSelection());
    const found = this.#sheet(sheet);
    const block = parseBlock(range);
    const isWhole = block.row === 0 && block.lastRow >= found.getMaxRows() - 1;
    const [first, last] = blockName(block).replace(/\d/g, "").split(":");
    return addressOn(found.getSheetName(), isWhole ? `${first}:${last ?? first}` : blockName(block));
  }

  onChange(listener: () => void): () => void {
    return this.#workbook.onChange(listener);
  }

  async getValues(range: string): Promise<CellValue[][]> {
    const { sheet, block } = this.#place(range);
    return this.#workbook.getValues(addressOn(sheet.getSheetName(), blockName(block)));
  }

  async getFormula(cell: string): Promise<FormulaCell | undefined> {
    const { sheet, block, range } = this.#place(cell);
    const spilled = this.#spilled(range);
    const caller = spilled.callerOf({ sheetId: range.getSheetId(), row: block.row, column: block.column });
    if (!caller) return undefined;
    const { row, column, formula } = caller;
    const area = spilled.areaOf(caller);
    const filled: Block = area
      ? { row: area.startRow, column: area.startColumn, lastRow: area.endRow, lastColumn: area.endColumn }
      : { row, column, lastRow: row, lastColumn: column };
    const on = (each: Block) => addressOn(sheet.getSheetName(), blockName(each));
    return { anchor: on({ row, column, lastRow: row, lastColumn: column }), range: on(filled), formula };
  }

  async getContents(address: string): Promise<Contents> {
    const { range } = this.#place(address);
    const inputs = range.getCellDatas().map((row) => row.map(toInput));
    const formulas = range.getFormulas();
    return {
      inputs: inputs.map((row, r) => row.map((input, c) => formulas[r]?.[c] || input)),
      formats: range.getNumberFormats().map((row) => row.map((format) => format || "General")),
    };
  }

  async inspect(address: string): Promise<Place> {
    const { sheet, block } = this.#place(address);
    const values = await this.getValues(address);
    const occupied: string[] = [];
    let occupiedCount = 0;
    values.forEach((row, r) => {
      row.forEach((value, c) => {
        if (value === "") return;
        occupiedCount++;
        const [cellRow, cellColumn] = [block.row + r, block.column + c];
        if (occupied.length >= FIRST_FEW) return;
        occupied.push(
          blockName({ row: cellRow, column: cellColumn, lastRow: cellRow, lastColumn: cellColumn }),
        );
      });
    });
    const merged = sheet.getMergeData().some((each) =>
      overlap(block, {
        row: each.getRow(),
        column: each.getColumn(),
        lastRow: each.getLastRow(),
        lastColumn: each.getLastColumn(),
      }),
    );
    return { occupied, occupiedCount, merged, inTable: false, protected: false };
  }

  async getUsedRange(address: string): Promise<string | undefined> {
    const { sheet, range } = this.#place(address);
    const used = reachOf(sheet, this.#spilled(range));
    const values = await this.getValues(addressOn(sheet.getSheetName(), blockName(used)));
    let [lastRow, lastColumn] = [-1, -1];
    values.forEach((row, r) => {
      row.forEach((value, c) => {
        if (value === "") return;
        lastRow = r;
        lastColumn = Math.max(lastColumn, c);
      });
    });
    return lastRow < 0 ? undefined : blockName({ row: 0, column: 0, lastRow, lastColumn });
  }

  async write(writings: readonly Writing[]): Promise<void> {
    await this.#grid.api.getActiveWorkbook()?.endEditingAsync(true);
    for (const { range: address, inputs, formats } of writings) {
      const { range } = this.#place(address);
      if (typeof formats === "string") range.setNumberFormat(engineFormat(formats));
      else if (formats) range.setNumberFormats(formats.map((row) => row.map(engineFormat)));
      if (inputs) range.setValues(inputs.map((row) => row.map(toCell)));
    }
  }

  async select(range: string): Promise<void> {
    await this.#workbook.select(range);
  }

  addSheet(sheet: FilledSheet): Promise<string> {
    return this.#workbook.addSheet(sheet);
  }

  async removeSheet(name: string): Promise<void> {
    const workbook = this.#grid.api.getActiveWorkbook();
    const sheet = this.#sheet(name);
    if (workbook?.getSheets().length === 1)
      throw new Trouble("It is the only sheet, and a workbook needs one.");
    const others = workbook?.getSheets().filter((each) => each.getSheetId() !== sheet.getSheetId()) ?? [];
    if (workbook?.getActiveSheet().getSheetId() === sheet.getSheetId()) {
      // The engine still draws the open sheet once more: it must not be the one that goes.
      workbook.setActiveSheet(others.at(-1)!);
      await new Promise(requestAnimationFrame);
    }
    workbook?.deleteSheet(sheet);
  }

  getErrorMessage(cell: string): Promise<string | undefined> {
    return this.#workbook.getErrorMessage(cell);
  }

  async getTraits(): Promise<Traits> {
    return { decimal: ".", list: ",", spills: true, name: "this sheet" };
  }

  #spilled(range: FRange): SpilledResults {
    return new SpilledResults(this.#grid.univer.__getInjector().get(FormulaDataModel), range.getUnitId());
  }

  #sheet(name: string | undefined): FWorksheet {
    const workbook = this.#grid.api.getActiveWorkbook();
    const sheet = name === undefined ? workbook?.getActiveSheet() : workbook?.getSheetByName(name);
    if (!sheet) throw new Trouble(`There is no sheet named ${name}.`);
    return sheet;
  }

  /** A range by its address, cut to the rows and columns that the sheet has. */
  #place(address: string): { sheet: FWorksheet; block: Block; range: FRange } {
    const { sheet: name, range } = parseAddress(address);
    const sheet = this.#sheet(name);
    const whole: Block = {
      row: 0,
      column: 0,
      lastRow: sheet.getMaxRows() - 1,
      lastColumn: sheet.getMaxColumns() - 1,
    };
    const block = within(asBlock(range), whole);
    if (!block) throw new Trouble(`${range} lies beyond the end of the sheet.`);
    return { sheet, block, range: sheet.getRange(blockName(block)) };
  }
}

function asBlock(range: string): Block {
  try {
    return parseBlock(range);
  } catch {
    throw new Trouble(`${range} is not the address of a cell.`);
  }
}

/** The engine takes no format for the general one. */
const engineFormat = (format: string): string => (format === "General" ? "" : format);

function toInput(cell: Nullable<ICellData>): CellInput {
  if (!cell) return "";
  if (cell.f) return cell.f;
  if (cell.v === null || cell.v === undefined) return "";
  if (cell.t === CellValueType.BOOLEAN) return cell.v === 1 || cell.v === true;
  return typeof cell.v === "string" && /^[='+-]/.test(cell.v) ? `'${cell.v}` : cell.v;
}

/** All that a cell can hold is named, so that nothing of what stood there stays. */
function toCell(input: CellInput): ICellData {
  const empty = { f: null, si: null, p: null, v: null, t: null };
  if (input === "") return empty;
  if (typeof input === "number") return { ...empty, v: input, t: CellValueType.NUMBER };
  if (typeof input === "boolean") return { ...empty, v: input ? 1 : 0, t: CellValueType.BOOLEAN };
  if (input.startsWith("=")) return { ...empty, f: input };
  return { ...empty, v: input.replace(/^'/, ""), t: CellValueType.STRING };
}
