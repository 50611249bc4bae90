import { expect, it } from "vitest";
import { frequencies, pixelsOf } from "./pictures/pixels";
import { closePage, goToCell, openSheet } from "./setup/sheet-page";

/** Relative luminance of a colour, by WCAG 2. */
function luminance(colour: number): number {
  const [red = 0, green = 0, blue = 0] = [colour >> 16, (colour >> 8) & 255, colour & 255].map((byte) => {
    const part = byte / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

it.each(["light", "dark"] as const)(
  "shows, before anything was typed, the formula behind a spilled result so that it can be read, %s",
  async (colorScheme) => {
    const sheet = await openSheet({ colorScheme });
    const { page } = sheet;
    /** Strongest contrast of a pixel that stands in the formula bar to its ground. */
    const contrast = async (): Promise<number> => {
      const bar = page.locator("#grid [data-u-comp=formula-bar] canvas").first();
      const { colours } = pixelsOf(await bar.screenshot({ caret: "hide" }));
      const all = frequencies(colours).map(([colour]) => luminance(colour) + 0.05);
      const ground = all[0]!;
      return Math.max(...all.map((one) => Math.max(one, ground) / Math.min(one, ground)));
    };
    await goToCell(page, "M20");
    await expect.poll(contrast).toBe(1);
    await goToCell(page, "I10");
    await expect.poll(contrast).toBeGreaterThan(4.5);
    await closePage(sheet);
  },
);
