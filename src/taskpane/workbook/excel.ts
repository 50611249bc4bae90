import { OfficeWorkbook } from "./office-workbook";

/**
 * The workbook of the Excel around this page; undefined in an ordinary browser, with Office.js (which then names no
 * host) or without it.
 */
export async function workbookOfExcel(): Promise<OfficeWorkbook | undefined> {
  if (typeof Office === "undefined") return undefined;
  try {
    const { host } = await Office.onReady();
    return host === Office.HostType.Excel ? new OfficeWorkbook() : undefined;
  } catch {
    return undefined;
  }
}
