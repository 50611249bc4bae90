import { readdirSync, readFileSync } from "node:fs";
import ExcelJS from "exceljs";
import { strToU8, zipSync } from "fflate";
import { describe, expect, it } from "vitest";
import { type StoredWorkbook, writeWorkbook } from "../../src/workbooks";
import { read } from "./hand-made";

/** A workbook of one sheet as another program might write it. */
const foreign = (rows: string, more = "") =>
  zipSync({
    "xl/workbook.xml": strToU8(
      `<x:workbook xmlns:x="m" xmlns:r="r"><x:sheets><x:sheet name="S" r:id="a"/></x:sheets></x:workbook>`,
    ),
    "xl/_rels/workbook.xml.rels": strToU8(
      `<Relationships><Relationship Id="a" Type="t/worksheet" Target="/xl/s.xml"/></Relationships>`,
    ),
    "xl/s.xml": strToU8(`<x:worksheet xmlns:x="m"><x:sheetData>${rows}</x:sheetData>${more}</x:worksheet>`),
  });

describe("reading a workbook file", () => {
  it("gives back what the writer stored", () => {
    const workbook: StoredWorkbook = {
      title: "t",
      sheets: [
        {
          name: "A",
          columns: [{ width: 152, look: { pattern: "yyyy-mm-dd" } }, {}, { width: 80 }],
          frozenRows: 3,
          heights: [{ row: 1, height: 48 }],
          cells: [
            {
              row: 0,
              column: 0,
              value: " a\u0001_x0041_<\n",
              look: { bold: true, size: 14, colour: "24262b" },
            },
            { row: 1, column: 1, value: 0.1, look: { align: "right", pattern: "0.000" } },
            { row: 1, column: 2, value: true },
            {
              row: 2,
              column: 1,
              formula: '=B1&"<"',
              value: "x<",
              look: { indented: true, align: "left", wrapped: true },
            },
            { row: 3, column: 1, formula: "=BEAD.EMF(A1:A2)", value: { error: "#N/A" }, spill: [2, 1] },
            { row: 4, column: 1, look: { pattern: "0.00" } },
          ],
        },
        { name: "It's B", columns: [], frozenRows: 0, cells: [] },
      ],
    };
    expect(read(writeWorkbook(workbook))).toEqual({ sheets: workbook.sheets, leftOut: [] });
  });

  it("leaves out the values of cells that an array fills, so that it can spill again", () => {
    const bytes = writeWorkbook({
      title: "",
      sheets: [
        {
          name: "A",
          columns: [],
          frozenRows: 0,
          cells: [
            { row: 0, column: 0, formula: "=BEAD.EMF(C1:C2)", value: 1, spill: [2, 1] },
            { row: 1, column: 0, value: 2 },
            { row: 2, column: 0, value: 3 },
          ],
        },
      ],
    });
    expect(read(bytes).sheets[0]?.cells.map(({ value }) => value)).toEqual([1, 3]);
  });

  it.each(readdirSync("samples").filter((file) => file.endsWith(".xlsx")))(
    "finds in %s the cells that the general reader finds",
    async (file) => {
      const general = new ExcelJS.Workbook();
      await general.xlsx.readFile(`samples/${file}`);
      const { sheets, leftOut } = read(readFileSync(`samples/${file}`));
      expect(leftOut).toEqual([]);
      expect(sheets.map(({ name }) => name)).toEqual(general.worksheets.map(({ name }) => name));
      for (const { name, cells } of sheets) {
        const sheet = general.getWorksheet(name)!;
        for (const { row, column, formula, value } of cells) {
          const found = sheet.getCell(row + 1, column + 1);
          if (formula !== undefined) {
            expect(formula.replaceAll("BEAD.", "_xldudf_BEAD_")).toBe(`=${found.formula}`);
          } else if (typeof value === "string") expect(found.value ?? "").toBe(value);
        }
      }
    },
  );

  it("understands prefixed elements, cells without addresses, shared formulas and texts with runs", () => {
    const bytes = foreign(
      `<x:row><x:c><x:v>1.5</x:v></x:c><x:c t="inlineStr"><x:is><x:r><x:t>a</x:t></x:r><x:r><x:t>b</x:t></x:r><x:rPh><x:t>no</x:t></x:rPh></x:is></x:c></x:row>
       <x:row r="5"><x:c r="B5"><x:f t="shared" si="0" ref="B5:B7">A5*$A$1</x:f><x:v>3</x:v></x:c></x:row>
       <x:row r="7"><x:c r="B7"><x:f t="shared" si="0"/><x:v>4</x:v></x:c><x:c r="C7" t="d"><x:v>2026-03-02T06:00:00</x:v></x:c></x:row>`,
      "<x:mergeCells/>",
    );
    expect(read(bytes)).toEqual({
      sheets: [
        {
          name: "S",
          columns: [],
          frozenRows: 0,
          cells: [
            { row: 0, column: 0, value: 1.5 },
            { row: 0, column: 1, value: "ab" },
            { row: 4, column: 1, formula: "=A5*$A$1", value: 3 },
            { row: 6, column: 1, formula: "=A7*$A$1", value: 4 },
            { row: 6, column: 2, value: 46083.25 },
          ],
        },
      ],
      leftOut: ["merged cells"],
    });
  });

  it.each([
    ["a text", strToU8("time,mV"), "no workbook of the kind .xlsx"],
    ["an old workbook", Uint8Array.of(0xd0, 0xcf, 0x11, 0xe0), "old workbook (.xls), or one with a password"],
    [
      "half a file",
      writeWorkbook({ title: "", sheets: [{ name: "A", columns: [], frozenRows: 0, cells: [] }] }).slice(
        0,
        900,
      ),
      "damaged",
    ],
    ["another archive", zipSync({ "a.txt": strToU8("a") }), "no workbook of the kind .xlsx"],
  ])("refuses %s with a reason", (_, bytes, reason) => {
    expect(() => read(bytes)).toThrow(reason);
  });
});
