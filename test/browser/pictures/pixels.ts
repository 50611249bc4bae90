/** Reads the pixels of a screenshot, or of a picture of ours: a PNG without interlacing, eight bits a channel. */
import { inflateSync } from "node:zlib";
import { chunks, imageSize } from "../../../src/build/png";

export interface Pixels {
  readonly width: number;
  readonly height: number;
  /** Red, green and blue in one number each, row by row. */
  readonly colours: Uint32Array;
}

/** By kind of colour: red, green and blue; the number of a colour in the palette; with opacity. */
const CHANNELS: Readonly<Record<number, number>> = { 2: 3, 3: 1, 6: 4 };

/** Of the bytes to the left, above and above left, the one nearest to where a plane through them would be. */
function paeth(left: number, above: number, corner: number): number {
  const guess = left + above - corner;
  const [a, b, c] = [Math.abs(guess - left), Math.abs(guess - above), Math.abs(guess - corner)];
  return a <= b && a <= c ? left : b <= c ? above : corner;
}

/** What each filter of the format adds to a byte: none, left, above, their mean, Paeth's. */
const FILTERS: readonly ((left: number, above: number, corner: number) => number)[] = [
  () => 0,
  (left) => left,
  (_, above) => above,
  (left, above) => (left + above) >> 1,
  paeth,
];

const colourAt = (bytes: Uint8Array, at: number): number =>
  ((bytes[at] as number) << 16) | ((bytes[at + 1] as number) << 8) | (bytes[at + 2] as number);

export function pixelsOf(png: Uint8Array): Pixels {
  const { width, height } = imageSize(png);
  const all = chunks(png);
  const [depth, kind = -1, , , interlaced] = (all[0]?.content ?? []).slice(8);
  const channels = CHANNELS[kind];
  if (depth !== 8 || channels === undefined || interlaced !== 0)
    throw new Error("Only whole rows of eight bits a channel are read here.");
  const packed = all.filter(({ name }) => name === "IDAT").map(({ content }) => content);
  const filtered = inflateSync(Buffer.concat(packed));
  const stride = width * channels;
  const bytes = new Uint8Array(stride * height);
  for (let y = 0; y < height; y++) {
    const predict = FILTERS[filtered[y * (stride + 1)] ?? 0] as (typeof FILTERS)[number];
    for (let x = 0; x < stride; x++) {
      const at = y * stride + x;
      const inside = x >= channels;
      const left = inside ? (bytes[at - channels] as number) : 0;
      const above = y > 0 ? (bytes[at - stride] as number) : 0;
      const corner = inside && y > 0 ? (bytes[at - stride - channels] as number) : 0;
      bytes[at] = (filtered[at + y + 1] as number) + predict(left, above, corner);
    }
  }
  const palette = all.find(({ name }) => name === "PLTE")?.content;
  const colours = Uint32Array.from({ length: width * height }, (_, i) => {
    const at = i * channels;
    return palette === undefined ? colourAt(bytes, at) : colourAt(palette, 3 * (bytes[at] as number));
  });
  return { width, height, colours };
}

/** Each colour with how many pixels have it, the most frequent first. */
export function frequencies(colours: Uint32Array): [colour: number, pixels: number][] {
  const counts = new Map<number, number>();
  for (const colour of colours) counts.set(colour, (counts.get(colour) ?? 0) + 1);
  return [...counts].sort(([, a], [, b]) => b - a);
}
