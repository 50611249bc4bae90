import { exec } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { promisify } from "node:util";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { imageSize } from "../../src/build/png";
import { fileOf, PICTURES, SCHEMES } from "./pictures/pictures";
import { type Pixels, pixelsOf } from "./pictures/pixels";

/** Pixels of a side, about: on each piece of a page of so much there are words. */
const PIECE = 400;

/** How many colours each piece of a picture has: ground alone has one, words in it have many shades. */
function coloursOfPieces({ width, height, colours }: Pixels): number[] {
  const [across, down] = [Math.round(width / PIECE), Math.round(height / PIECE)];
  const pieces = Array.from({ length: across * down }, () => new Set<number>());
  for (const [i, colour] of colours.entries()) {
    const column = Math.floor(((i % width) * across) / width);
    const row = Math.floor((Math.floor(i / width) * down) / height);
    pieces[row * across + column]?.add(colour);
  }
  return pieces.map(({ size }) => size);
}

const folder = mkdtempSync(join(tmpdir(), "beadline-pictures-"));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe("the pictures of the README, taken anew", () => {
  let printed = "";
  beforeAll(async () => {
    printed = (await promisify(exec)(`npm run pictures -- ${folder}`)).stdout;
  }, 300_000);

  it.each(
    PICTURES.flatMap((picture) => SCHEMES.map((scheme) => [fileOf(picture, scheme), picture] as const)),
  )("%s has its size, and something on every piece of it", (file, { size }) => {
    expect(printed).toContain(file);
    const png = readFileSync(join(folder, file));
    expect(imageSize(png)).toEqual(size);
    expect(Math.min(...coloursOfPieces(pixelsOf(png)))).toBeGreaterThan(10);
  });
});
