/** The README's pictures: what is on each, and the steps of a user that lead there. */
import type { Locator, Page } from "playwright-core";
import { fillFromSelection, openView, paneOf, searchOf, select } from "../setup/pane";
import { goToCell, waitForValue } from "../setup/sheet-page";

export const FOLDER = "samples/pictures";

export const SCHEMES = ["light", "dark"] as const;
export type Scheme = (typeof SCHEMES)[number];

/** Pixels of the picture to one of the page, for dense screens. */
export const SCALE = 2;

interface Size {
  readonly width: number;
  readonly height: number;
}

export interface Picture {
  readonly name: string;
  /** The window of the browser, in its own pixels. */
  readonly window: Size;
  /** What comes out, in pixels. */
  readonly size: Size;
  /** Leads from the opened sample to the moment of the picture, and gives the part of the page that is on it. */
  compose(page: Page): Promise<Locator>;
}

/** Opens the page of a function by words of the trade. */
async function openFunction(page: Page, words: string): Promise<void> {
  await searchOf(page).fill(words);
  await page.getByRole("option").first().click();
  await page.getByRole("button", { name: "Build this formula" }).waitFor();
}

/** Wide enough for the readings, the temperatures beside them and the pane. */
const wide: Pick<Picture, "window" | "size"> = {
  window: { width: 1330, height: 640 },
  size: { width: 2660, height: 1280 },
};

/** High enough for a function's examples and for the foot of a form. */
const paneAlone: Pick<Picture, "window" | "size"> = {
  window: { width: 1330, height: 955 },
  size: { width: 736, height: 1732 },
};

const sheet: Picture = {
  ...wide,
  name: "sheet",
  /** The first scans of an open sensor among good ones, with the fault in words and the formula behind it. */
  async compose(page) {
    await openView(page, "Formula");
    await select(page, "'Furnace log'!A902");
    await goToCell(page, "J908");
    await page.locator(".explain .fault").waitFor();
    return page.locator("body");
  },
};

const explanation: Picture = {
  ...paneAlone,
  name: "explanation",
  /** A function in words, with its examples worked out. */
  async compose(page) {
    await openFunction(page, "platinum resistance temperature");
    // A click beside takes the ring off the heading, which has the focus.
    await paneOf(page).getByText("Compensate", { exact: true }).click();
    return paneOf(page);
  },
};

const builder: Picture = {
  ...paneAlone,
  name: "builder",
  /** The form of a formula, filled in by pointing at cells, with what it would give and where. */
  async compose(page) {
    await openFunction(page, "millivolts cold junction");
    await page.getByRole("button", { name: "Build this formula" }).click();
    await select(page, "'Furnace log'!B8:E8");
    await fillFromSelection(page, "emf");
    await page.getByLabel(/^type/).selectOption("K");
    await goToCell(page, "F8");
    await fillFromSelection(page, "referenceTemperature");
    await page.getByText("the space is free").waitFor();
    await page.getByText("and 1994 more rows").waitFor();
    await page.getByRole("button", { name: "Insert formula" }).scrollIntoViewIfNeeded();
    return paneOf(page);
  },
};

export const PICTURES: readonly Picture[] = [sheet, explanation, builder];

export const fileOf = ({ name }: Picture, scheme: Scheme): string => `${name}-${scheme}.png`;

/** Once the sample is calculated. */
export const isReady = (page: Page): Promise<unknown> =>
  waitForValue(page, "'Furnace log'!H8", (value) => typeof value === "number");
