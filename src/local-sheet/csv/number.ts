export type DecimalMark = "." | ",";

const patterns: Record<DecimalMark, RegExp> = {
  ".": /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i,
  ",": /^[+-]?(\d+,?\d*|,\d+)(e[+-]?\d+)?$/i,
};

/**
 * A field as a number by the chosen decimal mark, or undefined. Thousands marks are not read: "1.234" with a
 * decimal comma stays text rather than becoming 1234, because a logger may have meant 1.234.
 */
export function readNumber(field: string, decimal: DecimalMark): number | undefined {
  const text = field.trim().replace("−", "-");
  if (!patterns[decimal].test(text)) return undefined;
  const value = Number(decimal === "," ? text.replace(",", ".") : text);
  return Number.isFinite(value) ? value : undefined;
}
