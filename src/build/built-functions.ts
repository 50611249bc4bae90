// Runs the built functions.js outside any spreadsheet. The bundle is a classic script that knows one global,
// `CustomFunctions`, so a context that holds nothing else also proves that it needs nothing else.

import { createContext, runInContext } from "node:vm";

export type Cell = number | string | boolean | WorksheetError | null;
export type Matrix = Cell[][];
export type WorksheetFunction = (...cells: (Matrix | null)[]) => Matrix;

/** The error object that the functions create in place of a value. */
export class WorksheetError {
  constructor(
    readonly code: string,
    readonly message: string = "",
  ) {}
}

/** The codes as the spreadsheet's runtime spells them. */
const ErrorCode = {
  invalidValue: "#VALUE!",
  notAvailable: "#N/A",
  divisionByZero: "#DIV/0!",
  invalidNumber: "#NUM!",
  nullReference: "#NULL!",
  invalidName: "#NAME?",
  invalidReference: "#REF!",
};

/** Runs the bundle and returns the functions that it associated, by id. */
export function loadBuiltFunctions(source: string): Map<string, WorksheetFunction> {
  const functions = new Map<string, WorksheetFunction>();
  const associate = (id: string, run: WorksheetFunction) => {
    if (functions.has(id)) throw new Error(`functions.js associates ${id} twice.`);
    functions.set(id, run);
  };
  const context = createContext({ CustomFunctions: { associate, Error: WorksheetError, ErrorCode } });
  runInContext(source, context, { filename: "functions.js" });
  return functions;
}
