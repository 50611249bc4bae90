/** Workbook files that mean harm: refused in words, or opened without what would harm. */
import ExcelJS from "exceljs";
import { strFromU8, strToU8, unzipSync, zipSync } from "fflate";
import { describe, expect, it } from "vitest";
import { type StoredCell, writeWorkbook } from "../../src/workbooks";
import { formulas, handMade, partsOf, read, zipped } from "./hand-made";

const cellsOf = (bytes: Uint8Array) => read(bytes).sheets[0]!.cells;

const outside = "links to other files, to programs and to the web (their last values are there)";

describe("an opened workbook that reaches outside", () => {
  it.each([
    ["a cell of another workbook, numbered as files do", "[1]Sheet1!A1"],
    ["a name of another workbook", "[1]!Rates*2"],
    ["another workbook by its place", "'\\\\server\\share\\[Book.xlsx]Sheet 1'!$A$1"],
    ["another workbook inside a call of ours", '_xldudf_BEAD_EMF([2]Log!A1:A9,"K")'],
    ["a program that is started", "cmd|'/C calc'!A0"],
    ["a program by a link of the file", "[1]!'!A0'"],
    ["a program behind an arithmetic sign", "-2+3+cmd|' /C calc'!A0"],
    ["an address on the web", '_xlfn.WEBSERVICE("http://127.0.0.1:9/"&A1)'],
    ["an address in small letters with a space", 'webservice ("http://127.0.0.1:9/")'],
    ["a picture from the web", '_xlfn.IMAGE("http://127.0.0.1:9/x.png")'],
    ["a server of live data", 'RTD("prog.id",,"topic")'],
    ["a library of the machine", 'CALL("kernel32","WinExec","JCJ","calc",0)'],
    ["a library that is registered first", 'REGISTER.ID("kernel32","WinExec")'],
    ["a program of another spreadsheet", 'DDE("soffice","a","b")'],
  ])("keeps the last value in place of %s, and says so", (_, formula) => {
    const opened = read(handMade({ rows: formulas([formula]) }));
    expect(opened.sheets[0]!.cells).toEqual([{ row: 0, column: 0, value: 7 }]);
    expect(opened.leftOut).toEqual([outside]);
    const again = strFromU8(
      unzipSync(writeWorkbook({ title: "", sheets: opened.sheets }))["xl/worksheets/sheet1.xml"]!,
    );
    expect(again).not.toContain("<f");
  });

  it("keeps them out of formulas that are shared, and of arrays", () => {
    const rows = `<row><c r="A1"><f t="shared" si="0" ref="A1:A2">[1]S!B1</f><v>1</v></c><c r="B1"><f t="array" ref="B1:B2">[1]S!A1:A2</f><v>3</v></c></row>
      <row><c r="A2"><f t="shared" si="0"/><v>2</v></c><c r="B2"><v>4</v></c></row>`;
    expect(cellsOf(handMade({ rows }))).toEqual([
      { row: 0, column: 0, value: 1 },
      { row: 0, column: 1, value: 3 },
      { row: 1, column: 0, value: 2 },
      { row: 1, column: 1, value: 4 },
    ]);
  });

  it.each([
    "=SUM(Log!A1:A9)",
    "='A & B: (log)'!A1",
    '="cmd|x"&"[1]S!A1"',
    "=Table1[mV]*2",
    "=Table1[[#This Row],[mV]]-Log!B2",
    "={1,2;3,4}",
    '=HYPERLINK("https://127.0.0.1/","a")',
    "=IMAGES+CALLS",
    "=A1<>Log!A1",
  ])("leaves alone %s, which does not", (formula) => {
    const opened = read(handMade({ rows: formulas([formula.slice(1)]) }));
    expect(opened.leftOut).toEqual([]);
    expect(opened.sheets[0]!.cells[0]!.formula).toBe(formula);
  });

  it("brings no names, links, macros or sheets of macros along, and says so", () => {
    const opened = read(
      handMade({
        more: `<hyperlinks><hyperlink ref="A1"/></hyperlinks>`,
        workbook: `<definedNames><definedName name="Evil">cmd|'/C calc'!A0</definedName></definedNames>`,
        relations: `<Relationship Id="v" Type="t/vbaProject" Target="vbaProject.bin"/>`,
      }),
    );
    expect(opened.leftOut).toEqual(["macros", "links", "names of ranges"]);
    const macro = partsOf({});
    macro["xl/_rels/workbook.xml.rels"] =
      `<Relationships><Relationship Id="a" Type="t/xlMacrosheet" Target="s.xml"/></Relationships>`;
    expect(() => read(zipped(macro))).toThrow("it holds no worksheet");
  });
});

