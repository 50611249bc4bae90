/** How a correction is found between the points of a certificate. */
import { noAnswer, type Refusal, wrongKind } from "../errors";
import { fitPolynomial } from "../numeric/least-squares";
import { cubicAt, monotoneSlopes } from "../numeric/monotone-cubic";
import { intervalOf } from "./points";

export type Method = "linear" | "nearest" | "smooth" | "fit1" | "fit2" | "fit3";

/** A prepared curve: cheap to evaluate, between the first and the last point only. */
export type Curve = (x: number) => number;

/** Points that rise strictly, with a value each. */
type Prepare = (xs: Float64Array, ys: Float64Array) => Curve | Refusal;

/** A certificate with a single point has nothing between. */
const alone = (ys: Float64Array): Curve | undefined => (ys.length === 1 ? () => ys[0] as number : undefined);

const linear: Prepare = (xs, ys) =>
  alone(ys) ??
  ((x) => {
    const i = intervalOf(xs, x);
    const left = xs[i] as number;
    const u = (x - left) / ((xs[i + 1] as number) - left);
    return (1 - u) * (ys[i] as number) + u * (ys[i + 1] as number);
  });

/** Half-way between two points the lower one counts. */
const nearest: Prepare = (xs, ys) =>
  alone(ys) ??
  ((x) => {
    const i = intervalOf(xs, x);
    return ys[x - (xs[i] as number) <= (xs[i + 1] as number) - x ? i : i + 1] as number;
  });

const smooth: Prepare = (xs, ys) => {
  const only = alone(ys);
  if (only !== undefined) return only;
  const slopes = monotoneSlopes(xs, ys);
  return slopes.every(Number.isFinite)
    ? (x) => cubicAt(xs, ys, slopes, intervalOf(xs, x), x)
    : wrongKind`the certificate's points lie too close together`;
};

/** At least one point more than coefficients, so that the fit smooths and does not merely pass through. */
const fitted =
  (order: number): Prepare =>
  (xs, ys) => {
    const needed = order + 2;
    if (xs.length < needed) {
      return noAnswer`a fit of order ${order} needs at least ${needed} points; the certificate has ${xs.length}`;
    }
    return (
      fitPolynomial([...xs], [...ys], order)?.value ??
      wrongKind`the certificate's points lie too close together`
    );
  };

export const interpolations: Readonly<Record<Method, Prepare>> = {
  linear,
  nearest,
  smooth,
  fit1: fitted(1),
  fit2: fitted(2),
  fit3: fitted(3),
};
