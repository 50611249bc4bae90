import { standardUncertainty } from "../../core";
import { each, ifGivenOrBlank } from "../arguments";
import { cellwise } from "../cellwise";
import { distribution } from "../kinds/distribution";
import { number } from "../kinds/numbers";
import { numberResult } from "../results";

/**
 * Standard uncertainty of what a certificate, a data sheet or a display states: a half-width, an expanded value or a
 * step, by its distribution.
 * @customfunction STANDARDU
 * @category Weigh
 * @param value Half-width without sign, expanded uncertainty (normal), full step (resolution) or standard uncertainty.
 * @param distribution normal, rectangular, triangular, u-shaped, trapezoidal, resolution or standard; uniform, gaussian and arcsine are understood.
 * @param [divisor] Divisor in place of the distribution's own: k for normal (2 when left out or blank). For trapezoidal, needed: top / bottom, above 0 up to 1.
 * @returns Standard uncertainty, in the unit of the value.
 * @equation u = value / divisor: normal 2, rectangular √3, triangular √6, u-shaped √2, resolution √12, standard 1
 * @equation trapezoidal: u = value·√((1 + β²)/6), β = top / bottom
 * @standard JCGM 100:2008, 4.3; EA-4/02 M:2013
 * @keywords type B, rectangular, half-width, divisor, resolution, certificate, data sheet
 * @related BUDGET, COMBINEDU, TYPEA
 * @example =BEAD.STANDARDU({2;0.5;2},{"normal";"rectangular";"rectangular"}) → {1.00;0.29;1.15}
 * @example =BEAD.STANDARDU(0.5,"u-shaped") → 0.35
 */
export function STANDARDU(value: unknown[][], distribution: unknown[][], divisor?: unknown[][]): unknown[][] {
  return standardu({ value, distribution, divisor });
}

const standardu = cellwise(STANDARDU, {
  arguments: {
    value: each(number),
    distribution: each(distribution),
    divisor: ifGivenOrBlank(each(number)),
  },
  result: numberResult,
  cell: ({ value, distribution, divisor }) => standardUncertainty(value, distribution, divisor),
});
