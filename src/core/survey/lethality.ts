/** F value: the minutes at a reference temperature that would kill as much as the process did. */
import { degrees, degreesApart, noAnswer, type Refusal } from "../errors";
import { lengthRefusal, roundedMinutes, type TimeGrid } from "../log/time-grid";
import { refusedSetting } from "../numeric/above-zero";
import { toNinthDecimal } from "../numeric/ninth-decimal";
import { celsius, type TemperatureUnit } from "../units";
import { shareAbove } from "./time-above";

/** `straight`: the temperature runs straight between scans and its rate is integrated exactly; `trapezoid`: the rate does. */
export type LethalityMethod = "straight" | "trapezoid";

export interface LethalitySettings {
  /** Reference temperature, °C: 121, 121.1 and 121.11 are all in print for F0, so none is a default. */
  readonly reference: number;
  /** Temperature difference that changes the rate tenfold, °C, above 0. */
  readonly z: number;
  /** Readings below add nothing, °C; none are left out when undefined. */
  readonly threshold?: number | undefined;
  readonly method?: LethalityMethod | undefined;
  /** The unit of the call, in which the threshold is rounded; °C when left out. */
  readonly unit?: TemperatureUnit | undefined;
}

export interface Lethality {
  /** F value, minutes. */
  readonly f: number;
  /** F up to each scan, minutes. */
  readonly running: Float64Array;
  /** Minutes in gaps and in intervals with a missing reading at an end: they added nothing. */
  readonly missingMinutes: number;
}

/** Prepared settings, for any number of records on one time grid. */
export type LethalityOf = (grid: TimeGrid, temperatures: Float64Array) => Lethality | Refusal;

/**
 * F = ∫ L dt with the lethal rate L = 10^((T − reference)/z). Where a straight temperature crosses the threshold, the
 * part of the interval above it counts; by trapezoid, a reading below it has rate 0. Refused: a z that is not above 0;
 * of a record: another length, no two successive readings, a reading whose rate is too large for a number.
 */
export function lethality(settings: LethalitySettings): LethalityOf | Refusal {
  const { reference, z, method = "straight", unit = celsius } = settings;
  const threshold = settings.threshold ?? Number.NEGATIVE_INFINITY;
  const refused = refusedSetting(z, "z", degreesApart);
  if (refused !== undefined) return refused;
  const interval = method === "straight" ? straight : trapezoid;
  /** ln L. */
  const exponent = (temperature: number): number => (Math.LN10 * (temperature - reference)) / z;
  /** Height above the threshold; a reading at it counts as above. */
  const height = (temperature: number): number => toNinthDecimal((temperature - threshold) / unit.degree);
  return ({ times, elapsed, gap }, temperatures) => {
    const wrongLength = lengthRefusal(times, temperatures, "the record");
    if (wrongLength !== undefined) return wrongLength;
    const running = new Float64Array(times.length);
    let f = 0;
    let missingMinutes = 0;
    let known = false;
    for (let scan = 1; scan < times.length; scan++) {
      const from = temperatures[scan - 1] as number;
      const to = temperatures[scan] as number;
      const minutes = elapsed[scan] as number;
      if (gap[scan] === 1 || Number.isNaN(from + to)) {
        missingMinutes += minutes;
      } else {
        known = true;
        f += minutes * interval(exponent(from), exponent(to), height(from), height(to));
        if (!Number.isFinite(f)) {
          const hotter = to > from ? scan : scan - 1;
          return noAnswer`reading ${degrees(Math.max(from, to))} in row ${hotter + 1} is too far above the reference temperature`;
        }
      }
      running[scan] = f;
    }
    if (!known) return noAnswer`no two successive readings`;
    return { f, running, missingMinutes: roundedMinutes(missingMinutes) };
  };
}

/** Mean rate over an interval; a and b are ln L at its ends, the heights those above the threshold. */
type MeanRate = (a: number, b: number, heightA: number, heightB: number) => number;

const trapezoid: MeanRate = (a, b, heightA, heightB) =>
  ((heightA >= 0 ? Math.exp(a) : 0) + (heightB >= 0 ? Math.exp(b) : 0)) / 2;

const straight: MeanRate = (a, b, heightA, heightB) => {
  const share = shareAbove(heightA, heightB);
  if (share === 1) return meanExponential(a, b);
  if (share === 0) return 0;
  // From the crossing to the higher end.
  const [higher, lower] = heightA > heightB ? [a, b] : [b, a];
  return share * meanExponential(higher, higher + share * (lower - higher));
};

/** Mean of eˣ for x straight from a to b: (e^b − e^a)/(b − a), from the larger so that nothing overflows or cancels. */
function meanExponential(a: number, b: number): number {
  const fall = Math.abs(a - b);
  const larger = Math.exp(Math.max(a, b));
  return fall === 0 || larger === 0 ? larger : (larger * -Math.expm1(-fall)) / fall;
}
