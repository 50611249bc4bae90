/**
 * The engineer: a log from the furnace's recorder, put right as far as it goes, converted, screened, corrected by the
 * couples' certificate, saved. What comes out is held against printed tables and sums done here.
 */
import { rmSync } from "node:fs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { emfTables } from "../published/emf-tables";
import { type FileCell, fileSheets, saveAs } from "./setup/saved-file";
import { closePage, openSheet, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";
import { openLog, typeInto } from "./setup/typing";

/** Printed EMF of type K in mV, reference junction at 0 °C. */
const printed = new Map(
  emfTables.flatMap(({ rows }) =>
    rows.flatMap(([type, t, emf]) => (type === "K" ? [[t, emf] as const] : [])),
  ),
);

const emf = (t: number): number => {
  const found = printed.get(t);
  if (found === undefined) throw new Error(`${t} °C stands in no printed table`);
  return found;
};

/** A scan: temperatures of three couples, and of the terminals where they end. A word is a fault. */
type Channel = number | "" | "open" | "torn off";
interface Scan {
  couples: readonly Channel[];
  terminals: number | "";
  remark: string;
}

// biome-ignore format: one scan a line
const scans: readonly Scan[] = [
  { couples: [200, 210, 180], terminals: 50, remark: "=1+1" },
  { couples: [280, 290, 250], terminals: 50, remark: "@SUM(1)" },
  { couples: [340, 360, 310], terminals: 50, remark: "" },
  { couples: ["", "", ""], terminals: "", remark: "" },
  { couples: [490, "torn off", 440], terminals: 60, remark: "<img src=x onerror=alert(1)>" },
  { couples: [610, 620, 550], terminals: 60, remark: "+49 (0)" },
  { couples: [700, 730, "open"], terminals: 60, remark: "-" },
  { couples: [780, 790, 740], terminals: 60, remark: "" },
  { couples: ["", 890, 830], terminals: 60, remark: "" },
  { couples: [900, 910, 880], terminals: 70, remark: "=HYPERLINK(\"x\")" },
  { couples: [960, 970, 930], terminals: 70, remark: "" },
  { couples: [1050, 1070, 1010], terminals: 70, remark: "" },
];
const [top, bottom] = [2, scans.length + 1];

/** As a recorder set to German writes it. */
const field = (value: number, digits: number) => value.toFixed(digits).replace(".", ",");

function written(channel: Channel, terminals: number | ""): string {
  if (channel === "") return "";
  if (channel === "open") return "99,999";
  if (channel === "torn off") return "torn off";
  return field(emf(channel) - emf(Number(terminals)), 3);
}

const quoted = (text: string) => (text.includes('"') ? `"${text.replaceAll('"', '""')}"` : text);

const csv = [
  "time;CH1 mV;CH2 mV;CH3 mV;terminal °C;remark",
  ...scans.map(({ couples, terminals, remark }, minute) => {
    if (terminals === "") return ";;;;;";
    const readings = couples.map((each) => written(each, terminals));
    const time = `03.03.2026 07:${String(minute).padStart(2, "0")}:00`;
    return [time, ...readings, field(terminals, 1), quoted(remark)].join(";");
  }),
].join("\r\n");

const block = (columns: string) => {
  const [first, last] = columns.split(":");
  return `${first}${top}:${last}${bottom}`;
};
const blankSafe = (range: string) => `IF(ISBLANK(${range}),"",${range})`;

/** The certificate as its reader types it: reading in °C, correction in °C, in O and P. */
const certificate = [
  [0, 0.2],
  [400, -0.6],
  [800, -1.4],
  [1200, -2.2],
] as const;

const formulas = {
  temperature: `=BEAD.TEMPERATURE(${blankSafe(block("B:D"))},"K",${blankSafe(block("E:E"))})`,
  flags: `=BEAD.FLAGS(${blankSafe(block("B:D"))},-6.5,54.9)`,
  corrected: `=BEAD.CORRECTED(${block("H:J")},O2:O5,P2:P5)`,
};

/** Straight between the two points about it. */
function correction(t: number): number {
  const after = certificate.findIndex(([point]) => point >= t);
  const [[t0, c0], [t1, c1]] = [certificate[after - 1]!, certificate[after]!];
  return c0 + ((c1 - c0) * (t - t0)) / (t1 - t0);
}

/** A printed EMF is rounded to 1 µV, and two of them make a reading: 0.03 °C where type K gives least. */
const rounding = 0.03;

function expectTemperature(found: unknown, channel: Channel, shift = (_: number) => 0): void {
  if (channel === "") expect(found).toBe("");
  else if (channel === "open") expect(found).toBe("#N/A");
  else if (channel === "torn off") expect(found).toBe("#VALUE!");
  else {
    expect(typeof found).toBe("number");
    expect(Math.abs(Number(found) - channel - shift(channel))).toBeLessThan(rounding);
  }
}

/** By the words of FLAGS for what was done to each reading. */
const flagOf = (channel: Channel): string =>
  channel === "open" ? "over" : typeof channel === "number" ? "" : "missing";

let sheet: WatchedPage;
beforeAll(async () => {
  sheet = await openSheet({ locale: "en-GB" });
});
afterAll(() => closePage(sheet));

const on = (range: string) => `'run 12'!${range}`;
const values = (range: string) => readValues(sheet.page, on(range));

/** A result that is there: the last line of the log has no fault. */
const calculated = (cell: string) =>
  waitForValue(sheet.page, on(cell), (value) => value !== "" && value !== undefined);

describe("the engineer's way from a log to a saved workbook", () => {
  it("opens the log as it was meant: decimal commas, a blank row, words among numbers, remarks as texts", async () => {
    await openLog(sheet.page, "run 12.csv", csv);
    const rows = await values(`A${top}:F${bottom}`);
    scans.forEach(({ couples, terminals, remark }, i) => {
      const [, ...found] = rows[i]!;
      const readings = couples.map((channel) => {
        const text = written(channel, terminals).replace(",", ".");
        return text === "" || Number.isNaN(Number(text)) ? text : Number(text);
      });
      expect(found).toEqual([...readings, terminals, terminals === "" ? "" : remark]);
    });
  });

  it("turns the whole block into temperatures by one formula; each fault spoils its own cell", async () => {
    await typeInto(sheet.page, "H1", "CH1 °C");
    await typeInto(sheet.page, `H${top}`, formulas.temperature);
    await calculated(`J${bottom}`);
    const found = await values(block("H:J"));
    scans.forEach(({ couples }, i) => {
      couples.forEach((channel, c) => {
        expectTemperature(found[i]![c], channel);
      });
    });
  });

  it("says what is wrong with a spoilt reading when its result is selected", async () => {
    const { page } = sheet;
    const line = page.locator("#message");
    await page.evaluate(() => window.beadlineSheet!.select("'run 12'!J8"));
    await expect.poll(() => line.textContent()).toMatch(/^J8#N\/A:.*above/);
    await page.evaluate(() => window.beadlineSheet!.select("'run 12'!I6"));
    await expect.poll(() => line.textContent()).toMatch(/^I6#VALUE!:.*torn off/);
  });

  it("names the open sensor and the missing readings", async () => {
    await typeInto(sheet.page, `K${top}`, formulas.flags);
    await waitForValue(sheet.page, on("M8"), (value) => value === "over");
    expect(await values(block("K:M"))).toEqual(scans.map(({ couples }) => couples.map(flagOf)));
  });

  it("adds the certificate's correction, straight between its points", async () => {
    const { page } = sheet;
    await typeInto(page, "O2", ...certificate.map(([point]) => point));
    await typeInto(page, "P2", ...certificate.map(([, value]) => value));
    await typeInto(page, `R${top}`, formulas.corrected);
    await calculated(`T${bottom}`);
    const found = await values(block("R:T"));
    scans.forEach(({ couples }, i) => {
      couples.forEach((channel, c) => {
        expectTemperature(found[i]![c], channel, correction);
      });
    });
  });

  it("follows when a reading is put right, and in that cell alone", async () => {
    const { page } = sheet;
    const before = await values(`H${top}:T${bottom}`);
    await typeInto(page, "D8", (emf(660) - emf(60)).toFixed(3));
    await waitForValue(page, on("T8"), (value) => typeof value === "number");
    const after = await values(`H${top}:T${bottom}`);
    expectTemperature(after[6]![2], 660);
    expectTemperature(after[6]![12], 660, correction);
    expect(after[6]![5]).toBe("");
    for (const column of [2, 5, 12]) after[6]![column] = before[6]![column]!;
    expect(after).toEqual(before);
    await page.keyboard.press("Control+z");
    await waitForValue(page, on("T8"), (value) => value === "#N/A");
    expect(await values(`H${top}:T${bottom}`)).toEqual(before);
  });

  describe("the saved workbook, read by a general reader", () => {
    let cells: Map<string, FileCell>;
    const valueAt = (row: number, column: number) =>
      cells.get(`${String.fromCharCode(65 + column)}${row}`)?.value ?? "";

    beforeAll(async () => {
      const { name, path } = await saveAs(sheet.page, "Save workbook");
      expect(name).toBe("run 12.xlsx");
      const saved = (await fileSheets(path)).find((each) => each.name === "run 12");
      cells = new Map(saved!.cells.map((cell) => [cell.address, cell]));
      rmSync(path);
    });

    it("holds three formulas as Excel stores them, and none that the log brought along", () => {
      const stored = [...cells.values()].flatMap(({ address, formula }) =>
        formula === undefined ? [] : [[address, formula]],
      );
      const asStored = (formula: string) => formula.slice(1).replaceAll("BEAD.", "_xldudf_BEAD_");
      expect(stored).toEqual([
        [`H${top}`, asStored(formulas.temperature)],
        [`K${top}`, asStored(formulas.flags)],
        [`R${top}`, asStored(formulas.corrected)],
      ]);
      for (const [i, { terminals, remark }] of scans.entries())
        if (terminals !== "") expect(valueAt(top + i, 5)).toBe(remark);
    });

    it("names for each formula the rectangle that it spilled into: a line for each scan, a column for each couple", async () => {
      const refs = [...cells.values()].flatMap(({ ref }) => (ref === undefined ? [] : [ref]));
      expect(refs).toEqual([block("H:J"), block("K:M"), block("R:T")]);
      // Nothing of a result stands beside or below its rectangle, in the grid as in the file.
      for (const beside of [`N${top}:N${bottom}`, `U${top}:U${bottom}`, `H${bottom + 1}:U${bottom + 1}`]) {
        expect((await values(beside)).flat().every((value) => value === "")).toBe(true);
        const [first, last] = beside.split(":").map((each) => /([A-Z])(\d+)/.exec(each)!.slice(1));
        for (const { address } of cells.values()) {
          const [, column, row] = /([A-Z]+)(\d+)/.exec(address)!;
          const within =
            column! >= first![0]! && column! <= last![0]! && +row! >= +first![1]! && +row! <= +last![1]!;
          expect(within, address).toBe(false);
        }
      }
    });

    it("keeps the results that were on the screen, faults included", () => {
      scans.forEach(({ couples }, i) => {
        couples.forEach((channel, c) => {
          expectTemperature(valueAt(top + i, 7 + c), channel);
          expect(valueAt(top + i, 10 + c)).toBe(flagOf(channel));
          expectTemperature(valueAt(top + i, 17 + c), channel, correction);
        });
      });
    });
  });
});
