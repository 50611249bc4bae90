import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import type { Page } from "playwright-core";

/** Presses Save and one of the dialog's buttons; gives the file that the browser was handed. */
export async function savedFile(page: Page, button: string): Promise<{ name: string; path: string }> {
  await page.locator("#save").click();
  const [download] = await Promise.all([
    page.waitForEvent("download"),
    page.locator("#files").getByRole("button", { name: button }).click(),
  ]);
  const name = download.suggestedFilename();
  const path = join(mkdtempSync(join(tmpdir(), "beadline-saved-")), name);
  await download.saveAs(path);
  return { name, path };
}
