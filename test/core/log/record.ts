/** Small records for tests. */
import { Refusal } from "../../../src/core";
import { type TimeGrid, timeGrid } from "../../../src/core/log";

export const column = (...values: (number | undefined)[]): Float64Array =>
  Float64Array.from(values, (value) => value ?? Number.NaN);

/** Scans so many minutes apart. */
export const every = (minutes: number, count: number): Float64Array =>
  Float64Array.from({ length: count }, (_, i) => i * minutes);

/** The value, or the test fails with the refusal's words. */
export function given<T>(value: T | Refusal): T {
  if (value instanceof Refusal) throw new Error(`refused: ${value.message()}`);
  return value;
}

export function refusal(value: unknown): string {
  if (!(value instanceof Refusal)) throw new Error("not refused");
  return `${value.kind === "wrong kind" ? "#VALUE!" : "#N/A"} ${value.message()}`;
}

export const grid = (times: Float64Array, maxGap?: number): TimeGrid => given(timeGrid(times, maxGap));

/** Noise that looks random and is the same on every machine: the golden ratio's multiples, made even about 0. */
export const jitter = (i: number): number => ((i * 0.618033988749895) % 1) - 0.5;
