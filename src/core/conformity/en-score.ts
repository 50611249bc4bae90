import type { Refusal } from "../errors";
import { finite } from "../numeric/finite";
import { refusedUnlessPositive } from "../numeric/positive";
import { rootSumSquare } from "../numeric/root-sum-square";

/**
 * En number of a comparison, (x − X)/√(U² + U_ref²) with both uncertainties expanded at
 * about 95 % (ISO/IEC 17043:2010, B.3.1.3 e): satisfactory where |En| ≤ 1. Refused: an
 * uncertainty that is not above 0.
 */
export function enScore(
  value: number,
  expandedUncertainty: number,
  referenceValue: number,
  referenceUncertainty: number,
): number | Refusal {
  const refused =
    refusedUnlessPositive(expandedUncertainty, "expanded uncertainty") ??
    refusedUnlessPositive(referenceUncertainty, "reference uncertainty");
  if (refused !== undefined) return refused;
  const score = (value - referenceValue) / rootSumSquare([expandedUncertainty, referenceUncertainty]);
  return finite(score, "En number");
}
