import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { sampleFiles, sampleWorkbooks } from "../../src/build/samples";
import catalogue from "../../src/catalogue/catalogue.json";
import { cellName, numberFormats } from "../../src/sheets";

const files = sampleFiles();
const workbooks = Object.entries(sampleWorkbooks());
const sheets = workbooks.flatMap(([file, { sheets }]) =>
  sheets.map((sheet) => ({ at: `${file} ${sheet.name}`, ...sheet })),
);

describe("the samples", () => {
  it("come out the same every time, and are the committed ones, no more and no less", () => {
    expect(sampleFiles()).toEqual(files);
    const committed = readdirSync("samples").filter((file) => /\.(csv|json)$/.test(file));
    expect(committed.sort()).toEqual(Object.keys(files).sort());
    for (const [file, text] of Object.entries(files)) {
      expect(readFileSync(`samples/${file}`, "utf8").replaceAll("\r\n", "\n"), file).toBe(text);
    }
  });

  it("say in the list, in each log and on each sheet that they are invented", () => {
    for (const { invented } of JSON.parse(files["index.json"] ?? "")) expect(invented).toBe(true);
    for (const [file, text] of Object.entries(files)) {
      if (file.endsWith(".csv")) expect(text, file).toMatch(/^# INVENTED DATA/);
    }
    for (const { at, cells } of sheets) {
      const notes = cells.filter(({ role }) => role === "note").map(({ value }) => value);
      expect(notes.join(" "), at).toMatch(/INVENTED/);
    }
  });

  it("are read back from their files as they were planned", () => {
    for (const [file, plan] of workbooks) expect(JSON.parse(files[file] ?? "")).toEqual(plan);
  });

  it("call only functions that there are", () => {
    const known = new Set(catalogue.functions.map(({ id }) => id));
    for (const { at, cells } of sheets) {
      for (const { formula } of cells) {
        for (const [, id] of (formula ?? "").matchAll(/BEAD\.([A-Z0-9]+)\(/g))
          expect(known, at).toContain(id);
      }
    }
  });

  it("plan no cell twice and put nothing where a formula spills", () => {
    for (const { at, cells } of sheets) {
      const own = new Set<string>();
      for (const { row, column } of cells) {
        const cell = cellName(row, column);
        expect(own, `${at} ${cell}`).not.toContain(cell);
        own.add(cell);
      }
      const filled = new Set(
        cells
          .filter(({ value, formula }) => value !== undefined || formula !== undefined)
          .map(({ row, column }) => cellName(row, column)),
      );
      for (const { row, column, spill: [down, across] = [1, 1] } of cells) {
        for (let r = row; r < row + down; r++) {
          for (let c = column; c < column + across; c++) {
            if (r !== row || c !== column) expect(filled, at).not.toContain(cellName(r, c));
          }
        }
      }
    }
  });

  it("give every column that they use a width, and every cell a known format", () => {
    for (const { at, cells, columns, log } of sheets) {
      for (const { row, column, role, format, spill: [, across] = [1, 1] } of cells) {
        if (format !== undefined) expect(Object.keys(numberFormats)).toContain(format);
        // A remark runs on over empty cells; everything else stays in its columns.
        if (role !== "note")
          expect(columns.length, `${at} ${cellName(row, column)}`).toBeGreaterThan(column + across - 1);
      }
      if (log) expect(columns.length, at).toBeGreaterThan(log.column + (log.take?.length ?? 1) - 1);
    }
  });

  it("say in each workbook why a range is wrapped in ISBLANK", () => {
    for (const [file, { sheets }] of workbooks) {
      const cells = sheets.flatMap((sheet) => sheet.cells);
      expect(
        cells.some(({ formula }) => formula?.includes("ISBLANK(")),
        file,
      ).toBe(true);
      expect(
        cells.some(({ role, value }) => role === "note" && String(value).includes("ISBLANK")),
        file,
      ).toBe(true);
    }
  });
});
