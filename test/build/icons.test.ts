import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { DRAWN_FROM, drawingHash, ICON_SIZES } from "../../src/build/icons";
import { imageSize, textOf } from "../../src/build/png";

const mark = readFileSync("src/assets/mark.svg", "utf8");

test.each(ICON_SIZES)(
  "the icon of %i pixels has that size and was drawn from the mark as it is now",
  (size) => {
    const png = readFileSync(`src/assets/icon-${size}.png`);
    expect(imageSize(png)).toEqual({ width: size, height: size });
    expect(textOf(png, DRAWN_FROM)).toBe(drawingHash(mark));
  },
);

test("the mark is two strokes of unequal weight and one filled dot", () => {
  const weights = [...mark.matchAll(/stroke-width="([\d.]+)"/g)].map(([, weight]) => Number(weight));
  expect(weights).toHaveLength(2);
  expect(weights[0]).not.toBe(weights[1]);
  expect(mark.match(/<circle/g)).toHaveLength(1);
});

test("the mark holds no script and fetches nothing", () => {
  expect(mark).not.toMatch(/<script|href=|url\(|@import|\son\w+=/);
});

test("what is not a PNG file is refused", () => {
  expect(() => imageSize(new TextEncoder().encode("<svg/>"))).toThrow("not a PNG");
});
