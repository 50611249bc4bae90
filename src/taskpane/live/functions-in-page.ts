import { functionsRuntime, type WorksheetFunction } from "../../catalogue/functions-runtime";

interface PageOfFunctions {
  /** Published by functions.js, which stands before the pane in its page and before the grid in the other. */
  readonly BeadlineFunctions?: Readonly<Record<string, WorksheetFunction>>;
  CustomFunctions?: { Error?: unknown };
}

/**
 * The built function of an id: the very code that the sheet runs, so what the pane shows is what the sheet gives.
 * Undefined where functions.js did not load.
 */
export function functionInPage(id: string): WorksheetFunction | undefined {
  const page = globalThis as PageOfFunctions;
  const found = page.BeadlineFunctions;
  if (!found || !Object.hasOwn(found, id)) return undefined;
  // Opened in an ordinary browser the page has no runtime whose errors the functions could give: none at all, or with
  // Office.js one that only takes functions.
  if (typeof page.CustomFunctions?.Error !== "function")
    page.CustomFunctions = Object.assign(functionsRuntime().CustomFunctions, page.CustomFunctions);
  return found[id];
}
