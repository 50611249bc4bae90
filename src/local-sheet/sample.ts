import type { IWorkbookData } from "@univerjs/core";
import { LocaleType } from "@univerjs/core";
import type { Catalogue } from "../catalogue/catalogue";
import { decode } from "./csv/decode";
import { readLog } from "./csv/read-log";
import { sniff } from "./csv/sniff";
import { suggest } from "./csv/suggest";
import { toSheet } from "./csv/to-sheet";
import { toSheetData } from "./sheet-data";
import { trySheet } from "./try-sheet";
import type { NewSheet } from "./workbook";

export const sampleFile = "samples/furnace-log.csv";

/** The furnace log of an invented works, with its temperatures beside it: the job this is for, done once. */
export async function sampleWorkbook(catalogue: Catalogue): Promise<IWorkbookData> {
  const sheets = [await furnaceSheet(), trySheet(catalogue)];
  const data = sheets.map((sheet, index) => toSheetData(`sheet-${index}`, sheet));
  return {
    id: "workbook",
    name: "Beadline",
    appVersion: "",
    locale: LocaleType.EN_US,
    styles: Object.assign({}, ...data.map(({ styles }) => styles)),
    sheetOrder: data.map(({ sheet }) => sheet.id!),
    sheets: Object.fromEntries(data.map(({ sheet }) => [sheet.id, sheet])),
  };
}

async function furnaceSheet(): Promise<NewSheet> {
  const response = await fetch(sampleFile);
  if (!response.ok) throw new Error(`the sample log could not be read (${response.status})`);
  const { text } = decode(new Uint8Array(await response.arrayBuffer()));
  const log = readLog(text, sniff(text));
  const sheet = toSheet("Furnace log", {
    ...log,
    notes: ["Furnace log of an invented works", ...log.notes, resultNote],
  });
  const formula = suggest(log, sheet.headerRows + 1);
  if (!formula) return sheet;
  return withResults(sheet, formula.cell, formula.formula("K"), formula.titles);
}

const resultNote =
  "Columns H to K: the temperatures of the measuring junctions, type K, from one formula in the first cell.";

/** Puts the formula beside the readings, with its own header and columns wide enough for every result. */
function withResults(sheet: NewSheet, cell: string, formula: string, titles: string[]): NewSheet {
  const header = sheet.headerRows - 1;
  return {
    ...sheet,
    hasTitle: true,
    rows: sheet.rows.map((row, index) => (index === header ? [...row, null, ...titles] : row)),
    formulas: { ...sheet.formulas, [cell]: formula },
    columns: [
      ...sheet.columns,
      { width: 16 },
      ...titles.map(() => ({ width: 80, numberFormat: "General", role: "result" as const })),
    ],
  };
}
