/** What each scan of a survey is worth, all sensors together. */
import type { SurveyBlock } from "./block";

/** Every sensor is present and in band. */
export const ALL_IN_BAND = 0;
/** Bit of a scan in which a reading is missing. */
export const MISSING = 1;
/** Bit of a scan in which a reading is out of band. */
export const OUT_OF_BAND = 2;

/** One byte per scan, from one pass over the block. */
export function scanStates({ grid, sensors, band }: SurveyBlock): Uint8Array {
  const states = new Uint8Array(grid.times.length);
  for (const column of sensors) {
    for (let scan = 0; scan < column.length; scan++) {
      const temperature = column[scan] as number;
      if (Number.isNaN(temperature)) states[scan]! |= MISSING;
      else if (band.side(temperature) !== 0) states[scan]! |= OUT_OF_BAND;
    }
  }
  return states;
}

/** Why no scan has every sensor in band, for a message. */
export function whyNever({ sensors }: SurveyBlock): string {
  const silent = sensors.findIndex((column) => column.every(Number.isNaN));
  return silent < 0 ? "" : `; sensor ${silent + 1} has no reading at all`;
}
