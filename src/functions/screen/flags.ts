import { flagger, Refusal } from "../../core";
import { ifGiven, once, readings as readingsOf } from "../arguments";
import { columnwise } from "../columnwise";
import { number, sheetDifference, sheetTemperature } from "../kinds/numbers";
import { wordResult } from "../results";

/**
 * A word for each reading of a raw log: over (or open), under, spike, stuck, step or missing; an empty text for a good
 * one.
 * @customfunction FLAGS
 * @category Screen
 * @param readings Logged readings, a column per sensor, in whatever degrees the sheet holds. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0.
 * @param low Readings below are flagged under.
 * @param high Readings above are flagged over: too hot, or an open sensor.
 * @param [maxStep] Largest believable change from one scan to the next, in degrees; step and spike are off when left out.
 * @param [stuckCount] A run of at least so many equal readings is stuck, 2 or more; off when left out.
 * @param [spikeWidth] A jump of more than maxStep that comes back within so many scans is a spike, 1 to 1000; off when left out.
 * @returns A block of words in the shape of the readings.
 * @definition Where several apply, the first of: missing, over, under, spike, stuck, step. Missing is a blank, a text, TRUE or FALSE, or an error.
 * @definition spike: every reading of the jump, up to the one that is back within max step of the level before. step: the first reading at a new level. stuck: every reading of the run.
 * @definition Changes are taken between neighbouring scans; after a missing, over or under reading nothing is known of the change. At a limit passes.
 * @standard Common practice of data screening
 * @keywords data quality, outlier, open sensor, burnout, stuck sensor, spike, log check, validation
 * @related DESPIKE, TIMELINE, RAMPRATE
 * @example =BEAD.FLAGS({20;21;500;22;""},0,100) → {"";"";"over";"";"missing"}
 * @example =BEAD.FLAGS({20;21;60;22;23},0,100,10,,2) → {"";"";"spike";"";""}
 */
export function FLAGS(
  readings: unknown[][],
  low: unknown[][],
  high: unknown[][],
  maxStep?: unknown[][],
  stuckCount?: unknown[][],
  spikeWidth?: unknown[][],
): unknown[][] {
  return flags({ readings, low, high, maxStep, stuckCount, spikeWidth });
}

const flags = columnwise(FLAGS, {
  arguments: {
    readings: readingsOf(sheetTemperature),
    low: once(sheetTemperature),
    high: once(sheetTemperature),
    maxStep: ifGiven(once(sheetDifference)),
    stuckCount: ifGiven(once(number)),
    spikeWidth: ifGiven(once(number)),
  },
  result: wordResult,
  block: ({ readings }) => readings,
  answers({ readings, ...limits }) {
    const flag = flagger(limits);
    return flag instanceof Refusal ? flag : readings.columns.map(flag);
  },
});
