/** The text of a result for a certificate: value and expanded uncertainty rounded together. */
import { type Refusal, wrongKind } from "../errors";
import { decimal, plainDecimal, roundedTo } from "../numeric/decimal";
import { refusedUnlessPositive } from "../numeric/positive";

const MOST_DIGITS = 4;

/**
 * "1000.5 ± 1.3": U to `digits` significant digits, rounded up where rounding down would lose
 * more than 5 % of it (EA-4/02 M:2013, 6.3), the value to the same decimal place (JCGM 100:2008,
 * 7.2.6); halves away from zero, no exponents, no negative zero. Both numbers in one unit.
 * Refused: U not above 0; digits that are not a whole number from 1 to 4 (wrong kind).
 */
export function reportValue(value: number, expandedUncertainty: number, digits = 2): string | Refusal {
  const refused = refusedUnlessPositive(expandedUncertainty, "expanded uncertainty");
  if (refused !== undefined) return refused;
  if (!(Number.isInteger(digits) && digits >= 1 && digits <= MOST_DIGITS)) {
    return wrongKind`digits ${digits}: a whole number from 1 to ${MOST_DIGITS}`;
  }
  const u = decimal(expandedUncertainty);
  let place = u.leadingPlace - digits + 1;
  let units = roundedTo(u, place);
  const lost = u.digits - units * 10n ** BigInt(place - u.lastPlace);
  if (20n * lost > u.digits) units += 1n;
  // 9.96 has become 10.0, a digit too many.
  if (units === 10n ** BigInt(digits)) {
    units /= 10n;
    place += 1;
  }
  const v = decimal(value);
  return `${plainDecimal(roundedTo(v, place), place, v.negative)} ± ${plainDecimal(units, place, false)}`;
}
