import { despiker, Refusal } from "../../core";
import { once, orElse, readings as readingsOf } from "../arguments";
import { columnwise } from "../columnwise";
import { number, sheetTemperature } from "../kinds/numbers";
import { sheetTemperatureResult } from "../results";

/**
 * Spikes taken out of logged readings by a moving median (Hampel filter) down each column; readings that are no spikes
 * stay exactly as they are.
 * @customfunction DESPIKE
 * @category Screen
 * @param readings Logged readings, a column per sensor, in whatever degrees the sheet holds. Write IF(ISBLANK(range),"",range), so that an empty cell is missing and not 0.
 * @param [halfWindow] Scans on each side of a reading that it is compared with, 1 to 1000; 3 when left out.
 * @param [threshold] A reading further from the median than so many scaled deviations is a spike; 3 when left out.
 * @returns A block of readings in the shape of the given one. A spike is replaced by the median of its window.
 * @equation spike where |reading − median| > threshold · max(1.4826 · median |reading − median|, smallest step in the column)
 * @definition Missing readings take no part; a window with fewer than 3 readings changes nothing. At the ends of the column the window reaches as far as it goes.
 * @assumes Readings at about equal intervals, and a record that is slow beside the window: a real short peak would be taken out too.
 * @standard Hampel (1974), Journal of the American Statistical Association 69
 * @caution A cleaned record is for looking at. Keep the raw log, and judge a survey by it.
 * @keywords median filter, Hampel, outlier, noise, smooth, clean
 * @related FLAGS, RAMPRATE
 * @example =BEAD.DESPIKE({20;20.1;20.2;35;20.3;20.2;20.1}) → {20.0;20.1;20.2;20.2;20.3;20.2;20.1}
 */
export function DESPIKE(
  readings: unknown[][],
  halfWindow?: unknown[][],
  threshold?: unknown[][],
): unknown[][] {
  return despike({ readings, halfWindow, threshold });
}

const despike = columnwise(DESPIKE, {
  arguments: {
    readings: readingsOf(sheetTemperature),
    halfWindow: orElse(once(number), 3, "3"),
    threshold: orElse(once(number), 3, "3"),
  },
  result: sheetTemperatureResult,
  block: ({ readings }) => readings,
  answers({ readings, halfWindow, threshold }) {
    const clean = despiker(halfWindow, threshold);
    return clean instanceof Refusal ? clean : readings.columns.map(clean);
  },
});
