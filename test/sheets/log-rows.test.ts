import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { decode } from "../../src/local-sheet/csv/decode";
import { readLog } from "../../src/local-sheet/csv/read-log";
import { sniff } from "../../src/local-sheet/csv/sniff";
import { filled, logRows, type SheetPlan } from "../../src/sheets";

const text = "# invented\ntime,CH1 mV,CH2 mV\n2026-03-02 06:00:00,1.5,\n2026-03-02 06:00:30,-2,fault\n";
const extract = { file: "x.csv", first: 1, rows: 2, row: 7, column: 0 };

describe("the rows of a log file", () => {
  it("are numbers, date-time serials, texts and truly empty cells", () => {
    expect(logRows(text, extract)).toEqual([
      [46083.25, 1.5, null],
      [46083.25 + 30 / 86_400, -2, "fault"],
    ]);
  });

  it("are taken from the named row on, with the named columns, or refused where there are too few", () => {
    expect(logRows(text, { ...extract, first: 2, rows: 1, take: [2, 1] })).toEqual([["fault", -2]]);
    expect(() => logRows(text, { ...extract, first: 2 })).toThrow("x.csv has 2 rows, not 3");
  });

  it("are read as the page reads a log that somebody opens", () => {
    const bytes = readFileSync("samples/furnace-log.csv");
    const opened = decode(bytes).text;
    const { rows } = readLog(opened, sniff(opened));
    expect(logRows(bytes.toString("utf8"), { ...extract, rows: 2000 })).toEqual(rows);
  });

  it("stand in a filled sheet where the plan puts them", async () => {
    const plan: SheetPlan = {
      name: "Log",
      columns: [],
      frozenRows: 7,
      printOnePageWide: true,
      cells: [],
      log: extract,
    };
    const sheet = await filled(plan, async () => text);
    expect(sheet.readings).toMatchObject({ row: 7, column: 0 });
    expect(sheet.readings?.rows).toHaveLength(2);
    expect(sheet).not.toHaveProperty("log");
  });
});
