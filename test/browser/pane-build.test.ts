import { afterEach, beforeEach, describe, expect, it } from "vitest";
import {
  buildFormula,
  fillFromSelection,
  openSheetWithPane,
  openView,
  said,
  searchOf,
  select,
} from "./setup/pane";
import { closePage, goToCell, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";

let sheet: WatchedPage;
beforeEach(async () => {
  sheet = await openSheetWithPane();
});
afterEach(() => closePage(sheet));

const place = () => sheet.page.locator(".place-words").textContent();

describe("the way from millivolts and terminal temperatures to a corrected column", () => {
  it("is a handful of clicks by mouse", async () => {
    const { page } = sheet;
    await searchOf(page).fill("millivolts cold junction");
    await page.getByRole("option").first().click();
    await page.getByRole("button", { name: "Build this formula" }).click();
    // The first reading is selected in the grid; the rest of the column is one more press.
    await goToCell(page, "B8");
    await fillFromSelection(page, "emf");
    await page.getByLabel(/^type/).selectOption("K");
    await goToCell(page, "F8");
    await fillFromSelection(page, "referenceTemperature");
    await expect.poll(place).toContain("Fills M8:M2007, 2000 × 1 cells; the space is free.");
    await page.getByRole("button", { name: "Insert formula" }).click();
    await waitForValue(page, "'Furnace log'!M2007", (value) => typeof value === "number");
    const [same, inserted] = [
      await readValues(page, "'Furnace log'!H8:H2007"),
      await readValues(page, "'Furnace log'!M8:M2007"),
    ];
    expect(inserted).toEqual(same);
    expect(await said(page)).toContain("Inserted in M8");
  });

  it("is open to the keyboard alone", async () => {
    const { page } = sheet;
    await searchOf(page).focus();
    await page.keyboard.type("mv to deg cjc");
    await page.keyboard.press("Enter");
    await page.keyboard.press("Tab");
    expect(await page.evaluate(() => document.activeElement?.textContent)).toBe("Build this formula");
    await page.keyboard.press("Enter");
    await expect.poll(() => page.evaluate(() => document.activeElement?.getAttribute("name"))).toBe("emf");
    await page.keyboard.type("B8:E2007");
    await page.keyboard.press("Tab");
    await page.keyboard.press("Tab");
    await page.keyboard.type("K");
    await page.keyboard.press("Tab");
    await page.keyboard.press("Tab");
    await page.keyboard.type("F8:F2007");
    await expect.poll(place).toContain("the space is free");
    const insert = page.getByRole("button", { name: "Insert formula" });
    for (
      let tabs = 0;
      tabs < 15 && !(await insert.evaluate((each) => each === document.activeElement));
      tabs++
    ) {
      await page.keyboard.press("Tab");
    }
    await page.keyboard.press("Enter");
    await waitForValue(page, "'Furnace log'!P2007", (value) => typeof value === "number");
    expect(await readValues(page, "'Furnace log'!M8:P2007")).toEqual(
      await readValues(page, "'Furnace log'!H8:K2007"),
    );
  });
});

describe("building a formula", () => {
  it("shows what is still missing, and the function's own error before anything is written", async () => {
    const { page } = sheet;
    await buildFormula(page, "TEMPERATURE");
    await expect
      .poll(() => page.locator(".outcome").textContent())
      .toContain("Still to fill in: emf, type, referenceTemperature");
    await page.getByLabel(/^emf/).fill("100");
    await page.getByLabel(/^type/).selectOption("K");
    await page.getByLabel(/^referenceTemperature/).fill("0");
    await expect.poll(() => page.locator(".outcome").textContent()).toContain("above the limit of type K");
    await page.getByLabel(/^emf/).fill("4,096");
    await expect
      .poll(() => page.locator(".outcome").textContent())
      .toContain("Write numbers with a point here: 4.096");
  });

  it("keeps empty cells empty, with the reason beside it, and can leave that out", async () => {
    const { page } = sheet;
    await buildFormula(page, "EMF");
    await page.getByLabel(/^temperature/).fill("H8:H20");
    await page.getByLabel(/^type/).selectOption("K");
    const formula = page.locator(".outcome .formula");
    await expect.poll(() => formula.textContent()).toBe('=BEAD.EMF(IF(ISBLANK(H8:H20),"",H8:H20),"K")');
    const blanks = page.getByRole("checkbox", { name: /Keep empty cells empty/ });
    expect(await page.locator(".tick", { has: blanks }).textContent()).toContain("as 0");
    await blanks.uncheck();
    await expect.poll(() => formula.textContent()).toBe('=BEAD.EMF(H8:H20,"K")');
  });

  it("does not overwrite without consent, and takes back what it wrote", async () => {
    const { page } = sheet;
    await buildFormula(page, "EMF");
    await page.getByLabel(/^temperature/).fill("{100;200}");
    await page.getByLabel(/^type/).selectOption("K");
    await page.getByLabel("Goes into").fill("'Furnace log'!B8");
    await expect.poll(place).toContain("Not free: 2 cells are in use");
    await page.getByRole("button", { name: "Insert formula" }).click();
    expect(await page.locator(".questions").textContent()).toContain("B8:B9 is not free");
    const before = await readValues(page, "'Furnace log'!B8:B9");
    await page.getByRole("button", { name: "Overwrite them" }).click();
    await waitForValue(page, "'Furnace log'!B9", (value) => Number(value) > 8);
    await page.getByRole("button", { name: /^Undo/ }).click();
    await waitForValue(page, "'Furnace log'!B9", (value) => value === before[1]![0]);
    expect(await readValues(page, "'Furnace log'!B8:B9")).toEqual(before);
    expect(await said(page)).toContain("Taken back");
  });

  it("can go beside the data instead, in the number format of its kind", async () => {
    const { page } = sheet;
    await buildFormula(page, "EMF");
    await page.getByLabel(/^temperature/).fill("{100;200}");
    await page.getByLabel(/^type/).selectOption("K");
    await page.getByLabel("Goes into").fill("'Furnace log'!B8");
    await expect.poll(place).toContain("Not free");
    await page.getByRole("button", { name: "Insert formula" }).click();
    await page.getByRole("button", { name: "Put it beside the data" }).click();
    await waitForValue(page, "'Furnace log'!M9", (value) => Number(value) > 8);
    expect(await page.evaluate(() => window.beadlineSheet!.getText("M8"))).toBe("4.0962");
  });

  it("writes one formula in each row where nothing may spill", async () => {
    const { page } = sheet;
    await buildFormula(page, "TEMPERATURE");
    await page.getByLabel(/^emf/).fill("B8:C9");
    await page.getByLabel(/^type/).selectOption("K");
    await page.getByLabel(/^referenceTemperature/).fill("F8:F9");
    await page.getByRole("checkbox", { name: /One formula in each row/ }).check();
    await expect.poll(place).toContain("the space is free");
    await page.getByRole("button", { name: "Insert formula" }).click();
    await waitForValue(page, "'Furnace log'!N9", (value) => typeof value === "number");
    await select(page, "'Furnace log'!N9");
    await expect
      .poll(() => page.locator(".explain .formula").textContent())
      .toBe('=BEAD.TEMPERATURE(IF(ISBLANK(C9),"",C9),"K",IF(ISBLANK(F9),"",F9))');
  });
});

describe("explaining a cell", () => {
  it("says what the formula behind a result does, also inside a spilled block, and opens it for editing", async () => {
    const { page } = sheet;
    await select(page, "'Furnace log'!I10");
    await openView(page, "Formula");
    const card = page.locator(".explain");
    await expect.poll(() => card.textContent()).toContain("I10, from the formula in H8");
    await page.getByRole("button", { name: "Edit the formula in H8" }).click();
    expect(await page.getByLabel(/^emf/).inputValue()).toBe("B8:E2007");
    expect(await page.getByLabel(/^type/).inputValue()).toBe("K");
    await page.getByLabel(/^type/).selectOption("N");
    await expect.poll(place).toContain("the space is free");
    const before = (await readValues(page, "'Furnace log'!K2007"))[0]![0];
    await page.getByRole("button", { name: "Insert formula" }).click();
    await waitForValue(page, "'Furnace log'!K2007", (value) => typeof value === "number" && value !== before);
  });

  it("puts an error into words", async () => {
    const { page } = sheet;
    await page.evaluate(() => window.beadlineSheet!.setFormula("M8", '=BEAD.TEMPERATURE(99,"K",0)'));
    await waitForValue(page, "'Furnace log'!M8", (value) => value === "#N/A");
    await select(page, "'Furnace log'!M8");
    await openView(page, "Formula");
    await expect
      .poll(() => page.locator(".explain .fault").textContent())
      .toMatch(/#N\/A: .*above the limit of type K/);
  });
});
