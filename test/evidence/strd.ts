/** Digits in which our statistics agree with NIST's certified values. */
import { type DeviationFunction, fitDeviation } from "../../src/core/calibration";
import { type TypeA, typeA } from "../../src/core/uncertainty";
import { type StrdSet, strdPolynomials } from "../published/strd-polynomials";
import { univariateSets } from "../published/strd-univariate";

export interface CertifiedDigits {
  readonly set: string;
  /** What was compared. */
  readonly values: string;
  /** The fewest digits among them; 15 are certified. */
  readonly digits: number;
  readonly holds: boolean;
}

/** Fewer would mean that an algorithm loses more than the rounding of the data to doubles does. */
const LEAST = 13;

const digits = (value: number, certified: number): number =>
  value === certified ? 15 : Math.min(15, -Math.log10(Math.abs(value - certified) / Math.abs(certified)));

/** Whole tenths, rounded down, so that nothing is made to look better. */
const line = (set: string, values: string, found: readonly number[]): CertifiedDigits => {
  const least = Math.min(...found);
  return { set, values, digits: Math.floor(least * 10) / 10, holds: least > LEAST };
};

function polynomial({ name, order, throughZero, rows, certified }: StrdSet): CertifiedDigits[] {
  const fit = fitDeviation(
    rows.map(([x]) => x),
    rows.map(([, y]) => y),
    order,
    { throughZero },
  ) as DeviationFunction;
  const first = throughZero ? 1 : 0;
  const estimates = certified.map(([estimate], i) => digits(fit.coefficients[i + first] as number, estimate));
  const sds = certified.flatMap(([, sd], i) =>
    sd === 0 ? [] : [digits((fit.uncertainties as number[])[i + first] as number, sd)],
  );
  return [
    line(name, `${estimates.length} coefficients`, estimates),
    ...(sds.length > 0 ? [line(name, `${sds.length} standard deviations`, sds)] : []),
  ];
}

export const certifiedDigits = (): CertifiedDigits[] => [
  ...strdPolynomials.flatMap(polynomial),
  ...univariateSets.map(({ name, mean, sd, readings }) => {
    const found = typeA(readings) as TypeA;
    return line(name, "mean and standard deviation", [
      digits(found.mean as number, mean),
      digits(found.sd as number, sd),
    ]);
  }),
];
