// Calculates the formulas of a planned workbook with the worksheet functions themselves. Small and strict on purpose:
// it knows what the samples use, stops at everything else, and checks each result's size against the plan. The grid
// engine of the local sheet would do as well, but it answers in its own time, and the tests can now hold the one
// against the other.

import { WorksheetError, type WorksheetFunction } from "../../catalogue/functions-runtime";
import { cellName, type FilledSheet, type PlannedCell } from "../../sheets";
import { type Area, type Expression, parse } from "./parse";
import { type Block, type Cell, cellwise, operate, spreadsheetFunctions } from "./spreadsheet-functions";

interface SheetState {
  name: string;
  values: Map<number, Cell>;
  /** The planned formula that fills a cell, by cell. */
  filledBy: Map<number, PlannedCell>;
  results: Map<PlannedCell, Block | "busy">;
}

const key = (row: number, column: number): number => row * 16_384 + column;

export class Calculation {
  readonly #sheets: Map<string, SheetState>;
  readonly #functions: ReadonlyMap<string, WorksheetFunction>;

  constructor(sheets: readonly FilledSheet[], functions: ReadonlyMap<string, WorksheetFunction>) {
    this.#sheets = new Map(sheets.map((sheet) => [sheet.name, stateOf(sheet)]));
    this.#functions = functions;
  }

  /** The rectangle that the formula planned for this cell fills. */
  results(sheetName: string, row: number, column: number): Block {
    const sheet = this.#sheet(sheetName);
    const planned = sheet.filledBy.get(key(row, column));
    if (planned?.row !== row || planned.column !== column) {
      throw new Error(`${sheetName}!${cellName(row, column)} holds no formula`);
    }
    return this.#resultsOf(sheet, planned);
  }

  #resultsOf(sheet: SheetState, planned: PlannedCell): Block {
    const known = sheet.results.get(planned);
    const where = `${sheet.name}!${cellName(planned.row, planned.column)}`;
    if (known === "busy") throw new Error(`The formula in ${where} depends on itself`);
    if (known) return known;
    sheet.results.set(planned, "busy");
    const found = this.#evaluate(parse(planned.formula!), sheet).map((row) => row.map((cell) => cell ?? 0));
    const [rows, columns] = planned.spill ?? [1, 1];
    if (found.length !== rows || found.some((row) => row.length !== columns)) {
      throw new Error(
        `${where} gives ${found.length} × ${found[0]?.length} cells; its plan says ${rows} × ${columns}`,
      );
    }
    sheet.results.set(planned, found);
    return found;
  }

  #evaluate(expression: Expression, sheet: SheetState): Block {
    switch (expression.kind) {
      case "value":
        return [[expression.value]];
      case "array":
        return expression.rows;
      case "area":
        return this.#read(expression.area, sheet);
      case "negative":
        return operate("-", [[0]], this.#evaluate(expression.of, sheet));
      case "operation":
        return operate(
          expression.sign,
          this.#evaluate(expression.left, sheet),
          this.#evaluate(expression.right, sheet),
        );
      case "call":
        return this.#call(
          expression.name,
          expression.given.map((each) => each && this.#evaluate(each, sheet)),
        );
    }
  }

  #read({ sheet: name, top, left, rows, columns }: Area, own: SheetState): Block {
    const sheet = name === undefined ? own : this.#sheet(name);
    return Array.from({ length: rows }, (_, down) =>
      Array.from({ length: columns }, (_, across) => this.#cell(sheet, top + down, left + across)),
    );
  }

  #cell(sheet: SheetState, row: number, column: number): Cell {
    const planned = sheet.filledBy.get(key(row, column));
    if (!planned) return sheet.values.get(key(row, column)) ?? null;
    return this.#resultsOf(sheet, planned)[row - planned.row]![column - planned.column]!;
  }

  #call(name: string, given: (Block | undefined)[]): Block {
    if (!name.startsWith("BEAD.")) {
      const known = spreadsheetFunctions[name];
      if (!known) throw new Error(`${name} is not known here: write it into spreadsheet-functions.ts`);
      return known(...given);
    }
    const worksheetFunction = this.#functions.get(name.slice("BEAD.".length));
    if (!worksheetFunction) throw new Error(`There is no function ${name}`);
    // As desktop Excel hands over: an argument left out as null, an empty cell of a range as 0.
    const result = worksheetFunction(
      ...given.map((block) => (block ? cellwise([block], (cell) => cell ?? 0) : null)),
    ) as Block;
    if (result.flat().some((cell) => typeof cell === "object" && !(cell instanceof WorksheetError))) {
      throw new Error(`${name} gave something that no cell can hold`);
    }
    return result;
  }

  #sheet(name: string): SheetState {
    const found = this.#sheets.get(name);
    if (!found) throw new Error(`There is no sheet ${name}`);
    return found;
  }
}

function stateOf({ name, cells, readings }: FilledSheet): SheetState {
  const state: SheetState = { name, values: new Map(), filledBy: new Map(), results: new Map() };
  readings?.rows.forEach((values, down) => {
    values.forEach((value, across) => {
      state.values.set(key(readings.row + down, readings.column + across), value);
    });
  });
  for (const planned of cells) {
    const { row, column, value, formula, spill: [rows, columns] = [1, 1] } = planned;
    if (value !== undefined) state.values.set(key(row, column), value);
    if (formula === undefined) continue;
    for (let r = row; r < row + rows; r++) {
      for (let c = column; c < column + columns; c++) state.filledBy.set(key(r, c), planned);
    }
  }
  return state;
}
