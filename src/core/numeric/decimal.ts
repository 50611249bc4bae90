/**
 * Numbers as decimal digits, for text: what a certificate rounds is the number that a
 * spreadsheet shows, 15 significant digits, and not the binary one behind it.
 */
export interface Decimal {
  readonly negative: boolean;
  /** 15 of them, as one whole number: the size of the number in units of 10^lastPlace. */
  readonly digits: bigint;
  readonly lastPlace: number;
  /** Power of ten of the first digit. */
  readonly leadingPlace: number;
}

const SIGNIFICANT = 15;

export function decimal(value: number): Decimal {
  const [mantissa, exponent] = Math.abs(value)
    .toExponential(SIGNIFICANT - 1)
    .split("e") as [string, string];
  const leadingPlace = Number(exponent);
  return {
    negative: value < 0,
    digits: BigInt(mantissa.replace(".", "")),
    lastPlace: leadingPlace - SIGNIFICANT + 1,
    leadingPlace,
  };
}

/** The size in whole units of 10^place, halves rounded up. */
export function roundedTo({ digits, lastPlace }: Decimal, place: number): bigint {
  if (place <= lastPlace) return digits * 10n ** BigInt(lastPlace - place);
  const unit = 10n ** BigInt(place - lastPlace);
  return (digits + unit / 2n) / unit;
}

/** ± `units`·10^place without an exponent; zero has no sign. */
export function plainDecimal(units: bigint, place: number, negative: boolean): string {
  const sign = negative && units !== 0n ? "-" : "";
  if (units === 0n && place >= 0) return "0";
  if (place >= 0) return `${sign}${units}${"0".repeat(place)}`;
  const digits = String(units).padStart(1 - place, "0");
  return `${sign}${digits.slice(0, place)}.${digits.slice(place)}`;
}
