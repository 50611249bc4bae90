import { describe, expect, it } from "vitest";
import { readDateTime } from "../../../src/local-sheet/csv/date-time";
import { decode } from "../../../src/local-sheet/csv/decode";
import { readNumber } from "../../../src/local-sheet/csv/number";
import { readLog } from "../../../src/local-sheet/csv/read-log";
import { suggest } from "../../../src/local-sheet/csv/suggest";
import { sheetName, toSheet } from "../../../src/local-sheet/csv/to-sheet";

describe("a field", () => {
  it.each([
    ["4,096", ",", 4.096],
    ["-0,5", ",", -0.5],
    ["−3.2", ".", -3.2],
    [" 12.5 ", ".", 12.5],
    ["1e-3", ".", 0.001],
    [".5", ".", 0.5],
    ["4,096", ".", undefined],
    ["1.234,5", ",", undefined],
    ["1 234", ".", undefined],
    ["99.999 mV", ".", undefined],
    ["1e999", ".", undefined],
    ["NaN", ".", undefined],
    ["-", ".", undefined],
  ] as const)("%s with the decimal mark %s reads %s", (field, mark, value) => {
    expect(readNumber(field, mark)).toBe(value);
  });

  it.each([
    ["2026-03-02", "ymd", 46083],
    ["2026-03-02 06:00:00", "ymd", 46083.25],
    ["2026-03-02T18:00", "ymd", 46083.75],
    ["02.03.2026 06:00", "dmy", 46083.25],
    ["3/2/2026 06:00", "mdy", 46083.25],
    ["12:00:00", "ymd", 0.5],
    ["1900-03-01", "ymd", 61],
    ["1900-02-28", "ymd", undefined],
    ["2026-02-29", "ymd", undefined],
    ["2026-13-01", "ymd", undefined],
    ["2026-03-02 24:00", "ymd", undefined],
    ["2026-03-02T06:00Z", "ymd", undefined],
    ["2026-03-02 06:00", "none", undefined],
    ["13/01/2026", "mdy", undefined],
  ] as const)("%s in the order %s is the serial %s", (field, order, serial) => {
    expect(readDateTime(field, order)).toBe(serial);
  });
});

describe("a log", () => {
  const format = { delimiter: ";", decimal: ",", dates: "dmy", hasHeader: true } as const;
  const text = [
    "\uFEFF# invented",
    "Zeit;CH1 mV;CH2 mV;Klemme °C;note",
    "02.03.2026 06:00;4,096;;24,5;a",
    "02.03.2026 06:01;fault;8,1380;24,5;",
    "",
  ].join("\r\n");

  it("keeps blanks blank, text as text, the remarks and the header", () => {
    const log = readLog(text, format);
    expect(log.notes).toEqual(["invented"]);
    expect(log.header).toEqual(["Zeit", "CH1 mV", "CH2 mV", "Klemme °C", "note"]);
    expect(log.rows).toEqual([
      [46083.25, 4.096, null, 24.5, "a"],
      [expect.closeTo(46083.250694, 6), "fault", 8.138, 24.5, null],
    ]);
    expect(log.kinds[0]).toBe("date-time");
    expect(log.kinds[4]).toBe("text");
    expect(log.decimals).toEqual([0, 3, 4, 1, 0]);
    expect(log.leftAsText).toBe(1);
  });

  it("becomes a sheet with its number formats and a blank-safe formula beside it", () => {
    const log = readLog(text, format);
    const sheet = toSheet("run.csv", log);
    expect(sheet).toMatchObject({
      name: "run",
      frozenRows: 2,
      readings: { row: 2, column: 0, rows: log.rows },
    });
    expect(sheet.columns[1]?.format).toBe("3 decimals");
    expect(sheet.cells.map(({ value, role }) => [value, role]).slice(0, 3)).toEqual([
      ["invented", "note"],
      ["Zeit", "header"],
      ["CH1 mV", "header"],
    ]);
    const suggestion = suggest(log, 3);
    expect(suggestion?.cell).toBe("G3");
    expect(suggestion?.formula("N")).toBe(
      '=BEAD.TEMPERATURE(IF(ISBLANK(B3:C4),"",B3:C4),"N",IF(ISBLANK(D3:D4),"",D3:D4))',
    );
  });

  it("suggests nothing where the header names no mV or no terminal temperature", () => {
    expect(suggest(readLog("a;b\n1;2", format), 2)).toBeUndefined();
    expect(suggest(readLog("a;CH1 mV\n1;2", format), 2)).toBeUndefined();
  });

  it("says what is wrong with a quote that is never closed", () => {
    expect(readLog('a;b\n1;"2\n3;4', format).faults.join()).toMatch(/quot/);
  });

  it("is decoded from UTF-8, UTF-16 and the Western code page", () => {
    expect(decode(new TextEncoder().encode("°C"))).toEqual({ text: "°C", characters: "UTF-8" });
    expect(decode(Uint8Array.of(0xff, 0xfe, 0xb0, 0, 0x43, 0))).toEqual({ text: "°C", characters: "UTF-16" });
    expect(decode(Uint8Array.of(0xb0, 0x43))).toEqual({ text: "°C", characters: "Windows-1252" });
  });

  it("gives a sheet a name that a tab can carry", () => {
    expect(sheetName("run [3]: a/b?.csv")).toBe("run  3   a b");
    expect(sheetName("x".repeat(50))).toHaveLength(31);
    expect(sheetName(".csv")).toBe("Log");
  });
});