describe("an opened workbook that is too much", () => {
  /** The archive's own list of contents begins each entry with this, and states the size 24 bytes on. */
  const entryMark = [0x50, 0x4b, 0x01, 0x02];

  /** The bytes with another unpacked size stated for the first part. */
  const stating = (bytes: Uint8Array, size: number): Uint8Array => {
    const changed = bytes.slice();
    const at = changed.findIndex((_, i) => entryMark.every((byte, k) => changed[i + k] === byte));
    new DataView(changed.buffer).setUint32(at + 24, size, true);
    return changed;
  };

  it("is refused before it is unpacked, by the sizes that the archive states", () => {
    const bytes = handMade({});
    expect(bytes.length).toBeLessThan(2000);
    expect(() => read(stating(bytes, 400_000_000))).toThrow("it is larger than 150 MB unpacked");
  });

  it("is refused where the sum of its parts is too much, though each is not", () => {
    // Six parts that lie on one another in the archive, each of 30 MB: a few kilobytes as a file.
    const part = zipSync({ "a.xml": new Uint8Array(30_000_000) });
    const listAt = part.findIndex((_, i) => entryMark.every((byte, k) => part[i + k] === byte));
    const end = part.length - 22;
    const entry = part.subarray(listAt, end);
    const bomb = new Uint8Array(end + entry.length * 5 + 22);
    bomb.set(part.subarray(0, end));
    for (let copy = 0; copy < 5; copy++) bomb.set(entry, end + copy * entry.length);
    bomb.set(part.subarray(end), bomb.length - 22);
    const view = new DataView(bomb.buffer);
    for (const offset of [8, 10]) view.setUint16(bomb.length - 22 + offset, 6, true);
    view.setUint32(bomb.length - 22 + 12, entry.length * 6, true);
    expect(bomb.length).toBeLessThan(50_000);
    expect(() => read(bomb)).toThrow("it is larger than 150 MB unpacked");
  });

  it("is refused where its cells are empty and without number", () => {
    const parts = partsOf({});
    const row = `<row>${"<c/>".repeat(16_000)}</row>`;
    const bytes = zipSync(
      {
        ...Object.fromEntries(Object.entries(parts).map(([name, text]) => [name, strToU8(text)])),
        "xl/s.xml": strToU8(`<worksheet><sheetData>${row.repeat(1001)}</sheetData></worksheet>`),
      },
      { level: 1 },
    );
    expect(bytes.length).toBeLessThan(1_000_000);
    expect(() => read(bytes)).toThrow("it holds more cells than a browser's page can take");
  });

  it("is cut off where it states too small a size, and then not opened", () => {
    const parts = partsOf({ rows: "<row><c><v>1</v></c></row>".repeat(5000) });
    const sheet = { "xl/s.xml": parts["xl/s.xml"]!, ...parts };
    expect(cellsOf(zipped(sheet))).toHaveLength(5000);
    expect(() => read(stating(zipped(sheet), 100))).toThrow();
  });

  it("is refused where its list claims parts without end", () => {
    const bytes = handMade({});
    const view = new DataView(bytes.buffer);
    // The end of the list for large archives, put behind: it claims four thousand millions of parts.
    const large = new Uint8Array(bytes.length + 76);
    large.set(bytes.subarray(0, bytes.length - 22));
    const at = bytes.length - 22;
    const write = new DataView(large.buffer);
    write.setUint32(at, 0x06064b50, true);
    write.setUint32(at + 32, 4_000_000_000, true);
    write.setUint32(at + 48, view.getUint32(at + 16, true), true);
    write.setUint32(at + 56, 0x07064b50, true);
    write.setUint32(at + 64, at, true);
    large.set(bytes.subarray(at), large.length - 22);
    write.setUint16(large.length - 22 + 8, 0xffff, true);
    write.setUint32(large.length - 22 + 16, 0xffffffff, true);
    expect(() => read(large)).toThrow("it has more than 10000 parts");
  });

  it.each([
    ["the workbook", "xl/workbook.xml"],
    ["a sheet", "xl/s.xml"],
    ["the list of relations", "xl/_rels/workbook.xml.rels"],
    ["the styles", "xl/styles.xml"],
  ])("is refused where %s defines texts that could grow without end", (_, name) => {
    const entities = Array.from(
      { length: 9 },
      (_, i) => `<!ENTITY e${i + 1} "${`&e${i};`.repeat(10)}">`,
    ).join("");
    const parts = partsOf({ rows: `<row><c t="inlineStr"><is><t>a</t></is></c></row>` });
    parts[name] = `<?xml version="1.0"?><!DOCTYPE a [<!ENTITY e0 "lol">${entities}]>${parts[name]}`;
    expect(() => read(zipped(parts))).toThrow("it is damaged: a part of it brings definitions of its own");
  });

  it.each([
    ["a row beyond the last", `<row r="1048577"><c><v>1</v></c></row>`, "beyond the edges"],
    [
      "a row with a number without end",
      `<row r="${"9".repeat(400)}"><c><v>1</v></c></row>`,
      "beyond the edges",
    ],
    ["a row 0", `<row r="0"><c><v>1</v></c></row>`, "beyond the edges"],
    ["a column beyond the last", `<row r="1"><c r="XFE1"><v>1</v></c></row>`, "beyond the edges"],
    ["more cells than a row has", `<row>${"<c/>".repeat(16_385)}</row>`, "beyond the edges"],
    ["a cell of no address", `<row><c r="${"A".repeat(90)}"><v>1</v></c></row>`, "a cell has no address"],
    [
      "an array beyond the edges",
      `<row><c r="A1"><f t="array" ref="A1:A99999999">B1</f></c></row>`,
      "a cell has no address",
    ],
  ])("is refused for %s, in words without a word of the file", (_, rows, reason) => {
    expect(() => read(handMade({ rows }))).toThrow(new RegExp(`^it is damaged: .*${reason}.{0,40}$`));
  });

  it("says nothing of cells that a stated dimension only claims", () => {
    const parts = partsOf({ rows: `<row><c><v>1</v></c></row>` });
    parts["xl/s.xml"] = parts["xl/s.xml"]!.replace(
      "<sheetData>",
      `<dimension ref="A1:XFD1048576"/><sheetData>`,
    );
    expect(cellsOf(zipped(parts))).toEqual([{ row: 0, column: 0, value: 1 }]);
  });

  it("keeps the value of a formula that is longer than any sheet takes", () => {
    const opened = read(handMade({ rows: formulas([`1${"+1".repeat(5000)}`, "1+1"]) }));
    expect(opened.sheets[0]!.cells.map(({ formula }) => formula)).toEqual([undefined, "=1+1"]);
    expect(opened.leftOut).toEqual(["formulas longer than 8192 characters (their last values are there)"]);
  });

  it("reads arrays one below the other, each with its own rectangle", () => {
    const rows = Array.from(
      { length: 2000 },
      (_, i) =>
        `<row><c><f t="array" ref="A${i + 1}:B${i + 1}">C${i + 1}</f><v>1</v></c><c><v>2</v></c></row>`,
    ).join("");
    const cells = cellsOf(handMade({ rows }));
    expect(cells).toHaveLength(2000);
    expect(cells.at(-1)).toEqual({ row: 1999, column: 0, value: 1, formula: "=C2000", spill: [1, 2] });
  });

  it("takes an array at its word only where it stands, and the right way round", () => {
    const rows = `<row><c r="B2"><f t="array" ref="A1:C9">D1</f><v>1</v></c><c r="C2"><f t="array" ref="C2:C1">D1</f><v>1</v></c></row>`;
    expect(cellsOf(handMade({ rows })).map(({ spill }) => spill)).toEqual([undefined, undefined]);
  });
});

