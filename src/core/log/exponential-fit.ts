/**
 * Least-squares fit of y = a + b·exp(−t/τ). For a given τ the best a and b are a straight-line fit on exp(−t/τ), so
 * only τ has to be searched (variable projection: G. H. Golub, V. Pereyra, SIAM J. Numer. Anal. 10 (1973) 413–432):
 * Gauss–Newton steps in ln τ, from the best of a scan. One unknown needs no library.
 */

export interface ExponentialFit {
  /** a: where it settles. */
  readonly final: number;
  /** b: how far it is from there at the first time. */
  readonly amplitude: number;
  /** τ, in the unit of the times. */
  readonly timeConstant: number;
  /** Standard uncertainty of τ from the scatter about the curve, NaN without spare points. */
  readonly uncertainty: number;
  /** Sum of the squared residuals. */
  readonly squares: number;
  /** The search ended at a bound: τ too short or too long for the times to tell. */
  readonly bound: "short" | "long" | undefined;
}

const PARAMETERS = 3;
const MOST_STEPS = 60;
/** Relative change of τ at which the search has arrived. */
const ARRIVED = 1e-12;

/**
 * `times` rise from anywhere; at least three of them differ. The search begins at `start` (`bestOfScan`); `shortest` and
 * `longest` bound τ.
 */
export function exponentialFit(
  times: Float64Array,
  values: Float64Array,
  start: number,
  shortest: number,
  longest: number,
): ExponentialFit {
  const curve = new Curve(times, values);
  let timeConstant = start;
  let squares = curve.fit(timeConstant);
  for (let step = 0; step < MOST_STEPS; step++) {
    curve.fit(timeConstant);
    let move = curve.gaussNewtonStep();
    let next = Number.POSITIVE_INFINITY;
    let nextSquares = Number.POSITIVE_INFINITY;
    // A step that is too long for the curve is halved until it helps.
    for (; Math.abs(move) > ARRIVED; move /= 2) {
      next = clamp(timeConstant * Math.exp(move), shortest, longest);
      nextSquares = curve.fit(next);
      if (nextSquares < squares) break;
    }
    if (!(nextSquares < squares)) break;
    [timeConstant, squares] = [next, nextSquares];
  }
  curve.fit(timeConstant);
  return {
    final: curve.final,
    amplitude: curve.amplitude,
    timeConstant,
    uncertainty: timeConstant * curve.relativeUncertainty(),
    squares: curve.squares,
    bound: timeConstant <= shortest ? "short" : timeConstant >= longest ? "long" : undefined,
  };
}

const clamp = (value: number, low: number, high: number): number => Math.min(Math.max(value, low), high);

/** The curve at one τ, with the best a and b. */
class Curve {
  final = 0;
  amplitude = 0;
  squares = 0;
  private timeConstant = Number.NaN;
  private meanDecay = 0;
  private decaySquares = 0;
  /** exp(−t/τ) at each time. */
  private readonly decay: Float64Array;

  constructor(
    private readonly times: Float64Array,
    private readonly values: Float64Array,
  ) {
    this.decay = new Float64Array(times.length);
  }

  private since(i: number): number {
    return (this.times[i] as number) - (this.times[0] as number);
  }

  private residual(i: number): number {
    return (this.values[i] as number) - this.final - this.amplitude * (this.decay[i] as number);
  }

  /** Best a and b at this τ; returns the sum of the squared residuals. */
  fit(timeConstant: number): number {
    if (timeConstant === this.timeConstant) return this.squares;
    const { decay, values } = this;
    const n = decay.length;
    this.timeConstant = timeConstant;
    let sumDecay = 0;
    let sumValue = 0;
    for (let i = 0; i < n; i++) {
      const g = Math.exp(-this.since(i) / timeConstant);
      decay[i] = g;
      sumDecay += g;
      sumValue += values[i] as number;
    }
    const meanDecay = sumDecay / n;
    const meanValue = sumValue / n;
    let squares = 0;
    let products = 0;
    for (let i = 0; i < n; i++) {
      const g = (decay[i] as number) - meanDecay;
      squares += g * g;
      products += g * ((values[i] as number) - meanValue);
    }
    this.meanDecay = meanDecay;
    this.decaySquares = squares;
    this.amplitude = products / squares;
    this.final = meanValue - this.amplitude * meanDecay;
    this.squares = 0;
    for (let i = 0; i < n; i++) this.squares += this.residual(i) ** 2;
    return this.squares;
  }

  /**
   * The part of ∂y/∂ln τ that a and b cannot take up (orthogonal to 1 and exp(−t/τ)): its squared length, and its
   * product with the residuals.
   */
  private slope(): { squares: number; product: number } {
    const { decay } = this;
    const n = decay.length;
    const change = (i: number): number => (decay[i] as number) * (this.since(i) / this.timeConstant);
    let mean = 0;
    for (let i = 0; i < n; i++) mean += change(i) / n;
    let along = 0;
    for (let i = 0; i < n; i++) along += (change(i) - mean) * ((decay[i] as number) - this.meanDecay);
    along /= this.decaySquares;
    let squares = 0;
    let product = 0;
    for (let i = 0; i < n; i++) {
      const free = change(i) - mean - along * ((decay[i] as number) - this.meanDecay);
      squares += free * free;
      product += free * this.residual(i);
    }
    return { squares: squares * this.amplitude ** 2, product: product * this.amplitude };
  }

  /** The change of ln τ that a straight model would need. */
  gaussNewtonStep(): number {
    const { squares, product } = this.slope();
    return squares > 0 ? clamp(product / squares, -1, 1) : 0;
  }

  /** u(ln τ): residual standard deviation over the length of the free part of ∂y/∂ln τ. */
  relativeUncertainty(): number {
    const spare = this.decay.length - PARAMETERS;
    return spare > 0 ? Math.sqrt(this.squares / spare / this.slope().squares) : Number.NaN;
  }
}
