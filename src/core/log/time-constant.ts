/** The time constant of a sensor from a recorded step. */
import { measured, noAnswer, type Refusal } from "../errors";
import { smallestStep } from "./despike";
import { type ExponentialFit, exponentialFit } from "./exponential-fit";
import { bestOfScan } from "./exponential-scan";
import { lengthRefusal, type TimeGrid } from "./time-grid";

export interface StepResponse {
  /** Time constant, seconds. */
  readonly timeConstant: number;
  /** Its standard uncertainty from the scatter about the fitted curve, seconds. */
  readonly uncertainty: number;
  /** Before the step: mean of the readings before it, or the curve at the first reading; °C. */
  readonly initial: number;
  /** Where the response settles, °C. */
  readonly final: number;
}

const SECONDS_PER_MINUTE = 60;
const FEWEST_READINGS = 6;
/** A step needs no more, and the search for its start grows with the record. */
const MOST_READINGS = 20_000;
/** Readings that the response itself must have: its three parameters, and two to tell scatter from curve. */
const FEWEST_IN_RESPONSE = 5;
/** In so short a part of an interval a response is over before the next reading (e⁻⁵ < 1 %). */
const SHORTEST_PART_OF_INTERVAL = 1 / 5;
/** A response of which the record shows less than a tenth of a time constant cannot be told from a ramp. */
const LONGEST_IN_SPANS = 10;
/** Variance ratio (F) by which a step must stand out of the scatter; scatter alone gives 1. */
const STANDS_OUT = 50;
/** Share of the record's variance that the step must explain. */
const EXPLAINED = 0.8;
/** Variance ratio by which rows before the step must be better off without the curve. */
const BETTER_WITHOUT = 20;
/** A time constant less sure than this share of itself is not given. */
const LEAST_SURE = 0.5;
/** Places at which the step is looked for in a first pass. */
const PLACES = 64;

/**
 * Fits a + b·exp(−t/τ) to a recorded step, rising or falling. Level readings before the step are found and left out
 * of the curve. Missing readings (NaN) are left out. Refused: fewer than 6 readings or more than 20 000, no step that stands out of the
 * scatter or of the logger's resolution, a step over within one interval, a record too short to show it settle, and a
 * time constant whose uncertainty is more than half of it.
 */
export function timeConstant(grid: TimeGrid, temperatures: Float64Array): StepResponse | Refusal {
  const wrongLength = lengthRefusal(grid.times, temperatures, "the record");
  if (wrongLength !== undefined) return wrongLength;
  const present = (_: number, i: number): boolean => !Number.isNaN(temperatures[i]);
  const times = grid.times.filter(present);
  const count = times.length;
  if (count < FEWEST_READINGS) {
    return noAnswer`${count} readings are too few to fit a step: at least ${FEWEST_READINGS}`;
  }
  if (count > MOST_READINGS) {
    return noAnswer`${count} readings are too many to fit a step: cut the record to the step, at most ${MOST_READINGS}`;
  }
  if (!((times[count - 1] as number) > (times[0] as number))) return noAnswer`the times never rise`;
  const record = new Step(times, temperatures.filter(present));
  const from = record.start();
  const fit = record.curve(from);
  if (!record.standsOut(from, fit))
    return noAnswer`no step stands out of the scatter and the resolution of the record`;
  if (fit.bound === "short" || !record.responds(from, fit)) {
    return noAnswer`the step is over within one interval of the log`;
  }
  if (fit.bound === "long") return noAnswer`the record ends before the step begins to settle`;
  const seconds = fit.timeConstant * SECONDS_PER_MINUTE;
  const uncertainty = fit.uncertainty * SECONDS_PER_MINUTE;
  if (!(uncertainty <= LEAST_SURE * seconds)) {
    return noAnswer`the record does not fix the time constant: ${measured(seconds, "s")} with a standard uncertainty of ${measured(uncertainty, "s")}`;
  }
  const initial = from > 0 ? record.levelBefore(from) : fit.final + fit.amplitude;
  return { timeConstant: seconds, uncertainty, initial, final: fit.final };
}

