import type { Page } from "playwright-core";
import { describe, expect, it } from "vitest";
import { accessFaults } from "./setup/access";
import { openPane, openSheetWithPane, openView, searchOf, select } from "./setup/pane";
import { closePage, type PageOptions } from "./setup/sheet-page";

const THEMES: readonly (readonly [string, PageOptions])[] = [
  ["light", { colorScheme: "light" }],
  ["dark", { colorScheme: "dark" }],
  ["forced colours", { forcedColors: "active" }],
];

const VIEWS = ["Find", "Formula", "Pictures", "Sheets", "Freeze"];

const faultsOf = (page: Page) => accessFaults(page, ".pane");

describe.each(THEMES)("the pane in %s", (_, theme) => {
  it.each([320, 480, 800])("has no fault of access in any view, %i px wide", async (width) => {
    const pane = await openPane({ ...theme, viewport: { width, height: 800 } });
    const { page } = pane;
    for (const view of VIEWS) {
      await openView(page, view);
      if (view === "Pictures") await page.locator(".plot canvas").first().waitFor();
      expect(await faultsOf(page), view).toEqual([]);
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
      expect(overflow, `${view} scrolls sideways`).toBeLessThanOrEqual(0);
      const views = await page.evaluate(() => {
        const { scrollWidth, clientWidth } = document.querySelector(".views")!;
        return scrollWidth - clientWidth;
      });
      expect(views, `${view} is wider than the pane`).toBeLessThanOrEqual(0);
    }
    await openView(page, "Find");
    await searchOf(page).fill("survey");
    expect(await faultsOf(page), "search").toEqual([]);
    await searchOf(page).press("Enter");
    await page.locator(".errors dd").first().waitFor();
    expect(await faultsOf(page), "page").toEqual([]);
    await page.getByRole("button", { name: "Build this formula" }).click();
    expect(await faultsOf(page), "form").toEqual([]);
    await closePage(pane);
  });

  it("has none beside the grid, on a cell with an error", async () => {
    const sheet = await openSheetWithPane(theme);
    const { page } = sheet;
    await select(page, "'Furnace log'!I10");
    await openView(page, "Formula");
    await page.getByRole("button", { name: "Edit the formula in H8" }).click();
    await page.locator(".outcome .block").waitFor();
    expect(await faultsOf(page)).toEqual([]);
    await closePage(sheet);
  });
});

describe("the pane", () => {
  it("shifts nothing while it loads and while one types", async () => {
    const pane = await openPane();
    const { page } = pane;
    await page.evaluate(() => {
      Object.assign(window, { shifted: 0 });
      new PerformanceObserver((list) => {
        for (const entry of list.getEntries() as (PerformanceEntry & {
          value: number;
          hadRecentInput: boolean;
        })[]) {
          if (!entry.hadRecentInput) (window as unknown as { shifted: number }).shifted += entry.value;
        }
      }).observe({ type: "layout-shift", buffered: true });
    });
    await openView(page, "Pictures");
    await page.locator(".plot canvas").first().waitFor();
    await page.waitForTimeout(300);
    expect(await page.evaluate(() => (window as unknown as { shifted: number }).shifted)).toBeLessThan(0.1);
    await closePage(pane);
  });

  it.each(["script", "absent"] as const)("works with Office.js %s and no Excel around it", async (office) => {
    const pane = await openPane({ office });
    for (const view of VIEWS) await openView(pane.page, view);
    expect(await pane.page.locator(".freeze").textContent()).toContain("no sheet beside the pane");
    await openView(pane.page, "Sheets");
    await pane.page
      .getByRole("button", { name: /^Start this sheet/ })
      .first()
      .click();
    await expect.poll(() => pane.page.locator(".said").textContent()).toContain("Open it in Excel");
    await closePage(pane);
  });
});
