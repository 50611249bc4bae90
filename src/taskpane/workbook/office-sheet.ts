import { type CellRole, cellName, type FilledSheet, numberFormats, type PlannedCell } from "../../sheets";
import { blockName } from "./address";

/** Of look.md, for paper: a sheet is printed on white. */
const INK = "#24262B";
const MUTED = "#5E625F";
const SLATE = "#2F5D73";

const COLOURS: Readonly<Partial<Record<CellRole, string>>> = { note: MUTED, input: SLATE };
const BOLD: ReadonlySet<CellRole> = new Set(["title", "heading", "header", "verdict"]);

/** A pixel of a column's width in points. */
const POINTS = 0.75;

/** Puts a planned sheet into an empty one of Excel; the caller sends it all in one go. */
export function writeSheet(sheet: Excel.Worksheet, plan: FilledSheet): void {
  plan.columns.forEach(({ width, format, role }, index) => {
    const column = sheet.getRange(cellName(0, index)).getEntireColumn();
    column.format.columnWidth = width * POINTS;
    if (format) column.numberFormat = numberFormats[format] as unknown as string[][];
    if (role === "input") column.format.font.color = SLATE;
  });
  const { readings } = plan;
  if (readings) {
    const { row, column, rows } = readings;
    const lastColumn = column + Math.max(...rows.map(({ length }) => length)) - 1;
    const range = sheet.getRange(blockName({ row, column, lastRow: row + rows.length - 1, lastColumn }));
    // null leaves a cell as it is: empty.
    range.values = rows.map((values) =>
      Array.from({ length: lastColumn - column + 1 }, (_, index) => values[index] ?? null),
    );
  }
  for (const cell of plan.cells) writeCell(sheet, cell);
  if (plan.frozenRows > 0) sheet.freezePanes.freezeRows(plan.frozenRows);
  if (Office.context.requirements.isSetSupported("ExcelApi", "1.9")) {
    sheet.pageLayout.orientation = Excel.PageOrientation.landscape;
    sheet.pageLayout.zoom = { horizontalFitToPages: 1, verticalFitToPages: 0 };
  }
}

function writeCell(sheet: Excel.Worksheet, { row, column, value, formula, role, format }: PlannedCell): void {
  const range = sheet.getRange(cellName(row, column));
  const { font } = range.format;
  font.color = COLOURS[role] ?? INK;
  font.bold = BOLD.has(role);
  if (role === "title") font.size = 14;
  range.numberFormat = [[role === "header" ? "General" : numberFormats[format ?? "general"]]];
  range.format.horizontalAlignment = format === "text" ? "Left" : "Right";
  if (formula !== undefined) range.formulas = [[formula]];
  else if (value !== undefined) range.values = [[textKept(value)]];
}

/** A text that looks like a formula or a number stays a text. */
const textKept = (value: PlannedCell["value"]) =>
  typeof value === "string" && /^[=+\-@']|^\d/.test(value) ? `'${value}` : value;
