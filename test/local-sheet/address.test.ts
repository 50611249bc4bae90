import { expect, it } from "vitest";
import { addressOn, columnName, parseAddress, parseCell } from "../../src/local-sheet/address";

it("reads and writes addresses with quoted sheet names", () => {
  expect(parseCell("$AA$12")).toEqual({ row: 11, column: 26 });
  expect([0, 25, 26, 701, 702].map(columnName)).toEqual(["A", "Z", "AA", "ZZ", "AAA"]);
  expect(parseAddress(addressOn("Tom's log", "A1:B2"))).toEqual({ sheet: "Tom's log", range: "A1:B2" });
  expect(parseAddress("A1")).toEqual({ sheet: undefined, range: "A1" });
  expect(() => parseCell("A0")).toThrow(/A0/);
});
