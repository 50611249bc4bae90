import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { closePage, openSheet, readValues, type WatchedPage } from "./setup/sheet-page";

let sheet: WatchedPage;
beforeAll(async () => {
  sheet = await openSheet();
});
afterAll(() => closePage(sheet));

describe("the sample log", () => {
  it("says that it is invented, in the frame and in the sheet", async () => {
    expect(await sheet.page.locator("#sample-name").textContent()).toContain("invented");
    expect((await readValues(sheet.page, "'Furnace log'!A1:A3")).flat().join(" ")).toMatch(/invented/i);
  });

  it("has a temperature beside each reading, and an error only beside each fault", async () => {
    const { page } = sheet;
    const rows = await readValues(page, "'Furnace log'!A8:K2007");
    expect(rows).toHaveLength(2000);
    const kinds = { temperatures: 0, blank: 0, open: 0, text: 0 };
    for (const row of rows) {
      const [readings, results] = [row.slice(1, 5), row.slice(7, 11)];
      readings.forEach((reading, channel) => {
        const result = results[channel];
        if (reading === "") kinds.blank += Number(result === "");
        else if (typeof reading === "string") kinds.text += Number(result === "#VALUE!");
        else if (Number(reading) > 90) kinds.open += Number(result === "#N/A");
        else kinds.temperatures += Number(typeof result === "number" && result > 0 && result < 1372);
      });
    }
    expect(kinds.temperatures + kinds.blank + kinds.open + kinds.text).toBe(8000);
    expect(Math.min(kinds.temperatures, kinds.blank, kinds.open, kinds.text)).toBeGreaterThan(0);
  });

  it("shows no result longer than its column", async () => {
    const { page } = sheet;
    for (const column of "HIJK") {
      expect(await page.evaluate((cell) => window.beadlineSheet!.getText(cell), `${column}9`)).toMatch(
        /^\d+\.\d\d$/,
      );
    }
    expect(await page.evaluate(() => window.beadlineSheet!.getText("A9"))).toBe("2026-03-02 06:00:30");
  });

  it("runs every line of the sheet with examples without an error", async () => {
    const rows = await readValues(sheet.page, "'Try it'!A4:D60");
    const lines = rows.filter(([name]) => name !== "");
    expect(lines.length).toBeGreaterThanOrEqual(4);
    for (const [, result] of lines) expect(typeof result).toBe("number");
  });
});
