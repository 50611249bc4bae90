/**
 * The sample workbooks as they lie in samples/, read by a general reader that knows nothing of ours, against their
 * plans and against the built functions.
 */
import { readdirSync, readFileSync } from "node:fs";
import ExcelJS from "exceljs";
import { describe, expect, it } from "vitest";
import { loadBuiltFunctions } from "../../src/build/built-functions";
import { workbookFiles } from "../../src/build/workbooks";
import { Calculation } from "../../src/build/workbooks/calculate";
import { WorksheetError, type WorksheetFunction } from "../../src/catalogue/functions-runtime";
import { type FilledSheet, filled, type WorkbookPlan } from "../../src/sheets";

const folder = "samples/";
const text = (file: string) => readFileSync(folder + file, "utf8");
const files = readdirSync(folder).filter((file) => file.endsWith(".xlsx"));
const planOf = (file: string): WorkbookPlan => JSON.parse(text(file.replace(".xlsx", ".json")));
const functions = loadBuiltFunctions(readFileSync("dist/functions.js", "utf8")) as unknown as Map<
  string,
  WorksheetFunction
>;

async function open(file: string) {
  const found = new ExcelJS.Workbook();
  await found.xlsx.readFile(folder + file);
  const plan = planOf(file);
  const sheets: FilledSheet[] = await Promise.all(
    plan.sheets.map((sheet) => filled(sheet, async (log) => text(log))),
  );
  return { found, plan, sheets };
}

/** The reader gives an empty text as no value at all. */
const plain = (value: unknown): unknown => {
  if (value instanceof WorksheetError) return { error: value.code };
  if (value instanceof Date) return value.getTime() / 86_400_000 + 25_569;
  return value ?? "";
};

const sheetOf = (found: ExcelJS.Workbook, name: string) => {
  const sheet = found.getWorksheet(name);
  if (!sheet) throw new Error(`no sheet ${name}`);
  return sheet;
};

it("there is a file for each plan", () => {
  const plans = (JSON.parse(text("index.json")) as { file: string }[]).map(({ file }) =>
    file.replace(".json", ".xlsx"),
  );
  expect(files).toEqual(plans.sort());
});

describe.each(files)("%s", (file) => {
  it("is what its plan gives, to the byte", () => {
    const made = workbookFiles({ [file.replace(".xlsx", ".json")]: planOf(file) }, text)[file]!;
    expect(readFileSync(folder + file).equals(made)).toBe(true);
  });

  it("begins with a sheet that says what it is, that it is invented, and what to look at", async () => {
    const { found, plan } = await open(file);
    expect(found.worksheets.map(({ name }) => name)).toEqual([
      "About this workbook",
      ...plan.sheets.map(({ name }) => name),
    ]);
    const words = found.worksheets[0]!.getSheetValues().flat().join("\n");
    expect(words).toContain(plan.sentence);
    expect(words).toContain("INVENTED");
    for (const { cells } of plan.sheets) {
      for (const { formula, spill } of cells) if (formula && spill) expect(words).toContain(formula);
    }
  });

  it("stores each formula as Excel stores it, with the rectangle that it fills", async () => {
    const { found, sheets } = await open(file);
    let count = 0;
    for (const { name, cells } of sheets) {
      const sheet = sheetOf(found, name);
      for (const { row, column, formula, spill: [down, across] = [1, 1] } of cells) {
        if (formula === undefined) continue;
        const cell = sheet.getCell(row + 1, column + 1);
        const value = cell.value as { formula: string; ref?: string };
        expect(value.formula).toBe(formula.slice(1).replace(/\bBEAD\.([A-Z0-9]+)\(/g, "_xldudf_BEAD_$1("));
        const end = sheet.getCell(row + down, column + across).address;
        if (down * across > 1) expect(value.ref).toBe(`${cell.address}:${end}`);
        count++;
      }
    }
    expect(count).toBeGreaterThan(0);
  });

  it("holds for each formula the values that the built functions give", async () => {
    const { found, sheets } = await open(file);
    const calculation = new Calculation(sheets, functions);
    for (const { name, cells } of sheets) {
      const sheet = sheetOf(found, name);
      for (const { row, column, formula } of cells) {
        if (formula === undefined) continue;
        const expected = calculation.results(name, row, column).map((line) => line.map(plain));
        const stored = expected.map((line, down) =>
          line.map((_, across) => {
            const cell = sheet.getCell(row + 1 + down, column + 1 + across);
            // Not `cell.result`, which drops a 0.
            const result = down + across > 0 ? cell.value : (cell.model as { result?: unknown }).result;
            return plain(result);
          }),
        );
        expect(stored).toEqual(expected);
      }
    }
  });

  it("holds the readings and the words of its plan, and leaves empty what is empty", async () => {
    const { found, sheets } = await open(file);
    for (const { name, cells, readings } of sheets) {
      const sheet = sheetOf(found, name);
      for (const { row, column, value, formula } of cells) {
        if (value !== undefined && formula === undefined) {
          expect(plain(sheet.getCell(row + 1, column + 1).value)).toEqual(
            typeof value === "number" ? expect.closeTo(value, 6) : value,
          );
        }
      }
      readings?.rows.forEach((line, down) => {
        line.forEach((value, across) => {
          const found = sheet.getCell(readings.row + down + 1, readings.column + across + 1).value;
          if (value === null) expect(found).toBeNull();
          else if (typeof value === "number")
            expect(Math.abs((plain(found) as number) - value)).toBeLessThan(1e-7);
          else expect(found).toBe(value);
        });
      });
    }
  });
});
