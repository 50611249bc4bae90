// Draws the icons from the mark: `npx tsx src/build/icons.ts` after a change of mark.svg. Each PNG carries the
// hash of the drawing it was made from, so that a test notices icons that were not drawn anew.

import { createHash } from "node:crypto";
import { mkdtemp, readFile, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { type Browser, chromium } from "playwright-core";
import { textChunk, withChunkAfterHeader } from "./png";

export const ICON_SIZES = [16, 20, 24, 32, 40, 48, 64, 80, 128];
export const DRAWN_FROM = "Drawn from";

/** The hash an icon carries; line ends are left out of it, because git may change them. */
export function drawingHash(svg: string): string {
  return `mark.svg sha256 ${createHash("sha256").update(svg.replaceAll("\r\n", "\n")).digest("hex")}`;
}

/** The mark in the tones that read on light and dark alike: a ribbon tells an icon nothing of its colours. */
function withoutScheme(svg: string): string {
  return svg.replace(/<style>.*?<\/style>/s, "");
}

export async function drawIcons(assets: string): Promise<void> {
  const svg = await readFile(join(assets, "mark.svg"), "utf8");
  const note = textChunk(DRAWN_FROM, drawingHash(svg));
  const scratch = await mkdtemp(join(tmpdir(), "beadline-icons-"));
  try {
    const browser = await startBrowser(scratch);
    const page = await browser.newPage();
    for (const size of ICON_SIZES) {
      await page.setViewportSize({ width: size, height: size });
      await page.setContent(
        `<style>*{margin:0}svg{display:block;width:${size}px}</style>${withoutScheme(svg)}`,
      );
      const png = await page.screenshot({ omitBackground: true });
      await writeFile(join(assets, `icon-${size}.png`), withChunkAfterHeader(png, note));
    }
    await browser.close();
  } finally {
    await rm(scratch, { recursive: true, force: true });
  }
}

/** On Linux the browser comes inside an npm package and unpacks itself; elsewhere an installed one is used. */
async function startBrowser(scratch: string): Promise<Browser> {
  if (process.platform !== "linux") return chromium.launch({ channel: "chrome" });
  process.env.TMPDIR = scratch;
  process.env.AWS_EXECUTION_ENV ??= "AWS_Lambda_nodejs20.x"; // or its libraries stay packed
  const { default: packaged } = await import("@sparticuz/chromium");
  const executablePath = await packaged.executablePath();
  const LD_LIBRARY_PATH = join(scratch, "al2023", "lib");
  return chromium.launch({
    executablePath,
    args: ["--no-sandbox", "--disable-gpu"],
    env: { ...process.env, LD_LIBRARY_PATH } as Record<string, string>,
  });
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href) {
  await drawIcons("src/assets");
}
