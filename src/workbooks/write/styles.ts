import type { CellLook } from "../content";
import { element, part } from "../xml";

const main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";

/** Formats that every program knows by number; our own are numbered from 164. */
const known: ReadonlyMap<string, number> = new Map([
  ["General", 0],
  ["0", 1],
  ["0.00", 2],
  ["0%", 9],
]);
const firstOwn = 164;

/** Looks of cells, each kept once; a cell refers to its look by number, and 0 is the plain one. */
export class Styles {
  readonly #formats = new Map<string, number>();
  readonly #fonts = new Map<string, number>();
  readonly #looks = new Map<string, number>();

  constructor() {
    this.index({});
  }

  /** A text that is marked as typed behind an apostrophe stays a text when somebody edits its cell. */
  index(look: CellLook, isMarkedText = false): number {
    return numbered(this.#looks, this.#cellFormat(look, isMarkedText));
  }

  xml(): string {
    const formats = [...this.#formats].map(([formatCode, numFmtId]) =>
      element("numFmt", { numFmtId, formatCode }),
    );
    const fonts = [...this.#fonts.keys()];
    const looks = [...this.#looks.keys()];
    const borders = element("border", {}, "<left/><right/><top/><bottom/><diagonal/>");
    const fills = ["none", "gray125"].map((patternType) =>
      element("fill", {}, element("patternFill", { patternType })),
    );
    const list = (name: string, items: string[]) => element(name, { count: items.length }, ...items);
    return part(
      element(
        "styleSheet",
        { xmlns: main },
        ...(formats.length > 0 ? [list("numFmts", formats)] : []),
        list("fonts", fonts),
        list("fills", fills),
        list("borders", [borders]),
        list("cellStyleXfs", [element("xf", { numFmtId: 0, fontId: 0, fillId: 0, borderId: 0 })]),
        list("cellXfs", looks),
        list("cellStyles", [element("cellStyle", { name: "Normal", xfId: 0, builtinId: 0 })]),
      ),
    );
  }

  #cellFormat(
    { pattern = "General", align, indented, wrapped, ...font }: CellLook,
    isMarkedText: boolean,
  ): string {
    const numFmtId = known.get(pattern) ?? numbered(this.#formats, pattern, firstOwn);
    const fontId = numbered(this.#fonts, fontElement(font));
    const alignment =
      align || wrapped || indented
        ? [
            element("alignment", {
              horizontal: align,
              vertical: wrapped ? "top" : undefined,
              wrapText: wrapped ? 1 : undefined,
              indent: indented ? 1 : undefined,
            }),
          ]
        : [];
    return element(
      "xf",
      {
        numFmtId,
        fontId,
        fillId: 0,
        borderId: 0,
        xfId: 0,
        quotePrefix: isMarkedText ? 1 : undefined,
        applyNumberFormat: numFmtId ? 1 : undefined,
        applyFont: fontId ? 1 : undefined,
        applyAlignment: alignment.length > 0 ? 1 : undefined,
      },
      ...alignment,
    );
  }
}

function fontElement({ bold, size = 11, colour }: CellLook): string {
  return element(
    "font",
    {},
    ...(bold ? ["<b/>"] : []),
    element("sz", { val: size }),
    ...(colour ? [element("color", { rgb: `FF${colour.toUpperCase()}` })] : []),
    element("name", { val: "Calibri" }),
    element("family", { val: 2 }),
  );
}

function numbered(list: Map<string, number>, item: string, first = 0): number {
  const found = list.get(item) ?? first + list.size;
  list.set(item, found);
  return found;
}
