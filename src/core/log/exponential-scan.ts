/**
 * Where a fit of a + b·exp(−t/τ) should begin its search for τ, for the rest of a record from each of its rows on: the
 * best τ of a scan that cannot miss the valley. Done for all rows at once: from one row to the row before it, each
 * sum of exp(−t/τ) only decays by the interval between them and gains that row.
 */

/** Between neighbours of the scan τ grows by this factor: the valley in ln τ is far wider. */
const SCAN_FACTOR = 1.5;

/** `times` rise from anywhere; τ from `shortest` up to `longest`. */
export function bestOfScan(
  times: Float64Array,
  values: Float64Array,
  shortest: number,
  longest: number,
): Float64Array {
  const n = times.length;
  const best = new Float64Array(n).fill(shortest);
  const least = new Float64Array(n).fill(Number.POSITIVE_INFINITY);
  // Sums of values as they are would lose a small step at a high temperature.
  const level = values.reduce((sum, value) => sum + value, 0) / n;
  for (let timeConstant = shortest; timeConstant <= longest; timeConstant *= SCAN_FACTOR) {
    let decay = 0;
    let decaySquares = 0;
    let products = 0;
    let sum = 0;
    let valueSquares = 0;
    for (let row = n - 1; row >= 0; row--) {
      const interval = row < n - 1 ? (times[row + 1] as number) - (times[row] as number) : 0;
      const left = interval > 0 ? Math.exp(-interval / timeConstant) : 1;
      const value = (values[row] as number) - level;
      decay = 1 + left * decay;
      decaySquares = 1 + left * left * decaySquares;
      products = value + left * products;
      sum += value;
      valueSquares += value * value;
      const count = n - row;
      const along = products - (decay * sum) / count;
      const squares =
        valueSquares - (sum * sum) / count - (along * along) / (decaySquares - (decay * decay) / count);
      if (squares < (least[row] as number)) {
        least[row] = squares;
        best[row] = timeConstant;
      }
    }
  }
  return best;
}