describe("names that every object has", () => {
  const names = ["__proto__", "constructor", "toString", "hasOwnProperty"];

  it.each(names)("%s is no part of a workbook because somebody refers to it", (name) => {
    const parts = partsOf({});
    parts["xl/_rels/workbook.xml.rels"] = parts["xl/_rels/workbook.xml.rels"]!.replace("s.xml", `/${name}`);
    expect(cellsOf(zipped(parts))).toEqual([]);
  });

  it.each(names)("%s is a sheet, a text, a number format and a shared formula like any other", (name) => {
    const opened = read(
      handMade({
        sheetName: name,
        rows: `<row><c s="0" t="inlineStr"><is><t>${name}</t></is></c><c><f t="shared" si="${name}">A1</f><v>1</v></c><c><f t="shared" si="${name}"/><v>2</v></c><c t="s"><v>${name}</v></c></row>`,
        styles: `<numFmts><numFmt numFmtId="170" formatCode="${name}"/></numFmts><cellXfs><xf numFmtId="170"/></cellXfs>`,
      }),
    );
    const [sheet] = opened.sheets;
    expect(sheet!.name).toBe(name);
    expect(sheet!.cells.map(({ value, formula }) => formula ?? value)).toEqual([name, "=A1", "=B1", ""]);
    const saved = strFromU8(unzipSync(writeWorkbook({ title: "", sheets: opened.sheets }))["xl/styles.xml"]!);
    expect(saved).toContain(`<numFmt numFmtId="164" formatCode="${name}"/>`);
    expect(saved).toContain(`<xf numFmtId="164" `);
    expect(Object.prototype).not.toHaveProperty("row");
  });
});

