import { parseCell } from "./address";
import type { FormatName } from "./formats";
import type { CellRole, CellValue, LogExtract, PlannedCell, PlannedColumn, SheetPlan } from "./plan";

/** Titles of columns with what stands below them, which says to which side a title stands. */
export type Titles = readonly (readonly [title: string, format: FormatName])[];

export interface Spill {
  rows: number;
  /** The format of each column that the result fills. */
  formats: readonly FormatName[];
  /** The result's first row names its columns. */
  hasHeader?: boolean;
  /** Formats of single rows, where the rows of a column hold different things; rows count from 0. */
  rowFormats?: Readonly<Record<number, FormatName>>;
  /** Columns that hold verdicts, counted from 0. */
  verdicts?: readonly number[];
}

/** A sheet's plan in the making, cell by cell with addresses as its formulas have them. */
export class SheetDraft {
  readonly #cells: PlannedCell[] = [];
  readonly #heights: { row: number; height: number }[] = [];
  #log: LogExtract | undefined;

  constructor(
    readonly name: string,
    readonly columns: readonly PlannedColumn[],
    readonly frozenRows: number,
  ) {}

  title(text: string): this {
    return this.#put("A1", { value: text, role: "title", format: "text" });
  }

  /** Remarks one below another. */
  notes(cell: string, ...lines: string[]): this {
    return this.#column(cell, lines, "note", "text");
  }

  heading(cell: string, text: string): this {
    return this.#put(cell, { value: text, role: "heading", format: "text" });
  }

  labels(cell: string, ...names: string[]): this {
    return this.#column(cell, names, "label", "text");
  }

  /** Formulas to be read, not calculated. */
  examples(cell: string, ...formulas: string[]): this {
    return this.#column(cell, formulas, "example", "text");
  }

  /** Titles side by side. */
  headers(cell: string, titles: Titles): this {
    for (const [i, [value, format]] of titles.entries()) {
      this.#put(cell, { value, role: "header", format }, 0, i);
    }
    return this;
  }

  /** A block of inputs; a null stays truly empty. */
  inputs(
    cell: string,
    rows: readonly (readonly (CellValue | null)[])[],
    formats: readonly FormatName[],
  ): this {
    rows.forEach((values, row) => {
      values.forEach((value, i) => {
        const format = formats[i] ?? "general";
        this.#put(cell, { ...(value === null ? {} : { value }), role: "input", format }, row, i);
      });
    });
    return this;
  }

  /** One formula with one result. */
  result(cell: string, formula: string, format: FormatName, role: CellRole = "result"): this {
    return this.#put(cell, { formula, role, format });
  }

  /** One formula whose result is a text of several lines, and its name at the first of them. */
  paragraph(label: string, name: string, cell: string, formula: string, height: number): this {
    this.#heights.push({ row: parseCell(cell).row, height });
    this.#put(label, { value: name, role: "label", format: "paragraph" });
    return this.#put(cell, { formula, role: "result", format: "paragraph" });
  }

  /** One formula that fills a column of cells below it, or a block; the look is that of the sheet's columns. */
  spill(cell: string, formula: string, rows: number, columns = 1): this {
    const format = this.columns[parseCell(cell).column]?.format ?? "general";
    return this.#put(cell, { formula, spill: [rows, columns], role: "result", format });
  }

  /** One formula that fills a table. Cells that look as their column does are not planned one by one. */
  table(cell: string, formula: string, { rows, formats, hasHeader, rowFormats, verdicts }: Spill): this {
    const left = parseCell(cell).column;
    for (let row = 0; row < rows; row++) {
      formats.forEach((usual, i) => {
        const isFirst = row === 0 && i === 0;
        const format = i > 0 ? (rowFormats?.[row] ?? usual) : usual;
        const role = hasHeader && row === 0 ? "header" : verdicts?.includes(i) ? "verdict" : "result";
        const column = this.columns[left + i];
        if (!isFirst && role === column?.role && format === column.format) return;
        const own = isFirst ? { formula, spill: [rows, formats.length] as [number, number] } : {};
        this.#put(cell, { ...own, role, format }, row, i);
      });
    }
    return this;
  }

  /** Rows of a log file, in the look of the sheet's columns. */
  log(cell: string, extract: Omit<LogExtract, "row" | "column">): this {
    this.#log = { ...extract, ...parseCell(cell) };
    return this;
  }

  plan(): SheetPlan {
    return {
      name: this.name,
      columns: [...this.columns],
      frozenRows: this.frozenRows,
      printOnePageWide: true,
      cells: this.#cells,
      ...(this.#heights.length > 0 ? { heights: this.#heights } : {}),
      ...(this.#log ? { log: this.#log } : {}),
    };
  }

  #column(cell: string, lines: readonly string[], role: CellRole, format: FormatName): this {
    for (const [row, value] of lines.entries()) this.#put(cell, { value, role, format }, row);
    return this;
  }

  #put(cell: string, planned: Omit<PlannedCell, "row" | "column">, down = 0, across = 0): this {
    const { row, column } = parseCell(cell);
    this.#cells.push({ row: row + down, column: column + across, ...planned });
    return this;
  }
}
