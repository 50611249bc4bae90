/** Loggers that round their clock to the second give several scans the same stamp. */

/**
 * Spreads each run of equal stamps evenly up to the next stamp, no further apart than the usual `interval` (a gap may
 * follow). Adds to `added` and `repairs`; the first stamp of a run stands. `rows`: those that have a time.
 */
export function spreadRepeatedStamps(
  times: Float64Array,
  rows: readonly number[],
  interval: number,
  added: Float64Array,
  repairs: string[],
): void {
  const repaired = (k: number): number => {
    const row = rows[k] as number;
    return (times[row] as number) + (added[row] as number);
  };
  // Before the first row and after the last there is no stamp: NaN, which is unlike any other.
  const stamps = rows.filter((_, k) => repaired(k) !== repaired(k - 1)).length;
  let start = 0;
  while (start < rows.length) {
    const stamp = repaired(start);
    let end = start + 1;
    while (repaired(end) === stamp) end++;
    const toNext =
      end < rows.length
        ? (repaired(end) - stamp) / (end - start)
        : // After the last stamp there is only the usual share of an interval to go by.
          (interval * stamps) / rows.length;
    const spacing = Math.min(toNext, interval);
    for (let k = start + 1; k < end; k++) {
      const row = rows[k] as number;
      added[row] = (added[row] as number) + (k - start) * spacing;
      const name = "repeated stamp, spread";
      repairs[row] = repairs[row] === "" ? name : `${repairs[row]}; ${name}`;
    }
    start = end;
  }
}
