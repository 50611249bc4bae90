/** A word for each reading of a raw log. */
import { noAnswer, type Refusal, wrongKind } from "../errors";
import { refusedSetting } from "../numeric/above-zero";
import { exceeds, type RoundedLimit, roundedLimit } from "../numeric/rounded-limit";

/** "" for a good reading. Where several apply, the first of this order: missing, over, under, spike, stuck, step. */
export type Flag = "" | "missing" | "over" | "under" | "spike" | "stuck" | "step";

export interface FlagLimits {
  /** Readings below are `under`. */
  readonly low: number;
  /** Readings above are `over`: too hot, or an open sensor. */
  readonly high: number;
  /** Largest believable change from one scan to the next; `step` and `spike` are off without it. */
  readonly maxStep?: number | undefined;
  /** A run of at least so many equal readings is `stuck`; off without it. */
  readonly stuckCount?: number | undefined;
  /** A jump that comes back within so many scans is a `spike`; off without it. */
  readonly spikeWidth?: number | undefined;
}

/** Scans of a spike width: what stays away for longer is a step. */
const WIDEST = 1000;

/** Prepared limits, for any number of columns. */
export type Flagger = (readings: Float64Array) => Flag[];

/**
 * Flags a column of readings in any unit, NaN where missing. Limits are rounded to 1E-9 before they are compared; at
 * the limit passes. Changes are taken between readings in neighbouring scans only: after a missing reading, or one
 * that is over or under, nothing is known of the change.
 * Refused: low not below high, limits that are not above 0, counts that are not whole, a spike width without max step.
 */
export function flagger(limits: FlagLimits): Flagger | Refusal {
  const { low, high, maxStep, stuckCount, spikeWidth } = limits;
  if (!(low < high)) return noAnswer`low ${low} is not below high ${high}`;
  const refused = maxStep === undefined ? undefined : refusedSetting(maxStep, "max step");
  if (refused !== undefined) return refused;
  if (stuckCount !== undefined && !(Number.isInteger(stuckCount) && stuckCount >= 2)) {
    return wrongKind`stuck count ${stuckCount} is no whole number from 2 up`;
  }
  if (
    spikeWidth !== undefined &&
    !(Number.isInteger(spikeWidth) && spikeWidth >= 1 && spikeWidth <= WIDEST)
  ) {
    return wrongKind`spike width ${spikeWidth} is no whole number from 1 to ${WIDEST}`;
  }
  if (spikeWidth !== undefined && maxStep === undefined) {
    return wrongKind`a spike width needs a max step, which says how far a spike jumps`;
  }
  const over = roundedLimit(high);
  const under = roundedLimit(-low);
  const jump = maxStep === undefined ? undefined : roundedLimit(maxStep);
  return (readings) => {
    const flags = new Array<Flag>(readings.length).fill("");
    readings.forEach((reading, i) => {
      if (Number.isNaN(reading)) flags[i] = "missing";
      else if (exceeds(reading, over)) flags[i] = "over";
      else if (exceeds(-reading, under)) flags[i] = "under";
    });
    if (jump !== undefined) markJumps(readings, flags, jump, spikeWidth ?? 0);
    if (stuckCount !== undefined) markStuck(readings, flags, stuckCount);
    return flags;
  };
}

/** Jumps that come back within `width` scans are spikes; others are steps, flagged in the first scan at the new level. */
function markJumps(readings: Float64Array, flags: Flag[], jump: RoundedLimit, width: number): void {
  const usable = (i: number): boolean => flags[i] === "" || flags[i] === "step";
  const jumps = (from: number, to: number): boolean =>
    exceeds(Math.abs((readings[to] as number) - (readings[from] as number)), jump);
  /** The first scan after `start`, no more than `width` on, whose reading is back at the level before it. */
  const comesBack = (start: number): number | undefined => {
    for (let k = start + 1; k <= start + width; k++) {
      if (usable(k) && !jumps(start - 1, k)) return k;
    }
    return undefined;
  };
  for (let i = 1; i < readings.length; i++) {
    if (!usable(i) || !usable(i - 1) || !jumps(i - 1, i)) continue;
    const back = comesBack(i);
    if (back === undefined) flags[i] = "step";
    else for (let k = i; k < back; k++) if (usable(k)) flags[k] = "spike";
  }
}

function markStuck(readings: Float64Array, flags: Flag[], count: number): void {
  let start = 0;
  for (let i = 1; i <= readings.length; i++) {
    if (readings[i] === readings[start]) continue;
    if (i - start >= count) {
      for (let k = start; k < i; k++) if (flags[k] === "" || flags[k] === "step") flags[k] = "stuck";
    }
    start = i;
  }
}
