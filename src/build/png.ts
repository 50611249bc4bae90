// As much of the PNG format as the icons and the README's pictures need: a list of chunks, each of length, name, content and checksum.

import { crc32 } from "node:zlib";

const SIGNATURE_LENGTH = 8;

export interface Chunk {
  name: string;
  content: Uint8Array;
}

export function chunks(png: Uint8Array): Chunk[] {
  if (String.fromCharCode(...png.subarray(1, 4)) !== "PNG") throw new Error("This is not a PNG file.");
  const bytes = Buffer.from(png);
  const found: Chunk[] = [];
  for (let at = SIGNATURE_LENGTH; at < bytes.length; ) {
    const length = bytes.readUInt32BE(at);
    found.push({
      name: bytes.toString("latin1", at + 4, at + 8),
      content: bytes.subarray(at + 8, at + 8 + length),
    });
    at += length + 12;
  }
  return found;
}

/** Width and height in pixels, from the header chunk. */
export function imageSize(png: Uint8Array): { width: number; height: number } {
  const header = chunks(png)[0];
  if (header?.name !== "IHDR") throw new Error("This PNG file does not begin with its header.");
  const bytes = Buffer.from(header.content);
  return { width: bytes.readUInt32BE(0), height: bytes.readUInt32BE(4) };
}

/** A chunk as it stands in a file. */
export function framed({ name, content }: Chunk): Buffer {
  const named = Buffer.concat([Buffer.from(name, "latin1"), content]);
  const chunk = Buffer.alloc(named.length + 8);
  chunk.writeUInt32BE(content.length, 0);
  named.copy(chunk, 4);
  chunk.writeUInt32BE(crc32(named), named.length + 4);
  return chunk;
}

/** A chunk that holds a keyword and a text, ready to be put into a file. */
export const textChunk = (keyword: string, text: string): Buffer =>
  framed({ name: "tEXt", content: Buffer.from(`${keyword}\0${text}`, "latin1") });

/** The text under a keyword, if the file has it. */
export function textOf(png: Uint8Array, keyword: string): string | undefined {
  const start = `${keyword}\0`;
  for (const { name, content } of chunks(png)) {
    const text = Buffer.from(content).toString("latin1");
    if (name === "tEXt" && text.startsWith(start)) return text.slice(start.length);
  }
  return undefined;
}

export function withChunkAfterHeader(png: Buffer, chunk: Buffer): Buffer {
  const headerEnd = SIGNATURE_LENGTH + png.readUInt32BE(SIGNATURE_LENGTH) + 12;
  return Buffer.concat([png.subarray(0, headerEnd), chunk, png.subarray(headerEnd)]);
}
