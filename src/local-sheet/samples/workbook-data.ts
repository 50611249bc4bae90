import { type IWorkbookData, LocaleType } from "@univerjs/core";
import type { FilledSheet } from "../../sheets";
import { toSheetData } from "../sheet-data";

let opened = 0;

/** Sheets as a workbook of the grid engine, with ids of its own: messages of another one must not be found here. */
export function workbookData(sheets: readonly FilledSheet[]): IWorkbookData {
  const id = `workbook-${++opened}`;
  const data = sheets.map((sheet, index) => toSheetData(`${id}-sheet-${index}`, sheet));
  return {
    id,
    name: "Beadline",
    appVersion: "",
    locale: LocaleType.EN_US,
    styles: Object.assign({}, ...data.map(({ styles }) => styles)),
    sheetOrder: data.map(({ sheet }) => sheet.id!),
    sheets: Object.fromEntries(data.map(({ sheet }) => [sheet.id, sheet])),
  };
}
