/** The parts by which a workbook opens the pane, as [MS-OWEXML] and its vendor's article on documents with panes say. */
import { DOMParser } from "@xmldom/xmldom";
import ExcelJS from "exceljs";
import { strFromU8, unzipSync } from "fflate";
import { expect, it } from "vitest";
import { type PaneReference, writeWorkbook } from "../../src/workbooks";
import { read } from "./hand-made";

const sheets = [{ name: "A", columns: [], frozenRows: 0, cells: [{ row: 0, column: 0, value: "a" }] }];
const opensPane: PaneReference = {
  id: "01234567-89ab-4cde-8f01-23456789abcd",
  version: "1.2.3.0",
  storeType: "FileSystem",
  store: '\\\\plant\\add-ins & "more"',
};
const [plain, opening] = [
  writeWorkbook({ title: "", sheets }),
  writeWorkbook({ title: "", sheets, opensPane }),
];

const root = (name: string) =>
  new DOMParser().parseFromString(strFromU8(unzipSync(opening)[name]!), "text/xml").documentElement!;
const named = (part: string, name: string) => root(part).getElementsByTagName(name)[0]!;

it("a workbook that opens no pane has none of them", () => {
  const parts = unzipSync(plain);
  expect(Object.keys(parts).filter((name) => name.includes("webextension"))).toEqual([]);
  expect(strFromU8(parts["[Content_Types].xml"]!) + strFromU8(parts["_rels/.rels"]!)).not.toContain("webext");
});

it("refer to the add-in by the manifest's Id and version and by where it is installed from", () => {
  const reference = named("xl/webextensions/webextension1.xml", "we:reference");
  for (const [name, value] of Object.entries(opensPane)) expect(reference.getAttribute(name)).toBe(value);
  expect(root("xl/webextensions/webextension1.xml").getAttribute("id")).toBe(
    "{01234567-89AB-4CDE-8F01-23456789ABCD}",
  );
});

it("ask for the pane by the property, and ask nobody to install anything", () => {
  const property = named("xl/webextensions/webextension1.xml", "we:property");
  expect(property.getAttribute("name")).toBe("Office.AutoShowTaskpaneWithDocument");
  expect(property.getAttribute("value")).toBe("true");
  expect(named("xl/webextensions/taskpanes.xml", "wetp:taskpane").getAttribute("visibility")).toBe("0");
});

it("are found from the package, one from the other, each of its kind", () => {
  const relations = (part: string) =>
    Array.from(root(part).getElementsByTagName("Relationship"), (each) => [
      each.getAttribute("Id"),
      each.getAttribute("Target"),
      each.getAttribute("Type"),
    ]);
  const kind = "http://schemas.microsoft.com/office/2011/relationships";
  expect(relations("_rels/.rels")).toContainEqual([
    "rId4",
    "xl/webextensions/taskpanes.xml",
    `${kind}/webextensiontaskpanes`,
  ]);
  expect(relations("xl/webextensions/_rels/taskpanes.xml.rels")).toEqual([
    ["rId1", "webextension1.xml", `${kind}/webextension`],
  ]);
  expect(named("xl/webextensions/taskpanes.xml", "wetp:webextensionref").getAttribute("r:id")).toBe("rId1");
  const kinds = new Map(
    Array.from(root("[Content_Types].xml").getElementsByTagName("Override"), (each) => [
      each.getAttribute("PartName"),
      each.getAttribute("ContentType"),
    ]),
  );
  expect(kinds.get("/xl/webextensions/taskpanes.xml")).toBe(
    "application/vnd.ms-office.webextensiontaskpanes+xml",
  );
  expect(kinds.get("/xl/webextensions/webextension1.xml")).toBe("application/vnd.ms-office.webextension+xml");
});

it("change nothing else: readers find the same workbook", async () => {
  const [without, withPane] = [unzipSync(plain), unzipSync(opening)];
  for (const name of Object.keys(without).filter((each) => each.startsWith("xl/")))
    expect(withPane[name]).toEqual(without[name]);
  const found = new ExcelJS.Workbook();
  await found.xlsx.load(opening.buffer as ArrayBuffer);
  expect(found.worksheets[0]!.getCell("A1").value).toBe("a");
  expect(read(opening)).toEqual(read(plain));
});
