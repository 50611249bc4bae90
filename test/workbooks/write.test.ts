import { DOMParser } from "@xmldom/xmldom";
import ExcelJS from "exceljs";
import { strFromU8, unzipSync } from "fflate";
import { describe, expect, it } from "vitest";
import { type StoredCell, type StoredWorkbook, writeWorkbook } from "../../src/workbooks";

const workbook = (cells: StoredCell[], name = "A & B's"): StoredWorkbook => ({
  title: "T < U",
  sheets: [{ name, columns: [{ width: 152 }], frozenRows: 2, cells }],
});

async function read(cells: StoredCell[]): Promise<ExcelJS.Worksheet> {
  const found = new ExcelJS.Workbook();
  await found.xlsx.load(writeWorkbook(workbook(cells)).buffer as ArrayBuffer);
  return found.worksheets[0]!;
}

describe("a workbook file", () => {
  it("keeps numbers, texts, truth values and errors as what they are", async () => {
    const values = [0.1 + 0.2, -1e-12, 1e300, "=1+1", ' <a> & "b"\n', "", true, false, { error: "#N/A" }];
    const sheet = await read(values.map((value, row) => ({ row, column: 0, value })));
    expect(values.map((_, row) => sheet.getCell(row + 1, 1).value ?? "")).toEqual(values);
  });

  it("writes signs that XML cannot hold as all workbook files do", () => {
    const bytes = writeWorkbook(workbook([{ row: 0, column: 0, value: "a\u0001b_x0041_" }]));
    expect(strFromU8(unzipSync(bytes)["xl/sharedStrings.xml"]!)).toContain("<t>a_x0001_b_x005F_x0041_</t>");
  });

  it("freezes its header, sets widths and prints one page wide with the header on each page", async () => {
    const sheet = await read([
      { row: 4, column: 2, value: 1, look: { pattern: "0.00", bold: true, colour: "2f5d73" } },
    ]);
    expect(sheet.name).toBe("A & B's");
    expect(sheet.views[0]).toMatchObject({ state: "frozen", ySplit: 2 });
    expect(sheet.getColumn(1).width).toBe(21);
    expect(sheet.pageSetup).toMatchObject({
      fitToPage: true,
      fitToWidth: 1,
      fitToHeight: 0,
      printArea: "A1:C5",
    });
    expect(sheet.pageSetup.printTitlesRow).toBe("1:2");
    expect(sheet.getCell("C5")).toMatchObject({
      numFmt: "0.00",
      font: { bold: true, color: { argb: "FF2F5D73" } },
    });
  });

  it("marks a formula that could fill several cells as a dynamic array, and no other", () => {
    const parts = unzipSync(
      writeWorkbook(
        workbook([
          { row: 0, column: 0, formula: "=BEAD.EMF(C1:C2)", value: 1, spill: [2, 1] },
          { row: 1, column: 0, value: 2 },
          { row: 2, column: 0, formula: "=C1&1", value: "x" },
          { row: 3, column: 0, formula: "=BEAD.EMF(C1)", value: { error: "#N/A" } },
        ]),
      ),
    );
    const sheet = strFromU8(parts["xl/worksheets/sheet1.xml"]!);
    expect(sheet).toContain(
      '<c r="A1" cm="1"><f t="array" ref="A1:A2">_xldudf_BEAD_EMF(C1:C2)</f><v>1</v></c>',
    );
    expect(sheet).toContain('<c r="A2"><v>2</v></c>');
    expect(sheet).toContain('<c r="A3" t="str"><f>C1&amp;1</f><v>x</v></c>');
    expect(sheet).toContain(
      '<c r="A4" t="e" cm="1"><f t="array" ref="A4">_xldudf_BEAD_EMF(C1)</f><v>#N/A</v></c>',
    );
    const metadata = strFromU8(parts["xl/metadata.xml"]!);
    expect(metadata).toMatch(/<metadataType name="XLDAPR"[^>]* cellMeta="1"\/>/);
    expect(metadata).toMatch(/fDynamic="1"/);
  });

  it("has each part well formed, with a kind, and each relation leading to a part", () => {
    const parts = unzipSync(writeWorkbook(workbook([{ row: 0, column: 0, value: "a" }])));
    const parse = (name: string) =>
      new DOMParser({
        onError: (_, message) => {
          throw new Error(`${name}: ${message}`);
        },
      }).parseFromString(strFromU8(parts[name]!), "text/xml");
    const kinds = Array.from(parse("[Content_Types].xml").getElementsByTagName("Override"), (each) =>
      each.getAttribute("PartName")!.slice(1),
    );
    for (const name of Object.keys(parts)) {
      parse(name);
      if (!name.endsWith(".rels") && name !== "[Content_Types].xml") expect(kinds).toContain(name);
    }
    for (const kind of kinds) expect(Object.keys(parts)).toContain(kind);
    for (const [rels, folder] of [
      ["_rels/.rels", ""],
      ["xl/_rels/workbook.xml.rels", "xl/"],
    ] as const) {
      for (const relation of Array.from(parse(rels).getElementsByTagName("Relationship"))) {
        expect(Object.keys(parts)).toContain(folder + (relation.getAttribute("Target") ?? ""));
      }
    }
  });

  it("is the same to the byte for the same content", () => {
    const cells = [{ row: 0, column: 0, value: "a" }];
    expect(writeWorkbook(workbook(cells))).toEqual(writeWorkbook(workbook(cells)));
  });

  it.each(["", "a".repeat(32), "a/b", "'a"])("refuses the sheet name “%s”", (name) => {
    expect(() => writeWorkbook(workbook([], name))).toThrow("is no name for a sheet");
  });
});
