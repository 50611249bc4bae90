import type { Page } from "playwright-core";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { mostCells } from "../../src/local-sheet/print/printed-sheet";
import { accessFaults } from "./setup/access";
import { openView } from "./setup/pane";
import { openSample } from "./setup/samples";
import { closePage, goToCell, openSheet, type WatchedPage, waitForValue } from "./setup/sheet-page";

let sheet: WatchedPage;
beforeEach(async () => {
  sheet = await openSheet({ locale: "en-GB" });
});
afterEach(() => closePage(sheet));

const view = () => sheet.page.locator("#print-view");
const openPrintView = async () => {
  await sheet.page.getByRole("button", { name: "Print", exact: true }).click();
  await view().locator("table").waitFor();
};
const timesPrinted = (page: Page) => page.evaluate(() => (window as unknown as { printed: number }).printed);

/** Pages of a PDF with their size in points, by their own entries. */
function pagesOf(pdf: Buffer): { width: number; height: number }[] {
  const text = pdf.toString("latin1");
  return [...text.matchAll(/\/Type \/Page\b[\s\S]*?\/MediaBox \[0 0 ([\d.]+) ([\d.]+)\]/g)].map(
    ([, width, height]) => ({ width: Number(width), height: Number(height) }),
  );
}

describe("the print view", () => {
  it("opens by Ctrl+P from the grid and from the pane, prints by a second one, closes by Escape", async () => {
    const { page } = sheet;
    await page.evaluate(() => {
      Object.assign(window, { printed: 0 });
      window.print = () => {
        (window as unknown as { printed: number }).printed++;
      };
    });
    await goToCell(page, "B9");
    await page.keyboard.press("Control+p");
    await view().locator("table").waitFor();
    expect(await timesPrinted(page)).toBe(0);
    await page.keyboard.press("Control+p");
    expect(await timesPrinted(page)).toBe(1);
    await view().getByRole("button", { name: "Print", exact: true }).click();
    expect(await timesPrinted(page)).toBe(2);
    await page.keyboard.press("Escape");
    expect(await view().isVisible()).toBe(false);
    await page.getByRole("combobox", { name: "What do you want to do?" }).focus();
    await page.keyboard.press("Control+p");
    await view().locator("table").waitFor();
    await page.keyboard.press("Escape");
    expect(await page.evaluate(() => document.activeElement?.getAttribute("role"))).toBe("combobox");
  });

  it("takes over what is being typed, and keeps the keyboard off the grid behind it", async () => {
    const { page } = sheet;
    await goToCell(page, "M9");
    await page.keyboard.type("typed just now");
    await openPrintView();
    expect(await view().locator("tbody").textContent()).toContain("typed just now");
    await page.keyboard.type("x");
    await page.keyboard.press("Tab");
    expect(await page.evaluate(() => document.activeElement?.closest("#print-view") !== null)).toBe(true);
    await view().getByRole("button", { name: "Close", exact: true }).click();
    expect(await page.evaluate(() => window.beadlineSheet!.getText("M9"))).toBe("typed just now");
  });

  it("prints a long log upright over many pages, and the grid is there again afterwards", async () => {
    const { page } = sheet;
    await openPrintView();
    const pages = pagesOf(await page.pdf({ format: "A4", preferCSSPageSize: true }));
    // 2000 rows, of which a page holds some fifty.
    expect(pages.length).toBeGreaterThan(25);
    expect(pages.length).toBeLessThan(60);
    for (const { width, height } of pages) expect(height).toBeGreaterThan(width);
    await view().getByRole("button", { name: "Close", exact: true }).click();
    await goToCell(page, "H8");
    const canvas = await page.locator("#grid canvas").first().boundingBox();
    expect(canvas?.width).toBeGreaterThan(300);
  });

  it("turns the page for a wide sheet", async () => {
    await openSample(sheet.page, "Uniformity survey");
    await openPrintView();
    const pages = pagesOf(await sheet.page.pdf({ format: "A4", preferCSSPageSize: true }));
    expect(pages).toHaveLength(1);
    expect(pages[0]!.width).toBeGreaterThan(pages[0]!.height);
    // Nothing reaches past the paper's edge.
    const past = await view()
      .locator("article")
      .evaluate((paper) => {
        const edge = paper.getBoundingClientRect().right;
        return [...paper.querySelectorAll("td, th, p")].filter(
          (each) => each.getBoundingClientRect().right > edge,
        ).length;
      });
    expect(past).toBe(0);
  });

  it("is made for the browser's own print command, and is gone afterwards", async () => {
    const { page } = sheet;
    const printed = await page.evaluate(() => {
      dispatchEvent(new Event("beforeprint"));
      const rows = document.querySelectorAll("#print-view tbody tr").length;
      dispatchEvent(new Event("afterprint"));
      return rows;
    });
    expect(printed).toBe(2000);
    expect(await view().isVisible()).toBe(false);
    expect(pagesOf(await page.pdf()).length).toBeGreaterThan(25);
  });

  it("prints as much of a very long sheet as a page can lay out, and says so", async () => {
    const { page } = sheet;
    const rows = 60_000;
    await page.evaluate(async (count) => {
      await window.beadlineSheet!.addSheet({
        name: "Long",
        columns: [{ width: 80 }],
        frozenRows: 0,
        printOnePageWide: true,
        cells: [],
        readings: { row: 0, column: 0, rows: Array.from({ length: count }, (_, i) => [i]) },
      });
    }, rows);
    await waitForValue(page, `Long!A${rows}`, (value) => value === rows - 1);
    await openPrintView();
    expect(await view().locator("tbody tr").count()).toBe(mostCells);
    expect(await view().locator(".print-left-out").textContent()).toContain(
      `the first ${mostCells} of ${rows} rows`,
    );
  });

  it("says that an empty sheet is empty", async () => {
    const { page } = sheet;
    await page.locator("[data-u-comp=sheet-bar-append-button]").first().click();
    await page.getByRole("button", { name: "Print", exact: true }).click();
    await view().getByText("The sheet is empty.").waitFor();
  });

  it.each([
    ["light", { colorScheme: "light" }],
    ["dark", { colorScheme: "dark" }],
    ["forced colours", { forcedColors: "active" }],
  ] as const)("has no fault of access in %s, and light paper", async (name, media) => {
    const { page } = sheet;
    await page.emulateMedia(media);
    await openSample(page, "Uniformity survey");
    await openView(page, "Pictures");
    await page.locator(".plot canvas").first().waitFor();
    await openPrintView();
    await view().locator(".print-tick").waitFor();
    expect(await accessFaults(page, "#print-view")).toEqual([]);
    if (name === "forced colours") return;
    const paper = view().locator("article");
    expect(await paper.evaluate((each) => getComputedStyle(each).backgroundColor)).toBe("rgb(255, 255, 255)");
    expect(await paper.evaluate((each) => getComputedStyle(each).color)).toBe("rgb(36, 38, 43)");
  });
});
