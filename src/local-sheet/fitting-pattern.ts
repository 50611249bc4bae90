/** Digits that a column of usual width holds, the decimal mark and a sign included. */
const digits = 9;

/** A number format that keeps a long number inside its column; undefined where the general format does. */
export function fittingPattern(value: number): string | undefined {
  if (value === 0 || String(value).length <= digits) return undefined;
  const size = Math.abs(value);
  if (size >= 1e9 || size < 1e-3) return "0.000E+00";
  const decimals = digits - 2 - String(Math.trunc(size)).length;
  return decimals > 0 ? `0.${"0".repeat(decimals)}` : "0";
}
