import { parseCell } from "../../sheets";
import type { CellLook, StoredCell, StoredSheet, StoredValue } from "../content";
import { asksOutside, linksOutside } from "../outside-formula";
import { shifted } from "../shifted-formula";
import { fromStored } from "../stored-formula";
import { unescapedText } from "../xml";
import { attribute, children, count, down, isOn, textOf, type XmlNode } from "./xml-node";

const digit = 7;
const edges = 5;
const pixelsPerPoint = 4 / 3;

/** Wider ranges of columns are those of a whole sheet, which says nothing about a column. */
const mostColumns = 1024;

/** What a sheet and a formula may be at most, in every program: more is no sheet but an attempt at something. */
const lastRow = 1_048_575;
const lastColumn = 16_383;
const longestFormula = 8192;

const outside = "links to other files, to programs and to the web (their last values are there)";
const tooLong = `formulas longer than ${longestFormula} characters (their last values are there)`;

export interface Surroundings {
  looks: readonly CellLook[];
  texts: readonly string[];
}

/**
 * A sheet with its formulas as they are typed, and in words what is left out of it. Cells that a dynamic array fills
 * hold no values of their own: what it fills spills again by itself, and would not where its cells are taken.
 */
export function readSheet(
  name: string,
  root: XmlNode | undefined,
  surroundings: Surroundings,
): StoredSheet & { left: ReadonlySet<string> } {
  const pane = down(root, "sheetViews", "sheetView", "pane");
  const isFrozen = attribute(pane, "state")?.startsWith("frozen") ?? false;
  const reader = new CellReader(surroundings);
  const heights: { row: number; height: number }[] = [];
  let row = -1;
  for (const line of children(down(root, "sheetData"), "row")) {
    // Numbers may be left out: then it is the next.
    row = count(line, "r", row + 2) - 1;
    if (row < 0 || row > lastRow) throw beyond();
    const height = Number(attribute(line, "ht"));
    if (height > 0 && isOn(attribute(line, "customHeight"))) {
      heights.push({ row, height: Math.round(height * pixelsPerPoint) });
    }
    reader.readRow(row, line);
  }
  return {
    name,
    columns: readColumns(root, surroundings.looks),
    frozenRows: isFrozen ? count(pane, "ySplit", 0) : 0,
    ...(heights.length > 0 ? { heights } : {}),
    cells: reader.cells,
    left: reader.left,
  };
}

const beyond = () => new Error("it is damaged: a cell lies beyond the edges of a sheet");

/** An address out of a file. What stands there instead is not repeated: it can be of any length. */
function placeOf(address: string): { row: number; column: number } {
  if (!/^\$?[a-z]{1,3}\$?[1-9]\d{0,6}$/i.test(address))
    throw new Error("it is damaged: a cell has no address");
  const place = parseCell(address);
  if (place.row > lastRow || place.column > lastColumn) throw beyond();
  return place;
}

function readColumns(root: XmlNode | undefined, looks: readonly CellLook[]): StoredSheet["columns"] {
  const columns: StoredSheet["columns"] = [];
  for (const column of children(down(root, "cols"), "col")) {
    const [first, last] = [count(column, "min", 1), count(column, "max", 1)];
    if (first < 1 || last > mostColumns) continue;
    const characters = Number(attribute(column, "width"));
    const look = looks[count(column, "style", 0)];
    for (let index = first - 1; index < last; index++) {
      while (columns.length < index) columns.push({});
      columns[index] = {
        ...(characters > 0 ? { width: Math.round(characters * digit + edges) } : {}),
        ...(look && Object.keys(look).length > 0 ? { look } : {}),
      };
    }
  }
  return columns;
}

class CellReader {
  readonly cells: StoredCell[] = [];
  readonly left = new Set<string>();
  readonly #surroundings: Surroundings;
  /** By column the last row that an array already read fills. Its first cell comes before its others. */
  readonly #filledTo: number[] = [];
  readonly #shared = new Map<string, { formula: string; row: number; column: number }>();

