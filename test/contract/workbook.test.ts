/**
 * The workbook that each version left behind, as it would lie on somebody's disk: read by our reader, calculated anew
 * by the functions of today; and read by a reader that knows nothing of ours, against the record of its version.
 */
import { readFileSync } from "node:fs";
import ExcelJS from "exceljs";
import { describe, expect, it } from "vitest";
import { loadBuiltFunctions } from "../../src/build/built-functions";
import { frozenRecords } from "../../src/build/contract/frozen";
import { keyOf, type Result, type ResultCell, resultOf, sameResult } from "../../src/build/contract/record";
import { contractWorkbook } from "../../src/build/contract/workbook";
import type { Catalogue } from "../../src/catalogue/catalogue";
import catalogueFile from "../../src/catalogue/catalogue.json";
import { parseExample } from "../../src/catalogue/formula";
import { read } from "../workbooks/hand-made";

const catalogue = catalogueFile as unknown as Catalogue;
const built = loadBuiltFunctions(readFileSync("dist/functions.js", "utf8"));
const records = frozenRecords();
const bytesOf = (version: string) => readFileSync(`test/contract/${version}.xlsx`);

/** The formulas of a workbook as our reader gives them, each with the rectangle that it fills. */
const formulasIn = (version: string) =>
  read(bytesOf(version)).sheets.flatMap(({ name, cells }) =>
    cells.flatMap(({ row, column, formula, value, spill = [1, 1] }) =>
      formula === undefined ? [] : [{ sheet: name, row, column, formula, value, spill }],
    ),
  );

async function generalReader(version: string) {
  const book = new ExcelJS.Workbook();
  await book.xlsx.readFile(`test/contract/${version}.xlsx`);
  return ({ sheet, row, column, spill: [down, across] }: ReturnType<typeof formulasIn>[number]) => {
    const cells = book.getWorksheet(sheet)!;
    const values: Result = Array.from({ length: down }, (_, r) =>
      Array.from({ length: across }, (_, c): ResultCell => {
        const cell = cells.getCell(row + r + 1, column + c + 1);
        // Not `cell.result`, which drops a 0; an empty text comes as nothing.
        const value = r + c > 0 ? cell.value : (cell.model as { result?: unknown }).result;
        return (value ?? "") as ResultCell;
      }),
    );
    return { formula: cells.getCell(row + 1, column + 1).formula, values };
  };
}

/** The call of a formula, with an argument for each parameter that its version had. */
function callOf(formula: string, { functions }: (typeof records)[number]) {
  const { id, given } = parseExample(formula);
  const parameters = functions.find((one) => one.id === id)!.parameters;
  return { id, given: parameters.map((_, i) => given[i] ?? null) };
}

describe.each(records)("the workbook of version $version", (record) => {
  const { version, functions, calls } = record;
  const formulas = formulasIn(version);
  const later = records.slice(records.indexOf(record) + 1);
  const overruled = new Set(later.flatMap(({ changed }) => changed.map(keyOf)));

  it("is read without anything left out, and calls every function of its version", () => {
    expect(read(bytesOf(version)).leftOut).toEqual([]);
    const called = new Set(formulas.map(({ formula }) => parseExample(formula).id));
    expect([...called].sort()).toEqual(functions.map(({ id }) => id).sort());
  });

  it("stores each formula as Excel does, with the values of its version's record", async () => {
    const general = await generalReader(version);
    const frozen = new Map(calls.map((call) => [keyOf(call), call.result]));
    for (const found of formulas) {
      const { formula, values } = general(found);
      expect(`=${formula}`.replace("_xldudf_BEAD_", "BEAD.")).toBe(found.formula);
      expect(formula).toMatch(/^_xldudf_BEAD_[A-Z0-9]+\(/);
      expect(values).toEqual(frozen.get(keyOf(callOf(found.formula, record))));
    }
  });

  it("still calculates the values that it stores", async () => {
    const general = await generalReader(version);
    for (const found of formulas) {
      const call = callOf(found.formula, record);
      if (overruled.has(keyOf(call))) continue;
      const now = resultOf(built, call);
      const { values } = general(found);
      if (!sameResult(values, now, [version, catalogue.version]))
        expect({ ...call, now }).toEqual({ ...call, now: values });
    }
  });
});

it("there is a workbook for the version at hand: else run npm run contract", () => {
  expect(records.map(({ version }) => version)).toContain(catalogue.version);
  const examples = catalogue.functions.flatMap((one) => one.examples.map(({ formula }) => formula));
  expect(
    formulasIn(catalogue.version)
      .map(({ formula }) => formula)
      .sort(),
  ).toEqual(examples.sort());
});

it("the same version gives the same workbook to the byte", () => {
  expect(contractWorkbook(catalogue, built)).toEqual(contractWorkbook(catalogue, built));
});
