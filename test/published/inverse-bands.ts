/** The published inverse approximations less our exact inverse, over the whole range of each. */
import { type Thermocouple, thermocouple } from "../../src/core";
import { type PublishedInverse, publishedInverses } from "./inverse-approximations";

export interface InverseBand extends PublishedInverse {
  /** EMF in mV, approximation less exact inverse in °C. */
  readonly points: readonly (readonly [emf: number, error: number])[];
  readonly least: number;
  readonly most: number;
  /** The whole curve lies within the printed band and its last digit. */
  readonly holds: boolean;
}

const STEPS = 500;

export function inverseBand(published: PublishedInverse): InverseBand {
  const { type, emfRange, errorBand, rounding, coefficients } = published;
  const [from, to] = emfRange;
  const couple = thermocouple(type) as Thermocouple;
  const points = Array.from({ length: STEPS + 1 }, (_, i): [number, number] => {
    const emf = Math.min(Math.max(from + ((to - from) * i) / STEPS, couple.emfLow), couple.emfHigh);
    // Written out: the check must not share the evaluation with the code under test.
    const approximate = coefficients.reduce((sum, coefficient, power) => sum + coefficient * emf ** power, 0);
    return [emf, approximate - couple.temperature(emf)];
  });
  const errors = points.map(([, error]) => error);
  const [least, most] = [Math.min(...errors), Math.max(...errors)];
  const holds = least >= errorBand[0] - rounding && most <= errorBand[1] + rounding;
  return { ...published, points, least, most, holds };
}

export const inverseBands = (): InverseBand[] => publishedInverses.map(inverseBand);
