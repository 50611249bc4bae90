/**
 * The part of the custom-functions runtime that the functions use, made global for tests as the
 * spreadsheet makes it global for them.
 */
class CellError {
  constructor(
    readonly code: string,
    readonly message?: string,
  ) {}
}

const runtime = {
  Error: CellError,
  ErrorCode: {
    invalidValue: "#VALUE!",
    notAvailable: "#N/A",
    divisionByZero: "#DIV/0!",
    invalidNumber: "#NUM!",
    nullReference: "#NULL!",
    invalidName: "#NAME?",
    invalidReference: "#REF!",
  },
  associate(): void {},
};

Object.assign(globalThis, { CustomFunctions: runtime });
