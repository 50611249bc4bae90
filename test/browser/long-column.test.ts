import { afterEach, beforeEach, expect, it } from "vitest";
import { closePage, openSheet, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";

const rows = 100_000;

let sheet: WatchedPage;
beforeEach(async () => {
  sheet = await openSheet();
});
afterEach(() => closePage(sheet));

it("converts 100 000 readings, all different, with one formula", async () => {
  const { page } = sheet;
  await page.evaluate(async (count) => {
    const readings = Array.from({ length: count }, (_, index) => [
      (50 * index) / count,
      20 + (index % 50) / 10,
    ]);
    const column = { width: 88, format: "mV" } as const;
    await window.beadlineSheet!.addSheet({
      name: "Long",
      columns: [column, column],
      frozenRows: 0,
      printOnePageWide: true,
      cells: [],
      readings: { row: 0, column: 0, rows: readings },
    });
    await window.beadlineSheet!.setFormula(
      "C1",
      `=BEAD.TEMPERATURE(IF(ISBLANK(A1:A${count}),"",A1:A${count}),"K",B1:B${count})`,
    );
  }, rows);
  const started = Date.now();
  const last = await waitForValue(page, `Long!C${rows}`, (value) => typeof value === "number", 40_000);
  console.log(`100 000 rows in one formula: ${Date.now() - started} ms in the grid`);
  expect(last).toBeGreaterThan(1200);
  expect(await readValues(page, "Long!C1")).toEqual([[expect.closeTo(20, 6)]]);
});
