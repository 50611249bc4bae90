import type { Catalogue, CatalogueFunction } from "../catalogue/catalogue";

/** Number format of one result cell; undefined for the sheet's general format. */
export type ResultFormat = (value: number, column: number, columns: number) => string | undefined;

/** Digits by kind of quantity: finer than any thermocouple reading, and still well inside a column. */
const formats: Record<string, string> = {
  temperature: "0.00",
  EMF: "0.0000",
  "Seebeck coefficient": "0.000",
};

/**
 * How the results of a function are shown, so that none runs into its neighbour: in the general format the engine
 * shows every digit, and cuts them at the column's edge. Excel fits the digits to the column by itself.
 */
export function resultFormats(catalogue: Catalogue): (id: string) => ResultFormat {
  const known = new Map(catalogue.functions.map((each) => [each.id, formatOf(each)]));
  return (id) => known.get(id) ?? byValue;
}

function formatOf({ resultKinds }: CatalogueFunction): ResultFormat {
  const kinds = resultKinds.map(({ kind }) => formats[kind]);
  return (value, column, columns) => {
    if (kinds.length === 1) return kinds[0] ?? byValue(value);
    // A table shows its kinds side by side; one value or column of it does not say which it is.
    return columns === kinds.length ? (kinds[column] ?? byValue(value)) : byValue(value);
  };
}

const byValue = (value: number) => (Number.isInteger(value) ? undefined : "0.0000");
