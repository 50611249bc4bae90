/**
 * One call of every function over a whole column (1 048 576 rows) and over a whole row (16 384 columns): it ends, with
 * a sound result or a refusal. A routine that is quadratic in its rows would take hours; the limit is far from what
 * any of them needs and near to nothing that such a routine could meet.
 */
import { describe, expect, it } from "vitest";
import type { CatalogueFunction } from "../../src/catalogue/catalogue";
import catalogue from "../../src/catalogue/catalogue.json";
import * as worksheet from "../../src/functions";
import { ROWS, wholeColumn, wholeRow } from "./large-input";

type Call = (...given: unknown[]) => unknown[][];

/** Cells that are looked at in a long result; the first and the last among them. */
const LOOKED_AT = 1000;

/** Cell by cell all functions share one loop: TEMPERATURE and VERDICT, its two ways, go the whole length for them. */
const rowsFor = ({ id, parameters }: CatalogueFunction): number =>
  id === "TEMPERATURE" || id === "VERDICT" || parameters[0]?.shape !== "cells" ? ROWS : ROWS / 16;

function expectSound(result: unknown[][]): void {
  expect(result.length).toBeGreaterThan(0);
  const width = (result[0] as unknown[]).length;
  expect(width).toBeGreaterThan(0);
  const ragged = result.findIndex((row) => row.length !== width);
  expect(ragged).toBe(-1);
  for (let i = 0; i <= LOOKED_AT; i++) {
    const row = result[Math.round(((result.length - 1) * i) / LOOKED_AT)] as unknown[];
    const cell = row[Math.round(((width - 1) * i) / LOOKED_AT)];
    if (typeof cell === "number") expect(Number.isFinite(cell)).toBe(true);
    else if (typeof cell !== "string") expect(cell).toBeInstanceOf(CustomFunctions.Error);
  }
}

describe.each(catalogue.functions as readonly CatalogueFunction[])("$id", (one) => {
  const call = (worksheet as unknown as Record<string, Call>)[one.id] as Call;

  it("answers a whole column", { timeout: 180_000 }, () => {
    expectSound(call(...wholeColumn(one, rowsFor(one))));
  });

  it("answers a whole row", { timeout: 180_000 }, () => {
    expectSound(call(...wholeRow(one)));
  });
});
