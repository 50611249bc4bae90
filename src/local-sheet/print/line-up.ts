import type { PrintedCell, PrintedSheet } from "./printed-sheet";

type Row = readonly PrintedCell[];

/** A cell with the columns that it takes, itself among them. */
export interface PlacedCell {
  cell: PrintedCell;
  across: number;
  /** Holds a word far too long for the room, which has to be broken; one that is a little too long runs over. */
  breaks: boolean;
}

/** A rough width of a character, and the room at a cell's edges, both in the grid's pixels. */
const character = 7.5;
const edges = 6;
const gridPoints = 11;

/** By how much a word may run over before it is broken. */
const over = 1.3;

const widthOf = ({ text, look }: PrintedCell): number =>
  text.length * character * ((look.size ?? gridPoints) / gridPoints) + edges;

const longestWord = (text: string): string =>
  text.split(/\s/).reduce((longest, word) => (word.length > longest.length ? word : longest), "");

/** A text too long for its column runs on over empty cells to its right, as it does in the grid. */
export function linedUp(row: Row, widths: readonly number[]): PlacedCell[] {
  const placed: PlacedCell[] = [];
  for (let column = 0; column < row.length; ) {
    const cell = row[column]!;
    let across = 1;
    let width = widths[column]!;
    if (cell.text !== "" && !cell.isNumber && !cell.look.wrapped && cell.look.align !== "right") {
      const needed = widthOf(cell);
      while (width < needed && row[column + across]?.text === "") width += widths[column + across++]!;
    }
    const breaks = !cell.isNumber && widthOf({ ...cell, text: longestWord(cell.text) }) > over * width;
    placed.push({ cell, across, breaks });
    column += across;
  }
  return placed;
}

/**
 * Title and remarks at the top come once, above the table. What is left of the frozen rows heads the table, and
 * comes again on each page.
 */
export function partsOf({ rows, frozenRows }: PrintedSheet): {
  lines: readonly PrintedCell[];
  head: readonly Row[];
  body: readonly Row[];
} {
  const frozen = rows.slice(0, frozenRows);
  const heads = frozen.findIndex((row) => row.some(({ text }, column) => column > 0 && text !== ""));
  const first = heads < 0 ? frozen.length : heads;
  return {
    lines: rows.slice(0, first).flatMap(([cell]) => (cell?.text ? [cell] : [])),
    head: rows.slice(first, frozen.length),
    body: rows.slice(frozen.length),
  };
}
