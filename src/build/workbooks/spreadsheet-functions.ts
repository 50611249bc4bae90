// The spreadsheet's own functions that the samples use, as Excel documents them.

import { WorksheetError } from "../../catalogue/functions-runtime";

/** null is a truly empty cell. */
export type Cell = number | string | boolean | WorksheetError | null;
export type Block = Cell[][];

const isFault = (cell: Cell | undefined): cell is WorksheetError => cell instanceof WorksheetError;

/** Cell by cell over blocks of one size; a single row, column or cell stands for all. */
export function cellwise(blocks: Block[], of: (...cells: Cell[]) => Cell): Block {
  const rows = Math.max(...blocks.map((block) => block.length));
  const columns = Math.max(...blocks.map((block) => block[0]!.length));
  const at = (block: Block, row: number, column: number): Cell => {
    const line = block.length === 1 ? block[0]! : block[row];
    const cell = line?.length === 1 ? line[0] : line?.[column];
    return cell === undefined ? new WorksheetError("#N/A") : cell;
  };
  return Array.from({ length: rows }, (_, row) =>
    Array.from({ length: columns }, (_, column) => of(...blocks.map((block) => at(block, row, column)))),
  );
}

export function operate(sign: string, left: Block, right: Block): Block {
  return cellwise([left, right], (a, b) => {
    if (isFault(a)) return a;
    if (isFault(b)) return b;
    if (sign === "&") return `${a ?? ""}${b ?? ""}`;
    if (["=", "<>", "<", ">", "<=", ">="].includes(sign)) return compare(sign, a, b);
    return arithmetic(sign, a, b);
  });
}

function arithmetic(sign: string, a: Cell, b: Cell): Cell {
  const [x, y] = [toNumber(a), toNumber(b)];
  if (x === undefined || y === undefined) return new WorksheetError("#VALUE!");
  if (sign === "/" && y === 0) return new WorksheetError("#DIV/0!");
  const value = { "+": x + y, "-": x - y, "*": x * y, "/": x / y, "^": x ** y }[sign]!;
  return Number.isFinite(value) ? value : new WorksheetError("#NUM!");
}

/** A text in arithmetic counts by what it says. Dates in texts are not read here: no sample has any. */
function toNumber(cell: Cell): number | undefined {
  if (cell === null) return 0;
  if (typeof cell === "boolean") return Number(cell);
  if (typeof cell === "number") return cell;
  return typeof cell === "string" && /^\s*[-+]?\d+(\.\d+)?\s*$/.test(cell) ? Number(cell) : undefined;
}

/** Every text is more than every number; texts compare without regard to case. */
function compare(sign: string, a: Cell, b: Cell): boolean {
  const rank = (cell: Cell) => ["number", "string", "boolean"].indexOf(typeof cell);
  const empty = (other: Cell): Cell =>
    typeof other === "string" ? "" : typeof other === "boolean" ? false : 0;
  const [x, y] = [a ?? empty(b), b ?? empty(a)];
  const order =
    typeof x === "number" && typeof y === "number"
      ? x - y
      : rank(x) - rank(y) || String(x).toUpperCase().localeCompare(String(y).toUpperCase(), "en");
  return {
    "=": order === 0,
    "<>": order !== 0,
    "<": order < 0,
    ">": order > 0,
    "<=": order <= 0,
    ">=": order >= 0,
  }[sign]!;
}

const one: Block = [[0]];

/** The numbers of ranges: texts and empty cells do not count, an error is the result. */
function overNumbers(blocks: Block[], of: (numbers: number[]) => Cell): Block {
  const cells = blocks.flat(2);
  return [[cells.find(isFault) ?? of(cells.filter((cell) => typeof cell === "number"))]];
}

const mean = (numbers: number[]): Cell =>
  numbers.length > 0
    ? numbers.reduce((sum, each) => sum + each, 0) / numbers.length
    : new WorksheetError("#DIV/0!");

