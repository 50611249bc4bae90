import type { Page } from "playwright-core";
import { goToCell } from "./sheet-page";

/** Letters typed one by one; the rest of a longer text comes at once, as somebody pastes a formula. */
const typed = 24;

/** Types into a cell and the ones beneath it, each line ended by Enter, as a user does. */
export async function typeInto(page: Page, cell: string, ...lines: (string | number)[]): Promise<void> {
  await goToCell(page, cell);
  for (const line of lines) {
    const text = String(line);
    await page.keyboard.type(text.slice(0, typed));
    if (text.length > typed) await page.keyboard.insertText(text.slice(typed));
    await page.keyboard.press("Enter");
  }
}

/** Opens a sheet by its tab. */
export async function openTab(page: Page, name: string): Promise<void> {
  await page.locator("[data-u-comp=slide-tab-item]").getByText(name, { exact: true }).click();
  await page.waitForFunction(
    async (sheet) => (await window.beadlineSheet!.getSelection()).replaceAll("'", "").startsWith(`${sheet}!`),
    name,
  );
}

/** Opens a log by way of the file chooser and the dialog, as a new sheet. */
export async function openLog(page: Page, name: string, text: string): Promise<void> {
  const [chooser] = await Promise.all([
    page.waitForEvent("filechooser"),
    page.getByRole("button", { name: "Open a log or workbook" }).click(),
  ]);
  await chooser.setFiles({ name, mimeType: "text/csv", buffer: Buffer.from(text) });
  const dialog = page.locator("#import");
  await dialog.getByRole("button", { name: "Open as a new sheet" }).click();
  await dialog.getByText("is open").waitFor();
  await dialog.getByRole("button", { name: "Go to the sheet" }).click();
}
