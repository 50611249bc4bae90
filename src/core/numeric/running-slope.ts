/** The slope of a record, point by point. */
import { SlopeParts, SlopeSums } from "./slope-sums";

/** Wider windows are put together from sums over their parts. */
const WIDE = 256;

/**
 * Slope of the least-squares line through the points no further than `halfWidth` from each point. `x` rises, equal
 * values allowed; NaN in `y` is a missing point. NaN in the result: a missing point, or no second abscissa near it.
 *
 * Each window is summed afresh about its own point: sums carried along a long record would gather rounding errors.
 */
export function runningSlope(x: Float64Array, y: Float64Array, halfWidth: number): Float64Array {
  const slopes = new Float64Array(x.length).fill(Number.NaN);
  const sums = new SlopeSums();
  let parts: SlopeParts | undefined;
  let from = 0;
  let to = 0;
  for (let i = 0; i < x.length; i++) {
    const x0 = x[i] as number;
    const y0 = y[i] as number;
    while (to < x.length && (x[to] as number) - x0 <= halfWidth) to++;
    while (x0 - (x[from] as number) > halfWidth) from++;
    if (Number.isNaN(y0)) continue;
    sums.from(x0, y0);
    if (to - from > WIDE) {
      parts ??= new SlopeParts(x, y);
      parts.add(sums, from, to);
    } else {
      for (let k = from; k < to; k++) sums.point(x[k] as number, y[k] as number);
    }
    slopes[i] = sums.slope();
  }
  return slopes;
}
