import { describe, expect, it } from "vitest";
import {
  leftOutWords,
  mostCells,
  mostColumns,
  printedSize,
} from "../../../src/local-sheet/print/printed-sheet";

const sheet = (rows: number, columns: number, usedRows = rows, usedColumns = columns) => ({
  name: "S",
  widths: new Array(columns).fill(80),
  frozenRows: 0,
  rows: new Array(rows).fill([]),
  usedRows,
  usedColumns,
});

describe("how much of a sheet is printed", () => {
  it("is all of an ordinary one", () => {
    expect(printedSize(2007, 11)).toEqual({ rows: 2007, columns: 11 });
    expect(printedSize(0, 0)).toEqual({ rows: 0, columns: 0 });
    expect(leftOutWords(sheet(2007, 11))).toBeUndefined();
  });

  it("is never more than a page can lay out without a long halt", () => {
    for (const [rows, columns] of [
      [1_048_576, 1],
      [1_048_576, 16_384],
      [20_000, 39],
      [7, 16_384],
    ] as const) {
      const size = printedSize(rows, columns);
      expect(size.rows * size.columns).toBeLessThanOrEqual(mostCells);
      expect(size.columns).toBeLessThanOrEqual(mostColumns);
      expect(Math.min(size.rows, size.columns)).toBeGreaterThan(0);
    }
  });

  it("says in numbers what is left out, and where the rest can be printed", () => {
    const words = leftOutWords(sheet(3000, 10, 50_000, 12));
    expect(words).toContain("the first 3000 of 50000 rows, the first 10 of 12 columns");
    expect(words).toContain(".xlsx");
  });
});
