/** Contributions cᵢ·u(xᵢ) to a combined uncertainty. */
import { noAnswer, Refusal, wrongKind } from "../errors";
import { finite } from "../numeric/finite";

/** A refusal of a sensitivity of 0, which is as likely an empty cell. */
export const refusedSensitivity = (sensitivity: number): Refusal | undefined =>
  sensitivity === 0 ? noAnswer`sensitivity is 0 or an empty cell` : undefined;

/** A refusal with the row that it belongs to before it; `index` counts from 0, the message from 1. */
export function inRow(index: number, refusal: Refusal, name = ""): Refusal {
  const refuse = refusal.kind === "wrong kind" ? wrongKind : noAnswer;
  const named = name.trim() === "" ? "" : ` (${name.trim()})`;
  return refuse`row ${index + 1}${named}: ${refusal.message()}`;
}

/**
 * Each standard uncertainty times its sensitivity (undefined: 1), signed. Refused, naming the
 * row: an uncertainty below 0 and a sensitivity of 0; columns of different lengths (wrong kind).
 */
export function contributions(
  uncertainties: readonly number[],
  sensitivities?: readonly (number | undefined)[],
): number[] | Refusal {
  if (uncertainties.length === 0) return noAnswer`no uncertainties`;
  if (sensitivities !== undefined && sensitivities.length !== uncertainties.length) {
    return wrongKind`${sensitivities.length} sensitivities for ${uncertainties.length} uncertainties`;
  }
  const products: number[] = [];
  for (const [i, u] of uncertainties.entries()) {
    if (u < 0) return inRow(i, noAnswer`uncertainty ${u} is below 0`);
    const sensitivity = sensitivities?.[i] ?? 1;
    const refused = refusedSensitivity(sensitivity);
    if (refused !== undefined) return inRow(i, refused);
    const product = finite(u * sensitivity, "contribution");
    if (product instanceof Refusal) return inRow(i, product);
    products.push(product);
  }
  return products;
}
