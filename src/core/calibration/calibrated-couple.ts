/**
 * A couple with its own calibration: E(t) = Eref(t) + ΔE(t), the reference function of
 * its type and its deviation function, between the temperatures of its certificate only.
 */
import { degrees, millivolts, noAnswer, type Refusal, wrongKind } from "../errors";
import { compensatedPolynomial, derivative, polynomial } from "../numeric/polynomial";
import { type Rising, whereReached } from "../numeric/root";
import { firstOutside } from "../thermoelectric/refusals";
import type { Thermocouple } from "../thermoelectric/thermocouple";
import { SAME_TEMPERATURE } from "./points";
import { turningPoint } from "./turning-point";

/**
 * What reaches the reference junction. `standard`: extension cable or the instrument's
 * compensation, which follow the reference function. `individual`: the couple's own wires,
 * as at an ice point, whose deviation at the reference junction counts too.
 */
export type ReferenceBy = "standard" | "individual";

/** An EMF beyond the value at an end of the range by no more than this, mV, is taken as that end. */
const AT_THE_END = 1e-9;

/** Newton's method has converged when its step is below this, °C. */
const CONVERGED = 1e-12;

export class CalibratedCouple implements Rising {
  private readonly slopeUv: Float64Array;
  /** The ends of the published segments from low to high, °C, low first, and the EMF at each, mV. */
  private readonly ends: readonly number[];
  private readonly emfEnds: readonly number[];
  /** E(low) and E(high), mV. */
  readonly emfLow: number;
  readonly emfHigh: number;

  constructor(
    readonly couple: Thermocouple,
    private readonly coefficientsUv: Float64Array,
    readonly low: number,
    readonly high: number,
  ) {
    this.slopeUv = Float64Array.from(derivative([...coefficientsUv]));
    const joins = couple.reference.segments.map(({ from }) => from);
    this.ends = [low, ...joins.filter((join) => join > low && join < high), high];
    this.emfEnds = this.ends.map((end) => this.value(end));
    this.emfLow = this.value(low);
    this.emfHigh = this.value(high);
  }

  /** The lowest temperature, °C, at which the EMF turns back; `low` where it falls throughout. */
  turnsBackAt(): number | undefined {
    return turningPoint((t) => this.slope(t), this.ends);
  }

  /** E(t) in mV, reference junction at 0 °C; nothing is checked. */
  value(t: number): number {
    return this.couple.emf(t) + compensatedPolynomial(this.coefficientsUv, t) / 1000;
  }

  /** dE/dt in mV/°C; nothing is checked. */
  slope(t: number): number {
    return this.couple.seebeck(t) + polynomial(this.slopeUv, t) / 1000;
  }

  /**
   * EMF in mV with the measuring junction at `t` and the reference junction at `reference`,
   * both °C. Refuses a `t` outside the calibrated range.
   */
  emf(t: number, reference: number, by: ReferenceBy = "standard"): number | Refusal {
    const { low, high } = this;
    if (!(t >= low - SAME_TEMPERATURE && t <= high + SAME_TEMPERATURE)) {
      return noAnswer`temperature ${degrees(t)} is outside the calibrated range, ${degrees(low)} to ${degrees(high)}`;
    }
    const emf = this.value(Math.min(Math.max(t, low), high)) - this.atReference(reference, by);
    return Number.isNaN(emf) ? this.referenceRefused(reference) : emf;
  }

  /**
   * Temperature in °C of the measuring junction from the EMF in mV and the reference
   * junction's temperature in °C: emf + Eref(reference) = Eref(t) + ΔE(t), with
   * ΔE(reference) added on the left where the couple's own wires reach the reference,
   * solved exactly. Refuses an EMF outside the calibrated range.
   */
  temperature(emf: number, reference: number, by: ReferenceBy = "standard"): number | Refusal {
    const { couple, low, high, emfLow, emfHigh } = this;
    const sum = emf + this.atReference(reference, by);
    if (sum > emfLow && sum < emfHigh) {
      // One segment at a time: where two do not meet, the join, and where they overlap, the lower one.
      const i = this.emfEnds.findIndex((end) => sum <= end);
      const [from, to] = [this.ends[i - 1] as number, this.ends[i] as number];
      return whereReached(this, sum, from, to, couple.temperature(sum), CONVERGED);
    }
    if (sum >= emfHigh && sum <= emfHigh + AT_THE_END) return high;
    if (sum <= emfLow && sum >= emfLow - AT_THE_END) return low;
    if (Number.isNaN(sum)) return this.referenceRefused(reference);
    return noAnswer`the EMF comes to ${millivolts(sum)}, outside the calibrated range, ${millivolts(emfLow)} (${degrees(low)}) to ${millivolts(emfHigh)} (${degrees(high)})`;
  }

  /**
   * What the reference junction takes off, mV; NaN where it is not known. ΔE is known in the
   * calibrated range, and at 0 °C outside it: there the certificate's own reference junction
   * was, and both junctions at one temperature give no EMF.
   */
  private atReference(reference: number, by: ReferenceBy): number {
    const { couple, coefficientsUv, low, high } = this;
    const standard = couple.emf(reference);
    if (by === "standard") return standard;
    if (reference >= low && reference <= high) {
      return standard + compensatedPolynomial(coefficientsUv, reference) / 1000;
    }
    return reference === 0 ? standard : Number.NaN;
  }

  private referenceRefused(reference: number): Refusal {
    const { couple, low, high } = this;
    return Number.isNaN(couple.emf(reference))
      ? firstOutside(couple, ["reference temperature", reference])
      : noAnswer`reference temperature ${degrees(reference)} is outside the calibrated range, ${degrees(low)} to ${degrees(high)}: the couple's own deviation there is not known`;
  }
}

/**
 * A calibrated couple from the coefficients of its deviation function, c0, c1, … in µV per
 * °Cⁱ, and the range in °C in which they hold.
 *
 * Refuses a range that is empty or outside the reference function, and coefficients that
 * make E(t) turn back in it, naming the temperature: an EMF would belong to two.
 */
export function calibratedCouple(
  couple: Thermocouple,
  coefficientsUv: readonly number[],
  low: number,
  high: number,
): CalibratedCouple | Refusal {
  if (coefficientsUv.length === 0) return wrongKind`no coefficients are given`;
  if (!(low < high)) return wrongKind`low ${degrees(low)} is not below high ${degrees(high)}`;
  if (Number.isNaN(couple.emf(low)) || Number.isNaN(couple.emf(high))) {
    return firstOutside(couple, ["low", low], ["high", high]);
  }
  const calibrated = new CalibratedCouple(couple, Float64Array.from(coefficientsUv), low, high);
  const turn = calibrated.turnsBackAt();
  if (turn === undefined) {
    return calibrated.emfLow < calibrated.emfHigh ? calibrated : noAnswer`the coefficients are too large`;
  }
  return turn === low
    ? noAnswer`with these coefficients the EMF falls from ${degrees(low)} to ${degrees(high)}`
    : noAnswer`with these coefficients the EMF turns back at ${degrees(turn)}, inside ${degrees(low)} to ${degrees(high)}`;
}
