import { type Quantity, type Refusal, wrongKind } from "../errors";

/**
 * A refusal of a setting that must be above 0, such as a tolerance or a window, where 0 is as likely an empty cell;
 * undefined where it is above 0. `inUnit` says how the number is printed where it has a unit.
 */
export function refusedSetting(
  value: number,
  what: string,
  inUnit?: (value: number) => Quantity,
): Refusal | undefined {
  if (value > 0) return undefined;
  if (value === 0) return wrongKind`${what}: 0 or an empty cell`;
  return wrongKind`${what} ${inUnit?.(value) ?? value} is not above 0`;
}
