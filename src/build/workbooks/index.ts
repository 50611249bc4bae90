// The sample workbooks as files for Excel: the planned sheets behind one that says what they are, each formula with
// the values that the worksheet functions give.

import { functionsRuntime, WorksheetError, type WorksheetFunction } from "../../catalogue/functions-runtime";
import * as worksheet from "../../functions";
import { logRows, type SheetPlan, type WorkbookPlan } from "../../sheets";
import {
  aboutSheet,
  type StoredValue,
  type StoredWorkbook,
  storedSheet,
  writeWorkbook,
} from "../../workbooks";
import { Calculation } from "./calculate";
import type { Cell } from "./spreadsheet-functions";

export type ReadText = (file: string) => string;

/** Names of files with their bytes, made from the plans among the sample files. */
export function workbookFiles(
  plans: Readonly<Record<string, WorkbookPlan>>,
  read: ReadText,
): Record<string, Uint8Array> {
  return Object.fromEntries(
    Object.entries(plans).map(([file, plan]) => [
      file.replace(/\.json$/, ".xlsx"),
      writeWorkbook(storedWorkbook(plan, read)),
    ]),
  );
}

export function storedWorkbook(plan: WorkbookPlan, read: ReadText): StoredWorkbook {
  const sheets = [aboutSheet(plan), ...plan.sheets].map((sheet) => filledNow(sheet, read));
  const calculation = new Calculation(sheets, functionsById());
  return {
    title: plan.name,
    description: `${plan.sentence}${plan.invented ? " Invented data." : ""}`,
    sheets: sheets.map((sheet) =>
      storedSheet(sheet, (row, column) =>
        calculation.results(sheet.name, row, column).map((cells) => cells.map(stored)),
      ),
    ),
  };
}

function filledNow({ log, ...plan }: SheetPlan, read: ReadText) {
  if (!log) return plan;
  return { ...plan, readings: { row: log.row, column: log.column, rows: logRows(read(log.file), log) } };
}

const stored = (cell: Cell): StoredValue =>
  cell instanceof WorksheetError ? { error: cell.code } : (cell ?? 0);

/** The functions from their sources: while things are generated there is no bundle yet. A test holds them together. */
function functionsById(): Map<string, WorksheetFunction> {
  Object.assign(globalThis, { CustomFunctions: functionsRuntime().CustomFunctions });
  return new Map(Object.entries(worksheet) as [string, WorksheetFunction][]);
}
