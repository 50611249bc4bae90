import { CellValueType, type ICellData, type IWorksheetData } from "@univerjs/core";
import { parseCell } from "./address";
import { bodyStyle, bodyStyleName, type CellStyles, headStyle, headStyles } from "./cell-styles";
import type { CellValue, NewSheet } from "./workbook";

const spareRows = 100;
const leastColumns = 20;
const spareColumns = 8;

export interface SheetData {
  sheet: Partial<IWorksheetData>;
  styles: CellStyles;
}

/** A sheet as the grid engine stores it, with spare rows and columns around it and its header frozen. */
export function toSheetData(id: string, sheet: NewSheet): SheetData {
  const bodyStyles = sheet.columns.map(bodyStyleName);
  const cellData: IWorksheetData["cellData"] = {};
  sheet.rows.forEach((row, index) => {
    const cells: Record<number, ICellData> = {};
    const isHead = index < sheet.headerRows;
    row.forEach((value, column) => {
      // An empty field stays a truly empty cell: ISBLANK must be able to tell.
      if (value === null) return;
      const cell = toCell(value);
      cell.s = isHead ? headStyle(sheet, index, sheet.columns[column]) : (bodyStyles[column] ?? null);
      cells[column] = cell;
    });
    cellData[index] = cells;
  });
  for (const [cell, formula] of Object.entries(sheet.formulas ?? {})) {
    const { row, column } = parseCell(cell);
    cellData[row] = { ...cellData[row], [column]: { f: formula, s: bodyStyles[column] ?? null } };
  }
  return {
    sheet: {
      id,
      name: sheet.name,
      cellData,
      rowCount: Math.min(sheet.rows.length + spareRows, 1_048_576),
      columnCount: Math.max(sheet.columns.length + spareColumns, leastColumns),
      defaultColumnWidth: 96,
      defaultRowHeight: 24,
      columnData: Object.fromEntries(sheet.columns.map((column, index) => [index, { w: column.width }])),
      freeze: { xSplit: 0, ySplit: sheet.headerRows, startRow: sheet.headerRows, startColumn: -1 },
    },
    styles: {
      ...headStyles,
      ...Object.fromEntries(sheet.columns.map((column, index) => [bodyStyles[index], bodyStyle(column)])),
    },
  };
}

function toCell(value: CellValue): ICellData {
  if (typeof value === "number") return { v: value, t: CellValueType.NUMBER };
  if (typeof value === "boolean") return { v: value ? 1 : 0, t: CellValueType.BOOLEAN };
  return { v: value, t: CellValueType.STRING };
}
