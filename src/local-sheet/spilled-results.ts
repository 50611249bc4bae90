import type { IRange } from "@univerjs/core";
import type { FormulaDataModel } from "@univerjs/preset-sheets-core";
import type { Caller, CellPosition } from "./error-messages";
import type { CellValue } from "./workbook";

/** What spilled: the engine keeps these values, and the rectangles they fill, beside the cells themselves. */
export class SpilledResults {
  readonly #model: FormulaDataModel;
  readonly #unitId: string;

  constructor(model: FormulaDataModel, unitId: string) {
    this.#model = model;
    this.#unitId = unitId;
  }

  valueAt({ sheetId, row, column }: CellPosition): CellValue | undefined {
    const values = this.#model.getArrayFormulaCellData()[this.#unitId]?.[sheetId];
    return values?.[row]?.[column]?.v ?? undefined;
  }

  /** The cell whose formula fills this one: itself, or the corner of the rectangle that lies over it. */
  callerOf({ sheetId, row, column }: CellPosition): Caller | undefined {
    const own = this.#formulaAt(sheetId, row, column);
    if (own) return { sheetId, row, column, formula: own };
    for (const area of this.areas(sheetId)) {
      if (row < area.startRow || row > area.endRow) continue;
      if (column < area.startColumn || column > area.endColumn) continue;
      const formula = this.#formulaAt(sheetId, area.startRow, area.startColumn);
      if (formula) return { sheetId, row: area.startRow, column: area.startColumn, formula };
    }
    return undefined;
  }

  /** Every rectangle of a sheet that a formula fills. */
  *areas(sheetId: string): Generator<IRange> {
    const rectangles = this.#model.getArrayFormulaRange()[this.#unitId]?.[sheetId] ?? {};
    for (const columns of Object.values(rectangles)) {
      for (const area of Object.values((columns ?? {}) as Record<number, IRange>)) if (area) yield area;
    }
  }

  /** The rectangle that a cell's formula fills; undefined where it fills its own cell only. */
  areaOf({ sheetId, row, column }: CellPosition): IRange | undefined {
    const rectangles = this.#model.getArrayFormulaRange()[this.#unitId]?.[sheetId];
    return (rectangles?.[row]?.[column] as IRange | undefined) ?? undefined;
  }

  #formulaAt(sheetId: string, row: number, column: number): string | undefined {
    return this.#model.getFormulaStringByCell(row, column, sheetId, this.#unitId) || undefined;
  }
}
