/** The arguments of a call over so many rows: its documented example, grown. */
import type { CatalogueFunction } from "../../src/catalogue/catalogue";
import { parseExample } from "../../src/catalogue/formula";
import { wholeColumn } from "../properties/large-input";

/** A function takes no more where a result would not fit a worksheet, or it would not end. */
const MOST: Readonly<Record<string, number>> = {
  // Two readings at each point, a row of the result for each.
  CHECKTABLE: 500_000,
  TIMECONSTANT: 20_000,
};

export const mostRows = ({ id }: CatalogueFunction, rows: number): number => Math.min(rows, MOST[id] ?? rows);

/** Whether its documented example has an argument that can be a range. */
export const takesRanges = ({ examples, parameters }: CatalogueFunction): boolean => {
  const { given } = parseExample(examples[0]?.formula ?? "");
  return parameters.some(({ shape }, i) => shape !== "cell" && given[i] != null);
};

/** A reading a second: level for a quarter of the record, then a response that settles, with a ripple. */
function recordedStep(rows: number): unknown[] {
  const before = rows / 4;
  const times = Array.from({ length: rows }, (_, i) => [i]);
  const readings = times.map(([time = 0]) => {
    const settled = time < before ? 0 : 1 - Math.exp((before - time) / (rows / 8));
    return [20 + 80 * settled + 0.2 * Math.sin(time * time)];
  });
  return [times, readings, [["s"]]];
}

/** The arguments call by call: the same, save for a simulation, which would be remembered and not done again. */
export function argumentsOf(one: CatalogueFunction, rows: number): () => unknown[] {
  // An example that comes again and again is no step.
  const given = one.id === "TIMECONSTANT" ? recordedStep(rows) : wholeColumn(one, rows);
  const seed = one.parameters.findIndex(({ name }) => name === "seed");
  if (seed < 0) return () => given;
  let calls = 0;
  return () => given.with(seed, [[++calls]]);
}
