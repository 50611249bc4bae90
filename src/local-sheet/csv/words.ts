/** A count with thin spaces between thousands. */
export const count = (value: number): string => value.toLocaleString("en-US").replaceAll(",", "\u2009");

/** "1 row", "2 rows". */
export const counted = (value: number, noun: string): string =>
  `${count(value)} ${noun}${value === 1 ? "" : "s"}`;
