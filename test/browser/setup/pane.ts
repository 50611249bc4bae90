import type { Locator, Page } from "playwright-core";
import { openPage, openSheet, type PageOptions, type WatchedPage } from "./sheet-page";

/** A language that browsers everywhere know: the one of a bare test machine may be none that Intl takes. */
const locale = "en-GB";

export const openPane = (options: PageOptions = {}): Promise<WatchedPage> =>
  openPage("taskpane.html", { office: "absent", viewport: { width: 360, height: 800 }, locale, ...options });

/** The local sheet with the pane beside it. */
export const openSheetWithPane = (options: PageOptions = {}): Promise<WatchedPage> =>
  openSheet({ locale, ...options });

export const paneOf = (page: Page): Locator => page.locator(".pane");

export const searchOf = (page: Page): Locator =>
  page.getByRole("combobox", { name: "What do you want to do?" });

export async function openView(page: Page, name: string): Promise<void> {
  await page.locator(".tabs").getByRole("button", { name, exact: true }).click();
}

/** Opens a function's form by way of the search. */
export async function buildFormula(page: Page, id: string): Promise<void> {
  await openView(page, "Find");
  const back = page.getByRole("button", { name: "All functions" });
  if (await back.isVisible()) await back.click();
  await searchOf(page).fill(id);
  await searchOf(page).press("Enter");
  await page.getByRole("button", { name: "Build this formula" }).click();
}

/** Fills an argument with the cells that are selected, and with all below them that belong to the log. */
export async function fillFromSelection(page: Page, argument: string): Promise<void> {
  await page.getByRole("button", { name: `Use selection for ${argument}` }).click();
  await page.getByRole("button", { name: "Down to row 2007" }).click();
}

export const select = (page: Page, range: string): Promise<void> =>
  page.evaluate((address) => window.beadlineSheet!.select(address), range);

export const said = (page: Page): Promise<string | null> => page.locator(".said").textContent();
