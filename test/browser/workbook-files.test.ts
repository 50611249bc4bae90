import { readdirSync, readFileSync } from "node:fs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { fileSheets, saveAs } from "./setup/saved-file";
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

const sameValue = (found: unknown, stored: unknown): boolean =>
  typeof found === "number" && typeof stored === "number"
    ? Math.abs(found - stored) <= 1e-9 * Math.max(1, Math.abs(stored))
    : found === stored;

const letter = (column: number) => String.fromCharCode(64 + column);

/** Waits until the grid shows what a file stores. */
async function expectShown(path: string): Promise<void> {
  const { page } = sheet;
  for (const { name, cells } of await fileSheets(path)) {
    const last = cells.findLast(({ formula }) => formula !== undefined) ?? cells[0]!;
    await waitForValue(
      page,
      `'${name}'!${last.address}`,
      (value) => (value !== "" && value !== 0) || last.value === value,
    );
    const bottom = Math.max(...cells.map(({ row }) => row));
    const right = Math.max(...cells.map(({ column }) => column));
    await expect
      .poll(
        async () => {
          const values = await readValues(page, `'${name}'!A1:${letter(right)}${bottom}`);
          return cells.flatMap(({ row, column, address, value }) => {
            const found = values[row - 1]?.[column - 1];
            return sameValue(found, value) ? [] : [`${name}!${address}: ${found}, not ${value}`];
          });
        },
        { timeout: 10_000 },
      )
      .toEqual([]);
  }
}

describe("workbook files", () => {
  it.each(samples)("opens %s, and the grid engine calculates what the file stores", async (file) => {
    await open(file);
    await expectShown(`samples/${file}`);
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

  it.each(samples)("saves %s with its formulas, rectangles and values", async (file) => {
    const { page } = sheet;
    await open(file);
    await expectShown(`samples/${file}`);
    const { name, path } = await saveAs(page, "Save workbook");
    expect(name).toBe(file);
    const [saved, original] = [await fileSheets(path), await fileSheets(`samples/${file}`)];
    expect(saved.map((each) => each.name)).toEqual(original.map((each) => each.name));
    const differences = original.flatMap(({ cells }, index) => {
      const found = new Map(saved[index]!.cells.map((cell) => [cell.address, cell]));
      return cells.flatMap((cell) => {
        const other = found.get(cell.address);
        const same =
          other?.formula === cell.formula &&
          other?.ref === cell.ref &&
          sameValue(other?.value ?? "", cell.value);
        return same ? [] : [{ cell, other }];
      });
    });
    expect(differences).toEqual([]);
    expect(original.some(({ cells }) => cells.some(({ ref }) => ref?.includes(":")))).toBe(true);
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
    const { name, path } = await saveAs(page, "Save sheet as CSV");
    expect(name).toBe("run.csv");
    expect(readFileSync(path, "utf8")).toBe("\ufefftag,CH1 mV\r\n'@SUM(1),-1.5\r\n");
  });

  it("asks before a file replaces own work, and before the page is left", async () => {
    const { page } = sheet;
    await saveAs(page, "Save workbook");
    await page.evaluate(() => window.beadlineSheet!.setFormula("Survey!T20", "=1+1"));
    await openFile("furnace-log.xlsx");
    const dialog = page.locator("#files");
    await dialog.getByText("You have worked on the open sheets").waitFor();
    await dialog.getByRole("button", { name: "Keep my sheets" }).click();
    expect((await readValues(page, "Survey!T20"))[0]).toEqual([2]);
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
    await saveAs(page, "Save workbook");
  });
});
