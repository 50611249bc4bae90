/**
 * Platinum resistance sensor at the reference junction.
 *
 * IEC 60751: R = R0 (1 + A t + B t² + C (t − 100 °C) t³), with C = 0 from 0 °C up.
 */
import { degrees, measured, noAnswer, type Refusal, wrongKind } from "../errors";
import { finite } from "../numeric/finite";
import { platinum } from "./iec-60751";

const { a, b, c, from, to } = platinum;

/** Beyond an end of the range by no more than this, °C, counts as the end. */
const AT_THE_END = 1e-9;

/** Newton's method has converged when its step is below this, °C. */
const CONVERGED = 1e-12;

/** R/R0 − 1 at t °C: what is left of the sensor's change keeps all its digits near 0 °C. */
const excess = (t: number): number => t * (a + t * (b + (t < 0 ? c * t * (t - 100) : 0)));

/** d(R/R0)/dt below 0 °C, per °C. */
const slopeBelowZero = (t: number): number => a + t * (2 * b + c * t * (4 * t - 300));

const lowestExcess = excess(from);
const highestExcess = excess(to);

const notPositive = (r0: number): Refusal =>
  r0 === 0
    ? wrongKind`resistance at 0 °C (r0) is 0 or an empty cell`
    : wrongKind`resistance at 0 °C (r0) is ${measured(r0, "Ω")}, not above 0`;

/**
 * Resistance in Ω of a platinum sensor at `t` °C, −200 to 850 °C; `r0` is its resistance
 * at 0 °C, Ω. Refuses a temperature outside that range, an r0 not above 0 and a resistance
 * too large for a number. IEC 60751.
 */
export function platinumResistance(t: number, r0: number): number | Refusal {
  if (!(r0 > 0)) return notPositive(r0);
  if (!(t >= from - AT_THE_END && t <= to + AT_THE_END)) {
    return noAnswer`temperature ${degrees(t)} is outside the range of platinum sensors, ${degrees(from)} to ${degrees(to)}`;
  }
  return finite(r0 * (1 + excess(t)), "resistance");
}

/**
 * Temperature in °C of a platinum sensor from its resistance, Ω, and its resistance at
 * 0 °C, `r0`, Ω: the exact inverse of `platinumResistance`. Refuses a resistance outside
 * its range, whose limits in Ω the message names. IEC 60751.
 */
export function platinumTemperature(resistance: number, r0: number): number | Refusal {
  if (!(r0 > 0)) return notPositive(r0);
  const x = (resistance - r0) / r0;
  if (x >= 0) {
    // The smaller root of the quadratic, in the form that does not cancel.
    const t = (2 * x) / (a + Math.sqrt(a * a + 4 * b * x));
    if (t <= to + AT_THE_END) return Math.min(t, to);
  } else if (x >= lowestExcess - AT_THE_END * slopeBelowZero(from)) {
    return Math.max(belowZero(x), from);
  }
  return noAnswer`resistance ${measured(resistance, "Ω")} is outside the range of a platinum sensor with ${measured(r0, "Ω")} at 0 °C, ${measured(r0 * (1 + lowestExcess), "Ω")} (${degrees(from)}) to ${measured(r0 * (1 + highestExcess), "Ω")} (${degrees(to)})`;
}

/** Newton's method; the curve bends one way only below 0 °C, so that it runs straight home. */
function belowZero(x: number): number {
  let t = x / a;
  let step: number;
  do {
    step = (x - excess(t)) / slopeBelowZero(t);
    t += step;
  } while (Math.abs(step) > CONVERGED);
  return t;
}
