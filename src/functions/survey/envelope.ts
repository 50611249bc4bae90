import { envelope as envelopeOf, noAnswer, Refusal } from "../../core";
import { column as columnOf, ifGiven, once, readings as readingsOf } from "../arguments";
import { choice } from "../kinds/kind";
import { sheetDifference, sheetTemperature } from "../kinds/numbers";
import { sheetDifferenceResult, sheetTemperatureResult } from "../results";
import { table } from "../whole";

/**
 * Lowest, highest and mean reading of each scan over all sensors, and the spread between them, for charts.
 * @customfunction ENVELOPE
 * @category Survey
 * @param readings Readings, a column per sensor, in whatever degrees the sheet holds. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0.
 * @param [corrections] Correction to add to each sensor's readings: one row, a cell per sensor; none when left out.
 * @param [column] One column without its header: lowest, highest, mean or spread.
 * @returns One row per scan: lowest, highest, mean, and spread, the highest less the lowest.
 * @definition Missing readings take no part. A scan without any reading is #N/A, blank rows too: a chart leaves it out, where it would draw an empty text as 0.
 * @standard Common practice of furnace surveys
 * @keywords chart, band, minimum, maximum, spread, furnace log, uniformity
 * @related SURVEY, SURVEYSENSORS
 * @example =BEAD.ENVELOPE({900,902;901,905},,"spread") → {2;4}
 */
export function ENVELOPE(
  readings: unknown[][],
  corrections?: unknown[][],
  column?: unknown[][],
): unknown[][] {
  return envelope({ readings, corrections, column });
}

const silent = noAnswer`no sensor has a reading in this scan`;

const envelope = table(ENVELOPE, {
  arguments: {
    readings: readingsOf(sheetTemperature),
    corrections: ifGiven(columnOf(sheetDifference)),
    column: ifGiven(once(choice(["lowest", "highest", "mean", "spread"]))),
  },
  result: {
    lowest: sheetTemperatureResult,
    highest: sheetTemperatureResult,
    mean: sheetTemperatureResult,
    spread: sheetDifferenceResult,
  },
  rows({ readings, corrections }) {
    const found = envelopeOf(readings.columns, corrections);
    if (found instanceof Refusal) return found;
    const figure = (column: Float64Array, scan: number): number | Refusal => {
      const value = column[scan] as number;
      return Number.isNaN(value) ? silent : value;
    };
    return Array.from(found.lowest, (_, scan) => ({
      lowest: figure(found.lowest, scan),
      highest: figure(found.highest, scan),
      mean: figure(found.mean, scan),
      spread: figure(found.spread, scan),
    }));
  },
});
