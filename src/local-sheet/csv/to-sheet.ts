import type { CellValue, NewSheet, SheetColumn } from "../workbook";
import { type ColumnKind, type Log, maxRows } from "./read-log";

/** How many of a log's readings a sheet has room for, below its remarks and its header. */
export const rowsThatFit = ({ notes, header, rows }: Log): number =>
  Math.min(rows.length, maxRows - notes.length - (header ? 1 : 0));

/** A log as a new sheet: its remarks in the first rows, then its header, then the readings that fit. */
export function toSheet(name: string, log: Log): NewSheet {
  const notes = log.notes.map((note): (CellValue | null)[] => [note]);
  const header = log.header ? [log.header.map((field): CellValue | null => field || null)] : [];
  const fitting = rowsThatFit(log);
  return {
    name: sheetName(name),
    rows: [...notes, ...header, ...(log.rows.length > fitting ? log.rows.slice(0, fitting) : log.rows)],
    columns: log.kinds.map((kind, column) => toColumn(kind, log, column)),
    headerRows: notes.length + header.length,
    noteRows: notes.length,
  };
}

function toColumn(kind: ColumnKind, log: Log, column: number): SheetColumn {
  const title = log.header?.[column]?.length ?? 0;
  const wide = (least: number) => Math.max(least, Math.min(240, title * 8 + 20));
  if (kind === "date-time") return { width: wide(152), numberFormat: "yyyy-mm-dd hh:mm:ss", role: "input" };
  if (kind === "time") return { width: wide(88), numberFormat: "hh:mm:ss", role: "input" };
  if (kind === "text") return { width: wide(120), role: "input" };
  const decimals = log.decimals[column] ?? 0;
  return {
    width: wide(76),
    numberFormat: decimals > 0 ? `0.${"0".repeat(decimals)}` : "General",
    role: "input",
  };
}

/** A sheet tab takes 31 characters and none of : \ / ? * [ ] */
export const sheetName = (fileName: string): string =>
  fileName
    .replace(/\.[^.]*$/, "")
    .replace(/[:\\/?*[\]]/g, " ")
    .replace(/^'+|'+$/g, "")
    .trim()
    .slice(0, 31) || "Log";
