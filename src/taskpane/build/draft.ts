import type { Catalogue, CatalogueFunction } from "../../catalogue/catalogue";
import { argumentText, callText, fieldOf } from "../formula/arguments";
import { findCall } from "../formula/syntax";

/** A formula as the fields hold it. */
export interface Draft {
  readonly found: CatalogueFunction;
  /** What each field holds. */
  readonly fields: readonly string[];
  readonly keepBlanks: boolean;
  /** What stands around the call in the formula it was read from: "=ROUND(" and ",1)". */
  readonly before: string;
  readonly after: string;
}

export const emptyDraft = (found: CatalogueFunction): Draft => ({
  found,
  fields: found.parameters.map(() => ""),
  keepBlanks: true,
  before: "=",
  after: "",
});

/** The fields of the first call of ours in a formula. */
export function readDraft(formula: string, catalogue: Catalogue): Draft | undefined {
  const call = findCall(formula, catalogue.namespace);
  const found = catalogue.functions.find(({ id }) => id === call?.id);
  if (!call || !found) return undefined;
  const read = found.parameters.map((parameter, index) => fieldOf(call.given[index] ?? "", parameter));
  const hasRanges = read.some(({ text }) => text.includes(":"));
  return {
    found,
    fields: read.map(({ text }) => text),
    // A formula that was written without keeps its form: explaining must not change it.
    keepBlanks: !hasRanges || read.some(({ blankSafe }) => blankSafe),
    before: call.before,
    after: call.after,
  };
}

export const givenOf = ({ found, fields, keepBlanks }: Draft): string[] =>
  found.parameters.map((parameter, index) => argumentText(fields[index] ?? "", parameter, keepBlanks));

/** The whole formula with these arguments. */
export const formulaOf = (
  { found, before, after }: Draft,
  namespace: string,
  given: readonly string[],
): string => `${before}${callText(namespace, found.id, given)}${after}`;
