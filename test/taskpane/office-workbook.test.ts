import { beforeEach, describe, expect, it } from "vitest";
import type { Catalogue } from "../../src/catalogue/catalogue";
import catalogueFile from "../../src/catalogue/catalogue.json";
import { JOBS } from "../../src/sheets/jobs";
import { freeze } from "../../src/taskpane/freeze/freeze";
import { workbookOfExcel } from "../../src/taskpane/workbook/excel";
import { OfficeWorkbook } from "../../src/taskpane/workbook/office-workbook";
import { Trouble } from "../../src/taskpane/workbook/trouble";
import { History, writeWithWayBack } from "../../src/taskpane/workbook/undo";
import { FakeExcel } from "./fake-excel";

const catalogue = catalogueFile as unknown as Catalogue;

let excel: FakeExcel;
let workbook: OfficeWorkbook;
beforeEach(() => {
  excel = new FakeExcel();
  excel.install();
  workbook = new OfficeWorkbook();
});

/** H8:H10 is filled from H8, by the readings in B8:B10. */
function withResults(): void {
  const sheet = excel.sheet();
  [4.096, 8.138, 12.209].forEach((emf, index) => {
    sheet.put(`B${8 + index}`, emf);
  });
  sheet.put("H8", '=BEAD.TEMPERATURE(B8:B10,"K",0)', 100).put("H9", "", 200).put("H10", "", 300);
  sheet.spills.set("H8", "H8:H10");
}

describe("Excel as a workbook", () => {
  it("is found in Excel only", async () => {
    expect(await workbookOfExcel()).toBeInstanceOf(OfficeWorkbook);
    Object.assign(Office, { onReady: async () => ({ host: null, platform: null }) });
    expect(await workbookOfExcel()).toBeUndefined();
    Object.assign(Office, { onReady: async () => Promise.reject(new Error("no")) });
    expect(await workbookOfExcel()).toBeUndefined();
    Object.assign(globalThis, { Office: undefined });
    expect(await workbookOfExcel()).toBeUndefined();
  });

  it("names the selection with its sheet, quoted", async () => {
    excel.selection = "Sheet1!B8:B10";
    expect(await workbook.getSelection()).toBe("'Sheet1'!B8:B10");
  });

  it("finds the formula behind a spilled cell, and what it fills", async () => {
    withResults();
    expect(await workbook.getFormula("Sheet1!H10")).toEqual({
      anchor: "'Sheet1'!H8",
      range: "'Sheet1'!H8:H10",
      formula: '=BEAD.TEMPERATURE(B8:B10,"K",0)',
    });
    expect(await workbook.getFormula("Sheet1!B8")).toBeUndefined();
  });

  it("takes a formula for its own cell where results do not spill", async () => {
    withResults();
    excel.version = 1.11;
    expect((await workbook.getFormula("Sheet1!H8"))?.range).toBe("'Sheet1'!H8");
    expect((await workbook.getTraits()).spills).toBe(false);
  });

  it("tells what is in the way", async () => {
    withResults();
    const sheet = excel.sheet();
    sheet.tables.push("B7:C10");
    sheet.merged.push("D1:E2");
    expect(await workbook.inspect("Sheet1!B8:C9")).toEqual({
      occupied: ["B8", "B9"],
      occupiedCount: 2,
      inTable: true,
      merged: false,
      protected: false,
    });
    expect((await workbook.inspect("Sheet1!D2")).merged).toBe(true);
    sheet.isProtected = true;
    expect((await workbook.inspect("Sheet1!M8")).protected).toBe(true);
  });

  it("knows the separators that go with a decimal comma", async () => {
    excel.decimal = ",";
    expect(await workbook.getTraits()).toEqual({ decimal: ",", list: ";", spills: true, name: "Excel" });
  });

  it("has the functions load with a document that it wrote into", async () => {
    await workbook.write([{ range: "Sheet1!A1", inputs: [["=1"]] }]);
    expect(excel.startup).toBe("Load");
  });

  it.each([
    ["InvalidOperationInCellEditMode", "A cell is being edited"],
    ["AccessDenied", "The sheet is protected"],
    ["SomethingNew", "Excel could not do this now"],
  ])("puts %s into a sentence", async (code, sentence) => {
    excel.refusal = code;
    const failure = await workbook.write([{ range: "Sheet1!A1", inputs: [[1]] }]).catch((each) => each);
    expect(failure).toBeInstanceOf(Trouble);
    expect(failure.message).toContain(sentence);
    expect(failure.message).not.toContain("stack");
  });
});

