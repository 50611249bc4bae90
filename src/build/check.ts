// What the built functions make of the sample log, in words: the main job seen without a browser.

import { WorksheetError } from "../catalogue/functions-runtime";
import { type Cell, loadBuiltFunctions, type Matrix } from "./built-functions";
import { type Log, readLog } from "./sample-log";

export interface SampleCheck {
  lines: string[];
  /** How many cells became a temperature. */
  temperatures: number;
}

interface Group {
  kind: string;
  reason: string;
  count: number;
  first: string;
}

/** Corrects the log with one call, as one formula in the sheet would, and tells what came out. */
export function checkSample(functionsSource: string, csv: string): SampleCheck {
  const run = loadBuiltFunctions(functionsSource).get("TEMPERATURE");
  if (run === undefined) throw new Error("The built functions.js holds no function TEMPERATURE.");
  const log = readLog(csv);
  const result = run(log.millivolts, [["K"]], log.terminals, null);
  if (result.length !== log.times.length) {
    throw new Error(`${log.times.length} scans went in and ${result.length} rows came out of TEMPERATURE.`);
  }
  const groups = grouped(result, log);
  const temperatures = result.flat().filter(isNumber).length;
  const lines = [
    `${log.times.length} scans of ${log.channels.length} channels, ${log.times[0]} to ${log.times.at(-1)}`,
    `One call of TEMPERATURE gave ${result.flat().length} cells:`,
    `${count(temperatures)} temperatures`,
    ...groups.map(
      ({ kind, reason, first, ...group }) =>
        `${count(group.count)} ${kind}, first at ${first}${reason && `: ${reason}`}`,
    ),
    ...table([
      ["", ...log.channels],
      ["first scan", ...(result[0] ?? []).map(shown)],
      ["last scan", ...(result.at(-1) ?? []).map(shown)],
      ["lowest", ...extremes(result, log, Math.min)],
      ["highest", ...extremes(result, log, Math.max)],
    ]),
  ];
  return { lines, temperatures };
}

/** Everything that is not a number, by kind and reason. Reasons that differ only in their numbers are one. */
function grouped(result: Matrix, log: Log): Group[] {
  const groups = new Map<string, Group>();
  result.forEach((row, scan) => {
    row.forEach((cell, channel) => {
      if (isNumber(cell)) return;
      const { kind, reason } = described(cell);
      const key = `${kind} ${reason.replace(/[-−]?\d+(\.\d+)?/g, "#")}`;
      const group = groups.get(key);
      if (group) group.count++;
      else groups.set(key, { kind, reason, count: 1, first: `scan ${scan + 1} of ${log.channels[channel]}` });
    });
  });
  return [...groups.values()].sort((a, b) => b.count - a.count);
}

function described(cell: Cell): { kind: string; reason: string } {
  if (cell instanceof WorksheetError) return { kind: `refused ${cell.code}`, reason: cell.message ?? "" };
  if (cell === "") return { kind: "blank", reason: "" };
  return { kind: "neither number nor error", reason: String(cell) };
}

function isNumber(cell: Cell): cell is number {
  return typeof cell === "number" && Number.isFinite(cell);
}

function extremes(result: Matrix, log: Log, pick: (...values: number[]) => number): string[] {
  return log.channels.map((_, channel) => {
    const values = result.map((row) => row[channel] ?? "").filter(isNumber);
    return values.length === 0 ? "none" : shown(pick(...values));
  });
}

function shown(cell: Cell): string {
  if (isNumber(cell)) return `${cell.toFixed(2)} °C`;
  return cell instanceof WorksheetError ? cell.code : String(cell);
}

function count(value: number): string {
  return String(value).padStart(8);
}

function table(rows: string[][]): string[] {
  return rows.map((row) =>
    row.map((cell, column) => (column ? cell.padStart(12) : cell.padEnd(12))).join(""),
  );
}
