import { blankSafe, columnName } from "../../sheets";
import type { Log } from "./read-log";

export interface Suggestion {
  /** Where the results go: the first free column but one, beside the first reading. */
  cell: string;
  /** One title for each column of results: the channel's own with its new unit. */
  titles: string[];
  /** The formula for a thermocouple type. */
  formula: (type: string) => string;
}

const millivolts = /\bm\s?v\b|millivolt/i;
const terminal = /terminal|junction|reference|cold|ambient|\bcj|\bcjc|\bref\b|°\s?c/i;

/**
 * The formula that turns this log's millivolts into temperatures, if the header names millivolt columns side by
 * side and a temperature of the terminals. Blank-safe, because Excel hands an empty cell of a range over as 0.
 */
export function suggest(log: Log, firstRow: number, rows = log.rows.length): Suggestion | undefined {
  const header = log.header ?? [];
  const first = header.findIndex((title) => millivolts.test(title));
  let last = first;
  while (last + 1 < header.length && millivolts.test(header[last + 1]!)) last++;
  const reference = header.findIndex((title) => terminal.test(title) && !millivolts.test(title));
  if (first < 0 || reference < 0 || rows === 0) return undefined;
  const range = (from: number, to: number) =>
    `${columnName(from)}${firstRow}:${columnName(to)}${firstRow + rows - 1}`;
  const [emf, terminals] = [blankSafe(range(first, last)), blankSafe(range(reference, reference))];
  return {
    cell: `${columnName(log.kinds.length + 1)}${firstRow}`,
    titles: header.slice(first, last + 1).map((title) => title.replace(millivolts, "°C")),
    formula: (type) => `=BEAD.TEMPERATURE(${emf},"${type}",${terminals})`,
  };
}