describe("a saved workbook", () => {
  const written = (cells: StoredCell[]) => {
    const bytes = writeWorkbook({ title: "", sheets: [{ name: "A", columns: [], frozenRows: 0, cells }] });
    const parts = unzipSync(bytes);
    const part = (name: string) => strFromU8(parts[name]!);
    return { bytes, sheet: part("xl/worksheets/sheet1.xml"), styles: part("xl/styles.xml") };
  };

  const dangerous = ["=1+1", "+1", "-1", "@SUM(A1)", "=cmd|'/C calc'!A0", "＝1", "'=1", "\t=1", "\r=1"];

  it.each(dangerous)("holds the text %j as a text, in no way as a formula", async (text) => {
    const { bytes, sheet } = written([{ row: 0, column: 0, value: text }]);
    expect(sheet).not.toContain("<f");
    expect(sheet).toContain(`t="s"`);
    const found = new ExcelJS.Workbook();
    await found.xlsx.load(bytes.buffer as ArrayBuffer);
    expect(found.worksheets[0]!.getCell("A1").value).toBe(text);
    expect(found.worksheets[0]!.getCell("A1").formula).toBeUndefined();
    expect(cellsOf(bytes)).toEqual([{ row: 0, column: 0, value: text }]);
  });

  it("marks the texts that Excel would take for formulas when somebody edits them, and no others", () => {
    const marked = (value: StoredCell["value"], look?: StoredCell["look"]) => {
      const { sheet, styles } = written([
        { row: 0, column: 0, ...(value !== undefined && { value }), ...(look && { look }) },
      ]);
      const looks = [...styles.matchAll(/<xf [^>]*xfId="0"[^>]*>/g)].map(([xf]) => xf);
      return looks[Number(/<c r="A1" s="(\d+)"/.exec(sheet)?.[1] ?? 0)]!.includes(`quotePrefix="1"`);
    };
    for (const text of dangerous.slice(0, 7)) expect(`${text} ${marked(text)}`).toBe(`${text} true`);
    expect(marked("=1", { bold: true })).toBe(true);
    for (const other of ["a=1", "°C", "", 5, -5, true, { error: "#N/A" }]) expect(marked(other)).toBe(false);
  });

  it("keeps the text that a formula gives a text, also where it begins like a formula", async () => {
    const { bytes, sheet } = written([
      { row: 0, column: 0, formula: '="="&"1+1"', value: "=1+1" },
      { row: 1, column: 0, formula: "=BEAD.WORKING(C1)", value: "=cmd|'/C calc'!A0", spill: [2, 1] },
      { row: 2, column: 0, value: "@SUM(A1)" },
    ]);
    expect(sheet).toContain(`t="str"`);
    expect([...sheet.matchAll(/<f[ >]/g)]).toHaveLength(2);
    const found = new ExcelJS.Workbook();
    await found.xlsx.load(bytes.buffer as ArrayBuffer);
    const results = ["A1", "A2"].map((cell) => found.worksheets[0]!.getCell(cell).result);
    expect(results).toEqual(["=1+1", "=cmd|'/C calc'!A0"]);
    expect(found.worksheets[0]!.getCell("A3").value).toBe("@SUM(A1)");
  });

  it("holds a formula that was typed here and reaches into files or programs as the text that was typed", () => {
    for (const formula of ["=cmd|'/C calc'!A0", "=[1]Sheet1!A1", "='[Book.xlsx]S'!A1"]) {
      const { bytes, sheet } = written([{ row: 0, column: 0, formula, value: { error: "#NAME?" } }]);
      expect(sheet).not.toContain("<f");
      expect(cellsOf(bytes)).toEqual([{ row: 0, column: 0, value: formula }]);
    }
  });

  it("lets no name of a sheet and no look break out of its attribute", () => {
    const look = { pattern: '0"<b>&"' };
    const bytes = writeWorkbook({
      title: "</dc:title><x/>",
      sheets: [
        { name: '"><x a="&', columns: [], frozenRows: 0, cells: [{ row: 0, column: 0, value: 1, look }] },
      ],
    });
    const [sheet] = read(bytes).sheets;
    expect(sheet!.name).toBe('"><x a="&');
    expect(sheet!.cells[0]!.look).toEqual(look);
    expect(strFromU8(unzipSync(bytes)["docProps/core.xml"]!)).not.toContain("<x/>");
  });
});

it("an archive of other things is told from a workbook", () => {
  expect(() => read(zipSync({ "a.txt": strToU8("a") }))).toThrow("no workbook of the kind .xlsx");
});
