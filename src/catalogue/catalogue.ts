/**
 * What the build knows of every worksheet function, for the pane, the help page, the
 * README and the example tests. `catalogue.json` beside this file is generated from
 * the functions' JSDoc and declared arguments; nobody writes it by hand.
 */
export interface Catalogue {
  readonly version: string;
  readonly namespace: string;
  readonly categories: readonly Category[];
  readonly functions: readonly CatalogueFunction[];
}

export interface Category {
  readonly name: string;
  /** The job that these functions do, in a sentence. */
  readonly sentence: string;
}

export interface CatalogueFunction {
  readonly id: string;
  readonly category: string;
  readonly description: string;
  readonly parameters: readonly CatalogueParameter[];
  /** What comes back, in words. */
  readonly result: string;
  /** Number formats of the result by column, or one for all: "temperature", "EMF", "text", … */
  readonly resultKinds: readonly ResultColumn[];
  readonly equations: readonly string[];
  readonly definitions: readonly string[];
  readonly assumptions: readonly string[];
  readonly standards: readonly string[];
  readonly cautions: readonly string[];
  readonly keywords: readonly string[];
  readonly examples: readonly Example[];
  readonly see: readonly string[];
}

export interface CatalogueParameter {
  readonly name: string;
  readonly description: string;
  /** "EMF", "temperature", "option", … */
  readonly kind: string;
  readonly unit?: string;
  readonly optional: boolean;
  /** What is used when the argument is left out, as printed. */
  readonly default?: string;
  readonly options?: readonly string[];
  /** `cells`: one cell or a range, cell by cell. `cell`: one cell for the whole call. */
  readonly shape: "cells" | "cell" | "column" | "block";
}

export interface ResultColumn {
  readonly name: string;
  readonly kind: string;
  readonly unit?: string;
}

export interface Example {
  readonly formula: string;
  /** As printed in a cell, or an array constant; a number counts to its printed digits. */
  readonly result: string;
}
