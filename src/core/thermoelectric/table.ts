/** The temperatures of a printed table: from start to end in equal steps. */
import { noAnswer, type Refusal, wrongKind } from "../errors";

/** A worksheet has no more rows than this, header included. */
const MOST_ROWS = 1_048_575;

/**
 * Start, start + step, … up to end (or down to it, when end lies below); end itself
 * is the last one when the steps meet it. `step` is positive.
 */
export function temperatureGrid(start: number, end: number, step: number): number[] | Refusal {
  if (!(step > 0)) return wrongKind`step ${step} is not above 0`;
  // A step that divides the span in print (0.1) may miss it by rounding.
  const intervals = Math.floor(Math.abs(end - start) / step + 1e-9);
  if (intervals >= MOST_ROWS) return noAnswer`table of ${intervals + 1} rows is longer than a worksheet`;
  const signed = end < start ? -step : step;
  return Array.from({ length: intervals + 1 }, (_, index) => start + index * signed);
}
