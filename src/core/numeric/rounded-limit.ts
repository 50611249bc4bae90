/**
 * Comparing many numbers with one limit, where what lies at the limit passes: both are rounded to 1E-9 of the unit in
 * which they were given (see `toNinthDecimal`) before they are compared. Here the rounding is done once, to the limit.
 */
const STEPS_PER_UNIT = 1e9;

/** Above this a double, counted in those steps, has no half step left: the number stands as it is. */
const NO_HALF_STEP = 2 ** 52;

export interface RoundedLimit {
  readonly scale: number;
  /** A number times `scale` exceeds the limit from here on. */
  readonly from: number;
}

/** `unit`: size of the given unit in the unit of the numbers: 5/9 for °F held in °C, otherwise 1. */
export function roundedLimit(limit: number, unit = 1): RoundedLimit {
  const scale = STEPS_PER_UNIT / unit;
  const steps = limit * scale;
  if (Math.abs(steps) < NO_HALF_STEP) return { scale, from: Math.round(steps) + 0.5 };
  return { scale: 1, from: limit + Math.abs(limit) * 2 ** -52 };
}

export const exceeds = (value: number, limit: RoundedLimit): boolean => value * limit.scale >= limit.from;
