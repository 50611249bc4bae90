import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { closePage, openSheet, readValues, type WatchedPage, waitForValue } from "./setup/sheet-page";

let sheet: WatchedPage;
beforeEach(async () => {
  sheet = await openSheet();
});
afterEach(() => closePage(sheet));

const semicolons = [
  "# invented readings",
  "Zeit;CH1 mV;CH2 mV;terminal °C",
  "02.03.2026 06:00:00;4,096;8,138;0,0",
  "02.03.2026 06:00:30;;12,209;0,0",
  "02.03.2026 06:01:00;<b>fault</b>;16,397;0,0",
].join("\r\n");

const open = (text: string, name = "run 7.csv") =>
  sheet.page.locator("#log-file").setInputFiles({ name, mimeType: "text/csv", buffer: Buffer.from(text) });

describe("opening a log", () => {
  it("shows how a semicolon log with decimal commas was understood, then opens it", async () => {
    const { page } = sheet;
    await open(semicolons);
    const dialog = page.locator("#import");
    await dialog.locator("table").waitFor();
    expect(await dialog.locator("select[name=delimiter]").inputValue()).toBe(";");
    expect(await dialog.locator("select[name=decimal]").inputValue()).toBe(",");
    expect(await dialog.locator("select[name=dates]").inputValue()).toBe("dmy");
    expect(await dialog.textContent()).toContain("1 field among numbers");
    await dialog.getByRole("button", { name: "Open as a new sheet" }).click();
    const note = dialog.locator(".formula-note");
    await note.waitFor();
    expect(await note.locator("code").textContent()).toContain('IF(ISBLANK(B3:C5),"",B3:C5)');
    expect(await note.getByRole("button", { name: "Insert formula" }).isDisabled()).toBe(true);
    await note.locator("select").selectOption("K");
    await note.getByRole("button", { name: "Insert formula" }).click();
    await waitForValue(page, "'run 7'!F3", (value) => typeof value === "number");
    const rows = await readValues(page, "'run 7'!A2:G5");
    expect(rows[0]).toEqual(["Zeit", "CH1 mV", "CH2 mV", "terminal °C", "", "CH1 °C", "CH2 °C"]);
    expect(rows[1]).toEqual([46083.25, 4.096, 8.138, 0, "", expect.closeTo(100, 1), expect.closeTo(200, 1)]);
    expect(rows[2]?.slice(1)).toEqual(["", 12.209, 0, "", "", expect.closeTo(300, 1)]);
    expect(rows[3]?.slice(1)).toEqual(["<b>fault</b>", 16.397, 0, "", "#VALUE!", expect.closeTo(400, 1)]);
  });

  it("keeps decimal commas as text when the shown choice says point", async () => {
    const { page } = sheet;
    await open(semicolons);
    const dialog = page.locator("#import");
    await dialog.locator("select[name=decimal]").selectOption(".");
    await dialog.getByRole("button", { name: "Open as a new sheet" }).click();
    await dialog.getByText("is open").waitFor();
    expect((await readValues(page, "'run 7'!B3"))[0]).toEqual(["4,096"]);
  });

  it("shows markup in a file as text", async () => {
    const { page } = sheet;
    await open('name,CH1 mV\n<img src=x onerror="document.title=1">,1.5\n', "<i>x</i>.csv");
    await page.locator("#import table").waitFor();
    expect(await page.locator("#import table img, #import i").count()).toBe(0);
    expect(await page.locator("#import").textContent()).toContain("<img src=x");
  });

  it("takes a dropped file", async () => {
    const { page } = sheet;
    await page.evaluate((text) => {
      const data = new DataTransfer();
      data.items.add(new File([text], "dropped.csv"));
      for (const kind of ["dragover", "drop"]) {
        const target = document.querySelector("#grid canvas")!;
        target.dispatchEvent(new DragEvent(kind, { dataTransfer: data, bubbles: true, cancelable: true }));
      }
    }, semicolons);
    await page.locator("#import").getByText("Open dropped.csv").waitFor();
  });

  it.each([
    ["an empty file", "", "it is empty"],
    ["a picture", "GIF89a\0\0", "not a text file"],
  ])("refuses %s with a reason", async (_, text, reason) => {
    await open(text);
    const dialog = sheet.page.locator("#import");
    await dialog.getByText(reason).waitFor();
    await dialog.getByRole("button", { name: "Close" }).click();
    expect(await dialog.isVisible()).toBe(false);
  });
});