/** Cell by cell of numbers alone. */
const numeric = (blocks: Block[], of: (...numbers: number[]) => number): Block =>
  cellwise(blocks, (...cells) => {
    const numbers = cells.map((cell) => (isFault(cell) ? cell : toNumber(cell)));
    return (
      numbers.find((each) => isFault(each ?? null)) ??
      (numbers.includes(undefined) ? new WorksheetError("#VALUE!") : of(...(numbers as number[])))
    );
  });

/**
 * Away from zero or towards it as the sheet does: of the digits that are written, so that 0.3 stays 0.3 although
 * three tenths are a little more in binary.
 */
function rounded(value: number, digits: number, to: (value: number) => number): number {
  const scaled = Number(`${Number(Math.abs(value).toPrecision(15))}e${digits}`);
  return Math.sign(value) * Number(`${to(Number(scaled.toPrecision(15)))}e${-digits}`);
}

type SpreadsheetFunction = (...given: (Block | undefined)[]) => Block;

const present = (given: (Block | undefined)[]) => given.map((block) => block ?? one);

export const spreadsheetFunctions: Readonly<Record<string, SpreadsheetFunction>> = {
  IF: (condition = one, yes = [[true]], no = [[false]]) =>
    cellwise([condition, yes, no], (asked, then, otherwise) => {
      if (isFault(asked)) return asked;
      const truth = typeof asked === "boolean" ? asked : toNumber(asked);
      if (truth === undefined) return new WorksheetError("#VALUE!");
      return (truth ? then : otherwise) ?? 0;
    }),
  IFERROR: (value = one, otherwise = one) =>
    cellwise([value, otherwise], (each, instead) => (isFault(each) ? instead : each) ?? 0),
  ISBLANK: (value = one) => cellwise([value], (cell) => cell === null),
  ISNUMBER: (value = one) => cellwise([value], (cell) => typeof cell === "number"),
  ABS: (value = one) => numeric([value], Math.abs),
  ROUND: (value = one, digits = one) => numeric([value, digits], (x, to) => rounded(x, to, Math.round)),
  ROUNDUP: (value = one, digits = one) => numeric([value, digits], (x, to) => rounded(x, to, Math.ceil)),
  ROUNDDOWN: (value = one, digits = one) => numeric([value, digits], (x, to) => rounded(x, to, Math.floor)),
  MIN: (...given) =>
    overNumbers(present(given), (numbers) => (numbers.length > 0 ? Math.min(...numbers) : 0)),
  MAX: (...given) =>
    overNumbers(present(given), (numbers) => (numbers.length > 0 ? Math.max(...numbers) : 0)),
  SUM: (...given) => overNumbers(present(given), (numbers) => numbers.reduce((sum, each) => sum + each, 0)),
  AVERAGE: (...given) => overNumbers(present(given), mean),
  COUNT: (...given) => [
    [
      present(given)
        .flat(2)
        .filter((cell) => typeof cell === "number").length,
    ],
  ],
  INDEX: (block = one, row = one, column = [[1]]) => {
    const [r, c] = [row[0]![0], column[0]![0]].map((cell) => (isFault(cell) ? cell : toNumber(cell ?? null)));
    if (isFault(r)) return [[r]];
    if (isFault(c)) return [[c]];
    // Of a single row the second argument counts the columns.
    const [down, across] = block.length === 1 && column.length === 0 ? [1, r] : [r, c];
    const found = block[(down ?? 0) - 1]?.[(across ?? 0) - 1];
    return [[found === undefined ? new WorksheetError("#REF!") : (found ?? 0)]];
  },
  MATCH: (wanted = one, within = one, mode) => {
    if (mode?.[0]?.[0] !== 0) throw new Error("MATCH is known here only with 0 as its third argument");
    const sought = wanted[0]![0]!;
    if (isFault(sought)) return [[sought]];
    const at = within
      .flat()
      .findIndex((cell) => !isFault(cell) && cell !== null && compare("=", cell, sought));
    return [[at < 0 ? new WorksheetError("#N/A") : at + 1]];
  },
};
