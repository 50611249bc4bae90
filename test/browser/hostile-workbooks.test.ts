/** Workbook files that mean harm, in the browser with its own parser; each kind in test/workbooks/hostile-files.test.ts. */
import ExcelJS from "exceljs";
import { afterAll, beforeAll, expect, it } from "vitest";
import { formulas, handMade, partsOf, zipped } from "../workbooks/hand-made";
import { saveAs } from "./setup/saved-file";
import { closePage, openSheet, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";

let sheet: WatchedPage;
beforeAll(async () => {
  sheet = await openSheet();
});
afterAll(() => closePage(sheet));

const openBook = (bytes: Uint8Array, name: string) =>
  sheet.page.locator("#log-file").setInputFiles({ name, mimeType: "", buffer: Buffer.from(bytes) });

it("a file that defines texts which grow without end is refused in words, and the open sheets stay", async () => {
  const { page } = sheet;
  const parts = partsOf({});
  parts["xl/s.xml"] =
    `<!DOCTYPE w [<!ENTITY a "x"><!ENTITY b "&a;&a;&a;">]><worksheet><sheetData><row><c t="inlineStr"><is><t>&b;</t></is></c></row></sheetData></worksheet>`;
  await openBook(zipped(parts), "entities.xlsx");
  const dialog = page.locator("#files");
  await dialog.getByText("The file cannot be opened: it is damaged").waitFor();
  expect(await dialog.textContent()).toContain("Your sheets are still open.");
  await dialog.getByRole("button", { name: "Close" }).click();
  expect((await readValues(page, "'Furnace log'!H8"))[0]![0]).toBeTypeOf("number");
});

it("a file with links to files, programs and the web opens with their last values, says so, and asks nobody", async () => {
  const { page } = sheet;
  const linked = ["cmd|'/C calc'!A0", "[1]Book!A1", '_xlfn.WEBSERVICE("http://127.0.0.1:9/")', "A1*2"];
  await openBook(handMade({ rows: formulas(linked) }), "linked.xlsx");
  const dialog = page.locator("#files");
  await dialog.getByText("Left out: links to other files, to programs and to the web").waitFor();
  await dialog.getByRole("button", { name: "Close" }).click();
  await waitForValue(page, "S!D1", (value) => value === 14);
  expect(await readValues(page, "S!A1:D1")).toEqual([[7, 7, 7, 14]]);
});

it("formulas that are typed and reach outside ask nobody, and start nothing from the saved file", async () => {
  const { page } = sheet;
  const typed = [
    "=cmd|'/C calc'!A0",
    "='[Book.xlsx]S'!A1",
    '=WEBSERVICE("http://127.0.0.1:9/")',
    "=constructor(1)",
    "=__proto__()",
    '=HYPERLINK("javascript:window.ran=1","a")',
  ];
  for (const [index, formula] of typed.entries()) {
    await page.evaluate(
      ([cell, text]) => window.beadlineSheet!.setFormula(cell!, text!),
      [`S!A${index + 3}`, formula],
    );
  }
  await page.evaluate(() => window.beadlineSheet!.setFormula("S!A20", "=1+1"));
  await waitForValue(page, "S!A20", (value) => value === 2);
  expect(await page.locator("#grid a[href]").count()).toBe(0);
  const { path } = await saveAs(page, "Save workbook");
  const book = new ExcelJS.Workbook();
  await book.xlsx.readFile(path);
  const saved = book.worksheets[0]!;
  for (const [index, formula] of typed.slice(0, 2).entries()) {
    expect(saved.getCell(index + 3, 1).formula).toBeUndefined();
    expect(saved.getCell(index + 3, 1).value).toBe(formula);
  }
  expect(saved.getCell("A20").formula).toBe("1+1");
});
