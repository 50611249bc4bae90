/** A sensor's calibration certificate: the correction at any reading between its points. */
import { degrees, noAnswer, Refusal, wrongKind } from "../errors";
import { type Curve, interpolations, type Method } from "./interpolation";
import { countRefused, directionOf, orderRefused, rising, SAME_TEMPERATURE } from "./points";

/** What the certificate prints: true − reading, or reading − true. */
export type GivenAs = "correction" | "error";

/** What its points are: readings of the sensor, or true temperatures. */
export type PointsAre = "readings" | "true";

export interface CertificateTerms {
  readonly givenAs?: GivenAs;
  readonly method?: Method;
  readonly pointsAre?: PointsAre;
}

/** No thermometer shows this many degrees: so bounded, nothing below can overflow. */
const ABSURD = 1e6;

/** Prepared once; a correction then costs a search among the points. */
export class Certificate {
  constructor(
    /** The readings, °C, between which it holds. */
    readonly first: number,
    readonly last: number,
    private readonly curve: Curve,
  ) {}

  /**
   * The correction in °C to add at a reading of `t` °C (true − reading). Refuses a
   * reading outside the points: a certificate is never extrapolated. `name` is what the
   * message calls t.
   */
  correction(t: number, name = "reading"): number | Refusal {
    const { first, last } = this;
    if (t >= first - SAME_TEMPERATURE && t <= last + SAME_TEMPERATURE) {
      return this.curve(Math.min(Math.max(t, first), last));
    }
    return first === last
      ? noAnswer`${name} ${degrees(t)} is not the certificate's only point, ${degrees(first)}`
      : noAnswer`${name} ${degrees(t)} is outside the certificate's points, ${degrees(first)} to ${degrees(last)}`;
  }
}

/**
 * A certificate from its points in °C and, at each, a correction or an error in °C.
 *
 * Methods: `linear`; `nearest` point, half-way the lower; `smooth`, a cubic that keeps
 * the shape and does not overshoot (Fritsch, Carlson 1980; Fritsch, Butland 1984);
 * `fit1` to `fit3`, least squares through at least order + 2 points. Points that are true
 * temperatures are moved to the reading axis by their own errors first: a sensor that
 * shows 2 °C too much at a true 800 °C has its correction at a reading of 802 °C.
 *
 * Refuses points that do not rise or fall strictly, and columns of different length.
 */
export function certificate(
  points: readonly number[],
  values: readonly number[],
  { givenAs = "correction", method = "linear", pointsAre = "readings" }: CertificateTerms = {},
): Certificate | Refusal {
  const refusal = countRefused(points, values, "values") ?? orderRefused(points);
  if (refusal !== undefined) return refusal;
  const absurd = points.findIndex(
    (point, i) => !(Math.max(Math.abs(point), Math.abs(values[i] as number)) < ABSURD),
  );
  if (absurd >= 0) return wrongKind`point ${absurd + 1} or its value is no temperature`;
  const corrections = givenAs === "correction" ? values : values.map((error) => 0 - error);
  const readings =
    pointsAre === "readings" ? points : points.map((point, i) => point - (corrections[i] as number));
  const moved = orderRefused(
    readings,
    "moved by their errors the points must keep their order",
    directionOf(points),
  );
  if (moved !== undefined) return moved;
  const [xs, ys] = rising(readings, corrections);
  const curve = interpolations[method](xs, ys);
  if (curve instanceof Refusal) return curve;
  return new Certificate(xs[0] as number, xs[xs.length - 1] as number, curve);
}
