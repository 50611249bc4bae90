import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { JOBS } from "../../src/sheets/jobs";
import { openSheetWithPane, openView, said, select } from "./setup/pane";
import { closePage, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";

let sheet: WatchedPage;
beforeEach(async () => {
  sheet = await openSheetWithPane();
});
afterEach(() => closePage(sheet));

/** A cell of each job whose value shows that its formulas work, and what it then holds. */
const RESULTS: Readonly<Record<string, readonly [string, RegExp]>> = {
  "Correct a log": ["F17", /^821\.\d/],
  "Tolerance check": ["M11", /^Pass$/],
  "Uncertainty budget": ["B21", /^1\.\d/],
  "Survey summary": ["I7", /^Pass$/],
};

describe("starting a sheet", () => {
  it.each(JOBS.map((job) => [job.name, job] as const))(
    "%s: written with example data, which one button removes and Undo brings back",
    async (name, job) => {
      const { page } = sheet;
      const [cell, expected] = RESULTS[name]!;
      await openView(page, "Sheets");
      await page.getByRole("button", { name: `Start this sheet: ${name}` }).click();
      const on = (range: string) => `'${job.sheet.name}'!${range}`;
      await waitForValue(page, on(cell), (value) => expected.test(String(value)));
      const texts = (await readValues(page, on("A1:M60"))).flat();
      // Where the examples leave a fault on purpose the sheet would teach it: there is none.
      expect(texts.filter((value) => /^#(VALUE|NAME|REF|SPILL)/.test(String(value)))).toEqual([]);
      expect((await readValues(page, on("A2")))[0]![0]).toContain("EXAMPLE DATA, invented");
      await page.getByRole("button", { name: "Remove the example data" }).click();
      await expect.poll(() => said(page)).toContain("removed");
      for (const range of job.examples) {
        const firstRows = range.replace(/\d+$/, (last) => String(Math.min(Number(last), 60)));
        expect((await readValues(page, on(firstRows))).flat().filter((value) => value !== "")).toEqual([]);
      }
      await page.getByRole("button", { name: /^Undo/ }).click();
      await waitForValue(page, on(cell), (value) => expected.test(String(value)));
      await page.getByRole("button", { name: /^Undo/ }).click();
      await expect
        .poll(() => page.locator("#grid").getByText(job.sheet.name, { exact: true }).count())
        .toBe(0);
    },
  );
});

it("forgets what it wrote when another workbook is opened in its place", async () => {
  const { page } = sheet;
  await openView(page, "Sheets");
  await page.getByRole("button", { name: "Start this sheet: Uncertainty budget" }).click();
  await page.getByRole("button", { name: /^Undo/ }).waitFor();
  await page.getByRole("button", { name: "Samples" }).click();
  await page.locator(".sample-choice").nth(1).click();
  await page.getByRole("button", { name: /^Close them/ }).click();
  await expect.poll(() => page.getByRole("button", { name: /^Undo/ }).count()).toBe(0);
  expect(await page.locator(".opened-job").count()).toBe(0);
});

describe("freezing a record", () => {
  const block = "'Furnace log'!H8:K2007";

  it.each([
    ["on a sheet of its own", "'Frozen result'!A3:B20"],
    ["beside the results", "'Furnace log'!M8:N25"],
  ])("turns the whole spill into values with a trace %s, and back", async (where, trace) => {
    const { page } = sheet;
    const before = await readValues(page, block);
    await select(page, "'Furnace log'!J100");
    await openView(page, "Freeze");
    await expect.poll(() => page.locator(".freeze-what").textContent()).toContain("H8:K2007");
    await page.getByRole("radio", { name: where }).check();
    await page.getByRole("button", { name: "Freeze these results" }).click();
    await expect.poll(() => said(page)).toContain("Frozen: H8:K2007");
    const frozen = await readValues(page, block);
    expect(frozen).toEqual(before);
    const lines = (await readValues(page, trace)).map((row) => row.join(": ")).join("\n");
    for (const words of [
      "H8:K2007",
      "=BEAD.TEMPERATURE(",
      "Argument emf: B8:E2007",
      "Version: Beadline",
      "IEC 60584-1",
    ]) {
      expect(lines).toContain(words);
    }
    // The formula is gone: a changed reading changes nothing.
    await page.evaluate(() => window.beadlineSheet!.setFormula("'Furnace log'!B8", "=5"));
    await waitForValue(page, "'Furnace log'!B8", (value) => value === 5);
    expect((await readValues(page, "'Furnace log'!H8"))[0]![0]).toBe(before[0]![0]);
    await page.getByRole("button", { name: /^Undo/ }).click();
    await waitForValue(page, "'Furnace log'!H8", (value) => Number(value) > 100);
    await waitForValue(page, "'Furnace log'!K2007", (value) => value === before.at(-1)!.at(-1));
    if (trace.startsWith("'Furnace")) expect((await readValues(page, trace)).flat().join("")).toBe("");
  });

  it("puts the trace behind everything, a typed formula's results included", async () => {
    const { page } = sheet;
    await page.evaluate(async () => {
      const name = "Typed";
      await window.beadlineSheet!.addSheet({
        name,
        columns: [],
        frozenRows: 0,
        printOnePageWide: true,
        cells: [],
      });
      await window.beadlineSheet!.setFormula("A1", '=BEAD.EMF({100;200},"K")');
      await window.beadlineSheet!.setFormula("C1", '=BEAD.EMF({100,200,300,400},"K")');
    });
    await waitForValue(page, "Typed!F1", (value) => typeof value === "number");
    const others = await readValues(page, "Typed!C1:F2");
    await select(page, "Typed!A1");
    await openView(page, "Freeze");
    await page.getByRole("radio", { name: "beside the results" }).check();
    await page.getByRole("button", { name: "Freeze these results" }).click();
    await expect.poll(() => said(page)).toContain("in H1:I");
    expect(await readValues(page, "Typed!C1:F2")).toEqual(others);
    expect((await readValues(page, "Typed!H1"))[0]![0]).toBe("Frozen result");
  });

  it("says what to do where nothing is to be frozen", async () => {
    const { page } = sheet;
    await select(page, "'Furnace log'!B8");
    await openView(page, "Freeze");
    await page.getByRole("button", { name: "Freeze these results" }).click();
    await expect.poll(() => said(page)).toContain("Select a cell with a result");
  });
});

describe("looking", () => {
  it("brings the plotting library only with the first picture", async () => {
    const { page } = sheet;
    const asked: string[] = [];
    page.on("request", (request) => asked.push(request.url()));
    await openView(page, "Formula");
    expect(asked.filter((url) => url.includes("picture"))).toEqual([]);
    await openView(page, "Pictures");
    await page.locator(".plot canvas").first().waitFor();
    expect(asked.filter((url) => url.includes("picture.js"))).toHaveLength(1);
  });

  it("states the finding, and gives the same numbers in a table", async () => {
    const { page } = sheet;
    await openView(page, "Pictures");
    const figure = page.locator(".picture").first();
    await expect.poll(() => figure.locator("figcaption").textContent()).toContain("Type K reaches 54.8864");
    await page.getByLabel("Over temperature").selectOption("tolerance");
    await expect
      .poll(() => figure.locator("figcaption").textContent())
      .toContain("Class 2 of type K allows ±9.00");
    await page.getByRole("checkbox", { name: "S", exact: true }).check();
    await page.getByLabel("Over temperature").selectOption("sensitivity");
    await figure.getByText("The numbers as a table").click();
    expect(await figure.locator("thead th").allTextContents()).toEqual(["temperature, °C", "K", "S"]);
    expect(await figure.locator("tbody tr").count()).toBeGreaterThan(20);
    await page.context().grantPermissions(["clipboard-write", "clipboard-read"]);
    await figure.getByRole("button", { name: "Copy as image" }).click();
    await expect.poll(() => said(page)).toMatch(/clipboard/);
  });

  it("draws the survey that the selected formula uses, with the worst sensor named", async () => {
    const { page } = sheet;
    await openView(page, "Sheets");
    await page.getByRole("button", { name: "Start this sheet: Survey summary" }).click();
    await waitForValue(page, "Survey!I7", (value) => value === "Pass");
    await select(page, "Survey!I7");
    await openView(page, "Pictures");
    await page.getByRole("button", { name: "Take from the selected formula" }).click();
    const figure = page.locator(".survey .picture");
    await expect
      .poll(() => figure.locator("figcaption").textContent())
      .toMatch(/^S\d reaches [+−]\d\.\d.°C at \d\d:\d\d/);
    await figure.locator("canvas").waitFor();
    expect(await figure.locator("tbody tr").count()).toBeGreaterThanOrEqual(5);
    const [lowest] = (await readValues(page, "Survey!I12")).flat();
    expect(await figure.locator("figcaption").textContent()).toContain(Math.abs(Number(lowest)).toFixed(1));
  });
});
