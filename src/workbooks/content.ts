/**
 * A workbook file's content as the writer takes it and the reader gives it: the grid with formulas, the values that
 * they had when it was stored, and the look of the cells. Rows and columns count from 0, widths are in pixels.
 */
export interface StoredWorkbook {
  title: string;
  description?: string;
  sheets: StoredSheet[];
  /** The add-in whose pane opens with the workbook, where it is installed from that place. */
  opensPane?: PaneReference;
}

/** [MS-OWEXML] 2.2.5: which add-in of which catalogue. A reference that the reader's Excel has not got opens nothing. */
export interface PaneReference {
  /** The manifest's Id. */
  id: string;
  /** The manifest's Version, of four numbers. */
  version: string;
  /** Given out to all by the administrator; from a shared folder; or registered on one machine by a developer. */
  storeType: "EXCatalog" | "FileSystem" | "Registry";
  /** "EXCatalog"; the folder's path; "developer". */
  store: string;
}

export interface StoredSheet {
  name: string;
  columns: { width?: number; look?: CellLook }[];
  /** Rows at the top that stay in view. */
  frozenRows: number;
  /** Of single rows, in pixels. */
  heights?: { row: number; height: number }[];
  cells: StoredCell[];
}

export interface StoredCell {
  row: number;
  column: number;
  /** For a formula the value that it had; left out where the cell is truly empty. */
  value?: StoredValue;
  /** As it is typed: in English, with commas and a "=" in front. */
  formula?: string;
  /** Rows and columns that an array formula fills, itself among them. The other cells hold values alone. */
  spill?: [rows: number, columns: number];
  look?: CellLook;
}

export type StoredValue = number | string | boolean | StoredError;

export interface StoredError {
  /** "#N/A" and the like. */
  error: string;
}

export interface CellLook {
  /** A number format; the general one when left out. */
  pattern?: string;
  bold?: boolean;
  /** In points. */
  size?: number;
  /** "rrggbb". */
  colour?: string;
  align?: "left" | "right" | "center";
  /** Text keeps a step away from the cell's edge. */
  indented?: boolean;
  wrapped?: boolean;
}

export const isError = (value: StoredValue | undefined): value is StoredError => typeof value === "object";