/** A record without missing readings whose times rise: level, perhaps, up to the step, then the response. */
class Step {
  readonly count: number;
  /** Sum of squared distances of the readings before each row from their own mean. */
  private readonly squaresBefore: Float64Array;
  private readonly means: Float64Array;
  private readonly shortest: number;
  private readonly longest: number;
  /** For each row, where the search for the time constant of the record from there on begins. */
  private readonly starts: Float64Array;
  /** Squares that the logger's steps (a rectangle of that width) and the arithmetic leave in any fit. */
  private readonly unavoidable: number;

  constructor(
    private readonly times: Float64Array,
    private readonly values: Float64Array,
  ) {
    const n = times.length;
    this.count = n;
    const span = (times[n - 1] as number) - (times[0] as number);
    this.squaresBefore = new Float64Array(n + 1);
    this.means = new Float64Array(n + 1);
    let shortest = span;
    for (let i = 0; i < n; i++) {
      const off = (values[i] as number) - (this.means[i] as number);
      this.means[i + 1] = (this.means[i] as number) + off / (i + 1);
      this.squaresBefore[i + 1] =
        (this.squaresBefore[i] as number) + off * ((values[i] as number) - (this.means[i + 1] as number));
      // NaN in the first row, which is no interval.
      const interval = (times[i] as number) - (times[i - 1] as number);
      if (interval > 0 && interval < shortest) shortest = interval;
    }
    this.shortest = shortest * SHORTEST_PART_OF_INTERVAL;
    this.longest = span * LONGEST_IN_SPANS;
    this.starts = bestOfScan(times, values, this.shortest, this.longest);
    this.unavoidable = n * (smallestStep(values) ** 2 / 12) + 1e-24 * (this.squaresBefore[n] as number);
  }

  levelBefore(row: number): number {
    return this.means[row] as number;
  }

  curve(from: number): ExponentialFit {
    const { times, values, starts, shortest, longest } = this;
    return exponentialFit(
      times.subarray(from),
      values.subarray(from),
      starts[from] as number,
      shortest,
      longest,
    );
  }

  /** Squares of a level up to a row and a curve from it, never under what cannot be avoided. */
  private squares(from: number, fit = this.curve(from)): number {
    return Math.max((this.squaresBefore[from] as number) + fit.squares, this.unavoidable);
  }

  /** The row from which the response runs: 0 unless level rows before it are clearly better left out of the curve. */
  start(): number {
    const last = this.count - FEWEST_IN_RESPONSE;
    const distinct = (row: number): boolean =>
      (this.times[row + FEWEST_IN_RESPONSE - 1] as number) > (this.times[row] as number);
    const whole = this.squares(0);
    let best = 0;
    let least = whole;
    const look = (from: number, to: number, stride: number): void => {
      for (let row = Math.max(from, 1); row <= Math.min(to, last); row += stride) {
        const squares = distinct(row) ? this.squares(row) : Number.POSITIVE_INFINITY;
        if (squares < least) [best, least] = [row, squares];
      }
    };
    for (let stride = Math.max(1, Math.floor(last / PLACES)), from = 1, to = last; ; ) {
      look(from, to, stride);
      if (stride === 1) break;
      [from, to] = [best - stride, best + stride];
      stride = Math.max(1, Math.floor(stride / 8));
    }
    const spare = this.count - 5;
    return spare > 0 && (whole - least) / 2 / (least / spare) > BETTER_WITHOUT ? best : 0;
  }

  /** Whether level and curve together explain the record so much better than its mean does. */
  standsOut(from: number, fit: ExponentialFit): boolean {
    const none = this.squaresBefore[this.count] as number;
    const left = this.squares(from, fit);
    const parameters = from > 0 ? 4 : 2;
    const spare = this.count - 1 - parameters;
    return none - left > EXPLAINED * none && (none - left) / parameters > (STANDS_OUT * left) / spare;
  }

  /** Whether the readings from `from` on follow the curve, and not just another level. */
  responds(from: number, fit: ExponentialFit): boolean {
    const response = this.values.subarray(from);
    const mean = response.reduce((sum, value) => sum + value, 0) / response.length;
    const none = response.reduce((sum, value) => sum + (value - mean) ** 2, 0);
    const left = Math.max(fit.squares, (this.unavoidable * response.length) / this.count);
    return (none - left) / 2 > (BETTER_WITHOUT * left) / (response.length - 3);
  }
}
