import type { CellValue, FilledSheet } from "../../sheets";

/**
 * The workbook as the pane sees it. The pane works on this alone, so the same pane serves Excel and the local sheet;
 * everything is asynchronous because Excel is. Addresses are in A1 style, with a sheet name in front
 * ("'Furnace log'!H6:K9") or without, which means the sheet that is open. What cannot be done is thrown as a
 * `Trouble` whose message is a sentence for the user.
 */
export interface Workbook {
  /** Address of the selected range, with its sheet. */
  getSelection(): Promise<string>;
  /** Calls back after each change of the selection or of a shown result; gives back how to stop. */
  onChange(listener: () => void): () => void;
  /** Values of a range, spilled results included; an empty cell is "". */
  getValues(range: string): Promise<CellValue[][]>;
  /** The formula that fills a cell: its own, or the one whose results spill over it. */
  getFormula(cell: string): Promise<FormulaCell | undefined>;
  /** What stands in the cells as it would be typed in, so that it can be put back. */
  getContents(range: string): Promise<Contents>;
  /** What is in the way of writing there. */
  inspect(range: string): Promise<Place>;
  /** The cells of a sheet that hold something, "A1:K2007"; undefined on an empty sheet. */
  getUsedRange(address: string): Promise<string | undefined>;
  /** Writes all of it in one go. */
  write(writings: readonly Writing[]): Promise<void>;
  /** Selects a range, opens its sheet and brings it into view. */
  select(range: string): Promise<void>;
  /** Adds a sheet as planned and opens it. A name in use gets a number; gives back the name it has. */
  addSheet(sheet: FilledSheet): Promise<string>;
  removeSheet(name: string): Promise<void>;
  /** What stands behind the error that a cell shows; undefined where there is none or it is not known. */
  getErrorMessage(cell: string): Promise<string | undefined>;
  /** How numbers and lists are written in this workbook, and whether results spill. */
  getTraits(): Promise<Traits>;
}

export type { CellValue, FilledSheet };

export interface FormulaCell {
  /** Address of the cell that holds the formula, with its sheet. */
  readonly anchor: string;
  /** The cells its results fill, with their sheet. */
  readonly range: string;
  /** In the English form, with commas. */
  readonly formula: string;
}

/** A formula starts with "=", a text that starts with an apostrophe is the rest of it, "" is an empty cell. */
export type CellInput = string | number | boolean;

export interface Contents {
  readonly inputs: CellInput[][];
  readonly formats: string[][];
}

export interface Writing {
  readonly range: string;
  /** Left out where only the number formats are written. */
  readonly inputs?: readonly (readonly CellInput[])[];
  /** One number format for all cells, or one for each. */
  readonly formats?: string | readonly (readonly string[])[];
}

export interface Place {
  /** Cells that hold something, the first few of them, and how many there are. */
  readonly occupied: readonly string[];
  readonly occupiedCount: number;
  readonly inTable: boolean;
  readonly merged: boolean;
  readonly protected: boolean;
}

export interface Traits {
  readonly decimal: string;
  readonly list: string;
  /** Whether one formula can fill many cells by itself. */
  readonly spills: boolean;
  /** The program, for sentences: "Excel", "this sheet". */
  readonly name: string;
}
