import { type DateOrder, readDateTime } from "./date-time";
import { readNumber } from "./number";
import { type LogFormat, parseRows, withoutComments } from "./sniff";

/** What a sheet can hold, in Excel as here. */
export const maxRows = 1_048_576;
export const maxColumns = 16_384;

export type ColumnKind = "number" | "date-time" | "time" | "text" | "empty";
export type LogCell = number | string | null;

export interface Log {
  /** The remarks in front of the table, without their "#". */
  notes: string[];
  /** null where the file has none. */
  header: string[] | null;
  /** null for an empty field. */
  rows: LogCell[][];
  kinds: ColumnKind[];
  /** Most digits behind the decimal mark, by column. */
  decimals: number[];
  /** Fields that stay text in columns of numbers or times, in the file's order. */
  leftAsText: number;
  /** What the parser found wrong, in plain words. */
  faults: string[];
}

export function readLog(text: string, format: LogFormat, preview = 0): Log {
  const body = withoutComments(text);
  const notes = text.slice(0, text.length - body.length);
  const parsed = parseRows(body, format.delimiter, preview);
  const fields = parsed.data;
  const header = format.hasHeader ? (fields.shift() ?? []).map((field) => field.trim()) : null;
  const rows = fields.map((row) => row.map((field) => readField(field, format)));
  const width = rows.reduce((most, row) => Math.max(most, row.length), header?.length ?? 0);
  const kinds = Array.from({ length: width }, (_, column) => kindOf(rows, column, fields, format.dates));
  return {
    notes: notes
      .split(/\r?\n/)
      .map((line) => line.replace(/^\uFEFF?#\s?/, "").trim())
      .filter((line) => line !== ""),
    header,
    rows,
    kinds,
    decimals: kinds.map((_, column) => decimalsOf(fields, column, format)),
    leftAsText: rows.reduce((sum, row) => sum + row.filter((cell, i) => isStray(cell, kinds[i])).length, 0),
    faults: parsed.errors
      .filter((error) => error.code !== "UndetectableDelimiter")
      .map((error) => `row ${(error.row ?? 0) + 1}: ${error.message.toLowerCase()}`),
  };
}

function readField(field: string, format: LogFormat): LogCell {
  if (field.trim() === "") return null;
  return readNumber(field, format.decimal) ?? readDateTime(field, format.dates) ?? field;
}

const isStray = (cell: LogCell, kind: ColumnKind | undefined) => typeof cell === "string" && kind !== "text";

/** A column is what most of its fields are. */
function kindOf(rows: LogCell[][], column: number, fields: string[][], dates: DateOrder): ColumnKind {
  let [numbers, texts, days, times] = [0, 0, 0, 0];
  const step = Math.max(1, Math.floor(rows.length / 2000));
  for (let row = 0; row < rows.length; row += step) {
    const cell = rows[row]?.[column];
    if (cell == null) continue;
    if (typeof cell === "string") texts++;
    else if (!/[:/]|\d[-.]\d+[-.]\d/.test(fields[row]?.[column] ?? "") || dates === "none") numbers++;
    else if (cell < 1) times++;
    else days++;
  }
  const most = Math.max(numbers, texts, days, times);
  if (most === 0) return "empty";
  if (most === numbers) return "number";
  return most === days ? "date-time" : most === times ? "time" : "text";
}

function decimalsOf(fields: string[][], column: number, { decimal }: LogFormat): number {
  let most = 0;
  for (let row = 0; row < Math.min(fields.length, 2000); row++) {
    const field = fields[row]?.[column]?.trim() ?? "";
    const mark = field.indexOf(decimal);
    if (mark >= 0 && readNumber(field, decimal) !== undefined) most = Math.max(most, field.length - mark - 1);
  }
  return Math.min(most, 6);
}
