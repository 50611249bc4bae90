import { strFromU8, unzipSync } from "fflate";
import type { ParseXml, XmlNode } from "./xml-node";

/** All parts that are read together. A file of some kilobytes can hold more than a browser's memory. */
const mostBytes = 300_000_000;

export class Archive {
  readonly #parts: Record<string, Uint8Array>;
  readonly #parse: ParseXml;

  constructor(bytes: Uint8Array, parse: ParseXml) {
    this.#parse = parse;
    let total = 0;
    try {
      this.#parts = unzipSync(bytes, {
        filter: ({ name, originalSize }) => {
          if (!/\.(xml|rels)$/i.test(name)) return false;
          total += originalSize;
          if (total > mostBytes) throw new TooLarge();
          return true;
        },
      });
    } catch (failure) {
      if (failure instanceof TooLarge) throw failure;
      throw new Error("it is damaged: it cannot be unpacked");
    }
  }

  /** The root element of a part; undefined where there is none. */
  root(name: string): XmlNode | undefined {
    const part = this.#parts[name] ?? this.#parts[this.#spelling(name)];
    return part && this.#parse(strFromU8(part));
  }

  /** Names in packages do not depend on case. */
  #spelling(name: string): string {
    const plain = name.toLowerCase();
    return Object.keys(this.#parts).find((each) => each.toLowerCase() === plain) ?? name;
  }
}

class TooLarge extends Error {
  constructor() {
    super("it is larger than 300 MB unpacked");
  }
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
