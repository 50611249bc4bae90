import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { chooseSample, openSample } from "./setup/samples";
import {
  closePage,
  goToCell,
  openSheet,
  readValues,
  type WatchedPage,
  waitForValue,
} from "./setup/sheet-page";

let sheet: WatchedPage;
beforeEach(async () => {
  sheet = await openSheet();
});
afterEach(() => closePage(sheet));

const dialog = () => sheet.page.locator("#samples");
const tabs = () => sheet.page.locator("[data-u-comp=slide-tab-item]").allTextContents();

describe("the menu of samples", () => {
  it("names each sample with its sentence and says that it is invented", async () => {
    await sheet.page.getByRole("button", { name: "Samples" }).click();
    const items = await dialog().locator(".sample-choice").allTextContents();
    expect(items).toHaveLength(5);
    for (const item of items) expect(item).toMatch(/[a-z].*\..*invented data/);
    expect(await dialog().locator("[aria-current=true]").textContent()).toContain("Furnace log");
  });

  it("is worked by the keyboard alone, and Escape leaves everything as it was", async () => {
    const { page } = sheet;
    await page.locator("#open-samples").focus();
    await page.keyboard.press("Enter");
    await dialog().waitFor();
    await page.keyboard.press("Escape");
    await dialog().waitFor({ state: "hidden" });
    expect(await page.locator("#sample-name").textContent()).toContain("Furnace log");
    await page.keyboard.press("Enter");
    await page.keyboard.press("Tab");
    await page.keyboard.press("Enter");
    await waitForValue(page, "Certificate!E8", (value) => typeof value === "number");
    expect(await page.locator("#sample-name").textContent()).toBe("Certificate and repairs · invented data");
  });

  it("opens each sample as sheets of its own in place of the open ones", async () => {
    const { page } = sheet;
    expect(await tabs()).toEqual(["Furnace log", "Try it"]);
    await openSample(page, "Uniformity survey");
    expect(await tabs()).toEqual(["Survey", "Survey log", "Try it"]);
    await openSample(page, "Furnace log");
    expect(await tabs()).toEqual(["Furnace log", "Try it"]);
  });

  it("asks before it closes a sheet that was edited, and keeps it when told so", async () => {
    const { page } = sheet;
    await goToCell(page, "M20");
    await page.keyboard.type("mine");
    await page.keyboard.press("Enter");
    await chooseSample(page, "Steriliser load");
    await dialog().getByText("Close your sheets?").waitFor();
    await dialog().getByRole("button", { name: "Keep my sheets" }).click();
    expect(await readValues(page, "'Furnace log'!M20")).toEqual([["mine"]]);
    await chooseSample(page, "Steriliser load");
    await dialog().getByRole("button", { name: "Close them and open the sample" }).click();
    await waitForValue(page, "'F values'!B14", (value) => typeof value === "number");
    // What is open now is a sample again: no question.
    await openSample(page, "Furnace log");
    expect(await readValues(page, "'Furnace log'!M20")).toEqual([[""]]);
  });

  it("asks before it closes a log that was opened, and counts a cell that is still being typed in", async () => {
    const { page } = sheet;
    await page.locator("#log-file").setInputFiles({
      name: "run 7.csv",
      mimeType: "text/csv",
      buffer: Buffer.from("time,CH1 mV\n2026-03-02 06:00:00,1.5\n"),
    });
    await page.getByRole("button", { name: "Open as a new sheet" }).click();
    await page.getByRole("button", { name: "Go to the sheet" }).click();
    await chooseSample(page, "Steriliser load");
    await dialog().getByRole("button", { name: "Close them and open the sample" }).click();
    await waitForValue(page, "'F values'!B14", (value) => typeof value === "number");
    await goToCell(page, "K20");
    await page.keyboard.type("half");
    await chooseSample(page, "Furnace log");
    await dialog().getByText("Close your sheets?").waitFor();
    await dialog().getByRole("button", { name: "Keep my sheets" }).click();
    expect(await readValues(page, "'F values'!K20")).toEqual([["half"]]);
  });

  it("says what went wrong where a sample cannot be read, and leaves the sheets open", async () => {
    const { page, faults } = sheet;
    await page.route("**/samples/steriliser-load.json", (route) => route.fulfill({ status: 404 }));
    await chooseSample(page, "Steriliser load");
    await dialog().getByText("Your sheets are still open").waitFor();
    await dialog().getByRole("button", { name: "Close" }).click();
    expect(await tabs()).toEqual(["Furnace log", "Try it"]);
    // The browser's own word on the missing file.
    faults.splice(0, faults.length, ...faults.filter((fault) => !fault.includes("404")));
  });
});

it("hands the empty text of a result on as a text, as Excel does, and not as 0", async () => {
  const { page } = sheet;
  await goToCell(page, "M8");
  await page.keyboard.type('=BEAD.EMF(H428,"K")');
  await page.keyboard.press("Enter");
  await page.keyboard.type('=BEAD.EMF(H8,"K")');
  await page.keyboard.press("Enter");
  await waitForValue(page, "M9", (value) => typeof value === "number");
  expect(await readValues(page, "H428")).toEqual([[""]]);
  expect(await readValues(page, "M8")).toEqual([[""]]);
});
