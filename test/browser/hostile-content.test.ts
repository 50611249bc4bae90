/** What cells, names and files hold is shown as text, wherever a page of ours shows it. */
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { formulas, handMade } from "../workbooks/hand-made";
import { hostileTexts, markupFound, watchMarkup } from "./setup/markup-watch";
import { buildFormula, openSheetWithPane, openView, paneOf, searchOf, select } from "./setup/pane";
import {
  closePage,
  goToCell,
  openPage,
  readValues,
  type WatchedPage,
  waitForValue,
} from "./setup/sheet-page";

let sheet: WatchedPage;
beforeEach(async () => {
  sheet = await openSheetWithPane();
  await watchMarkup(sheet.page);
});
afterEach(async () => {
  const found = await markupFound(sheet.page);
  await closePage(sheet);
  expect(found).toEqual({ found: [], ran: false });
});

const [image, script] = hostileTexts;
const quoted = (text: string) => `"${text.replaceAll('"', '""')}"`;

const openFile = (name: string, content: Buffer) =>
  sheet.page.locator("#log-file").setInputFiles({ name, mimeType: "", buffer: content });

async function openBook(bytes: Uint8Array): Promise<void> {
  await openFile("book.xlsx", Buffer.from(bytes));
  await expect.poll(() => sheet.page.locator("#sample-name").textContent()).toBe("book.xlsx");
}

const sheetName = "<img src=1 onerror=ran()>";

describe("a log that holds markup", () => {
  it("shows it as text in the dialog, in the grid and in the name of the sheet", async () => {
    const { page } = sheet;
    const rows = hostileTexts.map((text) => `${quoted(text)},1.5,20`);
    const log = [`# ${image}`, `${quoted(script)},${quoted(`${image} mV`)},terminal °C`, ...rows].join("\n");
    await openFile("<img src=x onerror=ran()>.csv", Buffer.from(log));
    const dialog = page.locator("#import");
    await dialog.locator("table").waitFor();
    for (const text of hostileTexts.slice(0, 3)) expect(await dialog.textContent()).toContain(text);
    await dialog.getByRole("button", { name: "Open as a new sheet" }).click();
    await dialog.locator(".formula-note select").selectOption("K");
    await dialog.getByRole("button", { name: "Insert formula" }).click();
    const name = "<img src=x onerror=ran()>";
    await waitForValue(page, `'${name}'!E3`, (value) => typeof value === "number");
    const values = await readValues(page, `'${name}'!A3:A9`);
    expect(values.flat()).toEqual([...hostileTexts]);
    expect(await page.locator("#grid").getByText(name).count()).toBeGreaterThan(0);
    await goToCell(page, "A3");
  });

  it("shows it as text where the file is refused", async () => {
    await openFile("<img src=x onerror=ran()>.csv", Buffer.from("GIF89a\0\0"));
    await sheet.page.locator("#import").getByText("<img src=x onerror=ran()>.csv was not opened").waitFor();
  });
});

