/** Writes pixels as a PNG of at most 256 colours: a page's text and lines lose nothing to the eye, and two thirds of the bytes. */
import { deflateSync } from "node:zlib";
import { framed } from "../../../src/build/png";
import { frequencies, type Pixels } from "./pixels";

const MOST = 256;
const SIGNATURE = Buffer.from("\x89PNG\r\n\x1a\n", "latin1");

const rgb = (colour: number): [number, number, number] => [colour >> 16, (colour >> 8) & 255, colour & 255];

/** Largest difference of a channel. */
function distance(a: number, b: number): number {
  const [p, q] = [rgb(a), rgb(b)];
  return Math.max(Math.abs(p[0] - q[0]), Math.abs(p[1] - q[1]), Math.abs(p[2] - q[2]));
}

/** The frequent colours, so close to each other that every other one is near one of them. */
function paletteOf(colours: readonly number[]): number[] {
  for (let near = 0; ; near++) {
    const palette: number[] = [];
    for (const colour of colours) {
      if (!palette.some((chosen) => distance(chosen, colour) <= near)) palette.push(colour);
      if (palette.length > MOST) break;
    }
    if (palette.length <= MOST) return palette;
  }
}

export function withPalette({ width, height, colours }: Pixels): Buffer {
  const all = frequencies(colours).map(([colour]) => colour);
  const palette = paletteOf(all);
  const nearest = new Map(
    all.map((colour) => {
      const distances = palette.map((chosen) => distance(chosen, colour));
      return [colour, distances.indexOf(Math.min(...distances))];
    }),
  );
  // A row begins with the number of its filter: 0, none, is best for numbers of colours.
  const rows = Buffer.alloc((width + 1) * height);
  for (const [i, colour] of colours.entries())
    rows[i + Math.floor(i / width) + 1] = nearest.get(colour) as number;
  const header = Buffer.from([0, 0, 0, 0, 0, 0, 0, 0, 8, 3, 0, 0, 0]);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  return Buffer.concat([
    SIGNATURE,
    framed({ name: "IHDR", content: header }),
    framed({ name: "PLTE", content: Uint8Array.from(palette.flatMap(rgb)) }),
    framed({ name: "IDAT", content: deflateSync(rows, { level: 9 }) }),
    framed({ name: "IEND", content: new Uint8Array() }),
  ]);
}
