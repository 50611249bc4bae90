/** A documented example grown to a whole column or a whole row of a worksheet. */
import type { CatalogueFunction } from "../../src/catalogue/catalogue";
import { parseExample } from "../../src/catalogue/formula";

export const ROWS = 1_048_576;
export const COLUMNS = 16_384;

type Range = readonly (readonly unknown[])[];

/** Whether one column of numbers only rises, as times and certificate points do: repeated, it would be refused. */
const rises = (range: Range): boolean =>
  range.length > 1 &&
  range.every(([value, ...more], i) => {
    const before = range[i - 1]?.[0] ?? Number.NEGATIVE_INFINITY;
    return more.length === 0 && typeof value === "number" && value > (before as number);
  });

/**
 * So many rows. Times go on in the steps of the example; what else rises fills the example's own span, so that it
 * stays in range; anything else comes again.
 */
function down(range: Range, rows: number, kind: string): unknown[][] {
  if (!rises(range)) return Array.from({ length: rows }, (_, row) => range[row % range.length] as unknown[]);
  const first = range[0]?.[0] as number;
  const span = (range[range.length - 1]?.[0] as number) - first;
  const step = span / ((kind === "time" ? range.length : rows) - 1);
  return Array.from({ length: rows }, (_, row) => [first + row * step]);
}

const across = (range: Range): unknown[][] =>
  range.map((cells) => Array.from({ length: COLUMNS }, (_, column) => cells[column % cells.length]));

/**
 * The arguments of the call: the example's own ranges grown together or, where it has none, the first argument;
 * single cells stay as they are.
 */
function grown(
  { examples, parameters }: CatalogueFunction,
  direction: "down" | "across",
  rows = ROWS,
): unknown[] {
  const given = parseExample(examples[0]?.formula ?? "").given;
  const all: unknown[] = parameters.map((_, i) => given[i] ?? null);
  const grows = parameters.flatMap(({ shape, kind }, i) => {
    const range = given[i];
    if (range == null || shape === "cell") return [];
    // A row of readings belongs to one time each: only blocks and cells grow sideways.
    if (direction === "across" && shape === "column" && parameters.some((one) => one.shape === "block"))
      return [];
    return range.length > 1 || i === 0 || kind === "rows" ? [i] : [];
  });
  for (const i of grows.length > 0 ? grows : [0]) {
    const range = (given[i] ?? [[1]]) as Range;
    all[i] = direction === "down" ? down(range, rows, parameters[i]?.kind ?? "") : across(range);
  }
  return all;
}

export const wholeColumn = (one: CatalogueFunction, rows = ROWS): unknown[] => grown(one, "down", rows);
export const wholeRow = (one: CatalogueFunction): unknown[] => grown(one, "across");
