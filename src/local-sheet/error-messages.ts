import type { WorksheetError } from "../catalogue/functions-runtime";

/** A cell by sheet, row and column, counted from 0. */
export interface CellPosition {
  sheetId: string;
  row: number;
  column: number;
}

/** A cell with the formula that called. */
export interface Caller extends CellPosition {
  formula: string;
}

interface Call {
  shape: { rows: number; columns: number };
  errors: Map<string, WorksheetError>;
}

/**
 * The messages of the last results. The engine keeps only an error's code, so the message that Excel shows in a
 * cell's error menu would be lost here. Kept per calling cell and function name: a formula may nest several calls.
 */
export class ErrorMessages {
  readonly #calls = new Map<string, Map<string, Call>>();

  record(
    caller: CellPosition,
    name: string,
    shape: Call["shape"],
    errors: Map<string, WorksheetError>,
  ): void {
    const key = keyOf(caller);
    const calls = this.#calls.get(key) ?? new Map<string, Call>();
    calls.delete(name);
    if (errors.size > 0) calls.set(name, { shape, errors });
    if (calls.size > 0) this.#calls.set(key, calls);
    else this.#calls.delete(key);
  }

  /**
   * The message behind an error that is shown `row` and `column` cells from the caller. Only a call that the
   * formula still names, and that gave this very code, can have caused it; the latest such call comes first.
   */
  find(caller: Caller, row: number, column: number, code: string): string | undefined {
    const named = caller.formula.toUpperCase();
    for (const [name, { shape, errors }] of [...(this.#calls.get(keyOf(caller)) ?? [])].reverse()) {
      if (!named.includes(`${name.toUpperCase()}(`)) continue;
      const single = shape.rows === 1 && shape.columns === 1;
      const error = errors.get(single ? "0,0" : `${row},${column}`);
      if (error?.code === code && error.message) return error.message;
    }
    return undefined;
  }
}

const keyOf = ({ sheetId, row, column }: CellPosition) => `${sheetId}!${row},${column}`;
