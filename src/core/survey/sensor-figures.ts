/** One sensor over the survey period, in one pass over its column. */
import type { SurveyBlock } from "./block";
import type { SurveyPeriod } from "./period";

export interface SensorFigures {
  /** Readings in the period. */
  readonly count: number;
  readonly missing: number;
  readonly outOfBand: number;
  /** °C; meaningless while `count` is 0, as everything below is. */
  readonly lowest: number;
  readonly lowestScan: number;
  readonly highest: number;
  readonly highestScan: number;
  readonly mean: number;
  /** Σ(t − t̄)(T − T̄) and Σ(t − t̄)², minutes and °C: the sensor's share of the pooled slope. */
  readonly timeProducts: number;
  readonly timeSquares: number;
}

/** Lowest and highest reading of each scan of the period; `Infinity` and `-Infinity` while it has none. */
export interface ScanExtremes {
  readonly lowest: Float64Array;
  readonly highest: Float64Array;
}

export function noExtremes({ first, last }: SurveyPeriod): ScanExtremes {
  const scans = last - first + 1;
  return {
    lowest: new Float64Array(scans).fill(Number.POSITIVE_INFINITY),
    highest: new Float64Array(scans).fill(Number.NEGATIVE_INFINITY),
  };
}

/** Figures of one sensor; widens the scans' extremes by its readings. */
export function sensorFigures(
  { grid, sensors, band }: SurveyBlock,
  sensor: number,
  { first, last }: SurveyPeriod,
  extremes: ScanExtremes,
): SensorFigures {
  const column = sensors[sensor]!;
  const { times } = grid;
  const { lowest: scanLowest, highest: scanHighest } = extremes;
  // Sums of deviations and of times from the middle of the period stay small beside those of the raw numbers.
  const middle = ((times[first] as number) + (times[last] as number)) / 2;
  const { setpoint } = band;
  let count = 0;
  let outOfBand = 0;
  let lowest = Number.POSITIVE_INFINITY;
  let highest = Number.NEGATIVE_INFINITY;
  let lowestScan = first;
  let highestScan = first;
  let sum = 0;
  let sumTime = 0;
  let sumTimeTime = 0;
  let sumTimeDeviation = 0;
  for (let scan = first; scan <= last; scan++) {
    const temperature = column[scan] as number;
    if (Number.isNaN(temperature)) continue;
    const deviation = temperature - setpoint;
    const time = (times[scan] as number) - middle;
    count++;
    sum += deviation;
    sumTime += time;
    sumTimeTime += time * time;
    sumTimeDeviation += time * deviation;
    if (band.sideOf(deviation) !== 0) outOfBand++;
    if (temperature < lowest) {
      lowest = temperature;
      lowestScan = scan;
    }
    if (temperature > highest) {
      highest = temperature;
      highestScan = scan;
    }
    const place = scan - first;
    scanLowest[place] = Math.min(scanLowest[place] as number, temperature);
    scanHighest[place] = Math.max(scanHighest[place] as number, temperature);
  }
  return {
    count,
    missing: last - first + 1 - count,
    outOfBand,
    lowest,
    lowestScan,
    highest,
    highestScan,
    mean: setpoint + sum / count,
    timeProducts: sumTimeDeviation - (sumTime * sum) / count,
    timeSquares: sumTimeTime - (sumTime * sumTime) / count,
  };
}
