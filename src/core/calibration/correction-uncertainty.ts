/** Uncertainty of a correction that was found between two points of a certificate. */
import { degrees, degreesApart, noAnswer, type Refusal, wrongKind } from "../errors";
import { countRefused, intervalOf, orderRefused, rising, SAME_TEMPERATURE } from "./points";

export class CorrectionUncertainty {
  constructor(
    private readonly points: Float64Array,
    /** U/k at each point, °C. */
    private readonly standard: Float64Array,
  ) {}

  /**
   * Standard uncertainty in °C of the correction at a reading of `t` °C: the larger U/k of
   * the two points beside it (at a point, its own), combined with the half-width `drift`
   * in °C of a rectangular distribution, √(u² + drift²/3) (JCGM 100, 4.3.7). Refuses a
   * reading outside the points and a negative drift.
   */
  at(t: number, drift = 0): number | Refusal {
    const { points } = this;
    const first = points[0] as number;
    const last = points[points.length - 1] as number;
    if (!(t >= first - SAME_TEMPERATURE && t <= last + SAME_TEMPERATURE)) {
      return noAnswer`reading ${degrees(t)} is outside the certificate's points, ${degrees(first)} to ${degrees(last)}`;
    }
    if (!(drift >= 0)) return wrongKind`drift allowance ${degreesApart(drift)} is below 0`;
    return Math.hypot(this.beside(t), drift / Math.sqrt(3));
  }

  /** The larger U/k of the two points beside t; at a point its own. */
  private beside(t: number): number {
    const { points, standard } = this;
    const i = intervalOf(points, t);
    const left = standard[i] as number;
    if (t - (points[i] as number) <= SAME_TEMPERATURE) return left;
    // Between two points, then: of a single one every reading is the point.
    const right = standard[i + 1] as number;
    return (points[i + 1] as number) - t <= SAME_TEMPERATURE ? right : Math.max(left, right);
  }
}

/**
 * From a certificate's points in °C, the expanded uncertainty U in °C at each, and their
 * coverage factor k. Refuses points that do not rise or fall strictly, and a U or k not
 * above 0.
 */
export function correctionUncertainty(
  points: readonly number[],
  expanded: readonly number[],
  k: number,
): CorrectionUncertainty | Refusal {
  const refusal = countRefused(points, expanded, "expanded uncertainties") ?? orderRefused(points);
  if (refusal !== undefined) return refusal;
  if (!(k > 0)) return wrongKind`coverage factor k ${k} is not above 0`;
  const bad = expanded.findIndex((uncertainty) => !(uncertainty > 0));
  if (bad >= 0) {
    const uncertainty = expanded[bad] as number;
    return uncertainty === 0
      ? wrongKind`expanded uncertainty of point ${bad + 1} is 0 or an empty cell`
      : wrongKind`expanded uncertainty of point ${bad + 1} is ${degreesApart(uncertainty)}, not above 0`;
  }
  const standard = expanded.map((uncertainty) => uncertainty / k);
  if (!standard.every(Number.isFinite)) return wrongKind`coverage factor k ${k} is too near to 0`;
  return new CorrectionUncertainty(...rising(points, standard));
}
