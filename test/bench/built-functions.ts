/** The built functions.js, imported as a browser would run it: a sandboxed context would slow its look-up of globals. */
import { resolve } from "node:path";
import "../custom-functions-runtime";

export type WorksheetFunction = (...given: unknown[]) => unknown[][];

let built: Promise<Map<string, WorksheetFunction>> | undefined;

async function load(): Promise<Map<string, WorksheetFunction>> {
  const found = new Map<string, WorksheetFunction>();
  Object.assign(CustomFunctions, {
    associate: (id: string, worksheetFunction: WorksheetFunction) => found.set(id, worksheetFunction),
  });
  await import(resolve("dist/functions.js"));
  return found;
}

/** Loaded once: a module is run no second time. */
export const builtFunctions = (): Promise<Map<string, WorksheetFunction>> => {
  built ??= load();
  return built;
};
