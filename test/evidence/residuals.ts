/**
 * What the inverse leaves over, against an evaluation of the published function with 50 digits: for an EMF e our
 * temperature t' is off by (E(t') − e) / E'(t'), where E is exact but for the fiftieth digit.
 */
import { Decimal } from "decimal.js";
import type { Thermocouple } from "../../src/core";
import { spoken, thermocouple } from "../../src/core";
import { furtherCouples, letterTypes } from "../../src/core/thermoelectric/couples";
import type { PublishedSegment, ReferenceFunction } from "../../src/core/thermoelectric/reference-function";

const Exact = Decimal.clone({ precision: 50 });

/** What we promise: the one in °C or, where a couple hardly responds, the other in mV. */
export const PROMISED_DEGREES = 1e-9;
export const PROMISED_MILLIVOLTS = 5e-11;

const POINTS = 400;

export interface Residuals {
  readonly name: string;
  readonly low: number;
  readonly high: number;
  /** Temperature, residual of the inverse in °C, in rising temperature. */
  readonly points: readonly (readonly [t: number, residual: number])[];
  readonly worstDegrees: number;
  readonly worstMillivolts: number;
  /** Largest error of E(t) itself, mV. */
  readonly worstEmf: number;
  /** Where the one in °C does not hold everywhere, the one in mV does. */
  readonly byDegrees: boolean;
  readonly holds: boolean;
}

function exactEmf(segment: PublishedSegment, at: number): Decimal {
  const t = new Exact(at);
  let sum = new Exact(0);
  for (const coefficient of [...segment.coefficients].reverse()) sum = sum.times(t).plus(coefficient);
  if (segment.exponential === undefined) return sum;
  const { a0, a1, a2 } = segment.exponential;
  return sum.plus(t.minus(a2).pow(2).times(a1).exp().times(a0));
}

/** At a join the lower segment serves. */
const segmentAt = ({ segments }: ReferenceFunction, t: number): PublishedSegment =>
  segments.find(({ to }) => t <= to) ?? (segments[segments.length - 1] as PublishedSegment);

/** `couple` is what is judged: ours, but for a test that shows that a wrong one falls short. */
export function residualsOf(
  reference: ReferenceFunction,
  couple: Thermocouple = thermocouple(reference.designation) as Thermocouple,
): Residuals {
  const { uniqueFrom: low, high } = couple;
  const points: [number, number][] = [];
  let [worstMillivolts, worstEmf, holds] = [0, 0, true];
  for (let i = 0; i <= POINTS; i++) {
    const t = Math.min(low + ((high - low) * i) / POINTS, high);
    const emf = couple.emf(t);
    worstEmf = Math.max(worstEmf, exactEmf(segmentAt(reference, t), t).minus(emf).abs().toNumber());
    const back = couple.temperature(emf);
    const millivolts = exactEmf(segmentAt(reference, back), back).minus(emf).toNumber();
    const degrees = millivolts / couple.seebeck(back);
    points.push([t, degrees]);
    worstMillivolts = Math.max(worstMillivolts, Math.abs(millivolts));
    holds &&= Math.abs(degrees) <= PROMISED_DEGREES || Math.abs(millivolts) <= PROMISED_MILLIVOLTS;
  }
  const worstDegrees = Math.max(...points.map(([, residual]) => Math.abs(residual)));
  const byDegrees = worstDegrees <= PROMISED_DEGREES;
  return {
    name: spoken(couple),
    low,
    high,
    points,
    worstDegrees,
    worstMillivolts,
    worstEmf,
    byDegrees,
    holds,
  };
}

export const conversionResiduals = (): Residuals[] =>
  [...letterTypes, ...furtherCouples].map((reference) => residualsOf(reference));
