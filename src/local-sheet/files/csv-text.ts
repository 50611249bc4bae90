import { isError, type StoredCell, type StoredSheet } from "../../workbooks";

/**
 * A sheet as CSV: commas, decimal points, ISO dates, each number with all its digits, as every program reads it.
 * Excel and others run a text that begins like a formula as one; such a text gets an apostrophe in front, as OWASP
 * advises, and numbers are left alone.
 */
export function csvText({ cells }: StoredSheet): string {
  const rows: string[][] = [];
  let width = 0;
  for (const cell of cells) {
    if (cell.value === undefined) continue;
    while (rows.length <= cell.row) rows.push([]);
    rows[cell.row]![cell.column] = field(cell);
    width = Math.max(width, cell.column + 1);
  }
  const lines = rows.map((row) => Array.from({ length: width }, (_, column) => row[column] ?? "").join(","));
  return lines.map((line) => `${line}\r\n`).join("");
}

function field({ value, look }: StoredCell): string {
  if (typeof value === "number") return isDate(look?.pattern) ? isoDate(value) : String(value);
  if (typeof value === "boolean") return value ? "TRUE" : "FALSE";
  if (isError(value)) return quoted(withoutFormula(value.error));
  return quoted(withoutFormula(value ?? ""));
}

/** A sign that begins a formula, or white space that a program strips before it looks; also in full width. */
const formulaStart = /^[=+\-@\t\r\n＝＋－＠]/;

export const withoutFormula = (text: string): string => (formulaStart.test(text) ? `'${text}` : text);

const quoted = (text: string): string =>
  /[",\t\r\n;]|^\s|\s$/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;

/** Of a format without its quoted words and colours, any letter of a date or a time. */
const isDate = (pattern = ""): boolean =>
  /[ymdhs]/i.test(pattern.replace(/"[^"]*"|\\.|\[[a-z]{3,}\d*\]/gi, ""));

/** To the millisecond, because a serial cannot hold a decimal second exactly. */
function isoDate(serial: number): string {
  const moment = new Date(Math.round((serial - 25_569) * 86_400_000));
  if (Number.isNaN(moment.getTime())) return String(serial);
  const written = moment
    .toISOString()
    .replace("T", " ")
    .replace("Z", "")
    .replace(/\.?0+$/, (zeros) => (zeros.startsWith(".") ? "" : zeros));
  const [date, time] = written.split(" ");
  if (serial < 1) return time ?? "";
  return Number.isInteger(serial) ? date! : written;
}
