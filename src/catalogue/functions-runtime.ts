/**
 * The part of Excel's custom-functions runtime that functions.js knows: a global
 * `CustomFunctions` to associate its functions with and to make errors by. For every
 * place that runs the functions without Excel: the local sheet, the build, the tests.
 */
export type WorksheetFunction = (...given: unknown[]) => unknown;

/** Codes and spelling are those of the custom-functions runtime. */
export const errorCodes = {
  invalidValue: "#VALUE!",
  notAvailable: "#N/A",
  divisionByZero: "#DIV/0!",
  invalidNumber: "#NUM!",
  nullReference: "#NULL!",
  invalidName: "#NAME?",
  invalidReference: "#REF!",
} as const;

/** Not a JavaScript error: in Excel it is a plain object too, and 100 000 of them must not collect stacks. */
export class WorksheetError {
  constructor(
    readonly code: string,
    readonly message?: string,
  ) {}
}

export interface FunctionsRuntime {
  /** The functions that have been associated, by id. */
  readonly associated: Map<string, WorksheetFunction>;
  /** What is to become the global `CustomFunctions`. */
  readonly CustomFunctions: object;
}

export function functionsRuntime(): FunctionsRuntime {
  const associated = new Map<string, WorksheetFunction>();
  return {
    associated,
    CustomFunctions: {
      Error: WorksheetError,
      ErrorCode: errorCodes,
      associate(id: string, worksheetFunction: WorksheetFunction) {
        if (associated.has(id)) throw new Error(`functions.js associates ${id} twice`);
        associated.set(id, worksheetFunction);
      },
    },
  };
}
