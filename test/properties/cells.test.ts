/** What must hold of every cellwise function, whatever stands in its cells. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import catalogue from "../../src/catalogue/catalogue.json";
import * as worksheet from "../../src/functions";
import { errorCell, one, readable } from "../functions/call";

type WorksheetFunction = (...given: (unknown[][] | undefined)[]) => unknown[][];

/** What stands in the required arguments that hold for the whole call. */
const HELD: Readonly<Record<string, unknown[][]>> = {
  coefficients: [[10], [0.01]],
  crossedAt: [["both"]],
  expandedUncertainties: [[1], [2], [3]],
  high: [[1000]],
  low: [[0]],
  points: [[0], [500], [1000]],
  values: [[1], [2], [3]],
  // A resistance at 25 °C and a beta.
  "NTCTEMPERATURE coefficients": [[10000], [3950]],
};

/** Each argument: a range that broadcasts, something for the whole call, or nothing. */
const functions = catalogue.functions.flatMap(({ id, parameters }) => {
  const worksheetFunction = Object.entries(worksheet).find(([name]) => name === id)?.[1] as WorksheetFunction;
  if (!parameters.some(({ shape }) => shape === "cells")) return [];
  const taken = parameters.map(({ name, shape, optional }) => {
    if (shape === "cells") return "range";
    if (optional) return undefined;
    const held = HELD[`${id} ${name}`] ?? HELD[name];
    if (held === undefined) throw new Error(`${id}: say in HELD what stands in ${name}`);
    return held;
  });
  const ranges = taken.filter((one) => one === "range").length;
  const call = (given: readonly (unknown[][] | undefined)[]): unknown[][] => {
    let next = 0;
    return worksheetFunction(...taken.map((one) => (one === "range" ? given[next++] : one)));
  };
  return [{ id, ranges, call }];
});

const cell = fc.oneof(
  { weight: 6, arbitrary: fc.double({ min: -20, max: 80, noNaN: true }) },
  { weight: 2, arbitrary: fc.constantFrom("K", "b", " type N ", "Au/Pt", "L", "constructor") },
  { weight: 1, arbitrary: fc.constantFrom<unknown>("", null, true, " ", "1,5", "NaN") },
  { weight: 1, arbitrary: fc.constantFrom(Number.NaN, Number.POSITIVE_INFINITY, 1e308, -1e-308) },
  { weight: 1, arbitrary: fc.constantFrom("#N/A", "#REF!", "#DIV/0!").map((code) => errorCell(code)) },
);

const block = fc
  .tuple(fc.integer({ min: 1, max: 4 }), fc.integer({ min: 1, max: 3 }))
  .chain(([rows, columns]) =>
    fc.array(fc.array(cell, { minLength: columns, maxLength: columns }), {
      minLength: rows,
      maxLength: rows,
    }),
  );

/** The cell that broadcasting hands on, written here once more: stretch a dimension of 1, else nothing. */
function stretched(
  matrix: readonly (readonly unknown[])[],
  row: number,
  column: number,
): unknown[][] | undefined {
  const cells = matrix.length === 1 ? matrix[0] : matrix[row];
  if (cells === undefined) return undefined;
  if (cells.length === 1) return one(cells[0]);
  return column < cells.length ? one(cells[column]) : undefined;
}

describe.each(functions)("$id", ({ ranges, call }) => {
  it("gives a block the results that its cells have alone, in the shape of the largest argument", () => {
    fc.assert(
      fc.property(fc.array(block, { minLength: ranges, maxLength: ranges }), (given) => {
        const result = readable(call(given));
        const rows = Math.max(...given.map((matrix) => matrix.length));
        const columns = Math.max(...given.map((matrix) => matrix[0]?.length ?? 0));
        expect(result.length).toBe(rows);
        for (let row = 0; row < rows; row++) {
          expect(result[row]?.length).toBe(columns);
          for (let column = 0; column < columns; column++) {
            const cells = given.map((matrix) => stretched(matrix, row, column));
            if (cells.some((alone) => alone === undefined)) {
              expect(result[row]?.[column]).toBe("#N/A no value here: the ranges differ in size");
            } else {
              expect(result[row]?.[column]).toBe(readable(call(cells))[0]?.[0]);
            }
          }
        }
      }),
      { numRuns: 300 },
    );
  });

  it("answers with numbers, texts and errors only, never NaN or infinity", () => {
    fc.assert(
      fc.property(fc.array(block, { minLength: ranges, maxLength: ranges }), (given) => {
        for (const result of call(given).flat()) {
          if (typeof result === "number") expect(Number.isFinite(result)).toBe(true);
          else if (typeof result !== "string") expect(result).toBeInstanceOf(CustomFunctions.Error);
        }
      }),
      { numRuns: 300 },
    );
  });
});
