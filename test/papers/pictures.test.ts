/** The README's pictures as they are committed; `npm run pictures` takes them. */
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { imageSize } from "../../src/build/png";
import { FOLDER, fileOf, PICTURES, SCHEMES } from "../browser/pictures/pictures";
import { linksOf } from "./links";

/** Bytes: a README is read on the way, too. */
const MOST = 300_000;

const readme = readFileSync("README.md", "utf8");
const pictures = PICTURES.flatMap((picture) =>
  SCHEMES.map((scheme) => ({ file: `${FOLDER}/${fileOf(picture, scheme)}`, size: picture.size })),
);

describe("the README's picture", () => {
  it.each(pictures)("$file is there, has its size and is small", ({ file, size }) => {
    expect(imageSize(readFileSync(file))).toEqual(size);
    expect(statSync(file).size).toBeLessThan(MOST);
  });

  it("is shown, each in the light and in the dark, and no file is left over", () => {
    const shown = linksOf(readme).filter((target) => target.endsWith(".png"));
    const files = pictures.map(({ file }) => file).sort();
    expect(shown.sort()).toEqual(files);
    expect(
      readdirSync(FOLDER)
        .map((name) => `${FOLDER}/${name}`)
        .sort(),
    ).toEqual(files);
  });

  it("is described in words", () => {
    for (const [image] of readme.matchAll(/<img [^>]*>/g)) expect(image).toMatch(/ alt="[^"]{30,}"/);
  });

  it("is not among what is built", () => {
    expect(existsSync("dist/samples/furnace-log.csv")).toBe(true);
    expect(existsSync("dist/samples/pictures")).toBe(false);
  });
});
