/** The three jobs of the README as they are printed there: each formula is typed into its cell of its sample. */
import { readFileSync } from "node:fs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { openSample } from "./setup/samples";
import { closePage, goToCell, openSheet, readValues, type WatchedPage } from "./setup/sheet-page";

interface Job {
  readonly title: string;
  readonly sample: string;
  /** Where the formulas are typed: the sample's first sheet, unless the job names another. */
  readonly tab: string | undefined;
  readonly steps: readonly { cell: string; formula: string }[];
}

function jobsOf(readme: string): Job[] {
  const [, section = ""] = readme.match(/^## The three jobs\n(.*?)^## /ms) ?? [];
  return section
    .split(/^### /m)
    .slice(1)
    .map((text) => {
      const [, sample = "", tab] = text.match(/^Sample \*([^*]+)\*(?:, sheet \*([^*]+)\*)?:/m) ?? [];
      const steps = [...text.matchAll(/`([A-Z]+\d+)` `(=[^`]+)`/g)].map(([, cell = "", formula = ""]) => ({
        cell,
        formula,
      }));
      return { title: text.split("\n", 1)[0] ?? "", sample, tab, steps };
    });
}

const jobs = jobsOf(readFileSync("README.md", "utf8"));

it("finds three jobs with four formulas or more", () => {
  expect(jobs).toHaveLength(3);
  for (const { sample, steps } of jobs) {
    expect(sample).not.toBe("");
    expect(steps.length).toBeGreaterThanOrEqual(4);
  }
});

describe.each(jobs)("the job $title", ({ sample, tab, steps }) => {
  let sheet: WatchedPage;
  beforeAll(async () => {
    sheet = await openSheet();
    await openSample(sheet.page, sample);
    if (tab !== undefined) await sheet.page.evaluate((on) => window.beadlineSheet!.select(`'${on}'!A1`), tab);
  });
  afterAll(() => closePage(sheet));

  it.each(steps)("$cell takes $formula", async ({ cell, formula }) => {
    const { page } = sheet;
    await goToCell(page, cell);
    const here = await page.evaluate(() => window.beadlineSheet!.getSelection());
    expect(await readValues(page, here)).toEqual([[""]]);
    await page.keyboard.type(formula);
    await page.keyboard.press("Enter");
    // A word for each fault, and an empty text for a good reading: the first words stand far down.
    const column = `${here}:${cell.replace(/\d+/, "2000")}`;
    const results = async () => (await readValues(page, column)).flat().filter((value) => value !== "");
    await expect.poll(async () => (await results()).length, { timeout: 30_000 }).toBeGreaterThan(0);
    expect(String((await results())[0])).not.toMatch(/^#/);
  });
});
