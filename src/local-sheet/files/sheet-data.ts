import {
  BooleanNumber,
  CellValueType,
  HorizontalAlign,
  type ICellData,
  type IStyleData,
  type IWorkbookData,
  type IWorksheetData,
  LocaleType,
  VerticalAlign,
  WrapStrategy,
} from "@univerjs/core";
import { type CellLook, isError, type StoredCell, type StoredSheet } from "../../workbooks";
import { sheetRoom } from "../sheet-room";

const alignments = {
  left: HorizontalAlign.LEFT,
  center: HorizontalAlign.CENTER,
  right: HorizontalAlign.RIGHT,
} as const;

let opened = 0;

/** Sheets read from a file as a workbook of the grid engine, which calculates their formulas anew. */
export function fileWorkbook(sheets: readonly StoredSheet[]): IWorkbookData {
  const id = `file-${++opened}`;
  const styles = new Map<string, { name: string; style: IStyleData }>();
  const styled = (look: CellLook | undefined): string | null => {
    if (!look) return null;
    const key = JSON.stringify(look);
    const known = styles.get(key) ?? { name: `${id}-look-${styles.size}`, style: gridStyle(look) };
    styles.set(key, known);
    return known.name;
  };
  const data = sheets.map((sheet, index) => sheetData(`${id}-sheet-${index}`, sheet, styled));
  return {
    id,
    name: "Beadline",
    appVersion: "",
    locale: LocaleType.EN_US,
    styles: Object.fromEntries([...styles.values()].map(({ name, style }) => [name, style])),
    sheetOrder: data.map((sheet) => sheet.id!),
    sheets: Object.fromEntries(data.map((sheet) => [sheet.id, sheet])),
  };
}

function sheetData(
  id: string,
  sheet: StoredSheet,
  styled: (look: CellLook | undefined) => string | null,
): Partial<IWorksheetData> {
  const cellData: Record<number, Record<number, ICellData>> = {};
  let [rows, columns] = [0, sheet.columns.length];
  for (const cell of sheet.cells) {
    rows = Math.max(rows, cell.row + 1);
    columns = Math.max(columns, cell.column + 1);
    cellData[cell.row] ??= {};
    cellData[cell.row]![cell.column] = { ...content(cell), s: styled(cell.look) };
  }
  const widths = sheet.columns.flatMap(({ width }, index) =>
    width === undefined ? [] : [[index, { w: width }]],
  );
  return {
    id,
    name: sheet.name,
    cellData,
    ...sheetRoom(rows, columns),
    defaultColumnWidth: 96,
    defaultRowHeight: 24,
    columnData: Object.fromEntries(widths),
    rowData: Object.fromEntries((sheet.heights ?? []).map(({ row, height }) => [row, { h: height }])),
    freeze: { xSplit: 0, ySplit: sheet.frozenRows, startRow: sheet.frozenRows, startColumn: -1 },
  };
}

function content({ value, formula }: StoredCell): ICellData {
  if (formula !== undefined) return { f: formula };
  if (value === undefined) return {};
  if (typeof value === "number") return { v: value, t: CellValueType.NUMBER };
  if (typeof value === "boolean") return { v: value ? 1 : 0, t: CellValueType.BOOLEAN };
  return { v: isError(value) ? value.error : value, t: CellValueType.STRING };
}

function gridStyle({ pattern, bold, size, colour, align, indented, wrapped }: CellLook): IStyleData {
  return {
    ...(pattern ? { n: { pattern } } : {}),
    ...(bold ? { bl: BooleanNumber.TRUE } : {}),
    ...(size ? { fs: size } : {}),
    ...(colour ? { cl: { rgb: `#${colour}` } } : {}),
    ...(align ? { ht: alignments[align] } : {}),
    ...(indented ? { pd: { l: 8 } } : {}),
    ...(wrapped ? { tb: WrapStrategy.WRAP, vt: VerticalAlign.TOP } : {}),
  };
}
