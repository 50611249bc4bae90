/** What the benchmark prints and judges. */
export interface Ratio {
  readonly ratio: number;
  readonly limit: number;
}

export interface Line extends Ratio {
  readonly what: string;
  /** What a row costs among many, to what it costs among few. */
  readonly growth?: Ratio | undefined;
  /** Why nothing was measured: the message of a call that was refused. */
  readonly refused?: string | undefined;
}

/** How long the run may take: everything with its limits, or a look for what is out by an order of magnitude. */
export interface Pace {
  readonly quick: boolean;
  /** Every limit on a ratio is multiplied by this. */
  readonly slack: number;
}

export const FULL: Pace = { quick: false, slack: 1 };
export const QUICK: Pace = { quick: true, slack: 10 };

export const HEADING = "    ratio     limit   growth   limit   what";

const number = (value: number): string => (value >= 100 ? value.toFixed(0) : value.toPrecision(2));

/** Also over where nothing could be measured. */
const over = ({ ratio, limit }: Ratio): boolean => !(ratio <= limit);

export const breaks = (line: Line): boolean =>
  over(line) || line.refused !== undefined || (line.growth !== undefined && over(line.growth));

export function printed(line: Line): string {
  const { what, ratio, limit, growth, refused } = line;
  const left = `${number(ratio).padStart(9)} ${number(limit).padStart(9)}`;
  const right =
    growth === undefined
      ? " ".repeat(17)
      : ` ${number(growth.ratio).padStart(8)} ${number(growth.limit).padStart(7)}`;
  const verdict = refused === undefined ? (breaks(line) ? "   OVER" : "") : `   REFUSED: ${refused}`;
  return `${left}${right}   ${what}${verdict}`;
}
