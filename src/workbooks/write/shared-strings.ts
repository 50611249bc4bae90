import { element, escapedText, part } from "../xml";

const main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";

/** Texts of all sheets, each kept once; a cell refers to its text by number. */
export class SharedStrings {
  readonly #texts = new Map<string, number>();
  #uses = 0;

  index(text: string): number {
    this.#uses++;
    const found = this.#texts.get(text) ?? this.#texts.size;
    this.#texts.set(text, found);
    return found;
  }

  xml(): string {
    const items = [...this.#texts.keys()].map((text) => element("si", {}, textElement(text)));
    return part(element("sst", { xmlns: main, count: this.#uses, uniqueCount: items.length }, ...items));
  }
}

/** White space at the ends is dropped by readers unless it is asked to stay. */
const textElement = (text: string): string =>
  element("t", { "xml:space": /^\s|\s$|\n/.test(text) ? "preserve" : undefined }, escapedText(text));