describe("a workbook file that holds markup", () => {
  beforeEach(() =>
    openBook(
      handMade({
        sheetName,
        rows: `${hostileTexts.map((text) => `<row><c t="inlineStr"><is><t>${text.replaceAll("&", "&amp;").replaceAll("<", "&lt;")}</t></is></c></row>`).join("")}
          ${formulas([`_xldudf_BEAD_EMF(100,A1)`, `A1&"K"`, `_xldudf_BEAD_EMF({100;200},"K")`])}
          <row><c s="0"><v>5</v></c><c t="e"><v>&lt;img src="/stolen"></v></c></row>`,
        styles: `<numFmts><numFmt numFmtId="170" formatCode="&quot;&lt;img src=/stolen>&quot;0"/></numFmts><cellXfs><xf numFmtId="170"/></cellXfs>`,
      }),
    ),
  );

  it("shows it as text in the grid, in the tab of the sheet and in the editor of a cell", async () => {
    const { page } = sheet;
    const values = await readValues(page, `'${sheetName}'!A1:A7`);
    expect(values.flat()).toEqual([...hostileTexts]);
    expect(await page.locator("#grid").getByText(sheetName).count()).toBeGreaterThan(0);
    await goToCell(page, "A1");
    await page.keyboard.press("F2");
    await page.keyboard.press("Escape");
  });

  it("copies and pastes it as text", async () => {
    const { page } = sheet;
    await page.context().grantPermissions(["clipboard-read", "clipboard-write"]);
    await goToCell(page, "A1");
    await page.keyboard.press("Control+c");
    const copied = () =>
      page.evaluate(async () => {
        const [item] = await navigator.clipboard.read();
        const isMarkup = item?.types.includes("text/html") ?? false;
        return isMarkup ? (await item!.getType("text/html")).text() : "";
      });
    await expect.poll(copied).toContain("&lt;img");
    expect(await copied()).not.toContain("<img");
    await goToCell(page, "E1");
    await page.keyboard.press("Control+v");
    await waitForValue(page, `'${sheetName}'!E1`, (value) => value === image);
    // The engine takes its own markup apart, whose looks stand in attributes: the policy drops those, and says so.
    const dropped = sheet.faults.splice(0);
    expect(
      dropped.filter((fault) => !/style-src-attr inline|^console: Applying inline style/.test(fault)),
    ).toEqual([]);
  });

  it("shows it as text in the pane: the selected formula, its error, the form and the preview", async () => {
    const { page } = sheet;
    await waitForValue(page, `'${sheetName}'!A8`, (value) => value === "#N/A" || value === "#VALUE!");
    await select(page, `'${sheetName}'!A8`);
    await openView(page, "Formula");
    await expect.poll(() => page.locator(".explain .fault").textContent()).toContain("<img");
    await page.getByRole("button", { name: "Edit this formula" }).click();
    await expect.poll(() => page.locator(".place-words").textContent()).not.toBe("");
    await buildFormula(page, "EMF");
    await page.getByLabel(/^temperature/).fill(`{100;${quoted(image)}}`);
    await page.getByLabel(/^type/).selectOption("K");
    await page.getByLabel("Goes into").fill(`'${sheetName}'!H1`);
    await expect.poll(() => page.locator(".outcome").textContent()).toContain("<img");
    await page.getByRole("button", { name: "Insert formula" }).click();
    await waitForValue(page, `'${sheetName}'!H1`, (value) => Number(value) > 4);
    await openView(page, "Find");
    await page.getByRole("button", { name: "All functions" }).click();
    await searchOf(page).fill(image);
    await expect.poll(() => page.getByRole("option").count()).toBeLessThan(60);
  });

  it("shows it as text in a record that is frozen, in its trace and on its way back", async () => {
    const { page } = sheet;
    await waitForValue(page, `'${sheetName}'!C8`, (value) => typeof value === "number");
    await page.evaluate(
      (formula) => window.beadlineSheet!.setFormula("J1", formula),
      `=BEAD.EMF({100;200},MID(${quoted(`K${image}`)},1,1))`,
    );
    await waitForValue(page, `'${sheetName}'!J2`, (value) => typeof value === "number");
    await select(page, `'${sheetName}'!J1`);
    await openView(page, "Freeze");
    await expect.poll(() => page.locator(".freeze-what").textContent()).toContain(sheetName);
    await page.getByRole("button", { name: "Freeze these results" }).click();
    await page.getByRole("button", { name: /^Undo/ }).waitFor();
    const trace = (await readValues(page, "'Frozen result'!A3:B12")).flat().join("\n");
    expect(trace).toContain(image.replaceAll('"', '""'));
    await page.emulateMedia({ media: "print" });
    await page.emulateMedia({ media: "screen" });
    await page.getByRole("button", { name: /^Undo/ }).click();
    await waitForValue(page, `'${sheetName}'!J2`, (value) => typeof value === "number");
  });

  it("shows it as text in a picture of a survey", async () => {
    const { page } = sheet;
    await openView(page, "Pictures");
    await page.getByRole("textbox", { name: "Times" }).fill(`'${sheetName}'!A1:A3`);
    await page.getByRole("textbox", { name: "Readings, °C" }).fill(image);
    await page.getByRole("textbox", { name: "Set point, °C" }).fill("100");
    await page.getByRole("textbox", { name: /^Tolerance ±/ }).fill("5");
    await page.getByRole("button", { name: "Draw the survey" }).click();
    await expect.poll(() => paneOf(page).locator(".said").textContent()).not.toBe("");
  });
});

describe("what is pasted into the grid", () => {
  it("is taken apart without being run or loaded", async () => {
    const { page } = sheet;
    await page.context().grantPermissions(["clipboard-read", "clipboard-write"]);
    await goToCell(page, "P20");
    await page.evaluate(async (markup) => {
      const html = `<table><tr><td>${markup}before</td><td>7</td></tr></table>`;
      const item = new ClipboardItem({
        "text/html": new Blob([html], { type: "text/html" }),
        "text/plain": new Blob(["before\t7"], { type: "text/plain" }),
      });
      await navigator.clipboard.write([item]);
    }, hostileTexts.slice(0, 5).join(""));
    await page.keyboard.press("Control+v");
    await waitForValue(page, "'Furnace log'!Q20", (value) => value === 7 || value === "7");
  });
});

it("the watch itself sees an element that comes and goes, a handler, and a request", async () => {
  const watched = await openPage("taskpane.html", { office: "absent" });
  const { page } = watched;
  await watchMarkup(page);
  await page.evaluate(() => {
    const frame = document.createElement("iframe");
    document.body.append(frame);
    frame.remove();
    document.body.setAttribute("onload", "1");
    new Image().src = "/stolen";
  });
  await expect
    .poll(async () => (await markupFound(page)).found.join("\n"))
    .toMatch(/iframe[\s\S]*onload[\s\S]*\/stolen/);
  await page.context().close();
});
