/** The soak: the longest stretch with every sensor present and in band. */
import { noAnswer, Refusal } from "../errors";
import { longer, roundedMinutes, type TimeGrid } from "../log/time-grid";
import { overshoots } from "./approach";
import { type SurveyLog, surveyBlock } from "./block";
import { ALL_IN_BAND, OUT_OF_BAND, scanStates, whyNever } from "./scan-state";

export interface Soak {
  /** First and last scan, counted from 0. */
  readonly first: number;
  readonly last: number;
  readonly minutes: number;
  /** From the first scan of the log to the first of the soak. */
  readonly minutesToReach: number;
  /** Highest reading less the set point on the way into the soak, °C; 0 when reached from above. */
  readonly overshoot: number;
  /** How often readings left the band between the first and the last scan in band. */
  readonly interruptions: number;
}

/**
 * The soak of a log; the first of several that are equally long. A reading out of band, a missing one or a gap ends a
 * stretch. Refused: what `surveyBlock` refuses, no scan with every sensor in band, none that lasts past one scan.
 */
export function soak(log: SurveyLog): Soak | Refusal {
  const block = surveyBlock(log);
  if (block instanceof Refusal) return block;
  const states = scanStates(block);
  const { times } = block.grid;
  const stretch = longestStretch(block.grid, states);
  if (stretch === undefined) return noAnswer`no scan has every sensor in band${whyNever(block)}`;
  const { first, last } = stretch;
  const minutes = roundedMinutes((times[last] as number) - (times[first] as number));
  if (minutes === 0) return noAnswer`no soak: every sensor is in band for no longer than one scan`;
  return {
    first,
    last,
    minutes,
    minutesToReach: roundedMinutes((times[first] as number) - (times[0] as number)),
    overshoot: Math.max(...overshoots(block, first, last)),
    interruptions: interruptions(states),
  };
}

function longestStretch(
  { times, gap }: TimeGrid,
  states: Uint8Array,
): { first: number; last: number } | undefined {
  let best: { first: number; last: number } | undefined;
  let first = 0;
  for (let scan = 0; scan < states.length; scan++) {
    if (states[scan] !== ALL_IN_BAND) continue;
    if (states[scan - 1] !== ALL_IN_BAND || gap[scan] === 1) first = scan;
    const minutes = (times[scan] as number) - (times[first] as number);
    const most = best === undefined ? -1 : (times[best.last] as number) - (times[best.first] as number);
    if (best?.first === first || longer(minutes, most)) best = { first, last: scan };
  }
  return best;
}

/** Stretches with a reading out of band, between the first and the last scan in band. */
function interruptions(states: Uint8Array): number {
  let count = 0;
  let left = false;
  const last = states.lastIndexOf(ALL_IN_BAND);
  for (let scan = states.indexOf(ALL_IN_BAND); scan <= last; scan++) {
    const state = states[scan] as number;
    if ((state & OUT_OF_BAND) !== 0) left = true;
    else if (state === ALL_IN_BAND && left) {
      count++;
      left = false;
    }
  }
  return count;
}
