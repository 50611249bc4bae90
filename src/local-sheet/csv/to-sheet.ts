import type { FilledSheet, FormatName, PlannedCell, PlannedColumn } from "../../sheets";
import { type ColumnKind, type Log, maxRows } from "./read-log";

/** How many of a log's readings a sheet has room for, below its remarks and its header. */
export const rowsThatFit = ({ notes, header, rows }: Log): number =>
  Math.min(rows.length, maxRows - notes.length - (header ? 1 : 0));

/** A log as a new sheet: its remarks in the first rows, then its header, then the readings that fit. */
export function toSheet(name: string, log: Log): FilledSheet {
  const columns = log.kinds.map((kind, column) => toColumn(kind, log, column));
  const header = log.notes.length;
  const first = header + (log.header ? 1 : 0);
  const fitting = rowsThatFit(log);
  return {
    name: sheetName(name),
    columns,
    frozenRows: first,
    printOnePageWide: true,
    cells: [
      ...log.notes.map(
        (value, row): PlannedCell => ({ row, column: 0, value, role: "note", format: "text" }),
      ),
      ...(log.header ?? []).flatMap((value, column): PlannedCell[] =>
        value === ""
          ? []
          : [{ row: header, column, value, role: "header", format: columns[column]?.format ?? "text" }],
      ),
    ],
    readings: {
      row: first,
      column: 0,
      rows: log.rows.length > fitting ? log.rows.slice(0, fitting) : log.rows,
    },
  };
}

function toColumn(kind: ColumnKind, log: Log, column: number): PlannedColumn {
  const title = log.header?.[column]?.length ?? 0;
  const wide = (least: number) => Math.max(least, Math.min(240, title * 8 + 20));
  if (kind === "date-time") return { width: wide(152), format: "date-time", role: "input" };
  if (kind === "time") return { width: wide(88), format: "clock", role: "input" };
  if (kind === "text" || kind === "empty")
    return { width: wide(kind === "text" ? 120 : 76), format: "text", role: "input" };
  return { width: wide(76), format: decimals[log.decimals[column] ?? 0] ?? "general", role: "input" };
}

/** As many decimals as the log writes. */
const decimals: FormatName[] = [
  "general",
  "1 decimal",
  "2 decimals",
  "3 decimals",
  "4 decimals",
  "5 decimals",
  "6 decimals",
];

/** A sheet tab takes 31 characters and none of : \ / ? * [ ] */
export const sheetName = (fileName: string): string =>
  fileName
    .replace(/\.[^.]*$/, "")
    .replace(/[:\\/?*[\]]/g, " ")
    .replace(/^'+|'+$/g, "")
    .trim()
    .slice(0, 31) || "Log";
