import { describe, expect, it } from "vitest";
import { linedUp, partsOf } from "../../../src/local-sheet/print/line-up";
import type { PrintedCell } from "../../../src/local-sheet/print/printed-sheet";

const text = (words: string, look = {}): PrintedCell => ({ text: words, isNumber: false, look });
const figure = (words: string): PrintedCell => ({ text: words, isNumber: true, look: {} });
const across = (row: PrintedCell[], widths: number[]) => linedUp(row, widths).map((each) => each.across);

describe("lining up a row", () => {
  it("lets a long text run on over empty cells, as far as it needs", () => {
    const long = text("a remark of thirty characters.");
    expect(across([long, text(""), text(""), text("")], [80, 80, 80, 80])).toEqual([3, 1]);
  });

  it("stops at a cell that holds something", () => {
    const long = text("a remark of thirty characters.");
    expect(across([long, text(""), figure("1.0"), text("")], [80, 80, 80, 80])).toEqual([2, 1, 1]);
  });

  it("keeps numbers, wrapped texts and texts at the right edge in their own cells", () => {
    const words = "a remark of thirty characters.";
    for (const cell of [figure(words), text(words, { wrapped: true }), text(words, { align: "right" })])
      expect(across([cell, text("")], [40, 40])).toEqual([1, 1]);
  });

  it("loses no cell and no column", () => {
    const row = [text("x".repeat(60)), text(""), figure("2"), text("y".repeat(9)), text(""), text("")];
    const placed = linedUp(row, [50, 50, 50, 50, 50, 50]);
    expect(placed.reduce((sum, each) => sum + each.across, 0)).toBe(6);
    expect(placed.map(({ cell }) => cell.text).join("")).toBe(row.map((cell) => cell.text).join(""));
  });

  it("breaks a word only when it is far too long, and never a number", () => {
    const [long, little, number] = linedUp(
      [text("=BEAD.TEMPERATURE(B8:B2007)"), text("minutes_to_reach"), figure("123456789.123456789")],
      [60, 100, 40],
    );
    expect([long, little, number].map((each) => each?.breaks)).toEqual([true, false, false]);
  });
});

describe("the parts of a sheet", () => {
  const sheet = (rows: PrintedCell[][], frozenRows: number) =>
    partsOf({ name: "S", widths: [80, 80], frozenRows, rows, usedRows: rows.length, usedColumns: 2 });
  const title = [text("Title"), text("")];
  const empty = [text(""), text("")];
  const header = [text("time"), text("CH1 mV")];
  const reading = [figure("1"), figure("2")];

  it("puts title and remarks above the table, and heads each page with what is left of the frozen rows", () => {
    const parts = sheet([title, empty, title, header, reading], 4);
    expect(parts.lines.map((each) => each.text)).toEqual(["Title", "Title"]);
    expect([parts.head, parts.body]).toEqual([[header], [reading]]);
  });

  it("leaves frozen rows of remarks alone no head", () => {
    expect(sheet([title, reading], 1)).toEqual({ lines: [title[0]], head: [], body: [reading] });
  });

  it("takes everything into the table where nothing is frozen", () => {
    expect(sheet([title, reading], 0)).toEqual({ lines: [], head: [], body: [title, reading] });
  });
});
