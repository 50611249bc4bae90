/** What may stand in a cell: plain values, errors, data types, and what no spreadsheet should hand over. */
import { describe, expect, it } from "vitest";
import { EMF, ENSCORE, TYPEINFO } from "../../src/functions";
import { columnOf, errorCell, one, readable } from "./call";

/** What is made of one cell: the EMF of type K at 0 °C is 0 by definition. */
const read = (cell: unknown): unknown => readable(EMF(one(cell), one("K")))[0]?.[0];
const notACell = "#VALUE! input is not a cell value";

describe("an error", () => {
  it.each(["#VALUE!", "#N/A", "#DIV/0!", "#NUM!", "#NULL!"])("%s goes out as it came in", (code) => {
    const original = errorCell(code, "what another function said");
    expect(EMF(one(original), one("K"))[0]?.[0]).toBe(original);
    // As plain data, which some hosts hand over, it becomes an error of the same code.
    const made = EMF(one({ code, message: "lost" }), one("K"))[0]?.[0];
    expect(made).toBeInstanceOf(CustomFunctions.Error);
    expect(made).toMatchObject({ code });
    expect(read({ type: "Error", basicType: "Error", basicValue: code })).toBe(code);
  });

  it.each(["#REF!", "#NAME?", "#SPILL!", "#CALC!", "#FIELD!"])(
    "%s cannot be returned and is named",
    (code) => {
      expect(read(errorCell(code, "lost"))).toBe(`#VALUE! input is ${code}`);
      expect(read({ type: "Error", basicType: "Error", basicValue: code })).toBe(`#VALUE! input is ${code}`);
    },
  );

  it("comes before a blank beside it and before a cell of the wrong kind", () => {
    const cells = ENSCORE(columnOf("", "x", 1), one(errorCell("#NUM!")), one(0), one(1));
    expect(readable(cells)).toEqual(columnOf("#NUM!", "#NUM!", "#NUM!"));
  });
});

describe("a data type", () => {
  it("stands for its basic value", () => {
    expect(read({ type: "FormattedNumber", basicType: "Double", basicValue: 0, numberFormat: "0.0" })).toBe(
      0,
    );
    expect(read({ type: "String", basicType: "String", basicValue: "x" })).toBe(
      '#VALUE! temperature: "x" is text, not a number',
    );
    expect(read({ type: "Boolean", basicType: "Boolean", basicValue: false })).toBe(
      "#VALUE! temperature: FALSE, not a number",
    );
    expect(read({ type: "Empty", basicType: "Empty", basicValue: "" })).toBe("");
    expect(TYPEINFO(one({ type: "String", basicType: "String", basicValue: "K" }), one("low"))).toEqual(
      one(-270),
    );
  });

  it("in another is no cell value", () => {
    expect(read({ basicType: "Double", basicValue: { basicValue: 0 } })).toBe(notACell);
    expect(read({ basicType: "Double", basicValue: [0] })).toBe(notACell);
  });
});

describe("what no cell holds", () => {
  it.each([
    ["a function", () => 1],
    ["a symbol", Symbol("cell")],
    ["a bigint", 10n],
  ])("%s is refused", (_, cell) => {
    expect(read(cell)).toBe(notACell);
    expect(readable(TYPEINFO(one(cell)))).toEqual(one(notACell));
  });
});

describe("a blank", () => {
  it.each([
    ["an empty text", ""],
    ["null", null],
    ["undefined", undefined],
  ])("%s gives a blank", (_, cell) => {
    expect(EMF(columnOf(0, cell, 0), one("K"))).toEqual(columnOf(0, "", 0));
    expect(EMF(columnOf(0, cell, 0), columnOf("K", "K", "K"))).toEqual(columnOf(0, "", 0));
    expect(readable(EMF(columnOf(0, 0), columnOf("K", cell)))).toEqual(columnOf(0, "#N/A type missing"));
  });
});
