/**
 * What the built functions.js expects of Excel: a global `CustomFunctions` to associate its functions with and to
 * make errors by. Installed before the script is loaded.
 */
export type WorksheetFunction = (...parameters: unknown[]) => unknown;

/** Codes and spelling are those of the custom functions runtime. */
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

export function installCustomFunctions(target: object): Map<string, WorksheetFunction> {
  const associated = new Map<string, WorksheetFunction>();
  Object.assign(target, {
    CustomFunctions: {
      Error: WorksheetError,
      ErrorCode: errorCodes,
      associate(idOrMap: string | Record<string, WorksheetFunction>, implementation?: WorksheetFunction) {
        if (typeof idOrMap !== "string") {
          for (const [id, each] of Object.entries(idOrMap)) associated.set(id.toUpperCase(), each);
        } else if (implementation) associated.set(idOrMap.toUpperCase(), implementation);
      },
    },
  });
  return associated;
}
