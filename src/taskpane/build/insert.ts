import { perRow } from "../formula/per-row";
import type { Shape } from "../formula/shape";
import type { LiveCell } from "../live/evaluate";
import { formatsOf } from "../live/show-value";
import { addressOn, type Block, blockName, parseBlock } from "../workbook/address";
import { type History, writeWithWayBack } from "../workbook/undo";
import type { Workbook, Writing } from "../workbook/workbook";
import { type Draft, formulaOf } from "./draft";
import type { Target } from "./target";

/** One formula whose results spill, or one in each cell. */
export type Form = "spill" | "per row";

export interface Insertion {
  readonly draft: Draft;
  readonly given: readonly string[];
  readonly namespace: string;
  readonly target: Target;
  /** The cells that the result fills. */
  readonly area: string;
  readonly shape: Shape;
  readonly form: Form;
  /** What the result looks like, as far as it is known. */
  readonly cells: readonly (readonly LiveCell[])[];
  /** Whether what stands in the area goes, as agreed. */
  readonly clears: boolean;
}

/** Writes the formula with the number formats of its results; what stood there is kept for the way back. */
export async function insert(workbook: Workbook, history: History, insertion: Insertion): Promise<void> {
  const { draft, given, namespace, target, area, shape, form } = insertion;
  const on = (range: string) => addressOn(target.sheet, range);
  const formulas =
    form === "spill"
      ? [[formulaOf(draft, namespace, given)]]
      : perRow(given, shape, (own) => formulaOf(draft, namespace, own));
  const whole = form === "per row" || insertion.clears;
  const inputs = whole ? blockOf(formulas, shape) : formulas;
  const writings: Writing[] = [
    ...formatsFor(insertion, on),
    { range: on(whole ? area : target.cell), inputs },
  ];
  await writeWithWayBack(workbook, history, `Inserted the formula in ${target.cell}`, writings);
  await workbook.select(on(target.cell));
}

/** A long column has one kind of result in all its rows; a table has its formats cell by cell. */
function formatsFor({ draft, cells, area, shape }: Insertion, on: (range: string) => string): Writing[] {
  if (cells.length === 0) return [];
  const formats = formatsOf(draft.found, cells);
  const all = new Set(formats.flat());
  if (cells.length === shape.rows && all.size > 1) return [{ range: on(area), formats }];
  const known = [...all].find((format) => format !== "General");
  return known === undefined ? [] : [{ range: on(area), formats: known }];
}

/** Cells of an area that a result does not fill yet: what must be free before it grows over them. */
export function grownOver(area: string, filled: string): string[] {
  const [next, now] = [parseBlock(area), parseBlock(filled)];
  const grown: Block[] = [];
  if (next.lastRow > now.lastRow) grown.push({ ...next, row: now.lastRow + 1 });
  if (next.lastColumn > now.lastColumn) {
    grown.push({ ...next, column: now.lastColumn + 1, lastRow: Math.min(next.lastRow, now.lastRow) });
  }
  return grown.map(blockName);
}

/** Empty cells after those that are given. */
const blockOf = (given: readonly (readonly string[])[], { rows, columns }: Shape): string[][] =>
  Array.from({ length: rows }, (_, row) =>
    Array.from({ length: columns }, (_, column) => given[row]?.[column] ?? ""),
  );
