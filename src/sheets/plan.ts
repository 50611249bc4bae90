/**
 * A sheet that we write is a plan first: pure data, which one writer turns into a sheet of the local grid, another
 * into a worksheet of Excel, a third into a workbook file. Rows and columns count from 0, addresses in formulas as
 * ever. Formulas are in English with commas, start with "=" and spill by themselves.
 */
import type { FormatName } from "./formats";

export interface WorkbookPlan {
  name: string;
  /** What it shows, for the one who chooses among several. */
  sentence: string;
  /** True where works, sensors and readings were made up. */
  invented: boolean;
  sheets: SheetPlan[];
}

export interface SheetPlan {
  name: string;
  columns: PlannedColumn[];
  /** Rows at the top that stay in view. */
  frozenRows: number;
  printOnePageWide: true;
  cells: PlannedCell[];
  /** Rows that are higher than one line, for text that wraps; in pixels. */
  heights?: { row: number; height: number }[];
  /** Rows of a log, in a file of their own. */
  log?: LogExtract;
}

export interface PlannedColumn {
  /** In pixels. */
  width: number;
  /** For the rows of a log and for what spills into cells that are not planned one by one. */
  format?: FormatName;
  role?: "input" | "result";
}

/**
 * title, note (muted), heading (a block's name) and label (the name of a value) are words of ours; header names a
 * column or a row; input, result and verdict are the figures; example is a formula shown as text.
 */
export type CellRole =
  | "title"
  | "note"
  | "heading"
  | "label"
  | "header"
  | "input"
  | "result"
  | "verdict"
  | "example";

/** With neither value nor formula it only says how a spilled value looks there, and must stay truly empty. */
export interface PlannedCell {
  row: number;
  column: number;
  value?: CellValue;
  formula?: string;
  /** Rows and columns that the formula fills, itself among them; one cell when left out. */
  spill?: [rows: number, columns: number];
  role: CellRole;
  format?: FormatName;
}

export type CellValue = string | number | boolean;

/** Some rows of a log file, so that a plan need not repeat them. */
export interface LogExtract {
  /** Beside the plan. */
  file: string;
  /** The first row that is taken, counted from 1 below the file's header. */
  first: number;
  rows: number;
  /** The file's columns that are taken, counted from 0; all when left out. */
  take?: number[];
  /** Where the block's corner lies on the sheet. */
  row: number;
  column: number;
}

/** A plan with all its readings at hand: what a writer takes. null leaves a cell truly empty. */
export interface FilledSheet extends Omit<SheetPlan, "log"> {
  readings?: { row: number; column: number; rows: readonly (readonly (CellValue | null)[])[] };
}
