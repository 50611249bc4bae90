/** Long columns go through in blocks of 2048 rows: nothing is lost, doubled or moved where one block ends. */
import { describe, expect, it } from "vitest";
import { EMFTABLE, TEMPERATURE } from "../../src/functions";
import { one, readable } from "./call";

describe("a column of", () => {
  it.each([1, 2047, 2048, 2049, 4096, 4097])("%d rows gives each reading what it has alone", (rows) => {
    const readings = Array.from({ length: rows }, (_, i) => [i === 2047 ? "open" : (i % 500) / 10]);
    const references = readings.map((_, i) => [20 + (i % 7)]);
    const result = readable(TEMPERATURE(readings, one("K"), references, one("F")));
    expect(result.length).toBe(rows);
    for (const row of new Set([0, rows - 1, Math.min(2047, rows - 1), Math.min(2048, rows - 1)])) {
      const alone = TEMPERATURE(
        [readings[row] as unknown[]],
        one("K"),
        [references[row] as unknown[]],
        one("F"),
      );
      expect(result[row]).toEqual(readable(alone)[0]);
    }
  });
});

describe("a table of as many rows as a worksheet has", () => {
  it("is given, and one row more is refused with their number", () => {
    const table = (end: number) => EMFTABLE(one("K"), one(0), one(end), one(0.001), one("temperature"));
    expect(table(1048.574).length).toBe(1_048_575);
    expect(readable(table(1048.575))).toEqual([["#N/A table of 1048576 rows is longer than a worksheet"]]);
  });
});
