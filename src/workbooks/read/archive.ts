import { strFromU8, unzipSync } from "fflate";
import type { ParseXml, XmlNode } from "./xml-node";

/**
 * All parts that are read together. A file of some kilobytes can hold more than a browser's memory: of a sheet with a
 * million cells, 40 MB unpacked, the parsed part takes well over half a gigabyte.
 */
const mostBytes = 150_000_000;

/** Beginnings and ends of elements in one part: a cell with a value has four, an empty one that does harm has one. */
const mostMarks = 16_000_000;

/** Of any kind. A workbook has some dozens; a forged list of contents can claim thousands of millions. */
const mostParts = 10_000;

export class Archive {
  /** A map, because a name may be one that every object has. */
  readonly #parts: ReadonlyMap<string, Uint8Array>;
  readonly #parse: ParseXml;

  constructor(bytes: Uint8Array, parse: ParseXml) {
    this.#parse = parse;
    let [parts, total] = [0, 0];
    try {
      const unpacked = unzipSync(bytes, {
        // Sizes as the archive states them: one that states too little is cut off there, and then not well-formed.
        filter: ({ name, originalSize }) => {
          if (++parts > mostParts) throw new TooLarge(`it has more than ${mostParts} parts`);
          if (!/\.(xml|rels)$/i.test(name)) return false;
          total += originalSize;
          if (total > mostBytes) throw new TooLarge("it is larger than 150 MB unpacked");
          return true;
        },
      });
      this.#parts = new Map(Object.entries(unpacked));
    } catch (failure) {
      if (failure instanceof TooLarge) throw failure;
      throw new Error("it is damaged: it cannot be unpacked");
    }
  }

  /** The root element of a part; undefined where there is none. */
  root(name: string): XmlNode | undefined {
    const part = this.#parts.get(name) ?? this.#parts.get(this.#spelling(name));
    if (!part) return undefined;
    const text = strFromU8(part);
    // Workbook files must have none. One could define texts that grow without end while they are read.
    if (text.includes("<!DOCTYPE"))
      throw new Error("it is damaged: a part of it brings definitions of its own");
    if (hasMoreMarks(text, mostMarks)) throw new Error("it holds more cells than a browser's page can take");
    return this.#parse(text);
  }

  /** Names in packages do not depend on case. */
  #spelling(name: string): string {
    const plain = name.toLowerCase();
    return [...this.#parts.keys()].find((each) => each.toLowerCase() === plain) ?? name;
  }
}

class TooLarge extends Error {}

function hasMoreMarks(text: string, most: number): boolean {
  let at = -1;
  for (let count = 0; count <= most; count++) {
    at = text.indexOf("<", at + 1);
    if (at < 0) return false;
  }
  return true;
}

/** A relation's target from the part that names it. */
export function targetFrom(part: string, target: string): string {
  if (target.startsWith("/")) return target.slice(1);
  const folders = part.split("/").slice(0, -1);
  for (const step of target.split("/")) {
    if (step === "..") folders.pop();
    else if (step !== ".") folders.push(step);
  }
  return folders.join("/");
}
