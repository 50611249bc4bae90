// Runs the built functions.js outside any spreadsheet. The bundle is a classic script that knows one global,
// `CustomFunctions`, so a context that holds nothing else also proves that it needs nothing else.

import { createContext, runInContext } from "node:vm";
import { functionsRuntime, type WorksheetError } from "../catalogue/functions-runtime";

export type Cell = number | string | boolean | WorksheetError | null;
export type Matrix = Cell[][];
export type WorksheetFunction = (...cells: (Matrix | null)[]) => Matrix;

/** Runs the bundle and returns the functions that it associated, by id. */
export function loadBuiltFunctions(source: string): Map<string, WorksheetFunction> {
  const { associated, CustomFunctions } = functionsRuntime();
  runInContext(source, createContext({ CustomFunctions }), { filename: "functions.js" });
  return associated as Map<string, WorksheetFunction>;
}
