/** What the benchmark holds its ratios to, in the words in which the README quotes them. */
export interface Limit {
  readonly what: string;
  readonly limit: number;
}

export const limits = {
  inverse: { what: "exact inverse, to one evaluation of the reference function", limit: 1.5 },
  formula: { what: "one formula over a million readings, to the bare loop of those evaluations", limit: 4 },
  references: { what: "the same with a reference temperature in every row", limit: 5.5 },
  sheet: {
    what: "one formula over 10 000 readings on the local sheet, to a native polynomial in each cell",
    limit: 1,
  },
} as const satisfies Readonly<Record<string, Limit>>;
