// Reads a log as the sheet would hold it: numbers as numbers, text as text, an empty cell as "".

import Papa from "papaparse";
import type { Cell, Matrix } from "./built-functions";

export interface Log {
  times: string[];
  /** Names of the millivolt columns without the unit. */
  channels: string[];
  millivolts: Matrix;
  /** Temperature of the terminals, one column. */
  terminals: Matrix;
}

export function readLog(csv: string): Log {
  const { data } = Papa.parse<string[]>(csv, { comments: "#", delimiter: ",", skipEmptyLines: true });
  const [header = [], ...rows] = data;
  const columns = header.flatMap((name, column) => (name.endsWith(" mV") ? [column] : []));
  const terminal = header.indexOf("terminal °C");
  if (columns.length === 0 || terminal < 0) {
    throw new Error('The log needs columns "… mV" and one column "terminal °C".');
  }
  return {
    times: rows.map((row) => row[0] ?? ""),
    channels: columns.map((column) => (header[column] ?? "").slice(0, -" mV".length)),
    millivolts: rows.map((row) => columns.map((column) => toCell(row[column]))),
    terminals: rows.map((row) => [toCell(row[terminal])]),
  };
}

function toCell(written = ""): Cell {
  return /^-?\d+(\.\d+)?$/.test(written) ? Number(written) : written;
}
