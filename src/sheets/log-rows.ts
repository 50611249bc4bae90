import type { CellValue, FilledSheet, LogExtract, SheetPlan } from "./plan";

/** The rows that an extract names, from the text of its file: numbers, date-time serials, texts, null for empty. */
export function logRows(text: string, { file, first, rows, take }: LogExtract): (CellValue | null)[][] {
  const lines = text.split(/\r?\n/).filter((line) => line !== "" && !line.startsWith("#"));
  // The first of the remaining lines is the header, so that row 1 has the index 1.
  const found = lines.slice(first, first + rows);
  if (found.length !== rows) throw new Error(`${file} has ${lines.length - 1} rows, not ${first + rows - 1}`);
  return found.map((line) => {
    const fields = line.split(",").map(readField);
    return take ? take.map((column) => fields[column] ?? null) : fields;
  });
}

/** A plan with its readings; `read` gives the text of a file. */
export async function filled(
  { log, ...plan }: SheetPlan,
  read: (file: string) => Promise<string>,
): Promise<FilledSheet> {
  if (!log) return plan;
  const { row, column, file } = log;
  return { ...plan, readings: { row, column, rows: logRows(await read(file), log) } };
}

const dateTime = /^(\d{4})-(\d\d)-(\d\d) (\d\d):(\d\d):(\d\d)$/;

/** Our own logs are written one way: points, commas, ISO dates; anything else is a text. */
function readField(field: string): CellValue | null {
  if (field === "") return null;
  if (/^-?\d+(\.\d+)?$/.test(field)) return Number(field);
  const found = dateTime.exec(field);
  return found ? serial(found.slice(1).map(Number)) : field;
}

/** Days since 1899-12-30, as worksheets count them. */
function serial([year, month, day, hour, minute, second]: number[]): number {
  const days = Date.UTC(year!, month! - 1, day!) / 86_400_000 + 25_569;
  return days + (hour! * 3600 + minute! * 60 + second!) / 86_400;
}
