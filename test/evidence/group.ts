/** A published value beside ours, and groups of them under their source. */
export interface Row {
  readonly what: string;
  readonly published: string;
  readonly ours: string;
  readonly difference: string;
  readonly holds: boolean;
}

export interface Group {
  readonly source: string;
  /** What is compared, with its unit and what counts as agreement. */
  readonly compared: string;
  readonly rows: readonly Row[];
}

/** Digits that change with the last bit of an exponential are noise: two of a difference are enough. */
export const short = (value: number): string =>
  value === 0 ? "0" : value.toExponential(1).replace("e", "E");

/** A published number; `decimals` are those printed, and ours gets three more. */
export function row(
  what: string,
  published: number,
  ours: unknown,
  decimals: number,
  tolerance?: number,
): Row {
  const value = typeof ours === "number" ? ours : Number.NaN;
  // Half a unit of the last printed digit, and the rounding of a sum that ends in 5.
  const allowed = tolerance ?? 0.5 * 10 ** -decimals + 1e-9;
  return {
    what,
    published: published.toFixed(decimals),
    ours: value.toFixed(Math.min(decimals + 3, 20)),
    difference: short(Number((value - published).toFixed(Math.min(decimals + 3, 20)))),
    holds: Math.abs(value - published) <= allowed,
  };
}

/** A published number that is far from 1: in significant digits. */
export function significant(what: string, published: number, ours: unknown, relative: number): Row {
  const value = typeof ours === "number" ? ours : Number.NaN;
  return {
    what,
    published: String(published),
    ours: value.toPrecision(12),
    difference: `${short(Number((value / published - 1).toFixed(14)))} of it`,
    holds: Math.abs(value / published - 1) <= relative,
  };
}
