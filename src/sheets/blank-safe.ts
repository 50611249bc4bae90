/**
 * A range as every formula of ours takes it: desktop Excel hands an empty cell of a range to an add-in as 0, a
 * reading like any other.
 */
export const blankSafe = (range: string): string => `IF(ISBLANK(${range}),"",${range})`;

/** Said once on each sheet that uses it. */
export const blankSafeNote =
  'IF(ISBLANK(range),"",range) keeps empty cells blank: Excel hands them to an add-in as 0, a reading like any other.';