describe("writing through Excel", () => {
  it("takes back what it wrote, results that spill left out", async () => {
    withResults();
    const history = new History();
    const inputs = [["=1"], [""], [""]];
    await writeWithWayBack(workbook, history, "Inserted", [
      { range: "Sheet1!H8:H10", inputs, formats: "0.0" },
    ]);
    expect(excel.sheet().cells.get("H8")).toMatchObject({ formula: "=1", format: "0.0" });
    await history.takeBack();
    expect(excel.sheet().cells.get("H8")).toMatchObject({
      formula: '=BEAD.TEMPERATURE(B8:B10,"K",0)',
      format: "General",
    });
    expect(excel.sheet().cells.get("H9")?.formula).toBe("");
  });

  it("keeps a step that cannot be taken back now", async () => {
    const history = new History();
    await writeWithWayBack(workbook, history, "Inserted", [{ range: "Sheet1!A1", inputs: [[1]] }]);
    excel.refusal = "AccessDenied";
    await expect(history.takeBack()).rejects.toThrow("protected");
    expect(history.last?.sentence).toBe("Inserted");
  });

  it("freezes values and trace in one go, the trace as text", async () => {
    withResults();
    const history = new History();
    const formula = (await workbook.getFormula("Sheet1!H9"))!;
    const before = excel.syncs;
    expect(await freeze(workbook, history, catalogue, formula, "beside")).toMatch(/^in J8:K/);
    const { cells } = excel.sheet();
    expect(["H8", "H9", "H10"].map((cell) => cells.get(cell)?.formula)).toEqual([100, 200, 300]);
    expect(cells.get("K10")).toMatchObject({ value: '=BEAD.TEMPERATURE(B8:B10,"K",0)', format: "@" });
    expect(excel.syncs).toBeGreaterThan(before);
    await history.takeBack();
    expect(cells.get("H8")?.formula).toBe('=BEAD.TEMPERATURE(B8:B10,"K",0)');
    expect(cells.get("K10")?.value).toBe("");
  });

  it("leaves no trace of something that could not be frozen", async () => {
    withResults();
    const formula = (await workbook.getFormula("Sheet1!H9"))!;
    const write = workbook.write.bind(workbook);
    workbook.write = () => Promise.reject(new Trouble("The sheet is protected."));
    await expect(freeze(workbook, new History(), catalogue, formula, "sheet")).rejects.toThrow("protected");
    workbook.write = write;
    expect([...excel.sheets.keys()]).toEqual(["Sheet1"]);
  });

  it.each(JOBS.map((job) => [job.name, job] as const))("writes the job sheet %s", async (_, job) => {
    const { log: _none, ...sheet } = job.sheet;
    expect(await workbook.addSheet(sheet)).toBe(job.sheet.name);
    expect(await workbook.addSheet(sheet)).toBe(`${job.sheet.name} (2)`);
    const { cells } = excel.sheet(job.sheet.name);
    for (const { row, column, formula } of job.sheet.cells) {
      if (formula === undefined) continue;
      const cell = `${String.fromCharCode(65 + column)}${row + 1}`;
      expect(cells.get(cell)?.formula).toBe(formula);
    }
    expect(String(cells.get("A2")?.value)).toContain("EXAMPLE");
  });
});
