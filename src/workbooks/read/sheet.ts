import { parseCell } from "../../sheets";
import type { CellLook, StoredCell, StoredSheet, StoredValue } from "../content";
import { shifted } from "../shifted-formula";
import { fromStored } from "../stored-formula";
import { unescapedText } from "../xml";
import { attribute, children, count, down, isOn, textOf, type XmlNode } from "./xml-node";

const digit = 7;
const edges = 5;
const pixelsPerPoint = 4 / 3;

/** Wider ranges of columns are those of a whole sheet, which says nothing about a column. */
const mostColumns = 1024;

export interface Surroundings {
  looks: readonly CellLook[];
  texts: readonly string[];
}

/** A sheet with its formulas as they are typed. Cells that a dynamic array fills hold no values of their own. */
export function readSheet(name: string, root: XmlNode | undefined, surroundings: Surroundings): StoredSheet {
  const pane = down(root, "sheetViews", "sheetView", "pane");
  const isFrozen = attribute(pane, "state")?.startsWith("frozen") ?? false;
  const reader = new CellReader(surroundings);
  const heights: { row: number; height: number }[] = [];
  let row = -1;
  for (const line of children(down(root, "sheetData"), "row")) {
    // Numbers may be left out: then it is the next.
    row = count(line, "r", row + 2) - 1;
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
    cells: reader.cells(),
  };
}

function readColumns(root: XmlNode | undefined, looks: readonly CellLook[]): StoredSheet["columns"] {
  const columns: StoredSheet["columns"] = [];
  for (const column of children(down(root, "cols"), "col")) {
    const [first, last] = [count(column, "min", 1), count(column, "max", 1)];
    if (last > mostColumns) continue;
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
  readonly #surroundings: Surroundings;
  readonly #cells: StoredCell[] = [];
  readonly #filled: { top: number; left: number; bottom: number; right: number }[] = [];
  readonly #shared = new Map<string, { formula: string; row: number; column: number }>();

  constructor(surroundings: Surroundings) {
    this.#surroundings = surroundings;
  }

  readRow(row: number, line: XmlNode): void {
    let column = -1;
    for (const cell of children(line, "c")) {
      const address = attribute(cell, "r");
      column = address === undefined ? column + 1 : parseCell(address).column;
      const read: StoredCell = { row, column };
      const look = this.#surroundings.looks[count(cell, "s", 0)];
      if (look && Object.keys(look).length > 0) read.look = look;
      const value = this.#value(cell);
      if (value !== undefined) read.value = value;
      this.#readFormula(down(cell, "f"), read);
      if (read.value !== undefined || read.formula !== undefined || read.look) this.#cells.push(read);
    }
  }

  /** What an array fills spills again by itself, and would not where its cells are taken. */
  cells(): StoredCell[] {
    const isFilled = ({ row, column }: StoredCell) =>
      this.#filled.some(
        ({ top, left, bottom, right }) => row >= top && row <= bottom && column >= left && column <= right,
      );
    return this.#cells.flatMap((cell) => {
      if (cell.formula !== undefined || !isFilled(cell)) return cell;
      const { value: _, ...rest } = cell;
      return rest.look ? rest : [];
    });
  }

  #readFormula(formula: XmlNode | undefined, cell: StoredCell): void {
    if (!formula) return;
    const kind = attribute(formula, "t");
    const text = unescapedText(formula.textContent ?? "").trim();
    if (kind === "shared") this.#readShared(attribute(formula, "si") ?? "", text, cell);
    else if (text !== "" && kind !== "dataTable") cell.formula = fromStored(text);
    if (kind !== "array" || cell.formula === undefined) return;
    const [first, last = first] = (attribute(formula, "ref") ?? "").split(":");
    if (!first || !last) return;
    const [from, to] = [parseCell(first), parseCell(last)];
    cell.spill = [to.row - from.row + 1, to.column - from.column + 1];
    if (cell.spill[0] * cell.spill[1] > 1) {
      this.#filled.push({ top: from.row, left: from.column, bottom: to.row, right: to.column });
    }
  }

  /** The first cell of those that share a formula holds it; the others only say that they share it. */
  #readShared(id: string, text: string, cell: StoredCell): void {
    const master = this.#shared.get(id);
    if (text !== "") {
      cell.formula = fromStored(text);
      this.#shared.set(id, { formula: cell.formula, row: cell.row, column: cell.column });
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
