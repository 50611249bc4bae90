import { describe, expect, it } from "vitest";
import { type DeviationFunction, fitDeviation } from "../../src/core/calibration";
import { fitPolynomial } from "../../src/core/numeric/least-squares";
import { certifiedPolynomials } from "./certified";
import { strdPolynomials } from "./strd-polynomials";

describe("NIST StRD, polynomial regression", () => {
  it.each(certifiedPolynomials())("$set, $what: more than $asked digits agree", (value) => {
    expect(value).toMatchObject({ holds: true });
  });
});

describe.each(strdPolynomials)("NIST StRD $name", ({ order, throughZero, rows, certified }) => {
  const xs = rows.map(([x]) => x);
  const ys = rows.map(([, y]) => y);
  const fit = fitDeviation(xs, ys, order, { throughZero }) as DeviationFunction;

  it("leaves a degree of freedom for each reading beyond the coefficients", () => {
    expect(fit.dof).toBe(xs.length - certified.length);
  });

  it("evaluates the fit alike from the centred coefficients and from the powers", () => {
    const centred = fitPolynomial(xs, ys, order, { throughZero });
    const largest = Math.max(...ys.map(Math.abs));
    xs.forEach((x, i) => {
      const fitted = (ys[i] as number) - (fit.residuals[i] as number);
      expect(Math.abs((centred?.value(x) ?? Number.NaN) - fitted)).toBeLessThan(1e-13 * largest);
    });
  });
});
