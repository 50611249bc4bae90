/** The summary of a survey: the figures that are signed. All on corrected readings of the survey period. */
import { noAnswer, Refusal } from "../errors";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import type { TemperatureUnit } from "../units";
import { furnaceClass } from "./furnace-class";
import type { ScanExtremes, SensorFigures } from "./sensor-figures";
import type { Survey } from "./survey";
import { type SurveyVerdict, surveyVerdict } from "./verdict";

export interface SurveySummary {
  /** Highest reading, °C; its sensor and scan, counted from 0 (the earliest, then the first sensor, of several). */
  readonly highest: number;
  readonly highestSensor: number;
  readonly highestScan: number;
  readonly lowest: number;
  readonly lowestSensor: number;
  readonly lowestScan: number;
  /** Highest and lowest reading less the set point, signed, °C. */
  readonly plusDeviation: number;
  readonly minusDeviation: number;
  /** Greatest difference between sensors in one scan, °C. */
  readonly spread: number;
  /** Pooled within-sensor least-squares slope, °C per hour. */
  readonly drift: number | Refusal;
  /** By mean, among sensors with at least 90 % of the scans. */
  readonly hottestSensor: number | Refusal;
  readonly coldestSensor: number | Refusal;
  /** Band centre less the middle of highest and lowest, °C: what to move the set point by. */
  readonly centringShift: number;
  /** Highest reading less the set point on the way into the band, °C; 0 when reached from above. */
  readonly overshoot: number;
  /** First and last scan of the period, counted from 0, and the minutes counted between them. */
  readonly first: number;
  readonly last: number;
  readonly minutes: number;
  /** Missing readings in the period, all sensors. */
  readonly missing: number;
  /** Least distance of any reading from its limit, °C; below 0 when one is out of band. */
  readonly margin: number;
  /** AMS2750 class met by the larger of the deviations and the overshoot. */
  readonly classMet: number | "none";
  readonly verdict: SurveyVerdict;
}

const MINUTES_PER_HOUR = 60;

export function surveySummary(survey: Survey): SurveySummary {
  const { block, period, sensors, minutes, unit } = survey;
  const { setpoint } = block.band;
  const highestSensor = extreme(
    sensors,
    unit,
    (s) => -s.highest,
    (s) => s.highestScan,
  );
  const lowestSensor = extreme(
    sensors,
    unit,
    (s) => s.lowest,
    (s) => s.lowestScan,
  );
  const { highest, highestScan } = sensors[highestSensor]!;
  const { lowest, lowestScan } = sensors[lowestSensor]!;
  const overshoot = Math.max(...survey.overshoots);
  const missing = sensors.reduce((sum, sensor) => sum + sensor.missing, 0);
  const met = furnaceClass(Math.max(highest - setpoint, setpoint - lowest, overshoot), unit);
  return {
    highest,
    highestSensor,
    highestScan,
    lowest,
    lowestSensor,
    lowestScan,
    plusDeviation: highest - setpoint,
    minusDeviation: lowest - setpoint,
    spread: spread(survey.extremes),
    drift: drift(sensors),
    hottestSensor: byMean(sensors, unit, -1),
    coldestSensor: byMean(sensors, unit, 1),
    centringShift: block.band.centre - (highest + lowest) / 2,
    overshoot,
    first: period.first,
    last: period.last,
    minutes,
    missing,
    margin: block.band.margin(lowest, highest),
    classMet: met instanceof Refusal ? "none" : met,
    verdict: surveyVerdict({
      outOfBand: sensors.some((sensor) => sensor.outOfBand > 0) || block.band.sideOf(overshoot) > 0,
      incomplete: missing > 0 || survey.gap,
      short: survey.short,
    }),
  };
}

/**
 * The sensor with the smallest `value`, in the earliest scan, among those that have readings. Values are rounded to
 * 1E-9 of the unit's degree first: which of two equal readings comes first is not for the last bit to say.
 */
function extreme(
  sensors: readonly SensorFigures[],
  { degree }: TemperatureUnit,
  value: (sensor: SensorFigures) => number,
  scan: (sensor: SensorFigures) => number,
): number {
  let best = 0;
  let least = Number.POSITIVE_INFINITY;
  sensors.forEach((sensor, index) => {
    if (sensor.count === 0) return;
    const rounded = toNinthDecimal(value(sensor) / degree);
    if (rounded < least || (rounded === least && scan(sensor) < scan(sensors[best]!))) {
      best = index;
      least = rounded;
    }
  });
  return best;
}

function spread({ lowest, highest }: ScanExtremes): number {
  let greatest = 0;
  for (let scan = 0; scan < lowest.length; scan++) {
    greatest = Math.max(greatest, (highest[scan] as number) - (lowest[scan] as number));
  }
  return greatest;
}

function drift(sensors: readonly SensorFigures[]): number | Refusal {
  let products = 0;
  let squares = 0;
  for (const { count, timeProducts, timeSquares } of sensors) {
    // Its mean is not a number; a single reading adds exactly 0 to both.
    if (count === 0) continue;
    products += timeProducts;
    squares += timeSquares;
  }
  if (!(squares > 0)) return noAnswer`no sensor has readings at two times, so there is no drift`;
  return (products / squares) * MINUTES_PER_HOUR;
}

/** The sensor with the highest (−1) or lowest (1) mean; one that was open for long cannot be it. */
function byMean(
  sensors: readonly SensorFigures[],
  { degree }: TemperatureUnit,
  sign: -1 | 1,
): number | Refusal {
  let best: number | undefined;
  let least = Number.POSITIVE_INFINITY;
  sensors.forEach(({ count, missing, mean }, index) => {
    // At least 90 % of the scans, in whole numbers.
    if (10 * count < 9 * (count + missing)) return;
    const rounded = toNinthDecimal((sign * mean) / degree);
    if (rounded < least) [best, least] = [index, rounded];
  });
  return best ?? noAnswer`no sensor has 90 % of the scans`;
}
