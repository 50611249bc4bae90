import type { CellValue, FilledSheet } from "../sheets";

/**
 * A workbook as our pages see it. The pane works on this alone, so the same pane serves Excel and the local sheet;
 * everything is asynchronous because Excel is. Addresses are in A1 style, with a sheet name in front
 * ("'Furnace log'!H6:K9") or without, which means the sheet that is open.
 */
export interface Workbook {
  /** Address of the selected range, with its sheet. */
  getSelection(): Promise<string>;
  /** Calls back after each change of the selection or of a shown result; gives back how to stop. */
  onChange(listener: () => void): () => void;
  /** Values of a range, spilled results included; an empty cell is "". */
  getValues(range: string): Promise<CellValue[][]>;
  /** The text a cell shows, in its number format. */
  getText(cell: string): Promise<string>;
  setFormula(cell: string, formula: string): Promise<void>;
  /** Writes the titles of columns of numbers side by side, the first one at the given cell. */
  setHeader(cell: string, titles: string[]): Promise<void>;
  /** Selects a range, opens its sheet and brings it into view. */
  select(range: string): Promise<void>;
  /** Adds a sheet behind the others and opens it. A name in use gets a number; gives back the name it has. */
  addSheet(sheet: FilledSheet): Promise<string>;
  /** What stands behind the error that a cell shows; undefined where there is no error. */
  getErrorMessage(cell: string): Promise<string | undefined>;
}

export type { CellValue, FilledSheet };

declare global {
  interface Window {
    /** The open workbook of the local sheet; fixed once the page is ready. */
    readonly beadlineSheet?: Workbook;
  }
}
