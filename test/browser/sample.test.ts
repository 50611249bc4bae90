import { readFileSync } from "node:fs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { type CellValue, cellName, logRows, type WorkbookPlan } from "../../src/sheets";
import { openSample } from "./setup/samples";
import { closePage, openSheet, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";

let sheet: WatchedPage;
beforeAll(async () => {
  sheet = await openSheet();
});
afterAll(() => closePage(sheet));

const planOf = (file: string): WorkbookPlan => JSON.parse(readFileSync(`samples/${file}`, "utf8"));
const list: { file: string; name: string }[] = JSON.parse(readFileSync("samples/index.json", "utf8"));

/** A log as its sheet holds it. */
const logOf = (file: string, rows: number): CellValue[][] =>
  logRows(readFileSync(`samples/${file}`, "utf8"), { file, first: 1, rows, row: 0, column: 0 }).map((row) =>
    row.map((cell) => cell ?? ""),
  );

const values = (range: string) => readValues(sheet.page, range);
const value = async (cell: string) => (await values(cell))[0]?.[0];

/** A spilled table of names and values. */
async function table(range: string): Promise<Record<string, CellValue>> {
  return Object.fromEntries((await values(range)).map(([name, found]) => [String(name), found ?? ""]));
}

describe("the sample that is open at the start", () => {
  it("says that it is invented, in the frame and in the sheet", async () => {
    expect(await sheet.page.locator("#sample-name").textContent()).toContain("invented");
    expect((await values("'Furnace log'!A1:A3")).flat().join(" ")).toMatch(/invented/i);
  });

  it("has a temperature beside each reading, and an error only beside each fault", async () => {
    const rows = await values("'Furnace log'!A8:K2007");
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
    const rows = await values("'Try it'!A4:D60");
    const lines = rows.filter(([name]) => name !== "");
    expect(lines.length).toBeGreaterThanOrEqual(4);
    for (const [, result] of lines) expect(typeof result).toBe("number");
  });
});

describe.each(list)("every formula of $name", ({ file, name }) => {
  const plan = planOf(file);

  it("fills the cells that are planned for it, and the next ones not", async () => {
    await openSample(sheet.page, name);
    for (const { name: tab, cells } of plan.sheets) {
      for (const { row, column, formula, spill: [down, across] = [1, 1] } of cells) {
        if (formula === undefined) continue;
        const at = `${tab}!${cellName(row, column)} ${formula}`;
        const found = await values(
          `'${tab}'!${cellName(row, column)}:${cellName(row + down - 1, column + across - 1)}`,
        );
        expect(found[0]?.[0], at).not.toBe("");
        expect(
          found.at(-1)?.some((cell) => cell !== ""),
          at,
        ).toBe(true);
        expect(
          found
            .flat()
            .map(String)
            .filter((text) => /^#(SPILL|NAME|REF|CALC|NUM|DIV)/.test(text)),
          at,
        ).toEqual([]);
        if (down * across === 1) continue;
        const planned = new Set(cells.map((cell) => cellName(cell.row, cell.column)));
        const [below, beside] = [cellName(row + down, column), cellName(row, column + across)];
        if (!planned.has(below)) expect(await value(`'${tab}'!${below}`), at).toBe("");
        if (!planned.has(beside)) expect(await value(`'${tab}'!${beside}`), at).toBe("");
      }
    }
  });

  it("gives errors only beside faults that are there to be seen", async () => {
    const errors = [];
    for (const { name: tab, cells } of plan.sheets) {
      for (const { row, column, formula, spill: [down, across] = [1, 1] } of cells) {
        if (formula === undefined) continue;
        const range = `'${tab}'!${cellName(row, column)}:${cellName(row + down - 1, column + across - 1)}`;
        errors.push(...(await values(range)).flat().filter((found) => String(found).startsWith("#")));
      }
    }
    expect(new Set(errors)).toEqual(new Set(name === "Furnace log" ? ["#N/A", "#VALUE!"] : []));
  });
});

describe("figures of the samples, worked out once more from their logs", () => {
  it("certificate: reading plus the correction between its two points, blank where nothing was read", async () => {
    await openSample(sheet.page, "Certificate and repairs");
    const [points, corrections] = [
      [600, 800, 1000],
      [-0.9, -1.4, -2.1],
    ];
    const rows = await values("Certificate!A8:G97");
    let blank = 0;
    for (const [, emf, , , reading, corrected, u] of rows) {
      if (emf === "") {
        expect([reading, corrected, u]).toEqual(["", "", ""]);
        blank++;
        continue;
      }
      const i = Number(reading) < 800 ? 0 : 1;
      const share = (Number(reading) - points[i]!) / 200;
      const correction = corrections[i]! + share * (corrections[i + 1]! - corrections[i]!);
      expect(corrected).toBeCloseTo(Number(reading) + correction, 9);
      expect(u).toBeCloseTo(Math.hypot((i === 0 ? 1.4 : 1.6) / 2, 0.5 / Math.sqrt(3)), 9);
    }
    expect(blank).toBe(26);
  });

  it("repairs: the EMF is the same before and after, and the crossed extension is found first", async () => {
    const rows = await values("'Wrong type set'!A8:H25");
    for (const [, logged, , , repaired, , asJ, asK] of rows) {
      if (logged === "") expect([repaired, asJ, asK]).toEqual(["", "", ""]);
      else expect(asK).toBeCloseTo(Number(asJ), 9);
    }
    expect((await values("'Crossed extension'!H14:J15"))[1]?.[0]).toBe("extension crossed at both ends");
  });

  it("lot: error, limit and guarded verdict of every reading", async () => {
    await openSample(sheet.page, "Tolerance check of a lot");
    const inputs = await values("'Lot check'!A8:I12");
    const budget = await values("Budget!B8:B13");
    const [certificate, drift, wells, indicator, step, scatter] = budget.flat().map(Number);
    const u = Math.sqrt(
      (certificate! / 2) ** 2 +
        (drift! ** 2 + wells! ** 2 + indicator! ** 2) / 3 +
        step! ** 2 / 12 +
        scatter! ** 2,
    );
    expect(await value("Budget!G23")).toBeCloseTo(u, 12);
    expect(await value("Budget!G24")).toBeCloseTo(u ** 4 / (scatter! ** 4 / 4), 9);
    const expanded = Number(await value("'Lot check'!B16"));
    expect(expanded).toBe(Math.ceil(10 * u * Number(await value("Budget!G26"))) / 10);
    const rows = (await values("'Lot check'!A20:G60")).slice(1);
    rows.forEach(([couple, reference, reading, error, limit, , verdict], i) => {
      const [at, column] = [i % 5, Math.floor(i / 5)];
      expect(couple).toBe(`K-0${column + 1}`);
      expect(reference).toBe(inputs[at]?.[0]);
      expect(reading).toBe(inputs[at]?.[column + 1]);
      expect(limit).toBeCloseTo(Math.max(2.5, 0.0075 * Number(reference)), 9);
      if (reading === "") {
        expect([error, verdict]).toEqual(["", ""]);
        return;
      }
      const off = Number(reading) - Number(reference);
      expect(error).toBeCloseTo(off, 9);
      expect(verdict).toBe(Math.abs(off) <= Number(limit) - expanded + 1e-9 ? "Pass" : "Fail");
    });
    expect((await values("'Lot check'!B14:I14"))[0]).toEqual([1, 1, 2, 2, 2, "none", 1, 1]);
    expect(await value("Statement!C13")).toMatch(
      /^Fail: the error of 1\.9 °C lies within the limit of ±2\.5 °C, but not/,
    );
  });

  it("survey: extremes, deviations, spread, minutes, missing readings and overshoot", async () => {
    await openSample(sheet.page, "Uniformity survey");
    const corrections = (await values("'Survey log'!B6:J6"))[0]!.map(Number);
    const log = logOf("uniformity-survey.csv", 76).map(([time, ...row]) => ({
      time: Number(time),
      row: row.map((cell, i) => (typeof cell === "number" ? cell + corrections[i]! : Number.NaN)),
    }));
    const inBand = log.map(({ row }) => row.every((t) => Math.abs(t - 900) <= 10 + 1e-9));
    const [first, last] = [inBand.indexOf(true), inBand.lastIndexOf(true)];
    const period = log.slice(first, last + 1);
    const present = period.flatMap(({ row }) => row.filter(Number.isFinite));
    const whole = await table("Survey!A14:B35");
    expect(whole.highest).toBeCloseTo(Math.max(...present), 9);
    expect(whole.lowest).toBeCloseTo(Math.min(...present), 9);
    expect(whole.plus_deviation).toBeCloseTo(Math.max(...present) - 900, 9);
    expect(whole.minus_deviation).toBeCloseTo(Math.min(...present) - 900, 9);
    expect(whole.spread).toBeCloseTo(
      Math.max(
        ...period
          .map(({ row }) => row.filter(Number.isFinite))
          .map((row) => Math.max(...row) - Math.min(...row)),
      ),
      9,
    );
    expect(whole.missing).toBe(3);
    expect([whole.start, whole.end]).toEqual([log[first]!.time, log[last]!.time]);
    // 2 minutes each, less the four intervals that touch a missing reading.
    expect(whole.minutes).toBeCloseTo(2 * (last - first) - 8, 6);
    const below = log.findLastIndex(({ row }, i) => i < first && row.every((t) => t < 890));
    const before = log.slice(below, first).flatMap(({ row }) => row);
    expect(whole.overshoot).toBeCloseTo(Math.max(...before) - 900, 9);
    expect(Number(whole.overshoot)).toBeGreaterThan(Number(whole.plus_deviation));
    expect([whole.class_met, whole.verdict]).toEqual([4, "Incomplete"]);
    const later = await table("Survey!D14:E35");
    expect([later.missing, later.verdict, later.class_met]).toEqual([0, "Pass", 4]);
    expect(later.minutes).toBeCloseTo(34, 6);
    const sensors = (await values("Survey!G9:Q17")).map(([sensor, , minimum, mean, maximum]) => [
      sensor,
      minimum,
      mean,
      maximum,
    ]);
    sensors.forEach(([sensor, minimum, mean, maximum], i) => {
      const own = period.map(({ row }) => row[i]!).filter(Number.isFinite);
      expect(sensor).toBe(`S${i + 1}`);
      expect(minimum).toBeCloseTo(Math.min(...own), 9);
      expect(mean).toBeCloseTo(own.reduce((sum, t) => sum + t, 0) / own.length, 9);
      expect(maximum).toBeCloseTo(Math.max(...own), 9);
    });
    expect((await values("Survey!I21:I23")).flat()).toEqual([2, 2, 4]);
  });

  it("steriliser: F and the minutes above, by small steps between the scans", async () => {
    await openSample(sheet.page, "Steriliser load");
    const rows = logOf("steriliser-load.csv", 121);
    const found = await values("'F values'!B14:G16");
    for (let probe = 0; probe < 6; probe++) {
      let [lethal, above, missing] = [0, 0, 0];
      for (let i = 1; i < rows.length; i++) {
        const [from, to] = [rows[i - 1]![probe + 1], rows[i]![probe + 1]];
        if (typeof from !== "number" || typeof to !== "number") {
          missing += 0.5;
          continue;
        }
        for (let step = 0.5; step < 200; step++) {
          const t = from + ((to - from) * step) / 200;
          if (t >= 100) lethal += (0.5 / 200) * 10 ** ((t - 121.1) / 10);
          if (t >= 121.1) above += 0.5 / 200;
        }
      }
      expect(found[0]?.[probe]).toBeCloseTo(lethal, 3);
      expect(Number(found[1]?.[probe])).toBeGreaterThan(above - 0.05);
      expect(Number(found[1]?.[probe])).toBeLessThan(above + 0.05);
      expect(found[2]?.[probe]).toBeCloseTo(missing, 6);
    }
    const least = Math.min(...found[0]!.map(Number));
    expect(await value("'F values'!B19")).toBe(least);
    expect((await values("'F values'!B17:G17"))[0]).toEqual(["yes", "yes", "yes", "no", "yes", "yes"]);
    expect(await waitForValue(sheet.page, "'Load log'!L126", (cell) => typeof cell === "number")).toBe(least);
  });
});
