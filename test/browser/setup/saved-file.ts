import { mkdtempSync, readFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import ExcelJS from "exceljs";
import type { Page } from "playwright-core";

/** Saves by the dialog; gives back the name that the file is offered under and where it now lies. */
export async function saveAs(page: Page, button: string): Promise<{ name: string; path: string }> {
  await page.locator("#save").click();
  const [download] = await Promise.all([
    page.waitForEvent("download"),
    page.locator("#files").getByRole("button", { name: button }).click(),
  ]);
  const name = download.suggestedFilename();
  const path = join(mkdtempSync(join(tmpdir(), "beadline-saved-")), name);
  await download.saveAs(path);
  return { name, path };
}

/** A cell of a file as a general reader finds it, that knows nothing of ours. */
export interface FileCell {
  row: number;
  column: number;
  address: string;
  /** As the local sheet shows values: dates as serials, errors as their code. */
  value: unknown;
  formula: string | undefined;
  /** The rectangle that the file names for an array formula. */
  ref: string | undefined;
}

/** What a file holds, sheet by sheet; rows and columns count from 1. */
export async function fileSheets(path: string): Promise<{ name: string; cells: FileCell[] }[]> {
  const book = new ExcelJS.Workbook();
  await book.xlsx.load(readFileSync(path).buffer as ArrayBuffer);
  return book.worksheets.map((worksheet) => {
    const cells: FileCell[] = [];
    worksheet.eachRow((line, row) =>
      line.eachCell((cell, column) => {
        const { value, formula, address } = cell;
        // Not `cell.result`, which drops a 0.
        const { result } = cell.model as { result?: unknown };
        const { ref } = (value ?? {}) as { ref?: string };
        cells.push({
          row,
          column,
          address,
          value: shown(formula === undefined ? value : result),
          formula,
          ref,
        });
      }),
    );
    return { name: worksheet.name, cells };
  });
}

function shown(value: unknown): unknown {
  if (value instanceof Date) return value.getTime() / 86_400_000 + 25_569;
  if (typeof value === "object" && value !== null && "error" in value) return value.error;
  return value ?? "";
}
