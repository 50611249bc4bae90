/** Effective degrees of freedom of a combined uncertainty. */
import { noAnswer, type Refusal, wrongKind } from "../errors";
import { refusedUnlessPositive } from "../numeric/positive";
import { rootSumSquare } from "../numeric/root-sum-square";
import { contributions, inRow } from "./contributions";

/** Stands for infinitely many degrees of freedom, in and out. */
export const INFINITE_DOF = 1e99;

/** ν_eff = u⁴/Σ(uᵢ⁴/νᵢ), JCGM 100:2008, equation G.2b, from contributions that are not all 0. */
export function welchSatterthwaite(terms: readonly number[], dofs: readonly (number | undefined)[]): number {
  const combined = rootSumSquare(terms);
  let sum = 0;
  for (const [i, term] of terms.entries()) {
    sum += (term / combined) ** 4 / (dofs[i] ?? INFINITE_DOF);
  }
  return Math.min(1 / sum, INFINITE_DOF);
}

/**
 * Welch–Satterthwaite for independent contributions; degrees of freedom that are undefined or
 * from 1E+99 up are infinite, and so is the answer 1E+99. Refused, naming the row: degrees of
 * freedom that are not above 0; contributions that are all 0; what `contributions` refuses.
 */
export function effectiveDof(
  uncertainties: readonly number[],
  dofs: readonly (number | undefined)[],
  sensitivities?: readonly (number | undefined)[],
): number | Refusal {
  if (dofs.length !== uncertainties.length) {
    return wrongKind`${dofs.length} degrees of freedom for ${uncertainties.length} uncertainties`;
  }
  const terms = contributions(uncertainties, sensitivities);
  if (!Array.isArray(terms)) return terms;
  for (const [i, dof] of dofs.entries()) {
    const refused = dof === undefined ? undefined : refusedUnlessPositive(dof, "degrees of freedom");
    if (refused !== undefined) return inRow(i, refused);
  }
  if (terms.every((term) => term === 0)) return noAnswer`every contribution is 0`;
  return welchSatterthwaite(terms, dofs);
}
