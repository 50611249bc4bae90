import { CellValueType } from "@univerjs/core";
import {
  FormulaDataModel,
  type FRange,
  type FWorksheet,
  SetSelectionsOperation,
  SetWorksheetActiveOperation,
} from "@univerjs/preset-sheets-core";
import { parseAddress, parseCell } from "./address";
import { cellStyle } from "./cell-styles";
import { engineErrorMessage } from "./engine-errors";
import type { ErrorMessages } from "./error-messages";
import type { Grid } from "./grid";
import { growTo } from "./grow";
import { toSheetData } from "./sheet-data";
import { SpilledResults } from "./spilled-results";
import type { CellValue, FilledSheet, Workbook } from "./workbook";

/** Columns before a selected one that stay in view: a result next to the readings it came from. */
const columnsLeftInView = 4;
/** And rows above it, so that it does not stand right under the frozen header. */
const rowsAboveInView = 4;

const selectionCommands: ReadonlySet<string> = new Set([
  SetSelectionsOperation.id,
  SetWorksheetActiveOperation.id,
]);

/** The grid engine's workbook behind the interface that our pages share. */
export class GridWorkbook implements Workbook {
  readonly #grid: Grid;
  readonly #messages: ErrorMessages;

  constructor(grid: Grid, messages: ErrorMessages) {
    this.#grid = grid;
    this.#messages = messages;
  }

  async getSelection(): Promise<string> {
    return this.#workbook().getActiveRange()?.getA1Notation(true) ?? "";
  }

  onChange(listener: () => void): () => void {
    const { api } = this.#grid;
    // The engine's own selection event stays silent after some ways of moving, the name box among them.
    const selection = api.addEvent(api.Event.CommandExecuted, ({ id }) => {
      if (selectionCommands.has(id)) listener();
    });
    const results = api.getFormula().calculationResultApplied(listener);
    return () => {
      selection.dispose();
      results.dispose();
    };
  }

  async getValues(range: string): Promise<CellValue[][]> {
    const found = this.#range(range);
    // The engine's own reading gives what a cell shows, rounded; a spilled result stands beside the cells.
    const spilled = this.#spilled(found);
    const [sheetId, top, left] = [found.getSheetId(), found.getRow(), found.getColumn()];
    return found
      .getRawValues()
      .map((cells, row) =>
        cells.map(
          (value, c) => value ?? spilled.valueAt({ sheetId, row: top + row, column: left + c }) ?? "",
        ),
      );
  }

  async getText(cell: string): Promise<string> {
    return this.#range(cell).getDisplayValue();
  }

  async setFormula(cell: string, formula: string): Promise<void> {
    this.#range(cell).setFormula(formula);
  }

  async setHeader(cell: string, titles: string[]): Promise<void> {
    const corner = this.#range(cell);
    this.#sheetOf(corner)
      .getRange(corner.getRow(), corner.getColumn(), 1, titles.length)
      .setValues([titles.map((title) => ({ v: title, t: CellValueType.STRING, s: cellStyle("header") }))]);
  }

  async select(range: string): Promise<void> {
    const found = this.#range(range);
    const sheet = this.#sheetOf(found);
    this.#workbook().setActiveSheet(sheet);
    found.activate();
    sheet.scrollToCell(
      Math.max(0, found.getRow() - rowsAboveInView),
      Math.max(0, found.getColumn() - columnsLeftInView),
    );
  }

  async addSheet(sheet: FilledSheet): Promise<string> {
    const workbook = this.#workbook();
    // A cell still being typed in would keep the keyboard on the sheet left behind. What stands in it is dropped: half
    // a formula cannot be taken over.
    await workbook.endEditingAsync(false);
    const name = freeName(sheet.name, (each) => workbook.getSheetByName(each) !== null);
    const id = `sheet-${workbook.getSheets().length + 1}-${Date.now().toString(36)}`;
    const data = toSheetData(id, { ...sheet, name });
    workbook.addStyles(data.styles);
    const added = workbook.insertSheet(name, { sheet: data.sheet });
    workbook.setActiveSheet(added);
    return name;
  }

  async getErrorMessage(cell: string): Promise<string | undefined> {
    const range = this.#range(cell);
    const code = (await this.getValues(cell))[0]?.[0];
    if (typeof code !== "string" || !code.startsWith("#")) return undefined;
    const [row, column] = [range.getRow(), range.getColumn()];
    const caller = this.#spilled(range).callerOf({ sheetId: range.getSheetId(), row, column });
    if (!caller) return undefined;
    return (
      this.#messages.find(caller, row - caller.row, column - caller.column, code) ?? engineErrorMessage(code)
    );
  }

  #spilled(range: FRange): SpilledResults {
    return new SpilledResults(this.#grid.univer.__getInjector().get(FormulaDataModel), range.getUnitId());
  }

  #sheetOf(range: FRange): FWorksheet {
    return this.#workbook().getSheetBySheetId(range.getSheetId())!;
  }

  #workbook() {
    const workbook = this.#grid.api.getActiveWorkbook();
    if (!workbook) throw new Error("no workbook is open");
    return workbook;
  }

  /** A range by its A1 address, which is checked first: the engine takes a misspelt one for cell A1. */
  #range(address: string): FRange {
    const { sheet: name, range } = parseAddress(address);
    const workbook = this.#workbook();
    const sheet = name === undefined ? workbook.getActiveSheet() : workbook.getSheetByName(name);
    if (!sheet) throw new Error(`there is no sheet named ${name}`);
    for (const cell of range.split(":")) {
      const { row, column } = parseCell(cell);
      growTo(sheet, row, column);
    }
    return sheet.getRange(range);
  }
}

function freeName(wanted: string, taken: (name: string) => boolean): string {
  let name = wanted;
  for (let number = 2; taken(name); number++) name = `${wanted} (${number})`;
  return name;
}
