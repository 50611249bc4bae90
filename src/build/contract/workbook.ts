// The workbook that a version leaves behind: every documented example as a formula, as Excel stores it, with the values
// that this version gives. Later versions must still read it and calculate the same.

import type { Catalogue } from "../../catalogue/catalogue";
import { parseExample } from "../../catalogue/formula";
import { type StoredCell, type StoredSheet, writeWorkbook } from "../../workbooks";
import { type Functions, resultOf } from "./record";

/** Results stand from column B; the name of the function beside them. */
const resultColumn = 1;

export function contractWorkbook(
  { version, categories, functions }: Catalogue,
  built: Functions,
): Uint8Array {
  return writeWorkbook({
    title: `Beadline ${version}: documented examples`,
    sheets: categories
      .map(({ name }): StoredSheet => {
        const cells: StoredCell[] = [];
        let row = 0;
        for (const { id, parameters, examples } of functions.filter(({ category }) => category === name)) {
          for (const { formula } of examples) {
            const { given } = parseExample(formula);
            const result = resultOf(built, { id, given: parameters.map((_, i) => given[i] ?? null) });
            cells.push({ row, column: 0, value: id }, ...resultCells(row, formula, result));
            row += result.length + 1;
          }
        }
        return { name, columns: [], frozenRows: 0, cells };
      })
      .filter(({ cells }) => cells.length > 0),
  });
}

const resultCells = (top: number, formula: string, result: ReturnType<typeof resultOf>): StoredCell[] =>
  result.flatMap((values, down) =>
    values.map((value, across): StoredCell => {
      const cell = { row: top + down, column: resultColumn + across, value };
      return down + across > 0 ? cell : { ...cell, formula, spill: [result.length, values.length] };
    }),
  );
