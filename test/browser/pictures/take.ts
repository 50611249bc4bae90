/** Takes a picture of the real page, as the steps of `pictures.ts` leave it. */
import { writeFileSync } from "node:fs";
import { join } from "node:path";
import type { Browser, Locator } from "playwright-core";
import { withPalette } from "./palette";
import { fileOf, isReady, type Picture, SCALE, type Scheme } from "./pictures";
import { pixelsOf } from "./pixels";

const TRIES = 40;

/** What is on the screen once it no longer changes: the grid is drawn some frames after its contents are there. */
async function settled(part: Locator): Promise<Buffer> {
  let before: Buffer | undefined;
  for (let i = 0; i < TRIES; i++) {
    const now = await part.screenshot({ caret: "hide", animations: "disabled" });
    if (before?.equals(now)) return now;
    before = now;
    await part.page().waitForTimeout(300);
  }
  throw new Error("The page never came to rest.");
}

/** Gives the path of the file. */
export async function takePicture(
  browser: Browser,
  address: string,
  folder: string,
  picture: Picture,
  scheme: Scheme,
): Promise<string> {
  const context = await browser.newContext({
    viewport: picture.window,
    deviceScaleFactor: SCALE,
    colorScheme: scheme,
    reducedMotion: "reduce",
    locale: "en-GB",
  });
  try {
    const page = await context.newPage();
    await page.goto(address);
    await isReady(page);
    const screenshot = await settled(await picture.compose(page));
    const path = join(folder, fileOf(picture, scheme));
    writeFileSync(path, withPalette(pixelsOf(screenshot)));
    return path;
  } finally {
    await context.close();
  }
}
