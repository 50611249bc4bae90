/** The law of propagation of uncertainty. */
import type { Refusal } from "../errors";
import { finite } from "../numeric/finite";
import { rootSumSquare } from "../numeric/root-sum-square";
import { contributions } from "./contributions";
import { refusedCorrelations } from "./correlations";

/**
 * Combined standard uncertainty √(ΣᵢΣⱼ cᵢuᵢ rᵢⱼ cⱼuⱼ), JCGM 100:2008, equations 10 and 16.
 * A sensitivity that is undefined is 1; without correlations the quantities are independent.
 * Refused: what `contributions` and `refusedCorrelations` refuse.
 */
export function combinedUncertainty(
  uncertainties: readonly number[],
  sensitivities?: readonly (number | undefined)[],
  correlations?: readonly (readonly number[])[],
): number | Refusal {
  const terms = contributions(uncertainties, sensitivities);
  if (!Array.isArray(terms)) return terms;
  const independent = rootSumSquare(terms);
  if (correlations === undefined || independent === 0) return finite(independent, "combined uncertainty");
  const refused = refusedCorrelations(correlations, terms.length);
  if (refused !== undefined) return refused;
  let ratio = 0;
  for (const [i, row] of correlations.entries()) {
    for (const [j, r] of row.entries()) {
      ratio += ((terms[i] as number) / independent) * r * ((terms[j] as number) / independent);
    }
  }
  // Contributions that cancel wholly may leave a variance of −1E-17.
  return finite(independent * Math.sqrt(Math.max(0, ratio)), "combined uncertainty");
}
