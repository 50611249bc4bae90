/** A logger's time column put in order. Every change has a name; what cannot be decided is left as it is. */
import { noAnswer, type Refusal } from "../errors";
import { spreadRepeatedStamps } from "./repeated-stamps";
import { medianInterval, TIME_RESOLUTION } from "./time-grid";

export interface Timeline {
  /** Minutes to add to each time; exactly 0 where it stands as it was. */
  readonly added: Float64Array;
  /** What was repaired in a row, "" for nothing. A change of the clock is named once, in the first row it moves. */
  readonly repairs: readonly string[];
}

const DAY = 1440;
const HOUR = 60;

/** A stamp out of order is told from a clock change by the next one, which goes on within so many intervals. */
const NEXT_WITHIN = 3;

/**
 * Repairs of a time column in minutes (a missing time is NaN, and stays missing):
 * - `midnight`: it falls by more than half a day and no more than a whole one, so the date is missing: a day is added;
 * - `clock change`: adding whole hours makes it go on at about the usual interval;
 * - `clock set back`: any other fall; it goes on at the usual interval;
 * - `out of order`: one stamp falls and the next goes on as if it had not: it is put midway between its neighbours;
 * - `repeated stamp`: spread over the time to the next.
 *
 * A clock put forward cannot be told from a gap, and is left: as a gap it adds nothing to any duration.
 * Refused: no two times, times that never rise, and a log whose newest scan comes first.
 */
export function timeline(times: Float64Array): Timeline | Refusal {
  const rows = presentRows(times);
  if (rows.length < 2) return noAnswer`a timeline needs at least 2 times`;
  const interval = medianInterval(times.filter((time) => !Number.isNaN(time)));
  if (newestFirst(times, rows))
    return noAnswer`the times fall from row to row: sort the log, oldest scan first`;
  if (Number.isNaN(interval)) return noAnswer`the times never rise`;
  const added = new Float64Array(times.length);
  const repairs = new Array<string>(times.length).fill("");
  let shift = 0;
  let before = times[rows[0] as number] as number;
  for (let k = 1; k < rows.length; k++) {
    const row = rows[k] as number;
    const time = times[row] as number;
    if (time < before) {
      const next = times[rows[k + 1] ?? -1] ?? Number.NaN;
      if (next >= before && next - before <= NEXT_WITHIN * interval + TIME_RESOLUTION) {
        added[row] = shift + (before + next) / 2 - time;
        repairs[row] = "out of order, put between its neighbours";
        continue;
      }
      const change = clockChange(time - before, interval);
      shift += change.minutes;
      repairs[row] = change.name;
    }
    added[row] = shift;
    before = time;
  }
  spreadRepeatedStamps(times, rows, interval, added, repairs);
  return { added, repairs };
}

/** What puts a fall of the clock right: minutes to add from this row on. `step` is below 0. */
function clockChange(step: number, interval: number): { minutes: number; name: string } {
  if (-step > DAY / 2 && -step <= DAY) return { minutes: DAY, name: "midnight, 1 day added" };
  const hours = Math.ceil(-step / HOUR);
  if (Math.abs(step + hours * HOUR - interval) <= interval / 2) {
    return { minutes: hours * HOUR, name: `clock change, ${hours} h added` };
  }
  const minutes = interval - step;
  return { minutes, name: `clock set back, ${Number(minutes.toPrecision(3))} min added` };
}

function presentRows(times: Float64Array): number[] {
  const rows: number[] = [];
  times.forEach((time, row) => {
    if (!Number.isNaN(time)) rows.push(row);
  });
  return rows;
}

function newestFirst(times: Float64Array, rows: readonly number[]): boolean {
  let falls = 0;
  let rises = 0;
  for (let k = 1; k < rows.length; k++) {
    const step = (times[rows[k] as number] as number) - (times[rows[k - 1] as number] as number);
    if (step < 0) falls++;
    else if (step > 0) rises++;
  }
  // A single fall may be midnight.
  return falls > 1 && falls > rises;
}
