/** Columns that lie beside each other and may hold blank rows. */
import { noAnswer, type Refusal, wrongKind } from "../../core";

type Gapped = readonly (number | undefined)[];

/**
 * The uncertainties with 0 for a row that is wholly blank: it adds nothing, and the rows
 * below it keep the number by which a message names them.
 */
export function withBlankRowsAsNothing(
  uncertainties: Gapped,
  beside: Readonly<Record<string, Gapped | undefined>>,
): number[] | Refusal {
  const given = Object.entries(beside).flatMap(([words, column]) =>
    column === undefined ? [] : [{ words, column }],
  );
  for (const { words, column } of given) {
    if (column.length !== uncertainties.length)
      return wrongKind`uncertainties and ${words} differ in number, ${uncertainties.length} and ${column.length}`;
  }
  if (uncertainties.every((u) => u === undefined)) return noAnswer`no uncertainties`;
  const filled: number[] = [];
  for (const [i, u] of uncertainties.entries()) {
    if (u === undefined && given.some(({ column }) => column[i] !== undefined))
      return noAnswer`row ${i + 1}: uncertainty missing`;
    filled.push(u ?? 0);
  }
  return filled;
}
