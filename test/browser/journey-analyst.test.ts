/**
 * The analyst: the log of a uniformity survey, its soak and its summary, sensor by sensor, looked at in the pane and
 * printed. Every figure is worked out once more here, from the log's own text.
 */
import { readFileSync } from "node:fs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { CellValue } from "../../src/sheets";
import { plainSurvey } from "../core/survey/plain";
import { openView, select } from "./setup/pane";
import { closePage, openSheet, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";
import { openLog, openTab, typeInto } from "./setup/typing";

const setpoint = 900;
const tolerance = 10;
const corrections = [-0.4, 0.3, -0.6, -1.1, -2.4, 0.2, -0.3, 0.5, 0.4];

/** What a program might run or a page might take for markup: in the log these are remarks like any other. */
const remarks = ["=1+1", "@SUM(1)", "<img src=x onerror=alert(1)>", "+1+1", "-A1"];

/** The sample's log with a column of remarks, as somebody keeps one. */
const lines = readFileSync("samples/uniformity-survey.csv", "utf8").trimEnd().split("\n");
const [notes, scans] = [
  lines.filter((line) => line.startsWith("#")),
  lines.filter((line) => /^\d/.test(line)),
];
const csv = [
  ...notes,
  `${lines[notes.length]},remark`,
  ...scans.map((line, i) => `${line},${remarks[i] ?? ""}`),
].join("\n");

/** The log as the test reads it: minutes since its first scan, for each sensor a column of numbers; no number is NaN. */
const fields = scans.map((line) => line.split(","));
const minutes = fields.map(
  ([time]) =>
    (Date.parse(`${time}Z`.replace(" ", "T")) - Date.parse(`${fields[0]![0]}Z`.replace(" ", "T"))) / 60_000,
);
const readings = corrections.map((_, s) =>
  Float64Array.from(fields, (row) => (row[s + 1] === "" ? Number.NaN : Number(row[s + 1]))),
);
const plain = plainSurvey({
  times: Float64Array.from(minutes),
  readings,
  setpoint,
  tolerance: { below: tolerance, above: tolerance },
  corrections,
});

/** The longest run of scans with every sensor there and in the band, in minutes from the log's beginning. */
function longestSoak(): { start: number; end: number } {
  const isGood = fields.map((_, i) =>
    corrections.every((c, s) => Math.abs(readings[s]![i]! + c - setpoint) <= tolerance + 1e-9),
  );
  let best = { start: 0, end: 0 };
  isGood.forEach((_, from) => {
    let to = from;
    while (isGood[from] && isGood[to + 1]) to++;
    if (minutes[to]! - minutes[from]! > best.end - best.start)
      best = { start: minutes[from]!, end: minutes[to]! };
  });
  return best;
}

/** The reading of that stretch that lies furthest from the set point. */
function worstInSoak(): { sensor: string; deviation: number; time: string } {
  const { start, end } = longestSoak();
  const seen = minutes.flatMap((minute, i) =>
    minute < start || minute > end
      ? []
      : corrections.map((c, s) => ({
          sensor: `S${s + 1}`,
          deviation: readings[s]![i]! + c - setpoint,
          time: fields[i]![0]!.slice(11, 16),
        })),
  );
  return seen.reduce((worst, each) =>
    Math.abs(each.deviation) > Math.abs(worst.deviation) + 1e-9 ? each : worst,
  );
}

const log = "'uniformity-survey'!";
const [top, bottom] = [notes.length + 2, notes.length + 1 + scans.length];
const times = `IF(ISBLANK(${log}A${top}:A${bottom}),"",${log}A${top}:A${bottom})`;
const block = `IF(ISBLANK(${log}B${top}:J${bottom}),"",${log}B${top}:J${bottom})`;
const asked = `${times},${block},${setpoint},${tolerance},B2:J2`;

let sheet: WatchedPage;
let summary: string;
beforeAll(async () => {
  sheet = await openSheet({ locale: "en-GB", viewport: { width: 1600, height: 1000 } });
});
afterAll(() => closePage(sheet));

const values = (range: string) => readValues(sheet.page, `'${summary}'!${range}`);
const table = async (range: string): Promise<Record<string, CellValue>> =>
  Object.fromEntries((await values(range)).map(([name, value]) => [String(name), value ?? ""]));
const minuteOf = (time: CellValue | undefined) =>
  Math.round((Number(time) - 25_569) * 1440) - Date.parse(`${fields[0]![0]}Z`.replace(" ", "T")) / 60_000;
const calculated = (cell: string) =>
  waitForValue(sheet.page, `'${summary}'!${cell}`, (value) => value !== "");

describe("the analyst's way from a survey's log to a printed summary", () => {
  it("opens the log, its remarks as they were written", async () => {
    await openLog(sheet.page, "uniformity-survey.csv", csv);
    const found = await readValues(sheet.page, `${log}A${top}:K${bottom}`);
    expect(found.map((row) => row.slice(1, 10))).toEqual(
      fields.map((row) => row.slice(1).map((cell) => (/\d/.test(cell) ? Number(cell) : cell))),
    );
    expect(found.map((row) => minuteOf(row[0]))).toEqual(minutes);
    expect(found.slice(0, remarks.length).map((row) => row[10])).toEqual(remarks);
  });

  it("finds the soak", async () => {
    const { page } = sheet;
    await page.locator("[data-u-comp=sheet-bar-append-button]").first().click();
    await page.waitForFunction(async () => !(await window.beadlineSheet!.getSelection()).includes("survey"));
    summary = (await page.evaluate(() => window.beadlineSheet!.getSelection())).replace(/!.*|'/g, "");
    await typeInto(page, "A1", "Survey of furnace 3");
    await typeInto(page, "A2", "corrections °C");
    for (const [s, value] of corrections.entries())
      await typeInto(page, `${String.fromCharCode(66 + s)}2`, value);
    await typeInto(page, "A4", `=BEAD.SOAK(${asked})`);
    await calculated("B10");
    const soak = await table("A5:B10");
    const { start, end } = longestSoak();
    expect([minuteOf(soak.start), minuteOf(soak.end)]).toEqual([start, end]);
    expect(soak.minutes).toBeCloseTo(end - start, 6);
    expect(soak.minutes_to_reach).toBeCloseTo(start - minutes[0]!, 6);
  });

  it("sums the survey up", async () => {
    await typeInto(sheet.page, "D4", `=BEAD.SURVEY(${asked},${log}B${top - 1}:J${top - 1})`);
    await calculated("E25");
    const found = await table("D5:E25");
    const { summary: own } = plain;
    const name = (sensor: number) => `S${sensor + 1} °C`;
    for (const [metric, value] of [
      ["highest", own.highest],
      ["lowest", own.lowest],
      ["plus_deviation", own.plusDeviation],
      ["minus_deviation", own.minusDeviation],
      ["spread", own.spread],
      ["drift", own.drift],
      ["centring_shift", own.centringShift],
      ["overshoot", own.overshoot],
      ["minutes", own.minutes],
      ["missing", own.missing],
      ["margin", own.margin],
    ] as const)
      expect(found[metric], metric).toBeCloseTo(value, 6);
    expect(found).toMatchObject({
      highest_sensor: name(own.highestSensor),
      lowest_sensor: name(own.lowestSensor),
      hottest_sensor: name(own.hottestSensor),
      coldest_sensor: name(own.coldestSensor),
      verdict: own.verdict,
    });
    expect([found.start, found.end, found.highest_time, found.lowest_time].map(minuteOf)).toEqual(
      [own.first, own.last, own.highestScan, own.lowestScan].map((scan) => minutes[scan]),
    );
    // The lost sensor is not hidden.
    expect(own.missing).toBeGreaterThan(0);
    expect(found.verdict).toBe("Incomplete");
  });

  it("gives the same sensor by sensor", async () => {
    await typeInto(sheet.page, "G4", `=BEAD.SURVEYSENSORS(${asked},${log}B${top - 1}:J${top - 1})`);
    await calculated("Q13");
    const [header, ...rows] = await values("G4:Q13");
    expect(header).toEqual([
      ...["sensor", "correction", "minimum", "mean", "maximum", "plus_deviation", "minus_deviation"],
      ...["stability", "in_band", "missing", "verdict"],
    ]);
    rows.forEach(([sensor, ...figures], s) => {
      const own = plain.table[s]!;
      expect(sensor).toBe(`S${s + 1} °C`);
      const expected = [own.correction, own.minimum, own.mean, own.maximum, own.plusDeviation];
      [...expected, own.minusDeviation, own.stability, own.inBand, own.missing].forEach((value, i) => {
        expect(figures[i], `${sensor} ${header![i + 1]}`).toBeCloseTo(value, 9);
      });
    });
    expect(
      (await values("R4:R13"))
        .flat()
        .concat((await values("G14:Q14")).flat())
        .join(""),
    ).toBe("");
  });

  it("draws the survey beside the grid, with its finding in words", async () => {
    const { page } = sheet;
    await select(page, `'${summary}'!D4`);
    await openView(page, "Pictures");
    await page.getByRole("button", { name: "Take from the selected formula" }).click();
    const figure = page.locator(".survey .picture");
    await figure.locator("canvas").waitFor();
    const { sensor, deviation, time } = worstInSoak();
    const words = `${sensor} reaches ${deviation < 0 ? "−" : "+"}${Math.abs(deviation).toFixed(1)} °C at ${time}`;
    expect((await figure.locator("figcaption").textContent())?.replace(/\s/g, " ")).toContain(words);
  });

  describe("the print view", () => {
    const view = () => sheet.page.locator("#print-view");
    const cells = () =>
      view()
        .locator("tbody tr")
        .evaluateAll((rows) => rows.map((row) => [...row.children].map((cell) => cell.textContent)));

    it("shows the summary as the grid shows it, with the picture, and prints nothing else", async () => {
      const { page } = sheet;
      await page.getByRole("button", { name: "Print", exact: true }).click();
      await view().locator("figure:not([hidden]) img").waitFor();
      expect(await view().locator("h2").textContent()).toBe(summary);
      const printed = (await cells()).map((row) => row.filter((text) => text !== ""));
      for (let row = 4; row <= 13; row++) {
        const shown = await Promise.all(
          [..."ABDEGHIJKLMNOPQ"].map((column) =>
            page.evaluate((cell) => window.beadlineSheet!.getText(cell), `${column}${row}`),
          ),
        );
        expect(printed[row - 1]).toEqual(shown.filter((text) => text !== ""));
      }
      await page.emulateMedia({ media: "print" });
      for (const other of [".frame-header", ".bench", ".print-bar"])
        expect(await page.locator(other).isVisible(), other).toBe(false);
      expect(await view().locator("table").isVisible()).toBe(true);
      expect(await view().locator("tfoot").textContent()).toMatch(
        /Beadline \d+\.\d+\.\d+ · Records and analysis only/,
      );
      await page.emulateMedia({ media: null });
    });

    it("puts the picture onto light paper, with its finding", async () => {
      const figure = view().locator("figure:not([hidden])");
      expect(await figure.count()).toBe(1);
      expect(await figure.locator("figcaption").textContent()).toBe(
        await sheet.page.locator(".survey .picture figcaption").textContent(),
      );
      await view().getByRole("checkbox", { name: "With the survey's picture" }).uncheck();
      expect(await figure.count()).toBe(0);
      await view().getByRole("button", { name: "Close", exact: true }).click();
      expect(await view().isVisible()).toBe(false);
    });

    it("shows the log with its header on every page and its remarks as text", async () => {
      const { page } = sheet;
      await openTab(page, "uniformity-survey");
      await page.getByRole("button", { name: "Print", exact: true }).click();
      await view().locator("tbody").waitFor();
      expect(await view().locator("thead th").allTextContents()).toEqual([
        "time",
        ...corrections.map((_, s) => `S${s + 1} °C`),
        "remark",
      ]);
      const printed = await cells();
      expect(printed).toHaveLength(scans.length);
      expect(printed[0]).toEqual([fields[0]![0], ...fields[0]!.slice(1), remarks[0]]);
      expect(printed.slice(0, remarks.length).map((row) => row.at(-1))).toEqual(remarks);
      expect(await view().locator("table img, article > p > *").count()).toBe(0);
      await view().getByRole("button", { name: "Close", exact: true }).click();
    });
  });
});
