/** One segment of a reference function, ready to be evaluated. */
import { compensatedPolynomial, derivative, polynomial, roundingBound } from "../numeric/polynomial";
import type { PublishedSegment } from "./reference-function";

/**
 * Plain Horner evaluation serves as long as the bound of its rounding error is
 * worth no more than this, in °C. On these functions the bound is ten times the
 * error or more, so that forward and inverse agree to 1E-9 °C.
 */
const PLAIN_ENOUGH = 2e-9;

/** No published couple is less sensitive than this where its EMF is unique, mV/°C. */
const LEAST_SENSITIVITY = 1e-4;

export class Segment {
  readonly from: number;
  readonly to: number;
  private readonly coefficients: Float64Array;
  private readonly slopeCoefficients: Float64Array;
  private readonly exponential: PublishedSegment["exponential"];
  /** Up to this |t| plain Horner is good enough; beyond it the sum is compensated. */
  private readonly plainTo: number;

  constructor(published: PublishedSegment) {
    this.from = published.from;
    this.to = published.to;
    this.coefficients = Float64Array.from(published.coefficients);
    this.slopeCoefficients = Float64Array.from(derivative(published.coefficients));
    this.exponential = published.exponential;
    this.plainTo = this.findPlainTo(published.coefficients);
  }

  /** E(t) in mV. */
  emf(t: number): number {
    const { coefficients, exponential } = this;
    const sum =
      t <= this.plainTo && t >= -this.plainTo
        ? polynomial(coefficients, t)
        : compensatedPolynomial(coefficients, t);
    if (exponential === undefined) return sum;
    const offset = t - exponential.a2;
    return sum + exponential.a0 * Math.exp(exponential.a1 * offset * offset);
  }

  /** E(t) for those of the first `count` temperatures from `from` to this segment's end that have no EMF yet. */
  emfs(temperatures: Float64Array, emfs: Float64Array, count: number, from: number): void {
    const { to } = this;
    for (let i = 0; i < count; i++) {
      const t = temperatures[i] as number;
      if (t >= from && t <= to && Number.isNaN(emfs[i])) emfs[i] = this.emf(t);
    }
  }

  /** dE/dt in mV/°C. */
  slope(t: number): number {
    const slope = polynomial(this.slopeCoefficients, t);
    const { exponential } = this;
    if (exponential === undefined) return slope;
    const { a0, a1, a2 } = exponential;
    const offset = t - a2;
    return slope + 2 * a0 * a1 * offset * Math.exp(a1 * offset * offset);
  }

  /**
   * Walks outward from the end nearest to 0 °C and stops where the error bound of
   * plain Horner, turned into degrees, passes `PLAIN_ENOUGH`.
   */
  private findPlainTo(coefficients: readonly number[]): number {
    const near = Math.abs(this.from) < Math.abs(this.to) ? this.from : this.to;
    const far = near === this.from ? this.to : this.from;
    const steps = 256;
    let reached = Math.abs(near);
    for (let i = 0; i <= steps; i++) {
      const t = near + ((far - near) * i) / steps;
      const sensitivity = Math.max(Math.abs(this.slope(t)), LEAST_SENSITIVITY);
      if (roundingBound(coefficients, t) > PLAIN_ENOUGH * sensitivity) return reached;
      reached = Math.abs(t);
    }
    return Number.POSITIVE_INFINITY;
  }
}
