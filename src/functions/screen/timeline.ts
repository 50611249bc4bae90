import { Refusal, timeline as repaired, wrongKind } from "../../core";
import { ifGiven, once, readings } from "../arguments";
import { choice } from "../kinds/kind";
import { time as timeKind } from "../kinds/numbers";
import { MINUTES_PER_DAY } from "../kinds/time-unit";
import { timeResult, wordResult } from "../results";
import { table } from "../whole";

/**
 * A logger's time column put in order: midnight rollovers, clock changes and repeated stamps repaired, each repair
 * named in its row.
 * @customfunction TIMELINE
 * @category Screen
 * @param times One column of date-time serials, or of times of day without a date. Write IF(ISBLANK(range),"",range), so that an empty cell is not read as midnight.
 * @param [column] One column without its header: time or repair.
 * @returns Rows of time and repair, one for each row given; format the first column as date and time. A time that needed no repair is the cell's own number.
 * @definition midnight: the time falls by more than half a day and no more than a whole one; a day is added from there on.
 * @definition clock change: whole hours, added from there on, let the log go on at about its usual (median) interval. Any other fall is a clock set back: the log goes on at the usual interval.
 * @definition out of order: one stamp falls and the next goes on as if it had not; it is put midway between its neighbours.
 * @definition repeated stamp: equal stamps are spread evenly up to the next one, no further apart than the usual interval. The first of them stands.
 * @definition A change of the clock is named once, in the first row that it moves. A blank time stays blank; a cell that is no time keeps its own error.
 * @assumes Scans at about equal intervals. A clock put forward cannot be told from a gap, and is left as it is.
 * @standard Common practice of data loggers
 * @keywords logger, clock, midnight rollover, daylight saving, summer time, duplicate time stamps, sort, sequence
 * @related FLAGS, SOAK, RAMPRATE
 * @example =BEAD.TIMELINE({0.90;0.95;0.02},"time") → {0.90;0.95;1.02}
 * @example =BEAD.TIMELINE({0.90;0.95;0.02},"repair") → {"";"";"midnight, 1 day added"}
 */
export function TIMELINE(times: unknown[][], column?: unknown[][]): unknown[][] {
  return timeline({ times, column });
}

const timeline = table(TIMELINE, {
  arguments: {
    times: readings(timeKind),
    column: ifGiven(once(choice(["time", "repair"]))),
  },
  result: { time: timeResult, repair: wordResult },
  rows({ times }) {
    const [column, ...others] = times.columns;
    if (column === undefined || others.length > 0)
      return wrongKind`times: one column, not ${others.length + 1}`;
    const inSheet = withoutEmptyCells(column);
    const origin = inSheet.find((time) => !Number.isNaN(time)) ?? 0;
    const line = repaired(inSheet.map((time) => (time - origin) * MINUTES_PER_DAY));
    if (line instanceof Refusal) return line;
    return Array.from(inSheet, (time, row) => ({
      time: Number.isNaN(time)
        ? (times.fault(row, 0) ?? wrongKind`time: 0 or an empty cell`)
        : time + (line.added[row] as number) / MINUTES_PER_DAY,
      repair: line.repairs[row] as string,
    }));
  },
});

/**
 * An empty cell of a desktop sheet comes as 0. That is midnight in a column of times of day, but no date; and several
 * at the end are rows below the log.
 */
function withoutEmptyCells(times: Float64Array): Float64Array {
  let end = times.length;
  while (end > 0 && !(times[end - 1] !== 0)) end--;
  const below = times.length - end > 1 ? end : times.length;
  const dated = times.some((time) => time >= 1);
  return times.map((time, row) => (time === 0 && (dated || row >= below) ? Number.NaN : time));
}
