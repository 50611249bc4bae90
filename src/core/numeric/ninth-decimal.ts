/** Beyond this a double has no ninth decimal to round. */
const NO_NINTH_DECIMAL = 2 ** 53 / 1e9;

/**
 * A number rounded to 1E-9, halves away from zero. Differences and limits are rounded
 * so before they are compared: 902.2 − 900 is 2.2000000000000455 in binary, and does
 * not exceed a limit of 2.2.
 */
export function toNinthDecimal(value: number): number {
  const size = Math.abs(value);
  if (!(size < NO_NINTH_DECIMAL)) return value;
  return (Math.sign(value) * Math.round(size * 1e9)) / 1e9;
}
