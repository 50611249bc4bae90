import Papa from "papaparse";
import { type DateOrder, readDateTime, sniffDateOrder } from "./date-time";
import { type DecimalMark, readNumber } from "./number";

export type Delimiter = ";" | "\t" | "," | "|";

/** How a log is to be read. Detected first, shown, and changed by the user where the detection is wrong. */
export interface LogFormat {
  delimiter: Delimiter;
  decimal: DecimalMark;
  dates: DateOrder;
  hasHeader: boolean;
}

/** In this order of preference where two fit equally well: a comma may also be the decimal mark. */
const delimiters: Delimiter[] = [";", "\t", "|", ","];
const sampleRows = 200;

export const parseRows = (text: string, delimiter: Delimiter, preview = 0): Papa.ParseResult<string[]> =>
  Papa.parse<string[]>(text, { delimiter, preview, skipEmptyLines: true });

export function sniff(text: string): LogFormat {
  const body = withoutComments(text.slice(0, 200_000));
  const delimiter = delimiters.reduce((best, each) =>
    evenness(body, each) > evenness(body, best) ? each : best,
  );
  const rows = parseRows(body, delimiter, sampleRows).data;
  const fields = rows.slice(1).flat();
  const decimal = sniffDecimal(fields);
  const dates = sniffDateOrder(fields);
  return { delimiter, decimal, dates, hasHeader: looksLikeHeader(rows, decimal, dates) };
}

/** Lines in front that start with "#" are remarks: they say nothing about the columns. */
export const withoutComments = (text: string): string => text.replace(/^\uFEFF?(?:#[^\n]*(?:\n|$))+/, "");

/** Share of rows with the commonest width, if that is more than one column; wide tables win ties. */
function evenness(text: string, delimiter: Delimiter): number {
  const widths = new Map<number, number>();
  const rows = parseRows(text, delimiter, sampleRows).data;
  for (const row of rows) widths.set(row.length, (widths.get(row.length) ?? 0) + 1);
  const [width, count] = [...widths].sort((a, b) => b[1] - a[1])[0] ?? [1, 0];
  return width < 2 ? 0 : count / rows.length;
}

function sniffDecimal(fields: string[]): DecimalMark {
  const count = (mark: DecimalMark) =>
    fields.filter((field) => field.includes(mark) && readNumber(field, mark) !== undefined).length;
  return count(",") > count(".") ? "," : ".";
}

function looksLikeHeader(rows: string[][], decimal: DecimalMark, dates: DateOrder): boolean {
  const isValue = (field: string) =>
    readNumber(field, decimal) !== undefined || readDateTime(field, dates) !== undefined;
  const [first, ...rest] = rows;
  return (
    first !== undefined &&
    !first.some(isValue) &&
    (rest.length === 0 || rest.some((row) => row.some(isValue)))
  );
}
