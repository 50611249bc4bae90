/**
 * The clerk: a lot of couples checked at five temperatures, a late reading typed in, the uncertainty budget put right,
 * verdicts by two rules, the record frozen before it is mailed. Limits and sums are worked out here by hand.
 */
import { rmSync } from "node:fs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { CellValue } from "../../src/sheets";
import { openView, said, select } from "./setup/pane";
import { openSample } from "./setup/samples";
import { fileSheets, saveAs } from "./setup/saved-file";
import { closePage, openSheet, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";
import { openTab, typeInto } from "./setup/typing";

/**
 * Limits of type K in °C at the lot's reference temperatures, by IEC 60584-1:2013 as makers print it: class 1 is
 * 1.5 °C or 0.4 %, class 2 is 2.5 °C or 0.75 %, the larger one.
 */
const limits: Readonly<Record<number, readonly [first: number, second: number]>> = {
  199.6: [1.5, 2.5],
  400.3: [1.6012, 3.00225],
  600.8: [2.4032, 4.506],
  799.5: [3.198, 5.99625],
  998.7: [3.9948, 7.49025],
};

/** The reading of K-07 at 600.8 °C that was missing: 4.6 °C off, beyond 4.506 °C. */
const late = 605.4;

/**
 * The budget once the scatter of the mean is typed in as 0.05 °C: certificate 0.6 / 2; rectangles of 0.4, 0.5 and
 * 0.2; a step of 0.1; the scatter. Its degrees of freedom are so many that k is that of the normal distribution.
 */
const scatter = 0.05;
const combined = Math.sqrt(
  0.6 ** 2 / 4 + (0.4 ** 2 + 0.5 ** 2 + 0.2 ** 2) / 3 + 0.1 ** 2 / 12 + scatter ** 2,
);
/** Of its 0.9866 °C, rounded up to a tenth. */
const expanded = 1;

let sheet: WatchedPage;
beforeAll(async () => {
  sheet = await openSheet({ locale: "en-GB" });
});
afterAll(() => closePage(sheet));

const values = (range: string) => readValues(sheet.page, range);
const guarded = "'Lot check'!A20:G60";
const simple = "'Lot check'!K20:Q60";

interface Line {
  couple: CellValue;
  reference: number;
  reading: CellValue;
  error: CellValue;
  limit: CellValue;
  used: CellValue;
  verdict: CellValue;
}

async function lines(range: string): Promise<Line[]> {
  const [header, ...rows] = await values(range);
  return rows.map((row) => Object.fromEntries(header!.map((name, i) => [name, row[i]])) as unknown as Line);
}

/** Each line of a table against the readings of the lot and the limits above. */
async function expectJudged(range: string, toleranceClass: 1 | 2, guard: number): Promise<void> {
  const inputs = await values("'Lot check'!A8:I12");
  const found = await lines(range);
  expect(found).toHaveLength(40);
  const verdicts = found.map(({ reference, reading, error, limit, used, verdict }, i) => {
    const row = inputs[i % 5]!;
    expect([reference, reading]).toEqual([row[0], row[1 + Math.floor(i / 5)]]);
    const allowed = limits[reference]![toleranceClass - 1]!;
    const off = Math.abs(Number(reading) - reference);
    expect(limit).toBeCloseTo(allowed, 9);
    expect(Math.abs(Number(error))).toBeCloseTo(off, 9);
    expect(used).toBeCloseTo(off / allowed, 9);
    expect(verdict).toBe(off <= allowed - guard + 1e-9 ? "Pass" : "Fail");
    return verdict;
  });
  // Else the rule would not have been put to the test.
  expect(new Set(verdicts)).toEqual(new Set(["Pass", "Fail"]));
}

describe("the clerk's way from a lot to a frozen record", () => {
  beforeAll(() => openSample(sheet.page, "Tolerance check of a lot"));

  it("leaves a reading that was not taken without a verdict, and judges it once it is typed in", async () => {
    const { page } = sheet;
    const isLate = ({ couple, reference }: Line) => couple === "K-07" && reference === 600.8;
    expect((await lines(guarded)).find(isLate)).toMatchObject({ reading: "", error: "", verdict: "" });
    await openTab(page, "Lot check");
    await typeInto(page, "H10", late);
    await expect.poll(async () => (await lines(guarded)).find(isLate)?.verdict).toBe("Fail");
    const line = (await lines(guarded)).find(isLate);
    expect(line?.error).toBeCloseTo(4.6, 9);
    expect(line?.limit).toBeCloseTo(4.506, 9);
  });

  it("works out the budget anew when a line of it changes", async () => {
    const { page } = sheet;
    await openTab(page, "Budget");
    await typeInto(page, "B13", scatter);
    await expect.poll(async () => (await values("Budget!G23"))[0]![0]).toBeCloseTo(combined, 12);
    const [u, dof, probability, k, U] = (await values("Budget!G23:G27")).flat().map(Number);
    expect(dof).toBeCloseTo(combined ** 4 / (scatter ** 4 / 4), 3);
    expect(probability).toBeCloseTo(0.9545, 4);
    // JCGM 100, table G.2: k is 2.000 for 95.45 % and infinitely many degrees of freedom.
    expect(k).toBeCloseTo(2, 3);
    expect(U).toBeCloseTo(k! * u!, 12);
    const shares = (await values("Budget!I17:I22")).flat().map(Number);
    expect(shares.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
    expect((await values("'Lot check'!B16:B17")).flat()).toEqual([expanded, 2]);
  });

  it("judges the lot by class 2 with the uncertainty kept off the limits", () =>
    expectJudged(guarded, 2, expanded));

  it("judges it by class 1 without, in a table that is typed beside the first", async () => {
    const { page } = sheet;
    await openTab(page, "Lot check");
    await typeInto(
      page,
      "K20",
      '=BEAD.CHECKTABLE(A8:A12,IF(ISBLANK(B8:I12),"",B8:I12),"K",1,,"simple",B7:I7)',
    );
    await waitForValue(page, "'Lot check'!Q60", (value) => value === "Pass" || value === "Fail");
    await expectJudged(simple, 1, 0);
    expect((await lines(simple))[0]?.couple).toBe("K-01 °C");
  });

  describe("once the table and the budget are frozen", () => {
    let before: { guarded: CellValue[][]; budget: CellValue[][] };

    it("both say so in the pane", async () => {
      const { page } = sheet;
      before = { guarded: await values(guarded), budget: await values("Budget!A16:I27") };
      for (const [cell, words] of [
        ["'Lot check'!D30", "A20:G60"],
        ["Budget!C20", "A16:I27"],
      ] as const) {
        await select(page, cell);
        await openView(page, "Freeze");
        await expect.poll(() => page.locator(".freeze-what").textContent()).toContain(words);
        await page.getByRole("button", { name: "Freeze these results" }).click();
        await expect.poll(() => said(page)).toContain(`Frozen: ${words}`);
      }
    });

    it("its values stay as they were when a reading changes, and the typed table follows", async () => {
      const { page } = sheet;
      await openTab(page, "Lot check");
      await typeInto(page, "B8", 230);
      const first = async () => (await lines(simple))[0];
      await expect.poll(async () => (await first())?.verdict).toBe("Fail");
      expect((await first())?.error).toBeCloseTo(230 - 199.6, 9);
      expect(await values(guarded)).toEqual(before.guarded);
      await typeInto(page, "B8", 200);
      await expect.poll(async () => (await first())?.verdict).toBe("Pass");
    });

    it("has a trace of formula, arguments, version and publication for each", async () => {
      const traces = await Promise.all(
        ["'Frozen result'", "'Frozen result (2)'"].map(async (name) =>
          (await values(`${name}!A3:B30`)).map((row) => row.join(": ")).join("\n"),
        ),
      );
      for (const words of [
        "A20:G60",
        "=BEAD.CHECKTABLE(",
        "Argument rule",
        "Version: Beadline",
        "IEC 60584-1",
      ])
        expect(traces[0]).toContain(words);
      for (const words of ["A16:I27", "=BEAD.BUDGET(", "A8:F13 of the sheet Budget", "JCGM 100"])
        expect(traces[1]).toContain(words);
    });

    it("goes into the file as values without a formula, beside those that still calculate", async () => {
      const { name, path } = await saveAs(sheet.page, "Save workbook");
      expect(name).toBe("Tolerance check of a lot.xlsx");
      const saved = new Map((await fileSheets(path)).map((each) => [each.name, each.cells]));
      rmSync(path);
      const expectFrozen = (tab: string, [top, left]: [number, number], frozen: CellValue[][]) => {
        const cells = new Map(saved.get(tab)!.map((cell) => [`${cell.row},${cell.column}`, cell]));
        frozen.forEach((row, r) => {
          row.forEach((value, c) => {
            const cell = cells.get(`${top + r},${left + c}`);
            expect([cell?.formula, cell?.value ?? ""]).toEqual([undefined, value]);
          });
        });
      };
      expectFrozen("Lot check", [20, 1], before.guarded);
      expectFrozen("Budget", [16, 1], before.budget);
      const formulas = saved.get("Lot check")!.filter(({ formula }) => formula?.includes("CHECKTABLE"));
      expect(formulas.map(({ address, ref }) => [address, ref])).toEqual([["K20", "K20:Q60"]]);
      expect(
        saved.get("Frozen result")?.some(({ value }) => String(value).includes("=BEAD.CHECKTABLE(")),
      ).toBe(true);
    });
  });
});
