import {
  CellValueType,
  type ICellData,
  type IRange,
  type IWorkbookData,
  type IWorksheetData,
} from "@univerjs/core";
import { FormulaDataModel } from "@univerjs/preset-sheets-core";
import type { StoredCell, StoredSheet, StoredValue } from "../../workbooks";
import type { Grid } from "../grid";
import { storedLook } from "./stored-look";

const errorCode = /^#(NULL!|DIV\/0!|VALUE!|REF!|NAME\?|NUM!|N\/A|SPILL!|CALC!|CYCLE!|[A-Z]+[!?])$/;

/**
 * The open workbook's sheets as a file holds them. What the engine saves by itself lacks the spilled values: they
 * and their rectangles come from its model of formulas.
 */
export function gridSheets({ univer, api }: Grid): StoredSheet[] {
  const workbook = api.getActiveWorkbook();
  if (!workbook) throw new Error("no workbook is open");
  const saved = workbook.save();
  const model = univer.__getInjector().get(FormulaDataModel);
  return saved.sheetOrder.map((sheetId) => {
    const sheet = saved.sheets[sheetId] ?? {};
    return new SheetReader(saved, sheetId, sheet, model).read();
  });
}

class SheetReader {
  readonly #saved: IWorkbookData;
  readonly #id: string;
  readonly #sheet: Partial<IWorksheetData>;
  readonly #model: FormulaDataModel;
  readonly #cells = new Map<string, StoredCell>();

  constructor(saved: IWorkbookData, id: string, sheet: Partial<IWorksheetData>, model: FormulaDataModel) {
    this.#saved = saved;
    this.#id = id;
    this.#sheet = sheet;
    this.#model = model;
  }

  read(): StoredSheet {
    const { name = this.#id, freeze, columnData = {}, rowData = {}, defaultColumnWidth = 96 } = this.#sheet;
    const { defaultRowHeight } = this.#sheet;
    this.#eachCell(this.#sheet.cellData, (row, column, cell) => this.#readCell(row, column, cell));
    this.#readSpilled();
    const cells = [...this.#cells.values()].sort((a, b) => a.row - b.row || a.column - b.column);
    const columnCount = cells.reduce((most, { column }) => Math.max(most, column + 1), 0);
    const heights = Object.entries(rowData).flatMap(([row, data]) =>
      data?.h && data.h !== defaultRowHeight ? [{ row: Number(row), height: data.h }] : [],
    );
    return {
      name,
      columns: Array.from({ length: columnCount }, (_, c) => ({
        width: columnData[c]?.w ?? defaultColumnWidth,
      })),
      frozenRows: Math.max(0, freeze?.ySplit ?? 0),
      ...(heights.length > 0 ? { heights } : {}),
      cells,
    };
  }

  #readCell(row: number, column: number, cell: ICellData): void {
    const formula =
      cell.f || cell.si
        ? this.#model.getFormulaStringByCell(row, column, this.#id, this.#saved.id)
        : undefined;
    const text = cell.p?.body?.dataStream?.replace(/\r?\n$/, "");
    const value = storedValue(
      text === undefined ? cell : { v: text, t: CellValueType.STRING },
      Boolean(formula),
    );
    const look = storedLook(this.#styleOf(cell));
    const stored: StoredCell = {
      row,
      column,
      ...(formula ? { formula } : {}),
      ...(value !== undefined ? { value } : {}),
      ...(Object.keys(look).length > 0 ? { look } : {}),
    };
    if (formula || value !== undefined || stored.look) this.#cells.set(`${row},${column}`, stored);
  }

  #readSpilled(): void {
    const rectangles = this.#model.getArrayFormulaRange()[this.#saved.id]?.[this.#id] ?? {};
    for (const columns of Object.values(rectangles)) {
      for (const area of Object.values((columns ?? {}) as Record<number, IRange>))
        if (area) this.#readArea(area);
    }
  }

  #readArea({ startRow, endRow, startColumn, endColumn }: IRange): void {
    const anchor = this.#cells.get(`${startRow},${startColumn}`);
    // A result without room shows an error in its own cell, and nothing of it elsewhere.
    if (!anchor?.formula || (typeof anchor.value === "object" && anchor.value.error === "#SPILL!")) return;
    const values = this.#model.getArrayFormulaCellData()[this.#saved.id]?.[this.#id];
    anchor.spill = [endRow - startRow + 1, endColumn - startColumn + 1];
    for (let row = startRow; row <= endRow; row++) {
      for (let column = startColumn; column <= endColumn; column++) {
        const spilled = values?.[row]?.[column];
        const known = this.#cells.get(`${row},${column}`);
        const value = storedValue(spilled ?? {}, true) ?? known?.value ?? "";
        const style = this.#styleOf(this.#sheet.cellData?.[row]?.[column]);
        const look = storedLook(style, typeof spilled?.s === "object" ? spilled.s : undefined);
        this.#cells.set(`${row},${column}`, {
          row,
          column,
          ...known,
          value,
          ...(Object.keys(look).length > 0 ? { look } : {}),
        });
      }
    }
  }

  #styleOf(cell: ICellData | null | undefined) {
    return typeof cell?.s === "string" ? this.#saved.styles[cell.s] : cell?.s;
  }

  #eachCell(
    cellData: IWorksheetData["cellData"] | undefined,
    visit: (row: number, column: number, cell: ICellData) => void,
  ): void {
    for (const [row, cells] of Object.entries(cellData ?? {})) {
      for (const [column, cell] of Object.entries((cells ?? {}) as Record<string, ICellData | null>)) {
        if (cell) visit(Number(row), Number(column), cell);
      }
    }
  }
}

/** A typed "#N/A" is a text; the same from a formula is an error. */
function storedValue({ v, t }: ICellData, isResult: boolean): StoredValue | undefined {
  if (v === null || v === undefined) return undefined;
  if (t === CellValueType.BOOLEAN) return Boolean(v);
  if (isResult && typeof v === "string" && errorCode.test(v)) return { error: v };
  return v;
}
