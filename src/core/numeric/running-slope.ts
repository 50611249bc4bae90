/** The slope of a record, point by point. */

/**
 * Slope of the least-squares line through the points no further than `halfWidth` from each point. `x` rises, equal
 * values allowed; NaN in `y` is a missing point. NaN in the result: a missing point, or no second abscissa near it.
 *
 * Each window is summed afresh about its own point: sums carried along a long record would gather rounding errors.
 */
export function runningSlope(x: Float64Array, y: Float64Array, halfWidth: number): Float64Array {
  const slopes = new Float64Array(x.length).fill(Number.NaN);
  let from = 0;
  let to = 0;
  for (let i = 0; i < x.length; i++) {
    const x0 = x[i] as number;
    const y0 = y[i] as number;
    while (to < x.length && (x[to] as number) - x0 <= halfWidth) to++;
    while (x0 - (x[from] as number) > halfWidth) from++;
    if (!Number.isNaN(y0)) slopes[i] = slope(x, y, from, to, x0, y0);
  }
  return slopes;
}

/** Least-squares slope over from ≤ index < to, with the origin moved to (x0, y0). */
function slope(x: Float64Array, y: Float64Array, from: number, to: number, x0: number, y0: number): number {
  let n = 0;
  let sumX = 0;
  let sumY = 0;
  let sumXX = 0;
  let sumXY = 0;
  let apart = false;
  for (let i = from; i < to; i++) {
    const dy = (y[i] as number) - y0;
    if (Number.isNaN(dy)) continue;
    const dx = (x[i] as number) - x0;
    if (dx !== 0) apart = true;
    n++;
    sumX += dx;
    sumY += dy;
    sumXX += dx * dx;
    sumXY += dx * dy;
  }
  return apart ? (n * sumXY - sumX * sumY) / (n * sumXX - sumX * sumX) : Number.NaN;
}
