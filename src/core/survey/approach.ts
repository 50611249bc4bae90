/** The way into the band: how far readings overshot before the survey period began. */
import type { SurveyBlock } from "./block";

/** A set point that was held before: so many minutes, every sensor well above the band and steady. */
const HOLD_MINUTES = 20;
/** Well above: higher than the band by its own width. */
const CLEAR_BY_WIDTHS = 1;
/** Steady: within a quarter of the band's width of where the hold began. */
const STEADY_WITHIN_WIDTHS = 1 / 4;

/** Bits of a scan on the way. */
const SOME_BELOW = 1;
const SOME_NOT_BELOW = 2;

/**
 * Overshoot of each sensor, °C: its highest reading less the set point between the last scan with every sensor below
 * the band and the period first…last; never below 0. All 0 when the period was reached from above: when no scan had
 * every sensor below, or when an earlier, higher set point was held in between.
 *
 * A missing reading leaves its sensor where it was last seen, so that a reading lost on the way hides no overshoot. A
 * sensor without any reading in the period has no say in whether all were below.
 */
export function overshoots(block: SurveyBlock, first: number, last: number): Float64Array {
  const { sensors, band } = block;
  const found = new Float64Array(sensors.length);
  const from = firstOnTheWay(block, first, last);
  if (heldAbove(block, from, first)) return found;
  sensors.forEach((column, sensor) => {
    for (let scan = from; scan < first; scan++) {
      const deviation = (column[scan] as number) - band.setpoint;
      if (deviation > (found[sensor] as number)) found[sensor] = deviation;
    }
  });
  return found;
}

/** The scan after the last one before the period with every sensor below the band; `first` where there is no such. */
function firstOnTheWay({ sensors, band }: SurveyBlock, first: number, last: number): number {
  const way = new Uint8Array(first);
  for (const column of sensors) {
    if (column.subarray(first, last + 1).every(Number.isNaN)) continue;
    let below = true;
    for (let scan = 0; scan < first; scan++) {
      const temperature = column[scan] as number;
      const present = !Number.isNaN(temperature);
      if (present) below = band.side(temperature) < 0;
      if (!below) way[scan]! |= SOME_NOT_BELOW;
      else if (present) way[scan]! |= SOME_BELOW;
    }
  }
  const allBelow = way.lastIndexOf(SOME_BELOW);
  return allBelow < 0 ? first : allBelow + 1;
}

/** Whether from ≤ scan < to the load was held at a higher set point. */
function heldAbove({ sensors, band, grid }: SurveyBlock, from: number, to: number): boolean {
  const clear = band.tolerance.above + CLEAR_BY_WIDTHS * band.width;
  const anchors = new Float64Array(sensors.length);
  const steady = STEADY_WITHIN_WIDTHS * band.width;
  const allClear = (scan: number): boolean =>
    sensors.every((column) => !((column[scan] as number) - band.setpoint <= clear)) &&
    sensors.some((column) => !Number.isNaN(column[scan] as number));
  const stays = (scan: number): boolean =>
    sensors.every((column, i) => !(Math.abs((column[scan] as number) - (anchors[i] as number)) > steady));
  let minutes = Number.NaN; // no hold has begun
  for (let scan = from; scan < to; scan++) {
    if (!allClear(scan)) {
      minutes = Number.NaN;
    } else if (!Number.isNaN(minutes) && grid.gap[scan] === 0 && stays(scan)) {
      minutes += grid.elapsed[scan] as number;
      if (minutes >= HOLD_MINUTES) return true;
      // A sensor that was missing when the hold began is held to its first reading.
      sensors.forEach((column, i) => {
        if (Number.isNaN(anchors[i])) anchors[i] = column[scan] as number;
      });
    } else {
      minutes = 0;
      sensors.forEach((column, i) => {
        anchors[i] = column[scan] as number;
      });
    }
  }
  return false;
}
