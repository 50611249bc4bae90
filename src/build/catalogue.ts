// The catalogue: the words from the JSDoc, the kinds and defaults from the declared arguments, joined by function.

import type {
  Catalogue,
  CatalogueFunction,
  CatalogueParameter,
  Example,
  ResultColumn,
} from "../catalogue/catalogue";
import * as worksheet from "../functions";
import type { Argument } from "../functions/arguments";
import { type Declaration, declarationOf, type WorksheetFunction } from "../functions/declaration";
import { families } from "../functions/families";
import { version } from "../functions/version";
import type { DocumentedFunction } from "./sources";

const SHAPES = { each: "cells", once: "cell", column: "column", block: "block" } as const;

const worksheetFunctions = new Map<string, WorksheetFunction>(Object.entries(worksheet));

function worksheetFunction(id: string): WorksheetFunction {
  const found = worksheetFunctions.get(id);
  if (found === undefined) throw new Error(`src/functions exports no ${id}`);
  return found;
}

const listed = (texts: readonly string[], separator: string): string[] =>
  texts.flatMap((text) => text.split(separator).map((part) => part.trim())).filter((part) => part !== "");

function example(id: string, text: string): Example {
  const [formula, result] = text.split(" → ");
  if (formula === undefined || result === undefined)
    throw new Error(`${id}: @example without " → ": ${text}`);
  return { formula, result };
}

function parameter(
  { name, description, optional }: DocumentedFunction["parameters"][number],
  { kind, shape, printed }: Argument<unknown>,
): CatalogueParameter {
  return {
    name,
    description,
    kind: kind.name,
    ...(kind.unit === undefined ? {} : { unit: kind.unit }),
    optional,
    ...(printed === undefined ? {} : { default: printed }),
    ...(kind.options === undefined ? {} : { options: kind.options }),
    shape: SHAPES[shape],
  };
}

function resultColumns(result: Declaration["result"]): ResultColumn[] {
  const named = typeof result.write === "function" ? { "": result } : result;
  return Object.entries(named as Record<string, { name: string; unit?: string }>).map(([name, kind]) => ({
    name,
    kind: kind.name,
    ...(kind.unit === undefined ? {} : { unit: kind.unit }),
  }));
}

function entry(documented: DocumentedFunction): CatalogueFunction {
  const { id, tags } = documented;
  const declaration = declarationOf(worksheetFunction(id));
  const names = Object.keys(declaration.arguments);
  if (names.join() !== documented.parameters.map(({ name }) => name).join()) {
    throw new Error(`${id}: the declared arguments are not its parameters, or not in their order`);
  }
  const category = tags("category")[0] ?? "";
  if (!families.some(({ name }) => name === category))
    throw new Error(`${id}: unknown category "${category}"`);
  return {
    id,
    category,
    description: documented.description,
    parameters: documented.parameters.map((one) => {
      const argument = declaration.arguments[one.name] as Argument<unknown>;
      if (argument.optional !== one.optional)
        throw new Error(`${id}: ${one.name} is optional in one place only`);
      return parameter(one, argument);
    }),
    result: tags("returns")[0] ?? "",
    resultKinds: resultColumns(declaration.result),
    equations: tags("equation"),
    definitions: tags("definition"),
    assumptions: tags("assumes"),
    standards: listed(tags("standard"), ";"),
    cautions: tags("caution"),
    keywords: listed(tags("keywords"), ","),
    examples: tags("example").map((text) => example(id, text)),
    see: listed(tags("related"), ","),
  };
}

export const catalogue = (documented: readonly DocumentedFunction[]): Catalogue => ({
  version,
  namespace: "BEAD",
  categories: families,
  functions: documented.map(entry),
});