  constructor(surroundings: Surroundings) {
    this.#surroundings = surroundings;
  }

  readRow(row: number, line: XmlNode): void {
    let column = -1;
    for (const cell of children(line, "c")) {
      const address = attribute(cell, "r");
      column = address === undefined ? column + 1 : placeOf(address).column;
      if (column > lastColumn) throw beyond();
      const read: StoredCell = { row, column };
      const look = this.#surroundings.looks[count(cell, "s", 0)];
      if (look && Object.keys(look).length > 0) read.look = look;
      const value = this.#value(cell);
      if (value !== undefined) read.value = value;
      const isFilled = row <= (this.#filledTo[column] ?? -1);
      this.#readFormula(down(cell, "f"), read);
      if (isFilled && read.formula === undefined) delete read.value;
      if (read.value !== undefined || read.formula !== undefined || read.look) this.cells.push(read);
    }
  }

  #readFormula(formula: XmlNode | undefined, cell: StoredCell): void {
    if (!formula) return;
    const kind = attribute(formula, "t");
    const text = unescapedText(formula.textContent ?? "").trim();
    if (kind === "shared") this.#readShared(attribute(formula, "si") ?? "", text, cell);
    else if (kind !== "dataTable") this.#keep(text, cell);
    if (kind !== "array" || cell.formula === undefined) return;
    const [first, last = first] = (attribute(formula, "ref") ?? "").split(":");
    if (!first || !last) return;
    const [from, to] = [placeOf(first), placeOf(last)];
    const isHere = from.row === cell.row && from.column === cell.column;
    if (!isHere || to.row < from.row || to.column < from.column) return;
    cell.spill = [to.row - from.row + 1, to.column - from.column + 1];
    if (cell.spill[0] * cell.spill[1] === 1) return;
    for (let column = from.column; column <= to.column; column++) this.#filledTo[column] = to.row;
  }

  /** A formula that would take something from outside is left out: nothing of ours fetches, and nothing hands it on. */
  #keep(text: string, cell: StoredCell): void {
    if (text === "") return;
    if (text.length > longestFormula) {
      this.left.add(tooLong);
      return;
    }
    const formula = fromStored(text);
    if (linksOutside(formula) || asksOutside(formula)) this.left.add(outside);
    else cell.formula = formula;
  }

  /** The first cell of those that share a formula holds it; the others only say that they share it. */
  #readShared(id: string, text: string, cell: StoredCell): void {
    const master = this.#shared.get(id);
    if (text !== "") {
      this.#keep(text, cell);
      if (cell.formula !== undefined) {
        this.#shared.set(id, { formula: cell.formula, row: cell.row, column: cell.column });
      }
    } else if (master) {
      cell.formula = shifted(master.formula, cell.row - master.row, cell.column - master.column);
    }
  }

  #value(cell: XmlNode): StoredValue | undefined {
    const type = attribute(cell, "t") ?? "n";
    if (type === "inlineStr") return textOf(down(cell, "is"));
    const written = down(cell, "v")?.textContent ?? undefined;
    if (written === undefined) return undefined;
    if (type === "s") return this.#surroundings.texts[Number(written)] ?? "";
    if (type === "str") return unescapedText(written);
    if (type === "b") return isOn(written);
    if (type === "e") return { error: written };
    if (type === "d") return serialOf(written);
    const number = Number(written);
    return written.trim() === "" || Number.isNaN(number) ? undefined : number;
  }
}

/** Some programs write moments as ISO texts; sheets count days since 1899-12-30. */
function serialOf(written: string): StoredValue {
  const moment = Date.parse(
    /T/.test(written) && !/(Z|[+-]\d\d:\d\d)$/i.test(written) ? `${written}Z` : written,
  );
  return Number.isNaN(moment) ? written : moment / 86_400_000 + 25_569;
}
