import { make } from "../../taskpane/dom";
import type { CellLook } from "../../workbooks";
import { linedUp } from "./line-up";
import type { PageFit } from "./page-fit";
import type { PrintedCell } from "./printed-sheet";

export interface TableParts {
  widths: readonly number[];
  head: readonly (readonly PrintedCell[])[];
  body: readonly (readonly PrintedCell[])[];
  /** Stands beneath the table on each page. */
  foot: string;
  caption: string;
}

/** The cells as a table that a screen reader can walk through; its head comes again on each page. */
export function sheetTable({ widths, head, body, foot, caption }: TableParts, fit: PageFit): HTMLElement {
  const columns = fit.shares.map((share) => {
    const column = make("col");
    column.style.width = `${share}%`;
    return column;
  });
  const rowOf = (row: readonly PrintedCell[], isHeader: boolean) =>
    make(
      "tr",
      {},
      ...linedUp(row, widths).map(({ cell, across, breaks }) => {
        const colspan = across > 1 ? String(across) : undefined;
        const element =
          isHeader && cell.text !== "" ? make("th", { scope: "col", colspan }) : make("td", { colspan });
        written(element, cell);
        element.classList.toggle("broken", breaks);
        return element;
      }),
    );
  const table = make(
    "table",
    { class: "print-table" },
    make("caption", { class: "unseen" }, caption),
    make("colgroup", {}, ...columns),
    make("thead", {}, ...head.map((row, index) => rowOf(row, index === head.length - 1))),
    make("tbody", {}, ...body.map((row) => rowOf(row, false))),
    make("tfoot", {}, make("tr", {}, make("td", { colspan: String(Math.max(1, widths.length)) }, foot))),
  );
  table.style.width = `${fit.width}pt`;
  table.style.fontSize = `${fit.points}pt`;
  return table;
}

/** Text alone, whatever a cell holds, in the look that it has in the grid. */
export function written<Element extends HTMLElement>(element: Element, cell: PrintedCell): Element {
  const { text, isNumber, look } = cell;
  element.textContent = text;
  const names = classesOf(look, isNumber);
  if (names) element.className = names;
  if (look.colour) element.style.color = `#${look.colour}`;
  if (look.size) element.style.fontSize = `${look.size / 11}em`;
  return element;
}

const classesOf = ({ align, bold, indented, wrapped }: CellLook, isNumber: boolean): string =>
  [
    align ?? (isNumber ? "right" : ""),
    isNumber ? "figure" : "",
    bold ? "bold" : "",
    indented ? "indented" : "",
    wrapped ? "wrapped" : "",
  ]
    .filter(Boolean)
    .join(" ");
