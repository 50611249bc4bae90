/**
 * Functions that work cell by cell: ranges broadcast as native array formulas do, and
 * a bad cell spoils its own result only (rules 1–6 of the contract).
 */
import type { Arguments, Given } from "../arguments";
import { declare, type WorksheetFunction } from "../declaration";
import { byColumns, onlyNumbersVary } from "./by-columns";
import { Call, type Cell } from "./call";
import type { Cellwise } from "./spec";

export function cellwise<const A extends Arguments, P = undefined>(
  worksheetFunction: WorksheetFunction,
  spec: Cellwise<A, P>,
): (given: Given<A>) => Cell[][] {
  declare(worksheetFunction, spec);
  return (given) => {
    const call = new Call(spec, given as Readonly<Record<string, unknown>>);
    if (call.fault !== undefined) return [[call.fault]];
    if (spec.column !== undefined && onlyNumbersVary(call)) return byColumns(call, spec, spec.column);
    const result: Cell[][] = [];
    for (let row = 0; row < call.rows; row++) {
      const cells: Cell[] = [];
      for (let column = 0; column < call.columns; column++) cells.push(call.cell(row, column));
      result.push(cells);
    }
    return result;
  };
}
