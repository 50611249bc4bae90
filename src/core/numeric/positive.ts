import { noAnswer, type Quantity, type Refusal } from "../errors";

/**
 * A refusal of a number that must be above 0, such as an expanded uncertainty; undefined where
 * it is. `inUnit` says how the number is printed where it has a unit.
 */
export function refusedUnlessPositive(
  value: number,
  what: string,
  inUnit?: (value: number) => Quantity,
): Refusal | undefined {
  if (value > 0) return undefined;
  if (value === 0) return noAnswer`${what} is 0 or an empty cell`;
  return noAnswer`${what} ${inUnit?.(value) ?? value} is below 0`;
}
