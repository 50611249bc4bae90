/**
 * Our statistics beside NIST's certified values of the Statistical Reference Datasets. NIST certifies 15 digits; 13 are
 * asked for. Wampler 4 and 5 hide coefficients of 1 under a scatter of 2E5 and 2E7, and Filip's ten powers are nearly
 * dependent: they keep 14 digits because the fit carries twice the digits of a double. Pontius and Wampler 2 stop at
 * 13, because their decimals are rounded to doubles before any fit sees them.
 */
import { type DeviationFunction, fitDeviation } from "../../src/core/calibration";
import { type TypeA, typeA } from "../../src/core/uncertainty";
import type { Origin } from "./published-value";
import { type StrdSet, strdPolynomials } from "./strd-polynomials";
import { setsByRule, setsFromMemory } from "./strd-rules";
import { type CertifiedSet, univariateSets } from "./strd-univariate";

export interface CertifiedValue {
  readonly set: string;
  readonly kind: "polynomial" | "univariate";
  readonly origin: Origin;
  readonly what: string;
  readonly certified: number;
  readonly ours: number;
  /** Digits that agree, of 15: whole tenths, rounded down, so that nothing is made to look better. */
  readonly digits: number;
  /** So many are asked for. */
  readonly asked: number;
  readonly holds: boolean;
}

export const ASKED_DIGITS = 13;

/** Where 0 is certified: the rounding of the data leaves something, which is 1E-9 of the largest y at most. */
const LEAST_OF_ZERO = 9;

interface Compared {
  readonly what: string;
  readonly certified: number;
  readonly ours: unknown;
  readonly asked?: number;
}

type SetOf = Pick<CertifiedValue, "set" | "kind" | "origin">;

/** `scale` stands in for a certified value of 0. */
function certifiedValue(of: SetOf, { what, certified, ours, asked }: Compared, scale = 1): CertifiedValue {
  const value = typeof ours === "number" ? ours : Number.NaN;
  const error = Math.abs(value - certified) / Math.abs(certified === 0 ? scale : certified);
  // Written so that what is not a number has no digits.
  const digits = error === 0 ? 15 : error > 0 ? Math.min(15, -Math.log10(error)) : 0;
  const least = asked ?? (certified === 0 ? LEAST_OF_ZERO : ASKED_DIGITS);
  const holds = digits > least;
  return { ...of, what, certified, ours: value, digits: Math.floor(digits * 10) / 10, asked: least, holds };
}

/** Of one set. */
export function certifiedPolynomial({
  name,
  order,
  throughZero,
  rows,
  certified,
  residualSd,
}: StrdSet): CertifiedValue[] {
  const ys = rows.map(([, y]) => y);
  const fit = fitDeviation(
    rows.map(([x]) => x),
    ys,
    order,
    { throughZero },
  ) as DeviationFunction;
  const scale = Math.max(...ys.map(Math.abs));
  const of = { set: name, kind: "polynomial", origin: "print" } as const;
  const first = throughZero ? 1 : 0;
  return [
    ...certified.flatMap(([estimate, sd], i) => [
      certifiedValue(of, { what: `B${i + first}`, certified: estimate, ours: fit.coefficients[i + first] }),
      certifiedValue(
        of,
        {
          what: `standard deviation of B${i + first}`,
          certified: sd,
          ours: (fit.uncertainties as readonly number[])[i + first],
        },
        scale,
      ),
    ]),
    certifiedValue(
      of,
      { what: "residual standard deviation", certified: residualSd, ours: fit.residualSd },
      scale,
    ),
  ];
}

const univariate =
  (origin: Origin) =>
  ({ name, mean, sd, digitsOfSd, readings }: CertifiedSet): CertifiedValue[] => {
    const found = typeA(readings) as TypeA;
    const of = { set: name, kind: "univariate", origin } as const;
    return [
      certifiedValue(of, { what: "mean", certified: mean, ours: found.mean }),
      certifiedValue(of, {
        what: "standard deviation",
        certified: sd,
        ours: found.sd,
        ...(digitsOfSd === undefined ? {} : { asked: digitsOfSd }),
      }),
    ];
  };

export const certifiedPolynomials = (): CertifiedValue[] => strdPolynomials.flatMap(certifiedPolynomial);

export const certifiedUnivariate = (): CertifiedValue[] => [
  ...[...univariateSets, ...setsByRule].flatMap(univariate("print")),
  ...setsFromMemory.flatMap(univariate("memory")),
];
