import { describe, expect, it } from "vitest";
import { csvText, withoutFormula } from "../../../src/local-sheet/files/csv-text";
import type { CellLook, StoredValue } from "../../../src/workbooks";

const csv = (rows: (StoredValue | undefined)[][], look?: CellLook) =>
  csvText({
    name: "S",
    columns: [],
    frozenRows: 0,
    cells: rows.flatMap((values, row) =>
      values.map((value, column) => ({
        row,
        column,
        ...(value !== undefined && { value }),
        ...(look && { look }),
      })),
    ),
  });

describe("a sheet saved as CSV", () => {
  it("keeps every digit of numbers, and empty cells empty", () => {
    expect(
      csv([
        [0.1 + 0.2, undefined, -5],
        [1e-9, true, { error: "#N/A" }],
      ]),
    ).toBe("0.30000000000000004,,-5\r\n1e-9,TRUE,#N/A\r\n");
  });

  it("writes dates and times as ISO", () => {
    expect(
      csv([[46083.25, 46083, 0.25, 46083 + (6 * 3600 + 0.5) / 86_400]], { pattern: "yyyy-mm-dd hh:mm:ss" }),
    ).toBe("2026-03-02 06:00:00,2026-03-02,06:00:00,2026-03-02 06:00:00.500\r\n");
    expect(csv([[2]], { pattern: '0.0 "days"' })).toBe("2\r\n");
  });

  it("quotes what would break a line or a column", () => {
    expect(csv([['a "b", c', "d\ne", "f;g", " h"]])).toBe('"a ""b"", c","d\ne","f;g"," h"\r\n');
  });

  it.each(["=1+1", "+1", "-1", "@SUM(A1)", "\t=1", "\r=1", "\n=1", "＝1"])(
    "puts an apostrophe before the text %j",
    (text) => {
      expect(withoutFormula(text)).toBe(`'${text}`);
    },
  );

  it("leaves other texts as they are, and signs inside them", () => {
    for (const text of ["a=b", "CH1 mV", "'=1", "–5", "°C"]) expect(withoutFormula(text)).toBe(text);
  });
});
