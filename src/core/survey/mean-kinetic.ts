/** Mean kinetic temperature: the steady temperature that would age a product as much as the record did. */
import { degrees, measured, noAnswer, type Refusal, wrongKind } from "../errors";
import { lengthRefusal, type TimeGrid } from "../log/time-grid";

/** kJ/mol; with the gas constant below ΔH/R is 10 000 K. Published for medicines (USP, from memory). */
export const ACTIVATION_ENERGY = 83.144;
/** kJ/(mol K), as the publication rounds it, so that its own example comes out. */
const GAS_CONSTANT = 0.0083144;

const LEAST_ENERGY = 10;
const MOST_ENERGY = 500;
const ZERO_CELSIUS = 273.15;

/** Prepared for any number of records; weighted by time where they have a time grid. */
export type MeanKinetic = (temperatures: Float64Array, grid?: TimeGrid) => number | Refusal;

/**
 * T_K = (ΔH/R) / −ln(Σ w e^(−ΔH/RT) / Σ w), T in kelvin, °C in and out, NaN where missing. Without times each reading
 * weighs the same; with them half the time to each neighbour, gaps and intervals with a missing reading at an end
 * adding nothing. `activationEnergy` in kJ/mol, 10…500. Refused of a record: no reading (with times: no two successive
 * ones), a reading at or below absolute zero, another length than the grid's.
 */
export function meanKinetic(activationEnergy = ACTIVATION_ENERGY): MeanKinetic | Refusal {
  if (!(activationEnergy >= LEAST_ENERGY && activationEnergy <= MOST_ENERGY)) {
    return wrongKind`activation energy ${measured(activationEnergy, "kJ/mol")} is outside ${LEAST_ENERGY} to ${MOST_ENERGY} kJ/mol`;
  }
  const ratio = activationEnergy / GAS_CONSTANT;
  return (temperatures, grid) => {
    const wrongLength = grid && lengthRefusal(grid.times, temperatures, "the record");
    if (wrongLength !== undefined) return wrongLength;
    const weights = grid === undefined ? equalWeights(temperatures) : timeWeights(grid, temperatures);
    let highest = Number.NEGATIVE_INFINITY;
    for (let row = 0; row < temperatures.length; row++) {
      const temperature = temperatures[row] as number;
      if (temperature <= -ZERO_CELSIUS) {
        return noAnswer`reading ${degrees(temperature)} in row ${row + 1} is not above absolute zero`;
      }
      if ((weights[row] as number) > 0) highest = Math.max(highest, temperature);
    }
    if (highest === Number.NEGATIVE_INFINITY) {
      return grid === undefined ? noAnswer`no reading` : noAnswer`no two successive readings`;
    }
    // Rates relative to the highest reading's: none overflows, and that of a steady record is exactly 1.
    const hottest = 1 / (highest + ZERO_CELSIUS);
    let rates = 0;
    let total = 0;
    for (let row = 0; row < temperatures.length; row++) {
      const weight = weights[row] as number;
      if (weight === 0) continue;
      rates += weight * Math.exp(ratio * (hottest - 1 / ((temperatures[row] as number) + ZERO_CELSIUS)));
      total += weight;
    }
    return ratio / (ratio * hottest - Math.log(rates / total)) - ZERO_CELSIUS;
  };
}

const equalWeights = (temperatures: Float64Array): Float64Array =>
  temperatures.map((temperature) => (Number.isNaN(temperature) ? 0 : 1));

/**
 * Each interval that is known goes to the reading at either end: the trapezoid rule for the rate. Half of it would be
 * the reading's own time, but only the ratios of weights count.
 */
function timeWeights({ elapsed, gap }: TimeGrid, temperatures: Float64Array): Float64Array {
  const weights = new Float64Array(temperatures.length);
  for (let row = 1; row < temperatures.length; row++) {
    if (gap[row] === 1 || Number.isNaN((temperatures[row - 1] as number) + (temperatures[row] as number)))
      continue;
    weights[row - 1]! += elapsed[row] as number;
    weights[row]! += elapsed[row] as number;
  }
  return weights;
}
