import type { CatalogueFunction } from "../../catalogue/catalogue";
import { type Block, columnsOf, parseAddress, parseBlock, rowsOf } from "../workbook/address";
import { type Expression, parse } from "./syntax";

export interface Shape {
  readonly rows: number;
  readonly columns: number;
}

/** Whether a function answers cell by cell, so that its result has the shape of its arguments together. */
export const isCellwise = ({ parameters }: CatalogueFunction): boolean =>
  parameters.every(({ shape }) => shape === "cells" || shape === "cell") &&
  parameters.some(({ shape }) => shape === "cells");

/** The block of an argument that is a range, blank-safe or not. */
export function rangeOf(argument: string): string | undefined {
  const read = parse(argument);
  if (read.kind === "range") return read.address;
  if (read.kind !== "call" || read.name !== "IF") return undefined;
  const last = read.given[2];
  return last?.kind === "range" ? last.address : undefined;
}

export const blockOf = (address: string): Block => parseBlock(parseAddress(address).range);

/** The shape of a cellwise result; undefined where an argument's shape cannot be told without the sheet. */
export function resultShape(given: readonly string[]): Shape | undefined {
  let shape: Shape = { rows: 1, columns: 1 };
  for (const argument of given) {
    if (argument === "") continue;
    const own = shapeOf(argument);
    if (own === undefined) return undefined;
    shape = { rows: Math.max(shape.rows, own.rows), columns: Math.max(shape.columns, own.columns) };
  }
  return shape;
}

function shapeOf(argument: string): Shape | undefined {
  const range = rangeOf(argument);
  if (range !== undefined) {
    const block = blockOf(range);
    return { rows: rowsOf(block), columns: columnsOf(block) };
  }
  const read: Expression = parse(argument);
  if (read.kind === "array") return { rows: read.rows.length, columns: read.rows[0]?.length ?? 0 };
  return read.kind === "constant" ? { rows: 1, columns: 1 } : undefined;
}
