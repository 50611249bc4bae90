/** Propagation of distributions by a Monte Carlo method, JCGM 101:2008, for a converted temperature. */
import { noAnswer, Refusal } from "../errors";
import { normalDeviates } from "../numeric/normal-deviates";
import { stateFromSeed, xoshiro128 } from "../numeric/xoshiro128";
import { temperatureOf } from "../thermoelectric/convert";
import { spoken } from "../thermoelectric/designation";
import type { Thermocouple } from "../thermoelectric/thermocouple";
import { shortestInterval, symmetricInterval } from "./coverage-interval";
import { temperatureUncertainty } from "./temperature-uncertainty";
import { typeA } from "./type-a";
import { validation } from "./validation";

export interface SimulationInput {
  readonly couple: Thermocouple;
  /** mV */
  readonly emf: number;
  /** Temperature of the reference junction, °C. */
  readonly reference: number;
  /** Standard uncertainties: of the EMF in µV, of the reference temperature and of anything else in °C. */
  readonly uEmfUv: number;
  readonly uReference: number;
  readonly uOther?: number;
  readonly trials?: number;
  readonly seed?: number;
}

/** All in °C. */
export interface Simulation {
  readonly mean: number;
  readonly standard: number;
  /** Probabilistically symmetric 95 % coverage interval. */
  readonly low: number;
  readonly high: number;
  /** Shortest 95 % coverage interval. */
  readonly shortestLow: number;
  readonly shortestHigh: number;
  /** Whether the first-order result with k = 1.960 holds to one significant digit. */
  readonly validated: "yes" | "no" | Refusal;
}

export const DEFAULT_TRIALS = 1_000_000;
const FEWEST_TRIALS = 1000;
const MOST_TRIALS = 10_000_000;

let last: { readonly key: string; readonly simulation: Simulation | Refusal } | undefined;

/**
 * Simulates the temperature with normal inputs; the same arguments and seed give the same
 * result. The last simulation is remembered, so that asking for another of its values costs
 * nothing. Refused: what the conversion and its first-order uncertainty refuse; uncertainties
 * that are all 0; trials that are not a whole number from 1000 to 10 000 000, a seed that is not
 * one from 0 to 2⁵³ − 1; a trial outside the couple's range, with the count.
 */
export function simulateTemperature(input: SimulationInput): Simulation | Refusal {
  const { couple, emf, reference, uEmfUv, uReference, uOther = 0, trials = DEFAULT_TRIALS, seed = 1 } = input;
  const key = [couple.designation, emf, reference, uEmfUv, uReference, uOther, trials, seed].join(" ");
  if (last?.key !== key) last = { key, simulation: simulate({ ...input, uOther, trials, seed }) };
  return last.simulation;
}

function simulate(input: Required<SimulationInput>): Simulation | Refusal {
  const { couple, emf, reference, uEmfUv, uReference, uOther, trials, seed } = input;
  if (!(Number.isInteger(trials) && trials >= FEWEST_TRIALS && trials <= MOST_TRIALS)) {
    return noAnswer`trials ${String(trials)}: a whole number from ${String(FEWEST_TRIALS)} to ${String(MOST_TRIALS)}`;
  }
  if (!(Number.isSafeInteger(seed) && seed >= 0)) {
    return noAnswer`seed ${String(seed)}: a whole number from 0 to ${String(Number.MAX_SAFE_INTEGER)}`;
  }
  const y = temperatureOf(couple, emf, reference);
  if (y instanceof Refusal) return y;
  const u = temperatureUncertainty(couple, y, uEmfUv, uReference, reference, uOther);
  if (u instanceof Refusal) return u;
  if (u === 0) return noAnswer`every uncertainty is 0`;
  const temperatures = trialTemperatures(input);
  if (temperatures instanceof Refusal) return temperatures;
  const statistics = typeA(temperatures);
  if (statistics instanceof Refusal) return statistics;
  const { mean, sd } = statistics;
  if (mean instanceof Refusal) return mean;
  if (sd instanceof Refusal) return sd;
  temperatures.sort();
  const symmetric = symmetricInterval(temperatures);
  const shortest = shortestInterval(temperatures);
  return {
    mean,
    standard: sd,
    low: symmetric.low,
    high: symmetric.high,
    shortestLow: shortest.low,
    shortestHigh: shortest.high,
    validated: validation(temperatures, y, u),
  };
}

/** The temperature of each trial, unsorted. */
function trialTemperatures(input: Required<SimulationInput>): Float64Array | Refusal {
  const { couple, emf, reference, uEmfUv, uReference, uOther, trials, seed } = input;
  const deviate = normalDeviates(xoshiro128(stateFromSeed(seed)));
  const uEmf = uEmfUv / 1000;
  const temperatures = new Float64Array(trials);
  let outside = 0;
  for (let i = 0; i < trials; i++) {
    const sum = emf + uEmf * deviate() + couple.emf(reference + uReference * deviate());
    const t = couple.temperature(sum) + uOther * deviate();
    if (!Number.isFinite(t)) outside++;
    temperatures[i] = t;
  }
  if (outside === 0) return temperatures;
  return noAnswer`${String(outside)} of ${String(trials)} trials are outside the range of ${spoken(couple)}`;
}
