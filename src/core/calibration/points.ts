/** The points of a certificate: in order, so that what lies between two of them has a meaning. */
import { degrees, noAnswer, type Quantity, type Refusal, wrongKind } from "../errors";
import { fromCelsius } from "../units";

/** Two temperatures this close, °C, are the same. */
export const SAME_TEMPERATURE = 1e-9;

/** An empty cell arrives as 0 in the unit of the sheet, so only the printed message can tell. */
const perhapsEmpty = (t: number): Quantity => ({
  print: (unit) => (Math.abs(fromCelsius(t, unit)) < SAME_TEMPERATURE ? " (0 or an empty cell)" : ""),
});

/** 1 where most steps from point to point rise, −1 where most fall; the first step decides a tie. */
export function directionOf(points: readonly number[]): number {
  const steps = points.slice(1).map((point, i) => Math.sign(point - (points[i] as number)));
  return Math.sign(steps.reduce((sum, step) => sum + step, 0)) || (steps[0] ?? 0);
}

/**
 * Refuses points (°C) that neither rise nor fall strictly, naming the first that breaks
 * the order of most. A trailing empty cell, read as 0, is caught here when points rise.
 */
export function orderRefused(
  points: readonly number[],
  rule = "points must rise or fall throughout",
  direction = directionOf(points),
): Refusal | undefined {
  if (points.length === 0) return noAnswer`no points are given`;
  const at = points.findIndex((point, i) => i > 0 && !((point - (points[i - 1] as number)) * direction > 0));
  if (at < 0) return undefined;
  const before = points[at - 1] as number;
  const after = points[at] as number;
  return wrongKind`${rule}: point ${at + 1} is ${degrees(after)}${perhapsEmpty(after)} after ${degrees(before)}${perhapsEmpty(before)}`;
}

/** Refuses a column that has not one value for each point. */
export const countRefused = (
  points: readonly number[],
  values: readonly number[],
  name: string,
): Refusal | undefined =>
  points.length === values.length
    ? undefined
    : wrongKind`points and ${name} differ in number, ${points.length} and ${values.length}`;

/** The two columns with the points rising. */
export function rising(points: readonly number[], values: readonly number[]): [Float64Array, Float64Array] {
  const falls = (points[0] as number) > (points[points.length - 1] as number);
  const columns = [Float64Array.from(points), Float64Array.from(values)] as [Float64Array, Float64Array];
  if (falls) for (const column of columns) column.reverse();
  return columns;
}

/** i with xs[i] ≤ x < xs[i + 1], by halving; the last interval holds its right end too. xs rise, x lies among them. */
export function intervalOf(xs: Float64Array, x: number): number {
  let low = 0;
  let high = xs.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((xs[middle] as number) <= x) low = middle;
    else high = middle;
  }
  return low;
}
