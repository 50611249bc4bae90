import { readFileSync } from "node:fs";
import type { Page } from "playwright-core";
import { cellName, type WorkbookPlan } from "../../../src/sheets";
import { waitForValue } from "./sheet-page";

/** Chooses a sample in the menu, which may ask first. */
export async function chooseSample(page: Page, name: string): Promise<void> {
  await page.locator("#open-samples").click();
  await page.locator("#samples").getByText(name, { exact: true }).click();
}

/** Opens a sample by its name, and waits until its last formula has a result. */
export async function openSample(page: Page, name: string): Promise<void> {
  await chooseSample(page, name);
  await page.locator("#samples").waitFor({ state: "hidden" });
  const list: { file: string; name: string }[] = JSON.parse(readFileSync("samples/index.json", "utf8"));
  const { file } = list.find((each) => each.name === name)!;
  const plan: WorkbookPlan = JSON.parse(readFileSync(`samples/${file}`, "utf8"));
  for (const sheet of plan.sheets) {
    for (const { row, column, formula } of sheet.cells) {
      if (formula === undefined) continue;
      await waitForValue(
        page,
        `'${sheet.name}'!${cellName(row, column)}`,
        (value) => value !== "" && value !== undefined,
      );
    }
  }
}
