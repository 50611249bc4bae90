/**
 * Ties what a worksheet function's JSDoc cannot say (kinds, defaults, result) to the
 * declared function itself, so that the build finds both together and the compiler
 * checks the link.
 */
import type { Arguments } from "./arguments";
import type { ResultKind } from "./results";

export type WorksheetFunction = (...given: never[]) => unknown[][];

export interface Declaration {
  readonly arguments: Arguments;
  /** One result, or the columns of a table that spills. */
  readonly result: ResultKind | Readonly<Record<string, ResultKind>>;
}

const declarations = new Map<WorksheetFunction, Declaration>();

export function declare(worksheetFunction: WorksheetFunction, declaration: Declaration): void {
  declarations.set(worksheetFunction, declaration);
}

export function declarationOf(worksheetFunction: WorksheetFunction): Declaration {
  const declaration = declarations.get(worksheetFunction);
  if (declaration === undefined) throw new Error("a worksheet function without declared arguments");
  return declaration;
}
