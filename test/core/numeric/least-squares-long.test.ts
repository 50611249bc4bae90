import { expect, it } from "vitest";
import { fitPolynomial, type PolynomialFit } from "../../../src/core/numeric/least-squares";

it("takes a column of 150 000 points", () => {
  const xs = Array.from({ length: 150_000 }, (_, i) => i / 100);
  const fit = fitPolynomial(
    xs,
    xs.map((x) => 1 + x),
    1,
  ) as PolynomialFit;
  expect(fit.coefficients).toEqual([1, 1]);
});
