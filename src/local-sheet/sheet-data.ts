import { CellValueType, type ICellData, type IWorksheetData } from "@univerjs/core";
import type { CellRole, CellValue, FilledSheet, FormatName, PlannedCell } from "../sheets";
import { type CellStyles, cellStyle, styleName } from "./cell-styles";
import { sheetRoom } from "./sheet-room";

export interface SheetData {
  sheet: Partial<IWorksheetData>;
  styles: CellStyles;
}

/** A planned sheet as the grid engine stores it, with spare rows and columns around it and its header frozen. */
export function toSheetData(id: string, sheet: FilledSheet): SheetData {
  const cellData: Record<number, Record<number, ICellData>> = {};
  const styles: CellStyles = {};
  const styled = (role: CellRole, format?: FormatName): string => {
    const name = styleName(role, format);
    styles[name] ??= cellStyle(role, format);
    return name;
  };
  const columns = sheet.columns.map(({ role = "input", format }) => styled(role, format));
  let rows = 0;
  const put = (row: number, column: number, cell: ICellData) => {
    rows = Math.max(rows, row + 1);
    cellData[row] ??= {};
    cellData[row][column] = cell;
  };

  const { readings } = sheet;
  if (readings) rows = readings.row + readings.rows.length;
  readings?.rows.forEach((values, i) => {
    const cells: Record<number, ICellData> = {};
    values.forEach((value, c) => {
      // An empty field stays a truly empty cell: ISBLANK must be able to tell.
      if (value === null) return;
      const column = readings.column + c;
      cells[column] = { ...toCell(value), s: columns[column] ?? null };
    });
    cellData[readings.row + i] = cells;
  });
  for (const { row, column, spill: [down, across] = [1, 1] } of sheet.cells) {
    if (down * across === 1) continue;
    for (let r = row; r < row + down; r++) {
      for (let c = column; c < column + across; c++) put(r, c, { s: columns[c] ?? null });
    }
  }
  for (const cell of sheet.cells) {
    put(cell.row, cell.column, { ...content(cell), s: styled(cell.role, cell.format) });
  }

  const frozen = { xSplit: 0, ySplit: sheet.frozenRows, startRow: sheet.frozenRows, startColumn: -1 };
  return {
    sheet: {
      id,
      name: sheet.name,
      cellData,
      ...sheetRoom(rows, sheet.columns.length),
      defaultColumnWidth: 96,
      defaultRowHeight: 24,
      columnData: Object.fromEntries(sheet.columns.map((column, index) => [index, { w: column.width }])),
      rowData: Object.fromEntries((sheet.heights ?? []).map(({ row, height }) => [row, { h: height }])),
      freeze: frozen,
    },
    styles,
  };
}

function content({ value, formula }: PlannedCell): ICellData {
  if (formula !== undefined) return { f: formula };
  return value === undefined ? {} : toCell(value);
}

function toCell(value: CellValue): ICellData {
  if (typeof value === "number") return { v: value, t: CellValueType.NUMBER };
  if (typeof value === "boolean") return { v: value ? 1 : 0, t: CellValueType.BOOLEAN };
  return { v: value, t: CellValueType.STRING };
}
