import { describe, expect, it } from "vitest";
import { cellName, parseCell, SheetDraft } from "../../src/sheets";

const draft = () =>
  new SheetDraft(
    "Sheet",
    [
      { width: 80, format: "text", role: "result" },
      { width: 80, format: "degrees" },
    ],
    1,
  );

describe("a sheet in the making", () => {
  it("puts each thing where its address says", () => {
    const { cells } = draft()
      .title("Title")
      .labels("A3", "one", "two")
      .inputs("B3", [[1], [null]], ["mV"])
      .plan();
    expect(cells).toEqual([
      { row: 0, column: 0, value: "Title", role: "title", format: "text" },
      { row: 2, column: 0, value: "one", role: "label", format: "text" },
      { row: 3, column: 0, value: "two", role: "label", format: "text" },
      { row: 2, column: 1, value: 1, role: "input", format: "mV" },
      { row: 3, column: 1, role: "input", format: "mV" },
    ]);
  });

  it("plans of a table its formula, its header and what looks unlike the column", () => {
    const { cells } = draft()
      .table("A2", "=F()", {
        rows: 3,
        formats: ["text", "degrees"],
        hasHeader: true,
        rowFormats: { 2: "time" },
      })
      .plan();
    expect(cells).toEqual([
      { row: 1, column: 0, formula: "=F()", spill: [3, 2], role: "header", format: "text" },
      { row: 1, column: 1, role: "header", format: "degrees" },
      { row: 2, column: 1, role: "result", format: "degrees" },
      { row: 3, column: 1, role: "result", format: "time" },
    ]);
  });

  it("writes the addresses that it reads", () => {
    for (const cell of ["A1", "Z9", "AA10", "XFD1048576"]) {
      const { row, column } = parseCell(cell);
      expect(cellName(row, column)).toBe(cell);
    }
  });
});
