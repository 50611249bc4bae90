import { describe, expect, it } from "vitest";
import { Calculation } from "../../../src/build/workbooks/calculate";
import { WorksheetError, type WorksheetFunction } from "../../../src/catalogue/functions-runtime";
import type { FilledSheet, PlannedCell } from "../../../src/sheets";

const calls: unknown[][] = [];
const functions = new Map<string, WorksheetFunction>([
  [
    "ECHO",
    (...given) => {
      calls.push(given);
      return given[0];
    },
  ],
]);

/** A3 is truly empty, B holds 10, 20, "x". */
function calculate(formula: string, spill?: [number, number]) {
  const cells: PlannedCell[] = [
    ...[1, 2].map((value, row) => ({ row, column: 0, value, role: "input" as const })),
    ...[10, 20, "x"].map((value, row) => ({ row, column: 1, value, role: "input" as const })),
    { row: 0, column: 3, formula, role: "result", ...(spill && { spill }) },
    { row: 5, column: 0, formula: "=D1", role: "result" },
  ];
  const sheet: FilledSheet = { name: "A's", columns: [], frozenRows: 0, printOnePageWide: true, cells };
  return new Calculation([sheet], functions).results("A's", 0, 3);
}

describe("calculating the formulas of the samples", () => {
  it.each<[string, unknown]>([
    ["=1+2*3^2", 19],
    ["=-(A1+A2)/2", -1.5],
    ["='A''s'!B1&\"-\"&A2", "10-2"],
    ["=$B$1>=10", true],
    ["=MIN(A1:B3)+MAX(A1:B3)+COUNT(A1:B3)", 25],
    ['=INDEX(B1:B3,MATCH("X",B1:B3,0),1)', "x"],
    ["=ROUNDUP(0.3,1)", 0.3],
    ["=ROUNDUP(0.31,1)", 0.4],
    ["=ROUND(-2.345,2)", -2.35],
    ['=IF(A3="","empty",1)', "empty"],
    ["=A3", 0],
    ['=IFERROR(B3*1,"no number")', "no number"],
    ["=5%", undefined],
  ])("%s gives %j", (formula, expected) => {
    if (expected === undefined) expect(() => calculate(formula)).toThrow();
    else expect(calculate(formula)).toEqual([[expected]]);
  });

  it("keeps blanks, hands errors on, and spreads single rows and cells over blocks", () => {
    expect(calculate('=IF(ISBLANK(A1:A3),"",A1:A3*B1)', [3, 1])).toEqual([[10], [20], [""]]);
    expect(calculate("=A1:A2+{10,20}", [2, 2])).toEqual([
      [11, 21],
      [12, 22],
    ]);
    expect(calculate("=B1:B3*2", [3, 1])).toEqual([[20], [40], [new WorksheetError("#VALUE!")]]);
    expect(calculate("=A1/A3")).toEqual([[new WorksheetError("#DIV/0!")]]);
  });

  it("hands cells to our functions as desktop Excel does: an empty one as 0, an argument left out as null", () => {
    calls.length = 0;
    calculate('=BEAD.ECHO(A1:A3,,"K",)', [3, 1]);
    expect(calls).toEqual([[[[1], [2], [0]], null, [["K"]], null]]);
  });

  it("stops where it would have to guess, and where the plan's size is not the result's", () => {
    expect(() => calculate("=VLOOKUP(1,A1:B2,2)")).toThrow("VLOOKUP is not known here");
    expect(() => calculate("=BEAD.NONE(1)")).toThrow("no function BEAD.NONE");
    expect(() => calculate("=A1:A2", [3, 1])).toThrow("gives 2 × 1 cells; its plan says 3 × 1");
    expect(() => calculate("=A6+1")).toThrow("depends on itself");
    expect(() => calculate("=A1 B1")).toThrow("cannot read");
  });
});
