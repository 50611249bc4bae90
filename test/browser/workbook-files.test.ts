import { readdirSync, readFileSync } from "node:fs";
import ExcelJS from "exceljs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { savedFile } from "./setup/saved-file";
import { closePage, openSheet, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";

let sheet: WatchedPage;
beforeAll(async () => {
  sheet = await openSheet();
});
afterAll(() => closePage(sheet));

const samples = readdirSync("samples").filter((file) => file.endsWith(".xlsx"));

const openFile = (file: string) => sheet.page.locator("#log-file").setInputFiles(`samples/${file}`);

async function open(file: string): Promise<void> {
  await openFile(file);
  await sheet.page.waitForFunction(
    (name) => document.getElementById("sample-name")?.textContent === name,
    file,
  );
}

const saveAs = (button: string) => savedFile(sheet.page, button);

/** What a file holds, cell by cell, as the local sheet shows values. */
async function fileCells(path: string) {
  const book = new ExcelJS.Workbook();
  await book.xlsx.load(readFileSync(path).buffer as ArrayBuffer);
  return book.worksheets.map((worksheet) => {
    const cells: { row: number; column: number; value: unknown; formula: string | undefined }[] = [];
    worksheet.eachRow((row, r) =>
      row.eachCell((cell, c) => {
        const { value } = cell;
        const content = cell.formula === undefined ? value : (cell.model as { result?: unknown }).result;
        cells.push({ row: r, column: c, value: shown(content), formula: cell.formula });
      }),
    );
    return { name: worksheet.name, cells };
  });
}

function shown(value: unknown): unknown {
  if (value instanceof Date) return value.getTime() / 86_400_000 + 25_569;
  if (typeof value === "object" && value !== null && "error" in value) return value.error;
  return value ?? "";
}

const sameValue = (found: unknown, stored: unknown): boolean =>
  typeof found === "number" && typeof stored === "number"
    ? Math.abs(found - stored) <= 1e-9 * Math.max(1, Math.abs(stored))
    : found === stored;

describe("workbook files", () => {
  it.each(samples)("opens %s, and the grid engine calculates what the file stores", async (file) => {
    const { page } = sheet;
    await open(file);
    for (const { name, cells } of await fileCells(`samples/${file}`)) {
      const last = cells.findLast(({ formula }) => formula !== undefined) ?? cells[0]!;
      const at = (row: number, column: number) => `'${name}'!${String.fromCharCode(64 + column)}${row}`;
      await waitForValue(
        page,
        at(last.row, last.column),
        (value) => (value !== "" && value !== 0) || last.value === value,
      );
      await expect
        .poll(
          async () => {
            const bottom = Math.max(...cells.map(({ row }) => row));
            const right = Math.max(...cells.map(({ column }) => column));
            const values = await readValues(page, `'${name}'!A1:${String.fromCharCode(64 + right)}${bottom}`);
            return cells.flatMap(({ row, column, value }) => {
              const found = values[row - 1]?.[column - 1];
              return sameValue(found, value) ? [] : [`${at(row, column)}: ${found}, not ${value}`];
            });
          },
          { timeout: 10_000 },
        )
        .toEqual([]);
    }
  });

  it("refuses a damaged file with a reason and keeps the open sheets", async () => {
    const { page } = sheet;
    const buffer = readFileSync("samples/certificate.xlsx").subarray(0, 5000);
    await page.locator("#log-file").setInputFiles({ name: "half.xlsx", mimeType: "", buffer });
    const dialog = page.locator("#files");
    await dialog.getByText("it is damaged").waitFor();
    await dialog.getByRole("button", { name: "Close" }).click();
    expect((await readValues(page, "'About this workbook'!A1"))[0]?.[0]).not.toBe("");
  });

  it("saves the open sheets with formulas, rectangles and values, and reads them back", async () => {
    const { page } = sheet;
    await open("certificate.xlsx");
    await waitForValue(page, "Certificate!E8", (value) => typeof value === "number");
    const { name, path } = await saveAs("Save workbook");
    expect(name).toBe("certificate.xlsx");
    const [saved, original] = [await fileCells(path), await fileCells("samples/certificate.xlsx")];
    expect(saved.map((each) => each.name)).toEqual(original.map((each) => each.name));
    const differences = original.flatMap(({ cells }, index) => {
      const found = new Map(saved[index]!.cells.map((cell) => [`${cell.row},${cell.column}`, cell]));
      return cells.flatMap((cell) => {
        const other = found.get(`${cell.row},${cell.column}`);
        const same = other?.formula === cell.formula && sameValue(other?.value ?? "", cell.value);
        return same ? [] : [{ cell, other }];
      });
    });
    expect(differences).toEqual([]);
  });

  it("saves the sheet in front as CSV, with texts that begin like formulas disarmed", async () => {
    const { page } = sheet;
    await page.locator("#log-file").setInputFiles({
      name: "run.csv",
      mimeType: "text/csv",
      buffer: Buffer.from("tag;CH1 mV\n@SUM(1);-1,5\n"),
    });
    await page.locator("#import").getByRole("button", { name: "Open as a new sheet" }).click();
    await page.locator("#import").getByText("is open").waitFor();
    await page.locator("#import").getByRole("button", { name: "Go to the sheet" }).click();
    const { name, path } = await saveAs("Save sheet as CSV");
    expect(name).toBe("run.csv");
    expect(readFileSync(path, "utf8")).toBe("\ufefftag,CH1 mV\r\n'@SUM(1),-1.5\r\n");
  });

  it("asks before a file replaces own work, and before the page is left", async () => {
    const { page } = sheet;
    await saveAs("Save workbook");
    await page.evaluate(() => window.beadlineSheet!.setFormula("Certificate!T20", "=1+1"));
    await openFile("furnace-log.xlsx");
    const dialog = page.locator("#files");
    await dialog.getByText("You have worked on the open sheets").waitFor();
    await dialog.getByRole("button", { name: "Keep my sheets" }).click();
    expect((await readValues(page, "Certificate!T20"))[0]).toEqual([2]);
    const asked = new Promise<string>((resolve) => {
      page.once("dialog", (each) => {
        resolve(each.type());
        void each.dismiss();
      });
    });
    await page.locator("#open-samples").click();
    await page.locator("#samples").getByRole("button", { name: "Close" }).click();
    await page.close({ runBeforeUnload: true });
    expect(await asked).toBe("beforeunload");
    await saveAs("Save workbook");
  });
});
