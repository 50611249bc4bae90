import { DEFAULT_TRIALS, Refusal, simulateTemperature } from "../../core";
import { ifGiven, once, orElse, unit as unitOption } from "../arguments";
import { couple } from "../kinds/couple";
import { choice } from "../kinds/kind";
import { emf as emfInMillivolts, microvolts, number } from "../kinds/numbers";
import { temperature, temperatureDifference } from "../kinds/temperature";
import { differenceResult, temperatureResult, wordResult } from "../results";
import { metrics } from "../whole";

/**
 * Uncertainty of a converted temperature by simulation: mean, standard uncertainty, 95 % intervals, and whether the
 * first-order result of TEMPERATUREU holds.
 * @customfunction SIMULATEU
 * @category Weigh
 * @param emf Measured EMF in mV.
 * @param type Thermocouple type: B C E J K N R S T A, or conductors such as Au/Pt.
 * @param referenceTemperature Temperature of the reference junction. Type 0 for an ice point.
 * @param uEmfUv Standard uncertainty of the EMF, in µV.
 * @param uReference Standard uncertainty of the reference junction's temperature, in degrees of the call's unit.
 * @param [uOther] Standard uncertainty of anything else, in degrees of the call's unit; 0 when left out.
 * @param [trials] Number of trials, 1000 to 10 000 000; 1 000 000 when left out.
 * @param [seed] Seed, a whole number from 0; 1 when left out. The same seed gives the same result.
 * @param [metric] One value: mean, standard, low, high, shortest_low, shortest_high or validated.
 * @param [unit] Unit of every temperature in the call: C (default), F, K or R.
 * @returns Rows of metric and value, or the one value asked for.
 * @definition low, high: ends of the probabilistically symmetric 95 % interval. shortest_low, shortest_high: of the shortest one.
 * @definition validated: yes where both ends of t ± 1.960·u of the first-order result agree with low and high to one significant digit of u in °C, else no.
 * @assumes Normal distributions of EMF, reference temperature and the rest, independent of each other.
 * @standard JCGM 101:2008
 * @keywords Monte Carlo, coverage interval, propagation of distributions, validation, GUM supplement 1
 * @related TEMPERATUREU, TEMPERATURE, BUDGET
 * @example =BEAD.SIMULATEU(0,"K",0,39.45,0,,100000,,"standard") → 1.0
 * @example =BEAD.SIMULATEU(0,"K",0,39.45,0,,100000,,"validated") → "yes"
 */
export function SIMULATEU(
  emf: unknown[][],
  type: unknown[][],
  referenceTemperature: unknown[][],
  uEmfUv: unknown[][],
  uReference: unknown[][],
  uOther?: unknown[][],
  trials?: unknown[][],
  seed?: unknown[][],
  metric?: unknown[][],
  unit?: unknown[][],
): unknown[][] {
  return simulateu({
    emf,
    type,
    referenceTemperature,
    uEmfUv,
    uReference,
    uOther,
    trials,
    seed,
    metric,
    unit,
  });
}

const simulateu = metrics(SIMULATEU, {
  arguments: {
    emf: once(emfInMillivolts),
    type: once(couple),
    referenceTemperature: once(temperature),
    uEmfUv: once(microvolts),
    uReference: once(temperatureDifference),
    uOther: orElse(once(temperatureDifference), 0, "0"),
    trials: orElse(once(number), DEFAULT_TRIALS, "1 000 000"),
    seed: orElse(once(number), 1, "1"),
    metric: ifGiven(
      once(choice(["mean", "standard", "low", "high", "shortest_low", "shortest_high", "validated"])),
    ),
    unit: unitOption,
  },
  result: {
    mean: temperatureResult,
    standard: differenceResult,
    low: temperatureResult,
    high: temperatureResult,
    shortest_low: temperatureResult,
    shortest_high: temperatureResult,
    validated: wordResult,
  },
  metrics({ emf, type, referenceTemperature, uEmfUv, uReference, uOther, trials, seed }) {
    const found = simulateTemperature({
      couple: type,
      emf,
      reference: referenceTemperature,
      uEmfUv,
      uReference,
      uOther,
      trials,
      seed,
    });
    if (found instanceof Refusal) return found;
    const { shortestLow, shortestHigh, ...named } = found;
    return { ...named, shortest_low: shortestLow, shortest_high: shortestHigh };
  },
});
