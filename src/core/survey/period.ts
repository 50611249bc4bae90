/** The survey period: the scans that a survey is about. */
import { noAnswer, type Refusal } from "../errors";
import { longer, TIME_RESOLUTION, type TimeGrid } from "../log/time-grid";
import type { SurveyBlock } from "./block";
import { ALL_IN_BAND, whyNever } from "./scan-state";

export interface SurveyPeriod {
  /** First and last scan, counted from 0; both belong to it. */
  readonly first: number;
  readonly last: number;
  /** The log has a gap where the period that was asked for begins or ends. */
  readonly ragged: boolean;
}

/**
 * Without `start` and `end` (minutes, as the times): from the first to the last scan with every sensor present and in
 * band. Otherwise the scans from start to end; a side that is left out falls back on the first or last scan in band
 * within the other. Refused: start after end, no scan between them, no reading between them, no scan in band.
 */
export function surveyPeriod(
  block: SurveyBlock,
  states: Uint8Array,
  start?: number,
  end?: number,
): SurveyPeriod | Refusal {
  const { times } = block.grid;
  const from = start ?? Number.NEGATIVE_INFINITY;
  const to = end ?? Number.POSITIVE_INFINITY;
  if (from > to) return noAnswer`start lies after end`;
  // Times of date-time cells carry a rounding error: a bound that is a scan's own time must hold that scan.
  let first = 0;
  while ((times[first] as number) < from - TIME_RESOLUTION) first++;
  let last = times.length - 1;
  while ((times[last] as number) > to + TIME_RESOLUTION) last--;
  if (first > last) return noAnswer`the log has no scan between start and end`;
  const ragged = raggedStart(block.grid, first, start) || raggedEnd(block.grid, last, end);
  if (start === undefined || end === undefined) {
    const firstIn = states.indexOf(ALL_IN_BAND, first);
    const lastIn = states.lastIndexOf(ALL_IN_BAND, last);
    if (firstIn < 0 || firstIn > last) return noAnswer`no scan has every sensor in band${whyNever(block)}`;
    if (start === undefined) first = firstIn;
    if (end === undefined) last = lastIn;
  }
  const silent = block.sensors.every((column) => column.subarray(first, last + 1).every(Number.isNaN));
  if (silent) return noAnswer`no sensor has a reading between start and end`;
  return { first, last, ragged };
}

/**
 * Nothing is known from `start` to the first scan: the log begins too late, or a gap reaches into the period. Left
 * out, the start is the first scan itself.
 */
function raggedStart(
  { times, gap, maxGap }: TimeGrid,
  first: number,
  start = times[first] as number,
): boolean {
  const wait = (times[first] as number) - start;
  return longer(wait, 0) && (gap[first] === 1 || longer(wait, maxGap));
}

/** The same at the other side. */
function raggedEnd({ times, gap, maxGap }: TimeGrid, last: number, end = times[last] as number): boolean {
  const rest = end - (times[last] as number);
  return longer(rest, 0) && (gap[last + 1] === 1 || longer(rest, maxGap));
}
