import { afterAll, beforeAll, beforeEach, describe, expect, it } from "vitest";
import { addressOn } from "../../src/local-sheet/address";
import {
  closePage,
  goToCell,
  openSheet,
  readValues,
  type WatchedPage,
  waitForValue,
} from "./setup/sheet-page";

let sheet: WatchedPage;
let bench: string;
const on = (range: string) => addressOn(bench, range);

// One page for all, and an empty sheet of its own for each test.
beforeAll(async () => {
  sheet = await openSheet();
});
beforeEach(async () => {
  bench = await sheet.page.evaluate(async () => {
    const blank = { name: "Bench", columns: [], frozenRows: 0, printOnePageWide: true as const, cells: [] };
    return await window.beadlineSheet!.addSheet(blank);
  });
});
afterAll(() => closePage(sheet));

describe("typing into the local sheet", () => {
  it("spills the temperatures of a typed formula", async () => {
    const { page } = sheet;
    await goToCell(page, "A20");
    // Table values of type K, IEC 60584-1: 100 °C, 500 °C, 1000 °C.
    await page.keyboard.type('=BEAD.TEMPERATURE({4.096;20.644;41.276},"K",0)');
    await page.keyboard.press("Enter");
    await waitForValue(page, on("A22"), (value) => typeof value === "number");
    const [a, b, c] = (await readValues(page, on("A20:A22"))).flat() as number[];
    expect(a).toBeCloseTo(100, 1);
    expect(b).toBeCloseTo(500, 1);
    expect(c).toBeCloseTo(1000, 1);
    expect(await readValues(page, on("A23"))).toEqual([[""]]);
  });

  it("goes on beyond the end that the sheet has at first", async () => {
    const { page } = sheet;
    await goToCell(page, "BZ9000");
    await page.keyboard.type('=BEAD.TEMPERATURE(4.096,"K",0)');
    await page.keyboard.press("Enter");
    // 4.096 mV is the table value of type K at 100 °C, IEC 60584-1.
    const found = await waitForValue(page, on("BZ9000"), (value) => typeof value === "number");
    expect(found).toBeCloseTo(100, 1);
    expect(await readValues(page, on("A30000:B30000"))).toEqual([["", ""]]);
    await expect(readValues(page, on("A1048577"))).rejects.toThrow("1048576 rows");
    // A row that Excel has not: the selection stays, and closing the page fails on a script error.
    await goToCell(page, "B2");
    const nameBox = page.locator("#grid input").first();
    await nameBox.fill("A2000000");
    await nameBox.press("Enter");
    expect(await page.evaluate(() => window.beadlineSheet!.getSelection())).toMatch(/!B2$/);
    await goToCell(page, "A1");
  });

  it("offers the functions with their sentence after =BEAD. and their arguments after the bracket", async () => {
    const { page } = sheet;
    await goToCell(page, "A20");
    await page.keyboard.type("=BEAD.", { delay: 20 });
    const functions = await page.evaluate(
      async () => (await (await fetch("functions.json")).json()).functions,
    );
    const offered = page.locator("ul.univer-list-none > li", { hasText: "BEAD." });
    await expect.poll(() => offered.count()).toBe(functions.length);
    const words = (await offered.allTextContents()).join("\n");
    for (const { name, description } of functions) {
      expect(words).toContain(`BEAD.${name}`);
      expect(words).toContain(description);
    }
    await page.keyboard.type("EMF(", { delay: 20 });
    const signature = page.getByText("BEAD.EMF(", { exact: true }).locator("xpath=..");
    await signature.waitFor();
    const help = await signature.textContent();
    for (const { name } of functions.find((each: { name: string }) => each.name === "EMF").parameters) {
      expect(help).toContain(name);
    }
    // Left open on purpose: the next test's sheet is added while this cell is still being typed in.
  });

  it("says in words what is behind the error of the selected cell, also inside a spilled block", async () => {
    const { page } = sheet;
    await goToCell(page, "A20");
    await page.keyboard.type('=BEAD.TEMPERATURE({10;60},"K",25)');
    await page.keyboard.press("Enter");
    await waitForValue(page, on("A21"), (value) => value === "#N/A");
    await goToCell(page, "A21");
    const line = page.locator("#message");
    await expect.poll(() => line.textContent()).toMatch(/^A21#N\/A:.*60 mV.*above.*1372 °C/);
    await goToCell(page, "A20");
    await expect.poll(() => line.textContent()).not.toContain("#N/A");
  });

  it("explains the sheet's own errors too", async () => {
    const { page } = sheet;
    await goToCell(page, "A20");
    await page.keyboard.type("=BEAD.TEMPERATUR(1)");
    await page.keyboard.press("Enter");
    await waitForValue(page, on("A20"), (value) => value === "#NAME?");
    await goToCell(page, "A20");
    await expect.poll(() => page.locator("#message").textContent()).toContain("Check its spelling");
  });

  it("hands empty cells over as 0, as Excel does, unless the formula is blank-safe", async () => {
    const { page } = sheet;
    await page.evaluate(() => window.beadlineSheet!.setFormula("A20", '=BEAD.EMF(Z1:Z2,"K")'));
    await page.evaluate(() =>
      window.beadlineSheet!.setFormula("B20", '=BEAD.EMF(IF(ISBLANK(Z1:Z2),"",Z1:Z2),"K")'),
    );
    await waitForValue(page, on("A21"), (value) => value === 0);
    expect(await readValues(page, on("A20:B21"))).toEqual([
      [0, ""],
      [0, ""],
    ]);
  });

  it("calculates again when a reading changes, and passes an upstream error through to its own cell only", async () => {
    const { page } = sheet;
    await page.evaluate(() => window.beadlineSheet!.setFormula("C20", '=BEAD.EMF(A20:A22,"K")'));
    await goToCell(page, "A20");
    for (const text of ["100", "=1/0", "300"]) {
      await page.keyboard.type(text);
      await page.keyboard.press("Enter");
    }
    await waitForValue(page, on("C22"), (value) => Math.abs(Number(value) - 12.209) < 1e-3);
    const [first, second] = (await readValues(page, on("C20:C22"))).flat();
    expect(first).toBeCloseTo(4.096, 3);
    expect(second).toBe("#DIV/0!");
  });
});
